import type { SystemDefinition } from './system-definition';

const TURN = 2 * Math.PI;

/** The sine map of the circle, x' = x + Omega - K/(2 pi) sin(2 pi x) modulo 1. */
export const sineCircle: SystemDefinition = {
  id: 'sine-circle',
  title: 'Sine map of the circle',
  group: 'clocks and loops',
  type: 'map',
  variables: ['x'],
  formulas: ['x + Omega - K/(2*pi)*sin(2*pi*x)'],
  parameters: [
    { name: 'Omega', title: 'detuning, turns per step', unit: 'turn', default: 0.2, range: [-1, 1] },
    { name: 'K', title: 'coupling', unit: '', default: 0.9, range: [0, 10] },
  ],
  domain: [{ from: 0, to: 1, ends: 'periodic' }],
  sigma: { default: 0.05, range: [1e-3, 0.5] },
  map(x, [Omega, K], out, slope) {
    const c = K / TURN;
    for (let i = 0; i < x.length; i++) {
      const angle = TURN * x[i];
      out[i] = x[i] + Omega - c * Math.sin(angle);
      if (slope) slope[i] = 1 - K * Math.cos(angle);
    }
  },
  breaks: () => [],
  citation:
    'V. I. Arnold, Small denominators I: mappings of the circumference onto itself, Amer. Math. Soc. Transl. 46 (1965) 213 (from memory)',
  known: [
    {
      quantity: 'fixed point',
      parameters: { Omega: 0.1, K: 0.9 },
      value: Math.asin((TURN * 0.1) / 0.9) / TURN,
      source: 'sin(2 pi x) = 2 pi Omega/K inside the locked tongue 2 pi |Omega| <= K, exact',
    },
    {
      quantity: 'modulus of the second eigenvalue',
      parameters: { Omega: 0.2, K: 0.9, sigma: 0.05 },
      value: Math.hypot(0.5206666526856423, 0.7052137447323862),
      source: 'matrix elements exp(-2 pi^2 sigma^2 k^2 - 2 pi i k Omega) J_(k-j)(kK), from DLMF 10.12.1',
    },
    {
      quantity: 'Lyapunov exponent with noise',
      parameters: { Omega: 0.2, K: 0.9, sigma: 0.05 },
      value: -0.05051378357605274,
      source: 'the same matrix; adaptive quadrature',
    },
  ],
  summary:
    'A clock that is pulled towards another one, as in clock recovery and phase-locked loops. Noise lets it slip where it would lock.',
};
