import type { Quantity, ResultCase } from '@/lib/shared/study-types';
import type { RailPoint } from './kernel-protocol';

export type LaneId = 'meanTime' | 'relaxationTime' | 'lyapunov' | 'gap' | 'entropy' | 'lostPerStep';

export interface Lane {
  id: LaneId;
  name: string;
  /** '' for a pure number. */
  unit: string;
  scale: 'log' | 'linear';
  /** Ink for how long it stays, rain for what the noise does to densities, plum for a second quantity. */
  colour: 'ink' | 'rain' | 'plum';
  dash?: string;
  /** Whether zero has its own line. */
  zero?: boolean;
  /** The same quantity in a result, with its uncertainty. */
  inCase(shown: ResultCase): Quantity | null | undefined;
}

export const LANES: readonly Lane[] = [
  {
    id: 'meanTime',
    name: 'mean exit time',
    unit: 'steps',
    scale: 'log',
    colour: 'ink',
    inCase: ({ exit }) => exit?.meanTime,
  },
  {
    id: 'relaxationTime',
    name: 'relaxation time',
    unit: 'steps',
    scale: 'log',
    colour: 'rain',
    inCase: ({ spectrum }) => spectrum?.relaxationTime,
  },
  {
    id: 'lyapunov',
    name: 'Lyapunov exponent',
    unit: 'per step',
    scale: 'linear',
    colour: 'plum',
    zero: true,
    inCase: ({ lyapunov }) => lyapunov?.value,
  },
  {
    id: 'gap',
    name: 'spectral gap',
    unit: '',
    scale: 'linear',
    colour: 'rain',
    dash: '7 3',
    inCase: ({ spectrum }) => spectrum?.gap,
  },
  {
    id: 'entropy',
    name: 'entropy',
    unit: 'nat',
    scale: 'linear',
    colour: 'plum',
    dash: '7 3',
    inCase: ({ stationary }) => stationary?.entropy,
  },
  {
    id: 'lostPerStep',
    name: 'mass lost',
    unit: 'per step',
    scale: 'log',
    colour: 'ink',
    dash: '7 3',
    inCase: ({ stationary }) => stationary?.lostPerStep,
  },
];

export const FIRST_LANES: LaneId[] = ['meanTime', 'relaxationTime', 'lyapunov'];

/** Longest exit time that is drawn; readouts and files have it whole. Mass lost is cut at one over it. */
export const DRAWN_MOST = 1e12;

/** What is drawn of a value: cut where its lane ends, null where there is nothing to draw. */
export function drawnValue(lane: Lane, value: number | null): number | null {
  if (value === null || !Number.isFinite(value)) return null;
  if (lane.scale === 'linear') return value;
  if (value <= 0) return null;
  if (lane.id === 'meanTime') return Math.min(value, DRAWN_MOST);
  return lane.id === 'lostPerStep' ? Math.max(value, 1 / DRAWN_MOST) : value;
}

/** The values that a lane's height spans: what is drawn with a margin, zero included where it has a line. */
export function laneDomain(lane: Lane, points: readonly RailPoint[]): [number, number] {
  const values = points.map((point) => drawnValue(lane, point[lane.id])).filter((value) => value !== null);
  if (values.length === 0) return lane.scale === 'log' ? [1, 10] : [0, 1];
  const low = Math.min(...values);
  const high = Math.max(...values);
  if (lane.scale === 'log') {
    const margin = Math.max((high / low) ** 0.08, 1.1);
    return [low / margin, high * margin];
  }
  const least = lane.zero ? Math.min(low, 0) : low;
  const most = lane.zero ? Math.max(high, 0) : high;
  const margin = (most - least) * 0.08 || Math.max(Math.abs(most), 1e-6) * 0.1;
  return [least - margin, most + margin];
}

/**
 * A lane's value between two computed points, straight in the lane's own scale over the logarithm of the noise level.
 * `points` increase; null outside them and beside a gap.
 */
export function laneValueAt(lane: Lane, points: readonly RailPoint[], sigma: number): number | null {
  const above = points.findIndex((point) => point.sigma >= sigma);
  if (above < 0) return null;
  const high = points[above];
  if (high.sigma === sigma) return high[lane.id];
  const low = points[above - 1];
  const from = low?.[lane.id] ?? null;
  const to = high[lane.id];
  if (from === null || to === null) return null;
  const share = Math.log(sigma / low.sigma) / Math.log(high.sigma / low.sigma);
  if (lane.scale === 'linear') return from + share * (to - from);
  return from > 0 && to > 0 ? from * (to / from) ** share : null;
}

/**
 * Largest noise level below which every computed point stays at least `steps` on average; null where none or all do.
 * Between two points exit times are straight in both logarithms.
 */
export function limitLevel(points: readonly RailPoint[], steps: number): number | null {
  const known = points.filter(({ meanTime }) => meanTime !== null);
  const over = known.findIndex(({ meanTime }) => (meanTime ?? 0) < steps);
  if (over <= 0) return null;
  const [low, high] = [known[over - 1], known[over]];
  const [from, to] = [low.meanTime ?? 1, high.meanTime ?? 1];
  const share = Math.log(from / steps) / Math.log(from / to);
  return low.sigma * (high.sigma / low.sigma) ** share;
}
