import type { SystemDefinition } from './system-definition';

/** The rotation of the circle, x' = x + a modulo 1. */
export const rotation: SystemDefinition = {
  id: 'rotation',
  title: 'Rotation',
  group: 'clocks and loops',
  type: 'map',
  variables: ['x'],
  formulas: ['x + a'],
  parameters: [{ name: 'a', title: 'angle per step', unit: 'turn', default: 0.6180339887498949, range: [-1, 1] }],
  domain: [{ from: 0, to: 1, ends: 'periodic' }],
  sigma: { default: 0.1, range: [1e-3, 1] },
  map(x, [a], out, slope) {
    for (let i = 0; i < x.length; i++) out[i] = x[i] + a;
    slope?.fill(1);
  },
  breaks: () => [],
  citation: 'K. V. Mardia & P. E. Jupp, Directional Statistics, Wiley, 2000 (the wrapped normal law; from memory)',
  known: [
    { quantity: 'Lyapunov exponent', parameters: { a: 0.3 }, value: 0, source: 'the slope is 1 everywhere, exact' },
    { quantity: 'invariant density at x = 0.3', parameters: { a: 0.3 }, value: 1, source: 'uniform, exact' },
    {
      quantity: 'modulus of the second eigenvalue',
      parameters: { a: 0.3, sigma: 0.1 },
      value: Math.exp(-2 * Math.PI ** 2 * 0.01),
      source: 'exp(-2 pi^2 sigma^2 k^2 - 2 pi i k a) with k = 1, exact',
    },
  ],
  summary: 'A free oscillator seen once per step; noise makes its phase diffuse. Its whole spectrum is known.',
};
