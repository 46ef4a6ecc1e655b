import { MOST_POINTS, TooManyPoints } from '../grid/plan-panels';
import { levelIndex, levelOf, NoisyPlan } from '../operators/noisy-plan';
import { StudyRefused } from '../study/study-refused';
import type { CaseSetup } from './case-setup';

/**
 * The plan of a case at its noise level, kept for all levels that share it.
 *
 * @param setup the case; its number of points, or "auto" for the tolerance
 * @param tolerance in eigenvalues, for "auto"
 * @param factor 1, or the refinement of the comparing grid
 * @throws StudyRefused where no affordable grid resolves the noise, with the noise level from which one does
 */
export function planOf(setup: CaseSetup, tolerance: number, factor: number): NoisyPlan {
  const { model, boundary, noise, sigma, points, cache } = setup;
  const request = points === 'auto' ? { tolerance } : { points };
  const shared = points === 'auto' ? levelIndex(sigma) : sigma;
  return cache(`plan ${factor} ${JSON.stringify(request)} ${shared}`, () => {
    try {
      return new NoisyPlan(model, boundary, noise, sigma, request, factor, setup.checkpoint);
    } catch (error) {
      if (!(error instanceof TooManyPoints)) throw error;
      const [, allowed] = levelOf(error.allowed);
      throw new StudyRefused(
        'noise.sigma',
        `${sigma} needs ${error.points} points with this map; allowed: ${Number(allowed.toPrecision(3))} and above (${MOST_POINTS} points), or the kind "none"`,
      );
    }
  });
}
