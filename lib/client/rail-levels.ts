import type { Bounds } from '@/lib/shared/step-number';
import type { StudyFile } from '@/lib/shared/study-types';

/** Noise levels per factor of ten at the coarsest spacing; finer ones halve it, so that zooming keeps what it knows. */
const PER_DECADE = 24;
const FEWEST = 40;
/** Every eighth level comes first. */
const STRIDES = [8, 4, 2, 1];

/**
 * Noise levels at which a window of the rail is computed, coarse to fine: its two ends and every eighth level, then
 * those between. Levels lie on one lattice of the logarithm, whatever the window, so that windows share them.
 */
export function railLevels({ min, max }: Bounds): number[] {
  const decades = Math.log10(max / min);
  let perDecade = PER_DECADE;
  while (decades * perDecade < FEWEST && perDecade < PER_DECADE * 4096) perDecade *= 2;
  const first = Math.floor(Math.log10(min) * perDecade) + 1;
  const last = Math.ceil(Math.log10(max) * perDecade) - 1;
  const levels = [min, max];
  for (const stride of STRIDES) {
    for (let i = first; i <= last; i++) {
      const coarser = STRIDES.some((other) => other > stride && i % other === 0);
      if (i % stride === 0 && !coarser) levels.push(latticeLevel(i / perDecade));
    }
  }
  return levels;
}

/** How many of the levels belong to the first, coarse drawing. */
export function coarseCount(levels: number[]): number {
  return Math.min(Math.ceil((levels.length - 2) / 8) + 2, levels.length);
}

/** Levels around one noise level at which its eigenvalues are followed, in increasing order. */
export function trailLevels(sigma: number, { min, max }: Bounds): number[] {
  const middle = Math.round(Math.log10(sigma) * PER_DECADE);
  const levels: number[] = [];
  for (let i = middle - TRAIL_STEPS; i <= middle + TRAIL_STEPS; i++) {
    const level = latticeLevel(i / PER_DECADE);
    if (level >= min && level <= max) levels.push(level);
  }
  return levels;
}

/** A factor of 1.78 either way. */
const TRAIL_STEPS = 6;

/** Twelve digits, so that a level is the same number wherever it is computed. */
function latticeLevel(exponent: number): number {
  return Number((10 ** exponent).toPrecision(12));
}

/** Studies with the same key have the same rail: all but the noise level itself, the questions and the words. */
export function railKey({ system, noise, domain, grid }: StudyFile): string {
  const { sigma: _sigma, ...kind } = noise;
  return JSON.stringify([system, kind, domain, grid?.tolerance ?? null]);
}
