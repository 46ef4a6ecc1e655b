import { scaleLinear } from 'd3-scale';
import type { ReactNode } from 'react';
import { BottomAxis } from './axis';
import { STRIP_MARGIN } from './strip-picture';

export interface StepsStripProps {
  steps: readonly number[];
  /** The chosen row, outlined. */
  chosen: number;
  /** The rows' canvas; a file has it as one image. */
  children?: ReactNode;
  from: number;
  to: number;
  /** "x, V" */
  variable: string;
  title: string;
  width: number;
  rowHeight: number;
}

export function stripHeight(rows: number, rowHeight: number): number {
  return STRIP_MARGIN.top + rows * rowHeight + STRIP_MARGIN.bottom;
}

/** Densities step by step, one row each, dark where there is much: the image lies between the axes. */
export function StepsStrip(props: StepsStripProps) {
  const { steps, chosen, children, from, to, variable, title, width, rowHeight } = props;
  const { left, right, top } = STRIP_MARGIN;
  const height = stripHeight(steps.length, rowHeight);
  const inner = Math.max(width - left - right, 1);
  const x = scaleLinear([from, to], [left, left + inner]);
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      className="relative block max-w-full"
      role="img"
      aria-label={title}
      fill="none"
    >
      <title>{title}</title>
      <foreignObject x={left} y={top} width={inner} height={steps.length * rowHeight}>
        {children}
      </foreignObject>
      <g className="figures fill-muted text-[12px]">
        {steps.map((step, row) =>
          step % 5 === 0 ? (
            <text key={step} x={left - 8} y={top + (row + 0.5) * rowHeight + 4} textAnchor="end">
              {step}
            </text>
          ) : null,
        )}
      </g>
      <rect
        data-series="step-chosen"
        x={left - 3}
        y={top + chosen * rowHeight - 0.5}
        width={inner + 6}
        height={rowHeight}
        rx="2"
        className="stroke-ink"
        strokeWidth="1.5"
      />
      <BottomAxis scale={x} at={top + steps.length * rowHeight} name={variable} />
    </svg>
  );
}
