import fc from 'fast-check';
import type { MapModel } from '@/kernels/core/map-model';
import { findCriticalPoints } from '@/kernels/formula/find-critical-points';
import { gaussian } from '@/kernels/noise/gaussian';
import { type Boundary, boundaryOf } from '@/kernels/operators/ends';
import { NoisyPlan } from '@/kernels/operators/noisy-plan';
import type { Ends } from '@/kernels/spec';

/** Every property runs on the same random cases each time; a failing case is reported as found, shrinking would take minutes. */
export const seeded = (numRuns: number) => ({ seed: 20261201, numRuns, endOnFailure: true });

/** A map of the unit interval, to be carried to any domain: values, slope, where it has a corner. */
interface UnitMap {
  name: string;
  value(u: number): number;
  slope(u: number): number;
  breaks: number[];
}

/** Even steps between two numbers: no subnormals, which no user types. */
const between = (min: number, max: number) =>
  fc.integer({ min: 0, max: 1e6 }).map((k) => min + ((max - min) * k) / 1e6);

const cubics: fc.Arbitrary<UnitMap> = fc
  .tuple(between(-0.5, 1), between(-3, 3), between(-3, 3), between(-2, 2))
  .map(([a, b, c, d]) => ({
    name: `${a} + ${b} u + ${c} u² + ${d} u³`,
    value: (u) => a + u * (b + u * (c + u * d)),
    slope: (u) => b + u * (2 * c + 3 * u * d),
    breaks: [],
  }));

/** Maps of degree one: smooth across the seam of a circle. */
export const sines: fc.Arbitrary<UnitMap> = fc.tuple(between(0, 1), between(-2, 2)).map(([w, k]) => ({
  name: `u + ${w} + ${k} sin(2πu)/2π`,
  value: (u) => u + w + (k * Math.sin(2 * Math.PI * u)) / (2 * Math.PI),
  slope: (u) => 1 + k * Math.cos(2 * Math.PI * u),
  breaks: [],
}));

const tents: fc.Arbitrary<UnitMap> = fc.tuple(between(0.5, 3), between(0.5, 3)).map(([s, t]) => ({
  name: `min(${s} u, ${t} (1 − u))`,
  value: (u) => Math.min(s * u, t * (1 - u)),
  slope: (u) => (s * u < t * (1 - u) ? s : -t),
  breaks: [t / (s + t)],
}));

/** A smooth map without branches that pile up, ready for the operators. */
export function plainModel(evaluate: MapModel['evaluate'], breaks: number[] = [], singular: number[] = []): MapModel {
  return {
    evaluate,
    breaks,
    singular,
    complete: true,
    stretch(x, out) {
      const value = new Float64Array(x.length);
      evaluate(x, value, out);
      for (let i = 0; i < x.length; i++) out[i] = Math.log(Math.abs(out[i]));
    },
    stretchSingular: singular,
  };
}

/** The map on [from, to]. */
export function modelOn(map: UnitMap, from: number, to: number): MapModel {
  const length = to - from;
  const evaluate: MapModel['evaluate'] = (x, out, slope) => {
    for (let i = 0; i < x.length; i++) {
      const u = (x[i] - from) / length;
      out[i] = from + length * map.value(u);
      if (slope) slope[i] = map.slope(u);
    }
  };
  const breaks = map.breaks.map((u) => from + length * u);
  return plainModel(evaluate, breaks, findCriticalPoints({ evaluate }, from, to, breaks));
}

export interface NoisyMap {
  name: string;
  model: MapModel;
  boundary: Boundary;
  sigma: number;
}

const closed: Ends[] = ['periodic', 'reflecting'];
const open: Ends[] = ['absorbing', ['reflecting', 'absorbing'], ['absorbing', 'reflecting']];

/** Random maps with random ends and noise levels; `lose` true: mass may leave, false: it cannot. */
export function noisyMaps(options: { lose?: boolean; circle?: boolean; least?: number } = {}): fc.Arbitrary<NoisyMap> {
  const kinds = options.circle
    ? fc.constant<Ends>('periodic')
    : fc.constantFrom(...(options.lose === undefined ? [...closed, ...open] : options.lose ? open : closed));
  const maps = options.circle ? sines : fc.oneof(cubics, sines, tents);
  return fc
    .tuple(maps, kinds, between(-2, 1), between(0.5, 3), between(Math.log(options.least ?? 0.03), Math.log(0.6)))
    .map(([map, ends, from, length, level]) => {
      const sigma = Math.exp(level) * length;
      return {
        name: `${map.name} on [${from}, ${from + length}], ${ends}, sigma ${sigma}`,
        model: modelOn(map, from, from + length),
        boundary: boundaryOf(from, from + length, ends),
        sigma,
      };
    });
}

export const planOf = ({ model, boundary, sigma }: NoisyMap, tolerance = 1e-8) =>
  new NoisyPlan(model, boundary, gaussian, sigma, { tolerance }, 1);

/** Values on so many nodes, drawn from a seed: fast-check would shrink thousands of numbers. */
export function randomValues(n: number, seed: number, low = 0, high = 1): Float64Array {
  let state = (seed >>> 0) + 1;
  return Float64Array.from({ length: n }, () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return low + ((high - low) * state) / 4294967296;
  });
}

export const seeds = fc.integer({ min: 1, max: 1e9 });

export const dot = (a: ArrayLike<number>, b: ArrayLike<number>, weights: ArrayLike<number>) => {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i] * b[i] * weights[i];
  return sum;
};

export const peak = (a: Float64Array) => a.reduce((m, v) => Math.max(m, Math.abs(v)), 0);

export const largestGap = (a: ArrayLike<number>, b: ArrayLike<number>) => {
  let most = 0;
  for (let i = 0; i < a.length; i++) most = Math.max(most, Math.abs(a[i] - b[i]));
  return most;
};
