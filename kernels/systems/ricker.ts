import type { SystemDefinition } from './system-definition';

/** The Ricker map, x' = x exp(r (1 - x)). */
export const ricker: SystemDefinition = {
  id: 'ricker',
  title: 'Ricker map',
  group: 'populations',
  type: 'map',
  variables: ['x'],
  formulas: ['x*exp(r*(1 - x))'],
  parameters: [{ name: 'r', title: 'growth rate per step at low numbers', unit: '', default: 2.6, range: [0, 4] }],
  domain: [{ from: 0, to: 6, ends: ['absorbing', 'reflecting'] }],
  sigma: { default: 0.05, range: [5e-3, 2] },
  map(x, [r], out, slope) {
    for (let i = 0; i < x.length; i++) {
      const growth = Math.exp(r * (1 - x[i]));
      out[i] = x[i] * growth;
      if (slope) slope[i] = (1 - r * x[i]) * growth;
    }
  },
  breaks: () => [],
  citation: 'W. E. Ricker, Stock and recruitment, J. Fish. Res. Board Can. 11 (1954) 559 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: { r: 2.6 }, value: 1, source: 'exact' },
    { quantity: 'slope at the fixed point', parameters: { r: 2.6 }, value: 1 - 2.6, source: '1 - r, exact' },
    {
      quantity: 'largest image',
      parameters: { r: 2.6 },
      value: Math.exp(1.6) / 2.6,
      source: 'exp(r - 1)/r at x = 1/r, exact',
    },
  ],
  summary: 'A population that overshoots: many young in one year, few in the next. Leaving at 0 is extinction.',
};
