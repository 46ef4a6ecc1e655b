import { type Checkpoint, neverStop } from './core/checkpoint';
import { caseSetup, type RunCache } from './solve/case-setup';
import { NoisySolver, seededStart } from './solve/noisy-solver';
import { planOf } from './solve/plan-of';
import type { Study } from './spec';
import { arnoldi, type EigenPair } from './spectrum/arnoldi';

/** One side of an eigenfunction on the grid: real part, and imaginary part where the eigenvalue is complex. */
export interface ModeSide {
  readonly re: number[];
  readonly im: number[] | null;
}

/** An eigenvalue with its eigenfunctions. */
export interface Mode {
  readonly re: number;
  readonly im: number;
  /** positions, increasing, units of the variable */
  readonly x: number[];
  /** eigenfunction of the step of densities, largest modulus 1 */
  readonly density: ModeSide;
  /** eigenfunction of the step of observables, largest modulus 1 */
  readonly observable: ModeSide;
}

/**
 * Eigenfunctions of one eigenvalue of a noisy study, on both sides.
 *
 * Each is scaled to a largest modulus of 1 and turned so that it is real and positive there.
 *
 * @param study as `parseStudy` returns it, with noise; its first case is meant where it has a sweep
 * @param index place of the eigenvalue among those of the spectrum, 0 up, largest modulus first
 * @throws RangeError where the index is beyond the eigenvalues found, or there is no noise
 */
export function mode(study: Study, index: number, options: { checkpoint?: Checkpoint; cache?: RunCache } = {}): Mode {
  const { checkpoint = neverStop, cache = new Map() } = options;
  if (study.noise.kind === 'none') throw new RangeError('noise.kind "none": eigenfunctions are computed with noise');
  const setup = caseSetup(study, {}, cache, checkpoint);
  const solver = new NoisySolver(planOf(setup, study.grid.tolerance, 1), setup.sigma, checkpoint);
  const right = solver.spectrum(index + 1).pairs;
  const pair = right[index];
  if (!pair) throw new RangeError(`eigenvalue ${index}: allowed are 0 to ${right.length - 1}`);
  const left = arnoldi((v, out) => solver.operator.applyAdjoint(v, out), solver.weights, {
    count: index + 2,
    tolerance: 1e-12,
    start: seededStart(solver.weights.length),
    checkpoint,
  }).pairs;
  const partner = left.reduce((best, q) => (distance(q, pair) < distance(best, pair) ? q : best), left[0]);
  return { re: pair.re, im: pair.im, x: [...solver.plan.grid.x], density: side(pair), observable: side(partner) };
}

const distance = (a: EigenPair, b: EigenPair) => Math.hypot(a.re - b.re, a.im - b.im);

/** Scales a vector to largest modulus 1 and turns it so that it is real and positive there. */
function side({ vector, imaginary }: EigenPair): ModeSide {
  let at = 0;
  const size = (i: number) => Math.hypot(vector[i], imaginary ? imaginary[i] : 0);
  for (let i = 1; i < vector.length; i++) if (size(i) > size(at)) at = i;
  const c = vector[at] / size(at) ** 2;
  const s = imaginary ? -imaginary[at] / size(at) ** 2 : 0;
  const re = Array.from(vector, (v, i) => v * c - (imaginary ? imaginary[i] * s : 0));
  return { re, im: imaginary ? Array.from(imaginary, (v, i) => v * c + vector[i] * s) : null };
}
