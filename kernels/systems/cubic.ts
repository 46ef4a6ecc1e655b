import type { SystemDefinition } from './system-definition';

/** The cubic map, x' = a x^3 + (1 - a) x. */
export const cubic: SystemDefinition = {
  id: 'cubic',
  title: 'Cubic map',
  group: 'switches and bistable devices',
  type: 'map',
  variables: ['x'],
  formulas: ['a*x^3 + (1 - a)*x'],
  parameters: [{ name: 'a', title: 'strength of the nonlinearity', unit: '', default: 3.6, range: [0, 5] }],
  domain: [{ from: -1, to: 1, ends: 'reflecting' }],
  sigma: { default: 0.02, range: [1e-3, 1] },
  map(x, [a], out, slope) {
    for (let i = 0; i < x.length; i++) {
      const v = x[i];
      out[i] = a * (v * v * v) + (1 - a) * v;
      if (slope) slope[i] = a * (3 * (v * v)) + (1 - a);
    }
  },
  breaks: () => [],
  citation: 'T. D. Rogers & D. C. Whitley, Chaos in the cubic mapping, Math. Modelling 4 (1983) 9 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: { a: 3.6 }, value: 1, source: 'exact' },
    {
      quantity: 'slope at the fixed point',
      parameters: { a: 3.6 },
      value: 1 + 2 * 3.6,
      source: '1 + 2a at x = 1, exact',
    },
    {
      quantity: 'the two bands meet at a',
      parameters: {},
      value: 1 + (3 * Math.sqrt(3)) / 2,
      source: 'the image of the local maximum is 0, exact',
    },
    {
      quantity: 'Lyapunov exponent',
      parameters: { a: 4 },
      value: Math.log(3),
      source: 'the Chebyshev polynomial T3, conjugate to tripling an angle; exact',
    },
    {
      quantity: 'invariant density at x = 0.3',
      parameters: { a: 4 },
      value: 1 / (Math.PI * Math.sqrt(1 - 0.09)),
      source: '1/(pi sqrt(1 - x^2)): Chebyshev polynomial, exact',
    },
  ],
  summary: 'An odd map with two symmetric bands; up to a = 3.598 each keeps its orbits, and noise makes them cross.',
};
