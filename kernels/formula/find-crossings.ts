import { nextDown, nextUp } from '../core/neighbours';
import { bisect } from './bisect';
import type { Curve } from './curve';

/** The heights a curve is asked to cross: 0 alone, or all whole numbers plus an offset. */
export type Levels = { kind: 'zero' } | { kind: 'whole'; offset: number };

export interface Crossings {
  /** places of crossing and touching, in no order, inside the open interval */
  at: number[];
  /** ends of the interval towards which crossings pile up without end, and the gap left there without any listed */
  accumulations: { at: number; from: number; to: number }[];
  /** false where crossings were left out although they do not pile up at an end */
  complete: boolean;
  /** what the search cost: evaluations in blocks and single ones */
  samples: number;
  singles: number;
}

/** A stretch between two samples, or between a sample and an extremum, on which the curve is taken to be monotone. */
interface Stretch {
  low: number;
  high: number;
  atLow: number;
  atHigh: number;
}

/** Single evaluations that finding one crossing takes, at most and about. */
const PER_CROSSING = 20;
/** Beyond this size neighbouring whole numbers are no longer told apart. */
const LARGEST = 2 ** 52;

/**
 * Where a smooth curve crosses or touches given heights between two places: samples, extrema between samples by the sign
 * of the slope, then bisection on every monotone stretch.
 * @param curve the function, smooth between `from` and `to`
 * @param from lower end; the curve may have a break or a pole there
 * @param to upper end, likewise
 * @param levels the heights
 * @param samples number of samples, at least 2: features narrower than (to - from)/samples can be missed
 * @param most how many crossings to list, and no closer together than `resolution`
 * @param resolution distance in the unit of x
 * @returns the places, each to the last bit (a touching place to that of the slope's zero).
 *   Cost: `samples` block evaluations and about 12 single ones per crossing.
 */
export function findCrossings(
  curve: Curve,
  from: number,
  to: number,
  levels: Levels,
  samples: number,
  most: number,
  resolution: number,
): Crossings {
  const found: Crossings = { at: [], accumulations: [], complete: true, samples, singles: 0 };
  const low = nextUp(from);
  const high = nextDown(to);
  if (!(low < high)) return found;
  const x = new Float64Array(samples + 1);
  for (let i = 0; i <= samples; i++) x[i] = low + (high - low) * (i / samples);
  x[samples] = high;
  const value = new Float64Array(samples + 1);
  const slope = new Float64Array(samples + 1);
  curve.sample(x, value, slope);
  const round = 16 * Number.EPSILON * typicalSize(value);

  const stretches: Stretch[] = [];
  const touched = new Set<Stretch>();
  const append = (a: number, b: number, atA: number, atB: number): Stretch | null => {
    const stretch = { low: a, high: b, atLow: atA, atHigh: atB };
    if (countLevels(stretch, levels) === 0) return null;
    stretches.push(stretch);
    return stretch;
  };
  const offset = levels.kind === 'zero' ? 0 : levels.offset;
  // The band between two levels that a value lies in; for zero alone: its sign.
  const band = levels.kind === 'zero' ? Math.sign : (height: number) => Math.floor(height - offset);
  let left = band(value[0]);
  for (let i = 0; i < samples; i++) {
    const right = band(value[i + 1]);
    if (slope[i] * slope[i + 1] < 0) {
      const middle = bisect(curve.slope, x[i], x[i + 1]);
      found.singles += PER_CROSSING;
      const top = curve.value(middle);
      const level = nearestLevel(top, levels);
      const halves = [append(x[i], middle, value[i], top), append(middle, x[i + 1], top, value[i + 1])];
      // Round-off decides whether an extremum at a level crosses twice, touches or misses it: call it one touch.
      if (Math.abs(top - level) <= round && value[i] !== level && value[i + 1] !== level) {
        found.at.push(middle);
        for (const half of halves) if (half !== null) touched.add(half);
      }
    } else if (right !== left) append(x[i], x[i + 1], value[i], value[i + 1]);
    // A sample right on a level belongs to no stretch.
    if (
      i > 0 &&
      Math.abs(value[i]) < LARGEST &&
      value[i] === nearestLevel(value[i], levels) &&
      value[i - 1] !== value[i] &&
      value[i + 1] !== value[i]
    ) {
      found.at.push(x[i]);
    }
    left = right;
  }
  const counts = stretches.map((stretch) => countLevels(stretch, levels));
  const total = counts.reduce((sum, count) => sum + count, 0);
  if (value.every((height) => !(Math.abs(height) < LARGEST))) found.complete = levels.kind === 'zero';
  const list = (order: number[], end: number | null) => {
    let remaining = most;
    let last = Number.NaN;
    for (const k of order) {
      const stretch = stretches[k];
      const downwards = end === from;
      for (const level of levelsOf(stretch, levels, downwards, remaining + 1)) {
        if (
          touched.has(stretch) &&
          Math.min(Math.abs(level - stretch.atLow), Math.abs(level - stretch.atHigh)) <= round
        )
          continue;
        found.singles += PER_CROSSING;
        const place = bisect((at) => curve.value(at) - level, stretch.low, stretch.high);
        if (remaining-- <= 0 || (end !== null && Math.abs(place - last) < resolution)) {
          if (end === null) found.complete = false;
          else found.accumulations.push({ at: end, from: Math.min(end, last), to: Math.max(end, last) });
          return;
        }
        found.at.push(place);
        last = place;
      }
    }
  };
  const upwards = stretches.map((_, k) => k);
  if (total <= most) {
    list(upwards, null);
    return found;
  }
  // Too many: leave out those next to an end where the curve runs away.
  const typical = median(value);
  const leftRuns = !(Math.abs(value[0]) <= 1e3 * typical);
  const rightRuns = !(Math.abs(value[samples]) <= 1e3 * typical);
  if (leftRuns && rightRuns) {
    const half = stretches.findIndex((stretch) => stretch.high >= (from + to) / 2);
    list(upwards.slice(0, half + 1).reverse(), from);
    list(upwards.slice(half + 1), to);
  } else if (leftRuns) list(upwards.reverse(), from);
  else list(upwards, rightRuns ? to : null);
  return found;
}

