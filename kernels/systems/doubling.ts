import type { SystemDefinition } from './system-definition';

/** The doubling map of the circle, x' = 2x modulo 1. */
export const doubling: SystemDefinition = {
  id: 'doubling',
  title: 'Doubling map of the circle',
  group: 'textbook',
  type: 'map',
  variables: ['x'],
  formulas: ['2*x'],
  parameters: [],
  domain: [{ from: 0, to: 1, ends: 'periodic' }],
  sigma: { default: 0.05, range: [1e-3, 0.5] },
  map(x, _p, out, slope) {
    for (let i = 0; i < x.length; i++) out[i] = 2 * x[i];
    slope?.fill(2);
  },
  breaks: () => [],
  citation:
    'A. Rényi, Representations for real numbers and their ergodic properties, Acta Math. Hung. 8 (1957) 477 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: {}, value: 0, source: 'exact' },
    { quantity: 'Lyapunov exponent', parameters: {}, value: Math.LN2, source: 'the slope is 2 everywhere, exact' },
    { quantity: 'invariant density at x = 0.3', parameters: {}, value: 1, source: 'uniform, exact' },
    {
      quantity: 'spectrum with noise',
      parameters: { sigma: 0.05 },
      value: '1 and 0 only',
      source: 'mode k goes to mode k/2 or to nothing: the operator is nilpotent beside the uniform density, exact',
    },
  ],
  summary: 'Every step doubles a phase: all memory is lost in finitely many steps once noise is there.',
};
