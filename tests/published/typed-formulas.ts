import type { Ends } from '@/kernels/index';
import type { PublishedCheck, Wanted } from './published-check';
import rows from './typed-formulas.json' with { type: 'json' };

const TOLERANCE = 1e-10;

interface Row {
  id: string;
  formula: string;
  parameters: Record<string, number | undefined>;
  sigma: number;
  from: number;
  to: number;
  ends: string | string[];
  eigenvalues: number[][];
  mean: number;
  variance: number;
  lyapunov: number;
  meanTime?: number;
  meanTimeFrom?: number;
  start?: number;
  /** largest difference between the two grids the row was computed on */
  shift: number;
}

function numbers(row: Row): Wanted[] {
  const number = (path: string, expected: number | undefined, tolerance: Wanted['tolerance']): Wanted[] =>
    expected === undefined
      ? []
      : [{ kind: 'number', path: `cases[0].${path}`, tolerance, known: Math.max(row.shift, 1e-13), expected }];
  const absolute = { absolute: TOLERANCE };
  const relative = { relative: TOLERANCE };
  return [
    {
      kind: 'eigenvalues',
      path: 'cases[0].spectrum.noisy',
      tolerance: absolute,
      known: Math.max(row.shift, 1e-13),
      expected: row.eigenvalues.map(([re, im]) => [re, im] as const),
    },
    ...number('stationary.mean[0]', row.mean, absolute),
    ...number('stationary.covariance[0][0]', row.variance, absolute),
    ...number('lyapunov.value', row.lyapunov, absolute),
    ...number('exit.meanTime', row.meanTime, relative),
    ...number('exit.meanTimeFrom', row.meanTimeFrom, relative),
  ];
}

/** Formulas as a user types them, with parameters of their own, against dense matrices of another program. */
export const typedFormulaChecks: readonly PublishedCheck[] = (rows as Row[]).map((row) => ({
  id: `typed-${row.id}`,
  title: `Typed formula ${row.formula}, ${typeof row.ends === 'string' ? row.ends : [...new Set(row.ends)].join(' and ')} ends`,
  group: 'Typed formulas',
  study: {
    format: 'smirr-study',
    version: 1,
    title: row.id,
    system: {
      type: 'map',
      formulas: [row.formula],
      parameters: Object.fromEntries(Object.entries(row.parameters).map(([name, value]) => [name, value ?? 0])),
    },
    noise: { kind: 'gaussian', sigma: row.sigma },
    domain: [{ from: row.from, to: row.to, ends: row.ends as Ends }],
    grid: { points: 'auto', tolerance: 1e-11 },
    ask: {
      spectrum: { count: 7 },
      stationary: {},
      lyapunov: {},
      ...(row.start === undefined ? {} : { exit: { start: { kind: 'point' as const, at: [row.start] } } }),
    },
  },
  compare: numbers(row),
  source:
    "Nyström's method on composite Gauss–Legendre nodes with NumPy's dense eigenvalues, two grids (nystrom.py); K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, 1997, section 4.1",
  basis: 'computed' as const,
  seen: 'recomputed' as const,
}));
