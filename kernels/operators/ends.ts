import type { Ends } from '../spec';

/** What happens to a position outside [from, to] after noise, in the form the operators use. */
export interface Boundary {
  readonly from: number;
  readonly to: number;
  readonly periodic: boolean;
  readonly low: 'reflecting' | 'absorbing';
  readonly high: 'reflecting' | 'absorbing';
}

/**
 * Reads the study's `ends` for one variable.
 *
 * @throws RangeError where from ≥ to, or an end is of a kind that the operators do not know ("holding")
 */
export function boundaryOf(from: number, to: number, ends: Ends): Boundary {
  if (!(from < to)) throw new RangeError(`domain ${from} to ${to}: from must be below to`);
  if (ends === 'periodic') return { from, to, periodic: true, low: 'reflecting', high: 'reflecting' };
  const [low, high] = typeof ends === 'string' ? [ends, ends] : ends;
  if (low === 'holding' || high === 'holding') throw new RangeError('ends "holding": not computed yet');
  return { from, to, periodic: false, low, high };
}

/** true where mass can leave the domain */
export const loses = (b: Boundary): boolean => !b.periodic && (b.low === 'absorbing' || b.high === 'absorbing');

/**
 * Folds an image by the ends that keep mass: periodic wraps, reflecting mirrors. An absorbing end leaves it where it is,
 * for the noise may still bring it back. Symmetric noise and this fold commute, so folding first loses nothing.
 *
 * @param y image of a point, before noise
 * @returns equivalent position; NaN for NaN
 */
export function foldImage(b: Boundary, y: number): number {
  const length = b.to - b.from;
  if (b.periodic) {
    const u = (y - b.from) % length;
    return b.from + (u < 0 ? u + length : u);
  }
  if (b.low === 'reflecting' && b.high === 'reflecting') {
    let u = (y - b.from) % (2 * length);
    if (u < 0) u += 2 * length;
    return b.from + (u > length ? 2 * length - u : u);
  }
  if (b.low === 'reflecting') return y < b.from ? 2 * b.from - y : y;
  if (b.high === 'reflecting') return y > b.to ? 2 * b.to - y : y;
  return y;
}

/**
 * The places on the unfolded line that stand for position y of the domain, as ±y + shift, within `reach` of the domain.
 *
 * The density at y is the sum of the noise's density over them: wrapped images, mirror images, or y alone.
 *
 * @param reach distance beyond which the noise's density counts as zero, > 0
 * @returns list of { sign, shift }; the first is { 1, 0 }
 */
export function imagesOf(b: Boundary, reach: number): { sign: 1 | -1; shift: number }[] {
  const length = b.to - b.from;
  const images: { sign: 1 | -1; shift: number }[] = [{ sign: 1, shift: 0 }];
  const turns = Math.ceil(reach / (b.periodic ? length : 2 * length)) + 1;
  if (b.periodic) {
    for (let m = 1; m <= turns; m++) images.push({ sign: 1, shift: m * length }, { sign: 1, shift: -m * length });
  } else if (b.low === 'reflecting' && b.high === 'reflecting') {
    for (let m = -turns; m <= turns; m++) {
      if (m !== 0) images.push({ sign: 1, shift: 2 * m * length });
      images.push({ sign: -1, shift: 2 * b.from + 2 * m * length });
    }
  } else if (b.low === 'reflecting') images.push({ sign: -1, shift: 2 * b.from });
  else if (b.high === 'reflecting') images.push({ sign: -1, shift: 2 * b.to });
  return images;
}

/**
 * Probability that a (folded) image leaves the domain when noise is added.
 *
 * @param tail tail(d) = probability that the noise exceeds d; used for d > 0 and d < 0 alike
 * @returns 0 to 1, with the relative accuracy of `tail`: a sum of positive terms, nothing is subtracted
 */
export function exitProbability(b: Boundary, y: number, tail: (d: number) => number): number {
  if (!loses(b)) return 0;
  const length = b.to - b.from;
  const below = b.low === 'absorbing' ? tail(y - b.from) : tail(y + length - b.to + length);
  const above = b.high === 'absorbing' ? tail(b.to - y) : tail(b.from + 2 * length - y);
  return Math.min(1, below + above);
}
