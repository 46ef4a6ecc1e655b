import { type Checkpoint, neverStop } from './core/checkpoint';
import { caseSetup, type RunCache } from './solve/case-setup';
import { NoisySolver } from './solve/noisy-solver';
import { planOf } from './solve/plan-of';
import { type RailPoint, railPoint } from './solve/rail-point';
import type { Study } from './spec';
import { StudyRefused } from './study/study-refused';

/** Tolerance of the rail's grids: far below what a plot shows. */
const RAIL_TOLERANCE = 1e-6;

export interface RailOptions {
  /** as in `run`; `done` counts noise levels */
  readonly checkpoint?: Checkpoint;
  readonly cache?: RunCache;
  /** mean exit times above it (steps) are only bounded from above, at a tenth of the cost; default: all are exact */
  readonly roughAbove?: number;
  /** called for each point as soon as it is there, with its place among the asked levels */
  onPoint?(index: number, point: RailPoint): void;
}

/**
 * What changes along the noise axis, for drawing: no error bars; numbers to about 1e-6, exit times at any rarity.
 *
 * @param study as `parseStudy` returns it, with noise; its sweep and its own sigma are not used
 * @param sigmas noise levels, > 0, in the order in which they shall be computed
 * @returns one point a level; where no grid resolves a level its numbers are null
 * @throws RangeError for a study without noise; StudyRefused for a formula that cannot be computed; what `checkpoint` throws
 */
export function rail(study: Study, sigmas: readonly number[], options: RailOptions = {}): RailPoint[] {
  const { checkpoint = neverStop, cache = new Map(), roughAbove, onPoint } = options;
  if (study.noise.kind === 'none') throw new RangeError('noise.kind "none": a noise axis needs noise');
  return sigmas.map((sigma, index) => {
    const watch: Checkpoint = (done, of) => checkpoint(index + Math.min(0.99, done / Math.max(1, of)), sigmas.length);
    watch(0, 1);
    const setup = { ...caseSetup(study, { 'noise.sigma': sigma }, cache, watch), points: 'auto' as const };
    const point = pointAt(
      () => railPoint(new NoisySolver(planOf(setup, RAIL_TOLERANCE, 1), sigma, watch), roughAbove),
      sigma,
    );
    onPoint?.(index, point);
    return point;
  });
}

function pointAt(compute: () => RailPoint, sigma: number): RailPoint {
  try {
    return compute();
  } catch (error) {
    if (!(error instanceof StudyRefused) || error.faults[0].path !== 'noise.sigma') throw error;
    return { sigma, meanTime: null, relaxationTime: null, gap: null, lyapunov: null, entropy: null, lostPerStep: null };
  }
}
