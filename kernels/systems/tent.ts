import type { SystemDefinition } from './system-definition';

/** The tent map, x' = s min(x, 1 - x). */
export const tent: SystemDefinition = {
  id: 'tent',
  title: 'Tent map',
  group: 'textbook',
  type: 'map',
  variables: ['x'],
  formulas: ['s*min(x, 1 - x)'],
  parameters: [{ name: 's', title: 'slope', unit: '', default: 2, range: [0, 4] }],
  domain: [{ from: 0, to: 1, ends: 'reflecting' }],
  sigma: { default: 0.02, range: [1e-3, 0.5] },
  map(x, [s], out, slope) {
    for (let i = 0; i < x.length; i++) {
      const rising = x[i] <= 1 - x[i];
      out[i] = s * (rising ? x[i] : 1 - x[i]);
      if (slope) slope[i] = rising ? s : -s;
    }
  },
  breaks: () => [0.5],
  citation: 'P. Gaspard, Chaos, Scattering and Statistical Mechanics, Cambridge University Press, 1998 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: { s: 2 }, value: 2 / 3, source: 's/(1 + s), exact' },
    { quantity: 'Lyapunov exponent', parameters: { s: 2 }, value: Math.LN2, source: 'ln s, exact' },
    { quantity: 'invariant density at x = 0.3', parameters: { s: 2 }, value: 1, source: 'uniform for s = 2, exact' },
    {
      quantity: 'second eigenvalue without noise, smooth densities',
      parameters: { s: 2 },
      value: 0.25,
      source:
        '4^-n: P. Gaspard, 1998; D. Driebe, Fully Chaotic Maps and Broken Time Symmetry, Kluwer, 1999 (from memory)',
    },
  ],
  summary:
    'The simplest map that stretches and folds. With slope 2 its density is uniform; above 2 it leaks at the top.',
};
