import { z } from 'zod';
import { studySchema } from './spec';

/** The result file, version 1: what `run` returns, the database stores and a published page draws. */

const number = z.number();
const list = z.array(number);
const grids = z.array(list);

/** A number with its error bar; `bound` from a second computation, `standardError` from sampling. */
export const quantitySchema = z.strictObject({
  value: number,
  uncertainty: number,
  kind: z.enum(['bound', 'standardError']),
});
const quantity = quantitySchema.nullable();

const eigenvalue = z.strictObject({
  re: number,
  im: number,
  modulus: number,
  residual: number,
  uncertainty: number.nullable(),
  multiplicity: z.number().int().min(1).default(1),
  /** false: moves when the grid or the cells are changed; drawn faint, never in a table. */
  resolved: z.boolean().optional(),
  rate: z.strictObject({ re: number, im: number, uncertainty: number.nullable().optional() }).optional(),
  dt: number.optional(),
  method: z.enum(['cells', 'collocation']).optional(),
  space: z.string().optional(),
});

const deterministicDensity = z.strictObject({
  x: grids,
  values: list,
  method: z.enum(['cells', 'collocation', 'orbit']),
});

export const caseSchema = z.strictObject({
  at: z.record(z.string(), number),
  grid: z.strictObject({
    points: list,
    x: grids,
    weights: grids,
    resolved: z.boolean(),
    compared: z.array(list),
  }),
  density: z
    .array(
      z.strictObject({
        at: number,
        mass: quantity,
        values: list.nullable(),
        atoms: list.optional(),
        uncertainty: number.nullable().optional(),
      }),
    )
    .optional(),
  stationary: z
    .strictObject({
      values: list,
      atoms: list.optional(),
      mean: z.array(quantity),
      covariance: z.array(z.array(quantity)),
      entropy: quantity,
      quasi: z.boolean(),
      uncertainty: number.nullable(),
      /** Probability that leaves the domain per step, from the quasi-stationary density; 0 where nothing is lost. */
      lostPerStep: quantity.optional(),
      /** Largest difference to the second way (dense kernel on other nodes), relative to the peak; null where it was not run. */
      secondWay: z.strictObject({ points: number, difference: number }).nullable().optional(),
      deterministic: deterministicDensity.optional(),
    })
    .optional(),
  spectrum: z
    .strictObject({
      noisy: z.array(eigenvalue).optional(),
      deterministic: z.array(eigenvalue).optional(),
      gap: quantity,
      relaxationTime: quantity,
      trace: z.strictObject({ integral: number, sum: number, rest: number }).optional(),
    })
    .optional(),
  exit: z
    .strictObject({
      rate: quantity,
      meanTime: quantity,
      meanTimeFrom: quantity,
      field: list.nullable(),
      survival: quantity.optional(),
      through: z.array(z.strictObject({ end: z.string(), probability: quantity })).optional(),
    })
    .optional(),
  lyapunov: z
    .strictObject({ exponents: z.array(quantity), value: quantity, survivors: quantity.optional() })
    .optional(),
  correlation: z.strictObject({ lags: list, values: list, uncertainty: number.nullable().optional() }).optional(),
  powerSpectrum: z
    .strictObject({ frequencies: list, values: list, uncertainty: number.nullable().optional() })
    .optional(),
  ensemble: z
    .strictObject({
      mean: z.array(quantity),
      covariance: z.array(z.array(quantity)),
      lost: quantity,
      meanExitTime: quantity,
      histogram: list,
      edges: grids.optional(),
    })
    .optional(),
  sensitivity: z.array(z.strictObject({ of: z.string(), to: z.string(), value: quantity })).optional(),
  target: z.strictObject({ value: quantity, reached: z.boolean(), others: z.array(number) }).optional(),
});

export const resultSchema = z.strictObject({
  format: z.literal('smirr-result'),
  version: z.literal(1),
  engine: z.string(),
  runtime: z.string(),
  study: studySchema,
  cases: z.array(caseSchema),
  warnings: z.array(z.strictObject({ code: z.string(), at: z.number().int().nullable(), message: z.string() })),
});

export type Quantity = z.output<typeof quantitySchema>;
export type Eigenvalue = z.output<typeof eigenvalue>;
export type ResultCase = z.output<typeof caseSchema>;
export type Result = z.output<typeof resultSchema>;
export type Warning = Result['warnings'][number];
