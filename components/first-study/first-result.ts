import type { Picture } from '@/lib/client/explore-core';
import { FIRST_STUDY } from '@/lib/shared/bench-study';
import type { Result } from '@/lib/shared/study-types';
import result from './result.json';

/**
 * The bench's first study as computed ahead, so that a page is drawn before any script has run:
 * `npm run -s compute -- components/first-study/study.json --out components/first-study/result.json`, then `npm run format`.
 * A test computes it again and compares number by number.
 */
export const FIRST_RESULT = result as unknown as Result;

/** The first picture of the bench, without the arrays that no figure draws. */
export function firstPicture(): Picture {
  const { exit, grid, ...shown } = FIRST_RESULT.cases[0];
  return {
    study: FIRST_STUDY,
    case: { ...shown, grid: { ...grid, weights: [] }, ...(exit && { exit: { ...exit, field: null } }) },
    warnings: FIRST_RESULT.warnings,
    settled: true,
    seconds: 0,
  };
}
