import { useId } from 'react';
import { BottomAxis, LeftAxis } from './axis';
import { areaPath, type Curve, curvePath, stepPath } from './density-path';
import { DENSITY_MARGIN, densityScales, densityTop } from './density-scales';

export interface DensityFigureProps {
  noisy: Curve | null;
  without: Curve | null;
  from: number;
  to: number;
  /** Name of the state's variable, with its unit where it has one: "x, V". */
  variable: string;
  title: string;
  width: number;
  height: number;
  /** Position of the readout's line. */
  at?: number | null;
}

/** A density with noise (filled) over the one without (steps). Draws on the server, on the bench and for files alike. */
export function DensityFigure({ noisy, without, from, to, variable, title, width, height, at }: DensityFigureProps) {
  const id = useId();
  const { x, y } = densityScales(width, height, from, to, densityTop(noisy, without));
  const { left, right, top, bottom } = DENSITY_MARGIN;
  const inner = Math.max(width - left - right, 1);
  const [unitPart] = variable.split(', ').slice(1);
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
      <clipPath id={`${id}plot`}>
        <rect x={left} y={top} width={inner} height={height - top - bottom + 1} />
      </clipPath>
      <LeftAxis scale={y} at={left} right={width - right} name={unitPart ? `density, per ${unitPart}` : 'density'} />
      <g clipPath={`url(#${id}plot)`}>
        {noisy && <path data-series="density-area" d={areaPath(noisy, x, y)} className="fill-rain-soft" />}
        {without && (
          <path
            data-series="density-without"
            d={stepPath(without, x, y, inner)}
            className="stroke-rust"
            strokeWidth="1"
          />
        )}
        {noisy && (
          <path
            data-series="density-with"
            d={curvePath(noisy, x, y)}
            className="stroke-rain"
            strokeWidth="2"
            strokeLinejoin="round"
          />
        )}
        {at !== null && at !== undefined && (
          <line x1={x(at)} x2={x(at)} y1={top} y2={height - bottom} className="stroke-ink" strokeDasharray="2 3" />
        )}
      </g>
      <BottomAxis scale={x} at={height - bottom} name={variable} />
    </svg>
  );
}
