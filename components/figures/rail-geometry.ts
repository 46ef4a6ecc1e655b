import { type ScaleLogarithmic, scaleLinear, scaleLog } from 'd3-scale';
import { line } from 'd3-shape';
import type { RailPoint } from '@/lib/client/kernel-protocol';
import { drawnValue, type Lane, laneDomain } from '@/lib/client/rail-lanes';
import { formatTick } from '@/lib/shared/format-number';
import type { Bounds } from '@/lib/shared/step-number';

export const RAIL_TOP = 6;
/** Room below the lanes for ticks, their numbers and the handle's. */
export const RAIL_AXIS = 46;

export interface RailFrame {
  width: number;
  laneHeight: number;
  window: Bounds;
}

export function railMargin(width: number) {
  return width < 560 ? { left: 40, right: 14 } : { left: 52, right: 24 };
}

export function railX({ width, window }: RailFrame): ScaleLogarithmic<number, number> {
  const { left, right } = railMargin(width);
  return scaleLog([window.min, window.max], [left, Math.max(width - right, left + 1)]);
}

export function railHeight(lanes: number, laneHeight: number): number {
  return RAIL_TOP + lanes * laneHeight + RAIL_AXIS;
}

export interface LaneGeometry {
  lane: Lane;
  top: number;
  bottom: number;
  y(value: number): number;
  path: string;
  ticks: { value: number; text: string; y: number }[];
  /** Height of the lane's name at its right end, where the curve leaves more room. */
  nameY: number;
  cut: boolean;
}

/** A lane's own scale over the points that the window shows, its curve and its ticks. */
export function laneGeometry(lane: Lane, place: number, points: readonly RailPoint[], frame: RailFrame): LaneGeometry {
  const top = RAIL_TOP + place * frame.laneHeight;
  const bottom = top + frame.laneHeight;
  const x = railX(frame);
  const { min, max } = frame.window;
  const within = points.filter(({ sigma }) => sigma >= min && sigma <= max);
  const domain = laneDomain(lane, within);
  const range = [bottom - 5, top + 5];
  const scale = lane.scale === 'log' ? scaleLog(domain, range) : scaleLinear(domain, range);
  const round = (value: number) => Math.round(value * 10) / 10;
  const path =
    line<RailPoint>()
      .defined((point) => drawnValue(lane, point[lane.id]) !== null)
      .x(({ sigma }) => round(x(sigma)))
      .y((point) => round(scale(drawnValue(lane, point[lane.id]) ?? 1)))(within) ?? '';
  const nearEnd = within.slice(-Math.ceil(within.length / 8)).map((point) => drawnValue(lane, point[lane.id]));
  const heights = nearEnd.filter((value) => value !== null).map((value) => scale(value));
  const middle = (top + bottom) / 2;
  const low = heights.reduce((sum, height) => sum + height, 0) / heights.length > middle;
  const zero = lane.zero ? scale(0) : bottom;
  return {
    lane,
    top,
    bottom,
    y: (value) => scale(drawnValue(lane, value) ?? value),
    path,
    ticks: apart(laneTicks(lane, domain).map((value) => ({ value, text: formatTick(value), y: round(scale(value)) }))),
    // Clear of the zero line, which lies low where the curve lies high.
    nameY: heights.length === 0 || low ? top + 15 : Math.min(bottom - 6, zero - 5),
    cut: within.some((point) => {
      const value = point[lane.id];
      return value !== null && drawnValue(lane, value) !== value && value > 0;
    }),
  };
}

/** Height that a tick's number takes. */
const LABEL = 12;

/** Leaves out ticks whose numbers would touch the one below. */
function apart<T extends { y: number }>(ticks: readonly T[]): T[] {
  const kept: T[] = [];
  for (const tick of ticks) if (kept.every(({ y }) => Math.abs(y - tick.y) >= LABEL)) kept.push(tick);
  return kept;
}

/** Two or three round values: powers of ten far apart where there are many, else round numbers of a linear scale. */
export function laneTicks(lane: Lane, [low, high]: [number, number]): number[] {
  if (lane.scale === 'log') {
    const first = Math.ceil(Math.log10(low) - 1e-9);
    const last = Math.floor(Math.log10(high) + 1e-9);
    const every = Math.max(Math.ceil((last - first + 1) / 3), 1);
    const powers: number[] = [];
    for (let power = first; power <= last; power += every) powers.push(Number(`1e${power}`));
    if (powers.length >= 2) return powers;
  }
  const ticks = scaleLinear([low, high], [0, 1]).ticks(2);
  return ticks.length > 3 ? ticks.filter((_, i) => i % 2 === 0) : ticks;
}

/** Ticks of the noise axis that can carry numbers without touching: powers of ten, and 2 and 5 between where they fit. */
export function railTicks(scale: ScaleLogarithmic<number, number>): { value: number; text: string | null }[] {
  const all = scale.ticks();
  const leading = (value: number) => Number(value.toExponential(6).split('e')[0]);
  const labelled = new Set<number>();
  for (const wanted of [[1], [2, 5], [3, 4, 7]]) {
    for (const value of all.filter((tick) => wanted.includes(leading(tick)))) {
      const free = [...labelled].every((other) => Math.abs(scale(other) - scale(value)) > 64);
      if (free) labelled.add(value);
    }
  }
  // A narrow window on a logarithmic scale can have very many ticks, or none.
  const shown = all.length > 60 ? all.filter((value) => labelled.has(value)) : all;
  return shown.map((value) => ({ value, text: labelled.has(value) ? formatTick(value) : null }));
}
