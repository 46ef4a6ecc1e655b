import type { SystemDefinition } from './system-definition';

/** The saturating map, x' = a tanh x. */
export const saturating: SystemDefinition = {
  id: 'saturating',
  title: 'Saturating map',
  group: 'switches and bistable devices',
  type: 'map',
  variables: ['x'],
  formulas: ['a*tanh(x)'],
  parameters: [{ name: 'a', title: 'gain', unit: '', default: 1.5, range: [-4, 4] }],
  domain: [{ from: -5, to: 5, ends: 'reflecting' }],
  sigma: { default: 0.4, range: [0.02, 4] },
  map(x, [a], out, slope) {
    for (let i = 0; i < x.length; i++) {
      out[i] = a * Math.tanh(x[i]);
      if (slope) {
        const c = Math.cosh(x[i]);
        slope[i] = a / c / c;
      }
    }
  },
  breaks: () => [],
  citation: 'J. J. Hopfield, Neurons with graded response, Proc. Natl. Acad. Sci. USA 81 (1984) 3088 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: { a: 1.5 }, value: 1.2878394549601655, source: 'x = a tanh x, solved here' },
    {
      quantity: 'second eigenvalue on the whole line',
      parameters: { a: 1.5, sigma: 0.4 },
      value: 0.9787476212334185,
      source: 'Gauss–Legendre Nyström, 300 and 420 nodes agree to 1e-14',
    },
    {
      quantity: 'stationary variance on the whole line',
      parameters: { a: 1.5, sigma: 0.4 },
      value: 1.520810506322118,
      source: 'Gauss–Legendre Nyström, 300 and 420 nodes agree to 1e-14',
    },
  ],
  summary:
    'An amplifier with feedback: above gain 1 it rests at one of two levels, and noise switches it between them.',
};
