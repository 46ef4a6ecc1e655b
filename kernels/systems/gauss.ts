import type { SystemDefinition } from './system-definition';

/** How many of the infinitely many breaks 1/2, 1/3, … are listed. */
const LISTED = 400;

/** The Gauss map of continued fractions, x' = 1/x modulo 1. */
export const gauss: SystemDefinition = {
  id: 'gauss',
  title: 'Gauss map (continued fractions)',
  group: 'textbook',
  type: 'map',
  variables: ['x'],
  formulas: ['mod(1/x, 1)'],
  parameters: [],
  domain: [{ from: 0, to: 1, ends: 'reflecting' }],
  sigma: { default: 0.02, range: [1e-3, 0.5] },
  map(x, _p, out, slope) {
    for (let i = 0; i < x.length; i++) {
      const inverse = 1 / x[i];
      out[i] = inverse - Math.floor(inverse);
      if (slope) slope[i] = -inverse / x[i];
    }
  },
  breaks: () => Array.from({ length: LISTED }, (_, k) => 1 / (LISTED + 1 - k)),
  citation: 'E. Wirsing, On the theorem of Gauss-Kusmin-Lévy, Acta Arith. 24 (1974) 507 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: {}, value: (Math.sqrt(5) - 1) / 2, source: 'x = 1/x - 1, exact' },
    {
      quantity: 'invariant density at x = 0.5',
      parameters: {},
      value: 1 / (1.5 * Math.LN2),
      source: '1/((1 + x) ln 2): C. F. Gauss; exact',
    },
    {
      quantity: 'Lyapunov exponent',
      parameters: {},
      value: Math.PI ** 2 / (6 * Math.LN2),
      source: 'A. Khinchin, Continued Fractions, 1935; P. Lévy, 1929 (from memory)',
    },
    {
      quantity: 'second eigenvalue without noise, smooth densities',
      parameters: {},
      value: -0.3036630028987326,
      source: 'E. Wirsing 1974; digits of OEIS A038517',
    },
  ],
  summary: 'Produces the digits of continued fractions. It has infinitely many branches, which pile up at 0.',
};
