import { type Checkpoint, neverStop } from './core/checkpoint';
import type { Result, ResultCase, Warning } from './result';
import { type CaseSetup, caseSetup, type RunCache } from './solve/case-setup';
import { noisyCase } from './solve/noisy-case';
import { COMPARISON_CELLS, cellSolver, coarserCells, quietCase, quietSpectrum } from './solve/quiet-case';
import type { Study } from './spec';
import { axisValues } from './study/parse-study';
import { ENGINE } from './version';

export interface RunOptions {
  /** where it runs, as the result shall say: "node 20.20.2", a browser's name */
  readonly runtime: string;
  /** called at least every million operations or so; throws `Stopped` to end the run */
  readonly checkpoint?: Checkpoint;
  /** default true; false: one grid only, error bars null or 0 */
  readonly uncertainties?: boolean;
  /** grids, pushes and cell matrices of earlier runs; at most eight systems are kept in it */
  readonly cache?: RunCache;
}

/**
 * Computes a study: one case per point of the sweep, in order, the first axis slow.
 *
 * @param study as `parseStudy` returns it
 * @returns the result; what could not be had is null in it and named in its warnings
 * @throws StudyRefused where the formula, a start or the noise level cannot be computed as stated; whatever `checkpoint` throws
 */
export function run(study: Study, options: RunOptions): Result {
  const { runtime, checkpoint = neverStop, uncertainties = true, cache = new Map() } = options;
  const warnings: Warning[] = [];
  const points = sweepPoints(study);
  const cases = points.map((at, index) => {
    const total = points.length;
    const watch: Checkpoint = (done, of) => checkpoint(index + Math.min(0.99, done / Math.max(1, of)), total);
    watch(0, 1);
    const warn = (w: Omit<Warning, 'at'>) => {
      warnings.push({ ...w, at: index });
    };
    return { at, ...computeCase(study, at, uncertainties, watch, cache, warn) };
  });
  checkpoint(points.length, points.length);
  return { format: 'smirr-result', version: 1, engine: ENGINE, runtime, study, cases, warnings };
}

/** Points of the sweep as { "noise.sigma": 0.01, … }; one empty point where there is no sweep. */
export function sweepPoints(study: Study): Record<string, number>[] {
  let points: Record<string, number>[] = [{}];
  for (const axis of study.sweep)
    points = points.flatMap((p) => axisValues(axis).map((v) => ({ ...p, [axis.over]: v })));
  return points;
}

function computeCase(
  study: Study,
  at: Readonly<Record<string, number>>,
  uncertainties: boolean,
  checkpoint: Checkpoint,
  cache: RunCache,
  warn: (w: Omit<Warning, 'at'>) => void,
): Omit<ResultCase, 'at'> {
  const setup = caseSetup(study, at, cache, checkpoint);
  if (study.noise.kind === 'none') return quietCase(study, setup, uncertainties, warn);
  const result = noisyCase(study, setup, uncertainties, warn);
  addComparison(study, setup, result, uncertainties);
  return result;
}

/** Density and spectrum without noise beside a noisy case, where asked for, on cells as fine as a figure shows. */
function addComparison(study: Study, setup: CaseSetup, result: Omit<ResultCase, 'at'>, uncertainties: boolean): void {
  const { ask } = study;
  if (!ask.stationary?.deterministic && !ask.spectrum?.deterministic) return;
  const { density, entries } = setup.cache(
    `comparison ${uncertainties} ${ask.spectrum?.deterministic ? ask.spectrum.count : 0}`,
    () => {
      const main = cellSolver(setup, COMPARISON_CELLS);
      const coarse = uncertainties ? cellSolver(setup, coarserCells(COMPARISON_CELLS)) : null;
      return {
        density: { x: [[...main.operator.x]], values: [...main.stationary()], method: 'cells' as const },
        entries: ask.spectrum?.deterministic ? quietSpectrum(main, coarse, ask.spectrum.count) : [],
      };
    },
  );
  if (ask.stationary?.deterministic && result.stationary) result.stationary.deterministic = density;
  if (ask.spectrum?.deterministic && result.spectrum) result.spectrum.deterministic = entries;
}
