import type { ScaleLinear } from 'd3-scale';
import { formatTick } from '@/lib/shared/format-number';

const CHARACTER = 7.2;

/** As many round ticks as fit without touching, at most `most`. */
export function fittingTicks(scale: ScaleLinear<number, number>, gap: number, most = 6): number[] {
  const [start, end] = scale.range();
  const room = Math.abs(end - start);
  for (let count = most; count >= 2; count--) {
    const ticks = scale.ticks(count);
    const widest = Math.max(...ticks.map((tick) => formatTick(tick).length)) * CHARACTER + gap;
    if (ticks.length < 2 || room / (ticks.length - 1) >= widest) return ticks;
  }
  return scale.domain();
}

interface AxisProps {
  scale: ScaleLinear<number, number>;
  /** Where the axis lies across its own direction. */
  at: number;
  name: string;
}

/** Ticks below the plot, the name in their line, right of the last one. */
export function BottomAxis({ scale, at, name }: AxisProps) {
  const [left, right] = scale.range();
  return (
    <g className="fill-muted figures text-[12px]">
      <line x1={left} x2={right} y1={at} y2={at} className="stroke-rule" />
      {fittingTicks(scale, 28).map((tick) => (
        <text key={tick} x={scale(tick)} y={at + 20} textAnchor="middle">
          {formatTick(tick)}
        </text>
      ))}
      <AxisName name={name} x={right + 14} y={at + 20} />
    </g>
  );
}

/** Horizontal rules with their values at the left; the name above the highest one. */
export function LeftAxis({ scale, at, name, right }: AxisProps & { right: number }) {
  const ticks = scale.ticks(4);
  return (
    <g className="fill-muted figures text-[12px]">
      {ticks.map((tick) => (
        <g key={tick}>
          <line
            x1={at}
            x2={right}
            y1={scale(tick)}
            y2={scale(tick)}
            className={tick === 0 ? 'stroke-rule' : 'stroke-rule-soft'}
          />
          <text x={at - 8} y={scale(tick) + 4} textAnchor="end">
            {formatTick(tick)}
          </text>
        </g>
      ))}
      <text x={0} y={11} className="fill-muted font-sans text-[12px]">
        {name}
      </text>
    </g>
  );
}

/** "x, V": the variable slanted as in the equation, its unit upright. */
function AxisName({ name, x, y }: { name: string; x: number; y: number }) {
  const [variable, ...unit] = name.split(', ');
  return (
    <text x={x} y={y} className="fill-ink math text-[15px]">
      <tspan fontStyle="italic">{variable}</tspan>
      {unit.length > 0 && <tspan className="fill-muted text-[12px]">, {unit.join(', ')}</tspan>}
    </text>
  );
}
