import type { SystemDefinition } from './system-definition';

/** The linear map, x' = a x + c: with noise the autoregressive process of first order. */
export const linear: SystemDefinition = {
  id: 'linear',
  title: 'Linear map (autoregressive)',
  group: 'control charts and random walks',
  type: 'map',
  variables: ['x'],
  formulas: ['a*x + c'],
  parameters: [
    { name: 'a', title: 'what is kept per step', unit: '', default: 0.8, range: [-4, 4] },
    { name: 'c', title: 'drift per step', unit: 'x', default: 0, range: [-2, 2] },
  ],
  domain: [{ from: -4, to: 4, ends: 'absorbing' }],
  sigma: { default: 0.3, range: [0.01, 4] },
  map(x, [a, c], out, slope) {
    for (let i = 0; i < x.length; i++) out[i] = a * x[i] + c;
    slope?.fill(a);
  },
  breaks: () => [],
  citation:
    'G. E. P. Box & G. M. Jenkins, Time Series Analysis: Forecasting and Control, Holden-Day, 1970 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: { a: 0.8, c: 0.1 }, value: 0.5, source: 'c/(1 - a), exact' },
    { quantity: 'Lyapunov exponent', parameters: { a: 0.8, c: 0 }, value: Math.log(0.8), source: 'ln |a|, exact' },
    {
      quantity: 'stationary variance on the whole line',
      parameters: { a: 0.8, c: 0, sigma: 0.3 },
      value: 0.09 / (1 - 0.64),
      source: 'sigma^2/(1 - a^2), Box & Jenkins (from memory); exact',
    },
    {
      quantity: 'second eigenvalue on the whole line',
      parameters: { a: 0.8, c: 0, sigma: 0.3 },
      value: 0.8,
      source: 'a^n with Hermite eigenfunctions: Mehler kernel, DLMF 18.18.28',
    },
  ],
  summary: 'A process that forgets at a steady rate; between limits it is a control chart, with a = 1 a random walk.',
};
