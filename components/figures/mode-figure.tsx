import { scaleLinear } from 'd3-scale';
import { BottomAxis } from './axis';
import { curvePath } from './density-path';

/** One side of an eigenfunction, its largest modulus 1; without an imaginary part where it is real. */
export interface ModeCurve {
  re: number[];
  im: number[] | null;
}

export interface ModeFigureProps {
  x: number[];
  density: ModeCurve;
  observable: ModeCurve;
  from: number;
  to: number;
  /** "x, V" */
  variable: string;
  title: string;
  width: number;
  height: number;
}

const MARGIN = { top: 22, right: 40, bottom: 30, left: 34 };

/** The size of a complex eigenfunction at each place, within which its real part turns from step to step. */
export function modeEnvelope({ re, im }: ModeCurve): number[] | null {
  return im === null ? null : re.map((value, i) => Math.hypot(value, im[i]));
}

/** An eigenvalue's two eigenfunctions: the pattern in densities that dies out with it, and the observable that shows it. */
export function ModeFigure({ x, density, observable, from, to, variable, title, width, height }: ModeFigureProps) {
  const { left, right, top, bottom } = MARGIN;
  const across = scaleLinear([from, to], [left, Math.max(width - right, left + 1)]);
  const up = scaleLinear([-1, 1], [height - bottom - 4, top + 4]);
  const sides = [
    { name: 'observable', curve: observable, stroke: 'stroke-plum', width: 1.6 },
    { name: 'density', curve: density, stroke: 'stroke-rain', width: 2 },
  ];
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
      <g className="figures fill-muted text-[12px]">
        {[-1, 0, 1].map((value) => (
          <g key={value}>
            <line
              x1={left}
              x2={width - right}
              y1={up(value)}
              y2={up(value)}
              className={value === 0 ? 'stroke-rule' : 'stroke-rule-soft'}
            />
            <text x={left - 7} y={up(value) + 4} textAnchor="end">
              {value}
            </text>
          </g>
        ))}
        <text x={0} y={11} className="fill-muted font-sans text-[12px]">
          real part, over the largest modulus
        </text>
      </g>
      {sides.map(({ name, curve, stroke, width: weight }) => {
        const envelope = modeEnvelope(curve);
        return (
          <g key={name} className={stroke} strokeLinejoin="round">
            {envelope &&
              [1, -1].map((sign) => (
                <path
                  key={sign}
                  data-series={`mode-${name}-envelope`}
                  d={curvePath({ x, values: envelope.map((value) => sign * value) }, across, up)}
                  strokeWidth="1"
                  strokeDasharray="2 3"
                />
              ))}
            <path
              data-series={`mode-${name}`}
              d={curvePath({ x, values: curve.re }, across, up)}
              strokeWidth={weight}
            />
          </g>
        );
      })}
      <BottomAxis scale={across} at={height - bottom} name={variable} />
    </svg>
  );
}
