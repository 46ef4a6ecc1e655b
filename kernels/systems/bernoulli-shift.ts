import type { SystemDefinition } from './system-definition';

/** The Bernoulli shift (beta transformation), x' = beta x modulo 1 on an interval whose ends are not joined. */
export const bernoulliShift: SystemDefinition = {
  id: 'bernoulli-shift',
  title: 'Bernoulli shift',
  group: 'textbook',
  type: 'map',
  variables: ['x'],
  formulas: ['mod(beta*x, 1)'],
  parameters: [{ name: 'beta', title: 'base', unit: '', default: 2, range: [1, 20] }],
  domain: [{ from: 0, to: 1, ends: 'reflecting' }],
  sigma: { default: 0.02, range: [1e-3, 0.5] },
  map(x, [beta], out, slope) {
    for (let i = 0; i < x.length; i++) {
      const y = beta * x[i];
      out[i] = y - Math.floor(y);
    }
    slope?.fill(beta);
  },
  breaks: ([beta]) => Array.from({ length: Math.ceil(beta) - 1 }, (_, k) => (k + 1) / beta),
  citation:
    'W. Parry, On the beta-expansions of real numbers, Acta Math. Hung. 11 (1960) 401; A. Rényi, 8 (1957) 477 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: { beta: 2 }, value: 0, source: 'exact' },
    {
      quantity: 'Lyapunov exponent',
      parameters: { beta: 1.618033988749895 },
      value: Math.log(1.618033988749895),
      source: 'ln beta, exact',
    },
    {
      quantity: 'invariant density at x = 0.3',
      parameters: { beta: 1.618033988749895 },
      value: (5 + 3 * Math.sqrt(5)) / 10,
      source: 'W. Parry 1960 (from memory); piecewise constant, checked by its own balance equation',
    },
    {
      quantity: 'second eigenvalue without noise, smooth densities',
      parameters: { beta: 2 },
      value: 0.5,
      source: '2^-n, Bernoulli polynomials: P. Gaspard, J. Phys. A 25 (1992) L483 (from memory)',
    },
  ],
  summary:
    'Reads off the digits of a number in base beta. Unlike the doubling map of the circle its ends are not joined.',
};
