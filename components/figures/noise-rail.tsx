import { memo, type ReactNode } from 'react';
import type { RailPoint } from '@/lib/client/kernel-protocol';
import type { Lane } from '@/lib/client/rail-lanes';
import { formatEntry } from '@/lib/shared/format-number';
import type { Bounds } from '@/lib/shared/step-number';
import {
  laneGeometry,
  RAIL_AXIS,
  RAIL_TOP,
  type RailFrame,
  railHeight,
  railMargin,
  railTicks,
  railX,
} from './rail-geometry';

export interface RailMark {
  sigma: number;
  text: string;
}

export interface NoiseRailProps {
  lanes: readonly Lane[];
  points: readonly RailPoint[];
  window: Bounds;
  /** Where the handle is; null without one. */
  sigma: number | null;
  /** Per lane the value at the handle and its text, in the order of `lanes`. */
  values: readonly { value: number | null; text: string }[];
  /** A noise level that must not be passed. */
  limit: RailMark | null;
  pins: readonly number[];
  /** The curves belong to an earlier study. */
  stale: boolean;
  title: string;
  /** "σ, V": what the axis counts. */
  axisName: string;
  width: number;
  laneHeight: number;
}

export const laneStroke = { ink: 'stroke-ink', rain: 'stroke-rain', plum: 'stroke-plum' };
export const laneFill = { ink: 'fill-ink', rain: 'fill-rain', plum: 'fill-plum' };

/** What changes along the noise level: one lane a quantity, each with its own scale, and the handle through them all. */
export function NoiseRail(props: NoiseRailProps) {
  const { lanes, points, window, sigma, values, limit, pins, stale, title, axisName, width, laneHeight } = props;
  const frame: RailFrame = { width, laneHeight, window };
  const x = railX(frame);
  const height = railHeight(lanes.length, laneHeight);
  const [start, end] = x.range();
  const bottom = height - RAIL_AXIS;
  const at = sigma === null ? null : Math.min(Math.max(x(sigma), start), end);
  const within = (level: number) => level >= window.min && level <= window.max;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      className="block max-w-full"
      role="img"
      aria-label={title}
      fill="none"
    >
      <title>{title}</title>
      <RailCurves
        lanes={lanes}
        points={points}
        min={window.min}
        max={window.max}
        stale={stale}
        axisName={axisName}
        width={width}
        laneHeight={laneHeight}
      />
      <g data-series="pins">
        {pins.filter(within).map((pin) => (
          <path key={pin} d={`M${x(pin)} ${bottom}l-4.5 9h9z`} className="fill-paper stroke-ink" strokeWidth="1.2" />
        ))}
      </g>
      {limit && within(limit.sigma) && (
        <Mark x={x(limit.sigma)} bottom={bottom} end={end} text={limit.text} name="limit" />
      )}
      {at !== null && (
        <g data-series="handle">
          <line x1={at} x2={at} y1={0} y2={bottom + 8} className="stroke-rain" strokeWidth="2" />
          <HandleValues lanes={lanes} points={points} frame={frame} at={at} values={values} end={end} />
          <rect x={at - 34} y={bottom + 19} width={68} height={22} rx={11} className="fill-rain" />
          <text x={at} y={bottom + 34.5} textAnchor="middle" className="figures fill-paper text-[13px]">
            {formatEntry(sigma ?? 0)}
          </text>
        </g>
      )}
    </svg>
  );
}

interface HandleValuesProps {
  lanes: readonly Lane[];
  points: readonly RailPoint[];
  frame: RailFrame;
  at: number;
  values: NoiseRailProps['values'];
  end: number;
}

function HandleValues({ lanes, points, frame, at, values, end }: HandleValuesProps) {
  // Left of the handle where the lanes' names stand at the right.
  const left = at > (frame.width < 560 ? 150 : end - 260);
  return lanes.map((lane, place) => {
    const { top, bottom, y } = laneGeometry(lane, place, points, frame);
    const { value, text } = values[place] ?? { value: null, text: '' };
    const raw = value === null ? null : y(value);
    const dot = raw === null || !Number.isFinite(raw) ? null : Math.min(Math.max(raw, top + 4), bottom - 4);
    const middle = (top + bottom) / 2;
    // On the side of the line that has more room; left of the handle below it, for most curves fall.
    const below = dot !== null && (dot <= middle || (left && dot + 18 <= bottom));
    const textY = dot === null ? middle + 4 : below ? dot + 17 : dot - 8;
    return (
      <g key={lane.id} data-lane-value={lane.id}>
        {dot !== null && <circle cx={at} cy={dot} r="4.5" className={laneFill[lane.colour]} />}
        <text
          x={left ? at - 10 : at + 10}
          y={textY}
          textAnchor={left ? 'end' : 'start'}
          className={`figures text-[13px] ${laneFill[lane.colour]}`}
        >
          {text}
        </text>
      </g>
    );
  });
}

