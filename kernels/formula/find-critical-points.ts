import { bisect } from './bisect';

/** What the search for critical points needs of a map. */
export interface SlopedMap {
  /** out: values at x; slope: derivatives at x */
  evaluate(x: Float64Array, out: Float64Array, slope?: Float64Array): void;
}

const SAMPLES = 4096;
const LEAST_SAMPLES = 64;
/** Places closer than this part of the interval are one. */
const MERGE = 1e-13;
/** More critical points than this come from a map that swings between the samples: the rest would say nothing. */
const MOST = 1000;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Where the derivative of a map vanishes or runs away, so that ln|F'| is singular: zeros with and without change of sign,
 * and ends of smooth pieces towards which the derivative behaves as a power of the distance.
 * @param map values and derivatives
 * @param from lower end
 * @param to upper end
 * @param breaks places in between where the map is not smooth, increasing
 * @returns the places, ends and breaks included where they are such, increasing and at least 1e-13 (to - from) apart.
 *   A simple zero is found to the last bits that the derivative's own round-off leaves, a zero without change of sign to the
 *   accuracy with which the derivative is computed close to it (to the last bits for x^3 and (x - c)^3).
 *   Two zeros within (to - from)/4096 of one another can be missed; beyond 1000 places the search ends.
 *   Cost: some 4096 evaluations in blocks, and about 55 single ones per zero.
 */
export function findCriticalPoints(map: SlopedMap, from: number, to: number, breaks: readonly number[]): number[] {
  const [x1, value1, slope1] = [new Float64Array(1), new Float64Array(1), new Float64Array(1)];
  const slopeAt = (x: number) => {
    x1[0] = x;
    map.evaluate(x1, value1, slope1);
    return slope1[0];
  };
  const found: number[] = [];
  const bounds = [from, ...breaks.filter((at) => at > from && at < to), to];
  for (let k = 0; k + 1 < bounds.length; k++) searchPiece(map, slopeAt, bounds[k], bounds[k + 1], to - from, found);
  found.sort((a, b) => a - b);
  return found.filter((at, k) => k === 0 || at - found[k - 1] > MERGE * (to - from));
}

function searchPiece(
  map: SlopedMap,
  slopeAt: (x: number) => number,
  low: number,
  high: number,
  span: number,
  found: number[],
): void {
  const length = high - low;
  if (!(length > 4 * MERGE * span)) return;
  const samples = Math.max(LEAST_SAMPLES, Math.ceil((SAMPLES * length) / span));
  // Just inside the ends, where the values may be those of the other side, and nowhere on a round fraction but the middle.
  const margin = MERGE * length;
  const x = Float64Array.from({ length: samples + 1 }, (_, i) => low + margin + (length - 2 * margin) * (i / samples));
  const value = new Float64Array(samples + 1);
  const slope = new Float64Array(samples + 1);
  map.evaluate(x, value, slope);
  const scale = typical(slope);
  if (scale === 0) return;

  const size = (at: number) => Math.abs(slopeAt(at));
  for (let i = 0; i < samples && found.length < MOST; i++) {
    const [left, right] = [slope[i], slope[i + 1]];
    if (left === 0 && i > 0) found.push(x[i]);
    else if (left * right < 0) {
      const at = bisect(slopeAt, x[i], x[i + 1]);
      // A change of sign through a jump of the slope that nobody listed is no zero.
      if (size(at) < 1e-6 * Math.max(Math.abs(left), Math.abs(right))) found.push(at);
    } else if (
      i > 0 &&
      left * right > 0 &&
      // A slope that touches zero between two samples is of the order of the squared distance there.
      Math.abs(left) < 1e-3 * scale &&
      Math.abs(left) <= Math.abs(right) &&
      Math.abs(left) < Math.abs(slope[i - 1])
    ) {
      const at = leastSize(size, x[i - 1], x[i + 1]);
      if (isPower(size, at, -1, (x[i] - low) / 8) && isPower(size, at, 1, (high - x[i]) / 8) && size(at) < 1e-9 * scale)
        found.push(at);
    }
  }
  if (isPower(size, low, 1, length / 8)) found.push(low);
  if (isPower(size, high, -1, length / 8)) found.push(high);
}

/** The place of the least value of a function with one minimum between two places, by golden section. */
function leastSize(size: (x: number) => number, low: number, high: number): number {
  let [left, right] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)];
  let [atLeft, atRight] = [size(left), size(right)];
  for (let i = 0; i < 90 && low < left && left < right && right < high; i++) {
    if (atLeft === 0) return left;
    if (atRight === 0) return right;
    if (atLeft < atRight) {
      [high, right, atRight] = [right, left, atLeft];
      left = high - GOLDEN * (high - low);
      atLeft = size(left);
    } else {
      [low, left, atLeft] = [left, right, atRight];
      right = low + GOLDEN * (high - low);
      atRight = size(right);
    }
  }
  return atLeft < atRight ? left : right;
}

/**
 * Whether the derivative goes to 0 or runs away beside a place as a power of the distance, d^p with |p| > 0.04: then its
 * sizes at 1e-4 and 1e-6 of the reach differ by 100^p, while next to an ordinary place they are equal.
 */
function isPower(size: (x: number) => number, at: number, side: 1 | -1, reach: number): boolean {
  const ratio = size(at + side * 1e-4 * reach) / size(at + side * 1e-6 * reach);
  return !(ratio < 1.2 && ratio > 1 / 1.2);
}

/** The median size of the derivatives. */
function typical(slopes: Float64Array): number {
  const sizes = Array.from(slopes, Math.abs).filter((size) => size < Number.POSITIVE_INFINITY);
  sizes.sort((a, b) => a - b);
  return sizes[sizes.length >> 1] ?? 0;
}
