import { compileFormula } from '@/kernels/formula/compile-formula';
import { parseFormula } from '@/kernels/formula/parse-formula';
import { gaussian } from '@/kernels/noise/gaussian';
import { boundaryOf } from '@/kernels/operators/ends';
import { levelIndex, NoisyPlan } from '@/kernels/operators/noisy-plan';
import { NoisySolver } from '@/kernels/solve/noisy-solver';
import { railPoint } from '@/kernels/solve/rail-point';
import { modelOf } from '@/kernels/study/model-of';
import { parseStudy } from '@/kernels/study/parse-study';

/** One thing that is timed: `work` is the whole of it, `error` compares what it gave with a second, finer computation. */
export interface BenchCase {
  readonly name: string;
  /** what is asked, and what counts as its error */
  readonly says: string;
  /** seconds (or a ratio, for formula-ratio) to stay under */
  readonly aim: number;
  /** repetitions of `work` behind one timing, for work too short for the clock */
  readonly loops: number;
  work(): unknown;
  error(result: unknown): number;
}

const parsed = parseStudy({
  format: 'smirr-study',
  version: 1,
  system: { type: 'map', id: 'logistic', parameters: { r: 3.8 } },
  noise: { kind: 'gaussian', sigma: 0.01 },
  domain: [{ from: 0, to: 1, ends: 'absorbing' }],
  ask: { stationary: {} },
});
if (!parsed.study) throw new Error(parsed.faults.map((f) => f.message).join());
const { study } = parsed;
const boundary = boundaryOf(0, 1, 'absorbing');
const model = () => modelOf(study, study.system.parameters);

type Pairs = ReturnType<NoisySolver['spectrum']>['pairs'];

/** Leading eigenvalues from scratch: map, grid, push, Arnoldi. */
function spectrumOf(sigma: number, request: { points: number } | { tolerance: number } = { tolerance: 1e-10 }): Pairs {
  return new NoisySolver(new NoisyPlan(model(), boundary, gaussian, sigma, request, 1), sigma).spectrum(8).pairs;
}

/** Largest distance of the first eight eigenvalues to the nearest one of a computation on a grid 1.6 times as fine. */
function spectrumError(sigma: number): (result: unknown) => number {
  return (result) => {
    const plan = new NoisyPlan(model(), boundary, gaussian, sigma, { tolerance: 1e-10 }, 1.6);
    const fine = new NoisySolver(plan, sigma).spectrum(10).pairs;
    const distances = (result as Pairs)
      .slice(0, 8)
      .map((p) => Math.min(...fine.map((q) => Math.hypot(p.re - q.re, p.im - q.im))));
    return Math.max(...distances);
  };
}

function stepCase(): BenchCase {
  const plan = new NoisyPlan(model(), boundary, gaussian, 0.01, { points: 1024 }, 1);
  const operator = plan.spreadOperator(0.01);
  const rho = plan.grid.x.map((x) => 6 * x * (1 - x));
  const out = new Float64Array(rho.length);
  return {
    name: 'step-1d',
    says: 'one noisy step, logistic r = 3.8, absorbing [0, 1], sigma 0.01, 1024 points; error against direct sums, of the peak',
    aim: 0.08e-3,
    loops: 500,
    work: () => {
      operator.apply(rho, out);
      return out;
    },
    error: () => {
      const direct = new Float64Array(out.length);
      plan.directOperator(0.01, gaussian.reach).apply(rho, direct);
      const peak = Math.max(...direct);
      return Math.max(...direct.map((v, i) => Math.abs(v - out[i]))) / peak;
    },
  };
}

const RAIL = Array.from({ length: 64 }, (_, i) => 3e-3 * (0.4 / 3e-3) ** (i / 63));

function rail(tolerance: number, factor: number) {
  const map = model();
  const plans = new Map<number, NoisyPlan>();
  return RAIL.map((sigma) => {
    const level = levelIndex(sigma);
    let plan = plans.get(level);
    if (!plan) {
      plan = new NoisyPlan(map, boundary, gaussian, sigma, { tolerance }, factor);
      plans.set(level, plan);
    }
    return railPoint(new NoisySolver(plan, sigma));
  });
}

function railCase(): BenchCase {
  const relative = (a: number | null, b: number | null) =>
    a === null || b === null ? Number.POSITIVE_INFINITY : Math.abs(a / b - 1);
  return {
    name: 'rail-1d',
    says: 'mean exit time, relaxation time and Lyapunov exponent at 64 sigmas from 3e-3 to 0.4; largest relative error',
    aim: 1,
    loops: 1,
    work: () => rail(1e-6, 1),
    error: (result) => {
      const fine = rail(1e-8, 1.3);
      return Math.max(
        ...(result as typeof fine).flatMap((p, i) => [
          relative(p.meanTime, fine[i].meanTime),
          relative(p.relaxationTime, fine[i].relaxationTime),
          relative(p.lyapunov, fine[i].lyapunov),
        ]),
      );
    },
  };
}

/** Both evaluations of the logistic map over the same array; the case's number is the ratio of their times. */
export function formulaPair() {
  const scope = { variables: ['x'], parameters: ['r'] };
  const formula = compileFormula(parseFormula('r*x*(1-x)', scope), scope);
  const x = Float64Array.from({ length: 65_536 }, (_, i) => (i + 0.5) / 65_536);
  const typed = new Float64Array(x.length);
  const written = new Float64Array(x.length);
  return {
    formula: () => formula.evaluate([x], [3.8], typed),
    byHand: () => {
      for (let i = 0; i < x.length; i++) written[i] = 3.8 * x[i] * (1 - x[i]);
    },
    difference: () => Math.max(...typed.map((v, i) => Math.abs(v - written[i]))),
  };
}

/** All timed cases but the ratio, in the order they are printed. */
export function benchCases(): BenchCase[] {
  return [
    stepCase(),
    {
      name: 'spectrum-1d-0.01',
      says: 'leading 8 eigenvalues from scratch at sigma 0.01; largest error',
      aim: 10e-3,
      loops: 1,
      work: () => spectrumOf(0.01),
      error: spectrumError(0.01),
    },
    {
      name: 'spectrum-1d-0.001',
      says: 'leading 8 eigenvalues from scratch at sigma 0.001; largest error',
      aim: 150e-3,
      loops: 1,
      work: () => spectrumOf(0.001),
      error: spectrumError(0.001),
    },
    railCase(),
  ];
}