function Mark({ x, bottom, end, text, name }: { x: number; bottom: number; end: number; text: string; name: string }) {
  const right = x < end - 220;
  return (
    <g data-series={name}>
      <line x1={x} x2={x} y1={0} y2={bottom} className="stroke-ink" strokeWidth="1.4" strokeDasharray="6 4" />
      <text x={right ? x + 6 : x - 6} y={12} textAnchor={right ? 'start' : 'end'} className="fill-ink text-[12px]">
        {text}
      </text>
    </g>
  );
}

interface RailCurvesProps {
  lanes: readonly Lane[];
  points: readonly RailPoint[];
  min: number;
  max: number;
  stale: boolean;
  axisName: string;
  width: number;
  laneHeight: number;
}

/** All that stays while the handle moves. */
const RailCurves = memo(function RailCurves(props: RailCurvesProps): ReactNode {
  const { lanes, points, min, max, stale, axisName, width, laneHeight } = props;
  const frame: RailFrame = { width, laneHeight, window: { min, max } };
  const x = railX(frame);
  const { left, right } = railMargin(width);
  const bottom = railHeight(lanes.length, laneHeight) - RAIL_AXIS;
  return (
    <>
      <rect
        x={left}
        y={RAIL_TOP}
        width={Math.max(width - left - right, 1)}
        height={bottom - RAIL_TOP}
        className="fill-raised"
      />
      {lanes.map((lane, place) => {
        const { top, bottom: foot, path, ticks, nameY, y, cut } = laneGeometry(lane, place, points, frame);
        const zero = y(0);
        return (
          <g key={lane.id} data-lane={lane.id}>
            {place > 0 && <line x1={left} x2={width - right} y1={top} y2={top} className="stroke-rule" />}
            {ticks.map(({ value, text, y: height }) => (
              <g key={value}>
                <line x1={left} x2={width - right} y1={height} y2={height} className="stroke-rule-soft" />
                <text
                  x={left - 7}
                  y={Math.min(Math.max(height + 4, top + 10), foot - 1)}
                  textAnchor="end"
                  className="figures fill-muted text-[11px]"
                >
                  {text}
                </text>
              </g>
            ))}
            {lane.zero && zero >= top && zero <= foot && (
              <line x1={left} x2={width - right} y1={zero} y2={zero} className="stroke-muted" strokeDasharray="2 3" />
            )}
            <path
              data-series={`rail-${lane.id}`}
              d={path}
              className={laneStroke[lane.colour]}
              strokeWidth="2"
              strokeDasharray={lane.dash}
              strokeLinejoin="round"
              opacity={stale ? 0.35 : 1}
            />
            <text
              x={width - right - 8}
              y={nameY}
              textAnchor="end"
              className={`text-[12px] font-semibold ${laneFill[lane.colour]}`}
            >
              {lane.unit ? `${lane.name}, ${lane.unit}` : lane.name}
              {cut && width >= 560 && (lane.id === 'meanTime' ? ' (drawn up to 1e12)' : ' (drawn from 1e-12)')}
            </text>
          </g>
        );
      })}
      <line x1={left} x2={width - right} y1={bottom} y2={bottom} className="stroke-muted" />
      {railTicks(x).map(({ value, text }) => (
        <g key={value}>
          <line x1={x(value)} x2={x(value)} y1={bottom} y2={bottom + (text ? 7 : 4)} className="stroke-muted" />
          {text && (
            <text x={x(value)} y={bottom + 19} textAnchor="middle" className="figures fill-muted text-[12px]">
              {text}
            </text>
          )}
        </g>
      ))}
      <text x={width - right} y={bottom + 38} textAnchor="end" className="math fill-ink text-[15px]">
        <tspan fontStyle="italic">{axisName.split(', ')[0]}</tspan>
        {axisName.includes(', ') && <tspan className="fill-muted text-[12px]">, {axisName.split(', ')[1]}</tspan>}
      </text>
    </>
  );
});