/**
 * The level nearest to a value.
 * @param value any number
 * @param levels 0 alone, or the whole numbers plus an offset
 * @returns the nearest of them
 */
export function nearestLevel(value: number, levels: Levels): number {
  return levels.kind === 'zero' ? 0 : Math.round(value - levels.offset) + levels.offset;
}

/** How many levels lie strictly between the ends of a stretch. */
function countLevels({ atLow, atHigh }: Stretch, levels: Levels): number {
  if (Number.isNaN(atLow) || Number.isNaN(atHigh)) return 0;
  if (levels.kind === 'zero')
    return atLow * atHigh < 0 || (Math.abs(atLow * atHigh) === Infinity && atLow < 0 !== atHigh < 0) ? 1 : 0;
  const bottom = Math.min(atLow, atHigh) - levels.offset;
  const top = Math.max(atLow, atHigh) - levels.offset;
  return Math.max(0, Math.ceil(top) - Math.floor(bottom) - 1);
}

/** The levels strictly between the ends, in the order met when walking up (or down) along x, at most `most` of them. */
function levelsOf(stretch: Stretch, levels: Levels, downwards: boolean, most: number): number[] {
  if (levels.kind === 'zero') return [0];
  const { offset } = levels;
  const [start, end] = downwards ? [stretch.atHigh, stretch.atLow] : [stretch.atLow, stretch.atHigh];
  const count = Math.min(countLevels(stretch, levels), most);
  const rising = end > start;
  const first = rising ? Math.floor(start - offset) + 1 : Math.ceil(start - offset) - 1;
  if (!(Math.abs(first) < LARGEST)) return [];
  return Array.from({ length: count }, (_, k) => (rising ? first + k : first - k) + offset);
}

/** The size of the values without their poles: the scale of their round-off. */
function typicalSize(values: Float64Array): number {
  let largest = 0;
  const cap = 1e3 * median(values);
  for (const value of values) {
    const size = Math.abs(value);
    if (size > largest && size <= cap) largest = size;
  }
  return largest;
}

/** The median size of some hundred of the values. */
function median(values: Float64Array): number {
  const sizes: number[] = [];
  const stride = Math.max(1, values.length >> 7);
  for (let i = 0; i < values.length; i += stride) if (!Number.isNaN(values[i])) sizes.push(Math.abs(values[i]));
  sizes.sort((a, b) => a - b);
  return sizes.length === 0 ? 0 : sizes[sizes.length >> 1];
}
