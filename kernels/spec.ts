import { z } from 'zod';

// The browser's content security policy forbids `new Function`, which zod would otherwise use to speed itself up.
z.config({ jitless: true });

/**
 * The study file, version 1: what a form edits, a worker computes, the database stores and the headless command reads.
 * Everything that Smirr is meant to compute is in the schema already; `normaliseStudy` refuses what this engine cannot
 * compute yet. Unknown keys are refused at every level.
 */

/** Sizes beyond which a study is refused; stated once, used by the schema and quoted in its messages. */
export const LIMITS = {
  title: 200,
  notes: 20_000,
  name: 32,
  formula: 2_000,
  parameters: 32,
  breaks: 200,
  points: 65_536,
  at: 500,
  samples: 1_000_000,
  eigenvalues: 64,
  lags: 100_000,
  frequencies: 10_000,
  paths: 10_000_000,
  steps: 10_000_000,
  sweepAxis: 1_000,
  sweepCases: 4_000,
} as const;

const finite = z.number().min(-1e300).max(1e300);
const positive = z.number().gt(0).max(1e300);
const name = z
  .string()
  .max(LIMITS.name)
  .regex(/^[A-Za-z][A-Za-z0-9_]*$/, 'must be a letter followed by letters, digits or _');
const formula = z.string().min(1).max(LIMITS.formula);

const end = z.enum(['reflecting', 'absorbing', 'holding']);
const ends = z.union([z.enum(['periodic', 'reflecting', 'absorbing', 'holding']), z.tuple([end, end])]);

const system = z.strictObject({
  type: z.enum(['map', 'sde']),
  id: z.string().min(1).max(60).optional(),
  variables: z.array(name).min(1).max(2).optional(),
  units: z.array(z.string().max(24)).min(1).max(2).optional(),
  formulas: z.array(formula).min(1).max(2).optional(),
  parameters: z.record(name, finite).default({}),
  period: z.union([positive, formula]).optional(),
  stepTime: z.strictObject({ value: positive, unit: z.string().min(1).max(24) }).optional(),
  breaks: z.array(z.array(finite).max(LIMITS.breaks)).min(1).max(2).optional(),
});

const noise = z.strictObject({
  kind: z.enum(['gaussian', 'uniform', 'laplace', 'cauchy', 'none']),
  sigma: z.union([positive, z.array(z.number().min(0).max(1e300)).min(1).max(2)]).optional(),
  correlation: z.number().gt(-1).lt(1).optional(),
  factor: z.array(formula).min(1).max(2).optional(),
  calculus: z.enum(['ito', 'stratonovich']).optional(),
});

const interval = z.strictObject({ from: finite, to: finite, ends });

const points = z.number().int().min(8).max(LIMITS.points);
const grid = z.strictObject({
  points: z.union([z.literal('auto'), points, z.array(points).min(1).max(2)]).default('auto'),
  tolerance: z.number().min(1e-11).max(0.1).default(1e-8),
});

const start = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('uniform') }),
  z.strictObject({
    kind: z.literal('gaussian'),
    mean: z.array(finite).min(1).max(2),
    sd: z.array(positive).min(1).max(2),
  }),
  z.strictObject({ kind: z.literal('point'), at: z.array(finite).min(1).max(2) }),
  z.strictObject({ kind: z.literal('formula'), formula }),
  z.strictObject({
    kind: z.literal('samples'),
    samples: z
      .array(z.union([finite, z.array(finite).min(1).max(2)]))
      .min(1)
      .max(LIMITS.samples),
  }),
]);

const observable = z.strictObject({
  observable: formula,
  lags: z.union([
    z.number().int().min(1).max(LIMITS.lags),
    z.strictObject({ count: z.number().int().min(1).max(LIMITS.lags), step: positive }),
  ]),
});

const ask = z.strictObject({
  density: z
    .strictObject({
      start: start.default({ kind: 'uniform' }),
      at: z.array(z.number().min(0).max(1e7)).min(1).max(LIMITS.at),
    })
    .optional(),
  stationary: z.strictObject({ deterministic: z.boolean().default(false) }).optional(),
  spectrum: z
    .strictObject({
      count: z.number().int().min(1).max(LIMITS.eigenvalues).default(8),
      deterministic: z.boolean().default(false),
      method: z.enum(['auto', 'cells', 'collocation']).default('auto'),
    })
    .optional(),
  exit: z
    .strictObject({
      start: start.default({ kind: 'uniform' }),
      inside: formula.optional(),
      survival: z.strictObject({ horizon: positive, devices: z.number().int().min(1).max(1e12).default(1) }).optional(),
    })
    .optional(),
  lyapunov: z.strictObject({}).optional(),
  correlation: observable.optional(),
  powerSpectrum: z
    .strictObject({
      observable: formula,
      frequencies: z.array(z.number().min(0).max(1e300)).min(1).max(LIMITS.frequencies),
    })
    .optional(),
  ensemble: z
    .strictObject({
      start: start.default({ kind: 'uniform' }),
      paths: z.number().int().min(1).max(LIMITS.paths),
      steps: z.number().int().min(1).max(LIMITS.steps),
      dt: positive.optional(),
      seed: z.string().min(1).max(200),
    })
    .optional(),
  sensitivity: z
    .strictObject({
      of: z.array(z.string().min(1).max(60)).min(1).max(20),
      to: z.array(z.string().min(1).max(60)).min(1).max(40),
    })
    .optional(),
  target: z
    .strictObject({
      quantity: z.string().min(1).max(60),
      atLeast: finite.optional(),
      atMost: finite.optional(),
      by: z.string().min(1).max(60),
      between: z.tuple([finite, finite]),
    })
    .optional(),
});

const over = z
  .string()
  .regex(
    /^(noise\.sigma(\[[01]\])?|noise\.correlation|parameters\.[A-Za-z][A-Za-z0-9_]*)$/,
    'allowed: noise.sigma, noise.sigma[0], noise.sigma[1], noise.correlation, parameters.NAME',
  );
const axis = z.union([
  z.strictObject({
    over,
    from: finite,
    to: finite,
    count: z.number().int().min(2).max(LIMITS.sweepAxis),
    scale: z.enum(['linear', 'log']).default('linear'),
  }),
  z.strictObject({ over, values: z.array(finite).min(1).max(LIMITS.sweepAxis) }),
]);

export const studySchema = z.strictObject({
  format: z.literal('smirr-study'),
  version: z.literal(1),
  title: z.string().max(LIMITS.title).default(''),
  notes: z.string().max(LIMITS.notes).default(''),
  system,
  noise,
  domain: z.array(interval).min(1).max(2),
  grid: grid.default({ points: 'auto', tolerance: 1e-8 }),
  step: z.strictObject({ dt: z.union([z.literal('auto'), positive]).default('auto') }).optional(),
  ask,
  sweep: z.array(axis).max(2).default([]),
});

/** A study as typed into a file: defaults may be left out. */
export type StudyFile = z.input<typeof studySchema>;
/** A study with the schema's defaults written out. */
export type Study = z.output<typeof studySchema>;
export type StartDensity = z.output<typeof start>;
export type Ends = z.output<typeof ends>;
export type End = z.output<typeof end>;
export type SweepAxis = z.output<typeof axis>;
export type Ask = z.output<typeof ask>;
