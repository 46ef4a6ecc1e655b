import type { StartDensity } from '@/kernels/spec';
import { usualStart } from '@/lib/shared/start-density';
import type { StudyFile } from '@/lib/shared/study-types';

export type { StartDensity };

/** Steps that the strip shows: the start and sixteen after it. */
export const STRIP_STEPS = Array.from({ length: 17 }, (_, step) => step);

/** Where the strip begins if the study does not say: a narrow Gaussian in the lower part of the domain. */
export function startOf(study: StudyFile): StartDensity {
  const given = study.ask.density?.start;
  return (given ?? usualStart(study.domain[0])) as StartDensity;
}

/** The densities of the strip. Without noise they come from cells, of which a moving picture takes fewer. */
export function stepsRequest(study: StudyFile, pass: 'live' | 'full'): StudyFile {
  const coarse = pass === 'live' && study.noise.kind === 'none' && { grid: { ...study.grid, points: 1024 } };
  return { ...bare(study), ...coarse, ask: { density: { start: startOf(study), at: STRIP_STEPS } } };
}

/** Eigenvalues with noise at a few noise levels. */
export function trailsRequest(study: StudyFile, levels: number[]): StudyFile {
  return { ...bare(study), ask: { spectrum: { count: 8 } }, sweep: [{ over: 'noise.sigma', values: levels }] };
}

/** A study with nothing asked that costs time: what a rail or an eigenfunction is computed from. */
export function bare(study: StudyFile): StudyFile {
  const { sweep: _sweep, notes: _notes, ...kept } = study;
  return { ...kept, ask: { spectrum: { count: 8 } } };
}

/** Studies with the same key have the same strip, eigenfunctions and trails. */
export function sideKey({ system, noise, domain, grid, ask }: StudyFile): string {
  return JSON.stringify([system, noise, domain, grid ?? null, ask.density?.start ?? null]);
}
