import type { SystemDefinition } from './system-definition';

/** The logistic map, x' = r x (1 - x). */
export const logistic: SystemDefinition = {
  id: 'logistic',
  title: 'Logistic map',
  group: 'populations',
  type: 'map',
  variables: ['x'],
  formulas: ['r*x*(1 - x)'],
  parameters: [{ name: 'r', title: 'growth factor per step', unit: '', default: 3.8, range: [0, 5] }],
  domain: [{ from: 0, to: 1, ends: 'absorbing' }],
  sigma: { default: 0.01, range: [1e-3, 0.5] },
  map(x, [r], out, slope) {
    for (let i = 0; i < x.length; i++) {
      const a = x[i];
      out[i] = r * a * (1 - a);
      if (slope) slope[i] = r * (1 - 2 * a);
    }
  },
  breaks: () => [],
  citation: 'R. M. May, Simple mathematical models with very complicated dynamics, Nature 261 (1976) 459 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: { r: 3.8 }, value: 1 - 1 / 3.8, source: '1 - 1/r, exact' },
    { quantity: 'slope at the fixed point', parameters: { r: 3.8 }, value: 2 - 3.8, source: '2 - r, exact' },
    {
      quantity: 'Lyapunov exponent',
      parameters: { r: 4 },
      value: Math.LN2,
      source:
        'S. Ulam & J. von Neumann, Bull. Amer. Math. Soc. 53 (1947) 1120 (from memory): conjugate to the tent map',
    },
    {
      quantity: 'end of the first period-doubling cascade, r',
      parameters: {},
      value: 3.569945671870945,
      source: 'M. J. Feigenbaum, J. Stat. Phys. 19 (1978) 25 and 21 (1979) 669 (from memory)',
    },
    {
      quantity: 'mean exit time from the quasi-stationary density, steps',
      parameters: { r: 3.8, sigma: 0.005 },
      value: 2.15748325e23,
      source: 'direct positive sums, two resolutions',
    },
  ],
  summary:
    'A population with one generation per step, or an amplifier that saturates. With noise it leaves [0, 1] sooner or later: the exit time grows as exp(const/sigma^2).',
};
