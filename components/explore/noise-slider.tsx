'use client';

import { scaleLog } from 'd3-scale';
import { type KeyboardEvent, type PointerEvent, useRef } from 'react';
import { useWidth } from '@/components/figures/use-width';
import { noiseLevel } from '@/lib/shared/bench-study';
import { formatEntry, formatTick } from '@/lib/shared/format-number';
import { plainDecimal } from '@/lib/shared/plain-decimal';
import { COARSE, clamp, digitStepper, threeDigits } from '@/lib/shared/step-number';
import { useExplore } from './explore-context';
import { sigmaBounds, withSigma } from './study-edits';

const INSET = 30;
const HEIGHT = 58;

/** The noise level on a logarithmic scale: drag, arrow keys (shift for coarse), Home and End. */
export function NoiseSlider() {
  const study = useExplore((state) => state.study);
  const edit = useExplore((state) => state.edit);
  const rest = useExplore((state) => state.rest);
  const [ref, width] = useWidth<HTMLDivElement>(1344);
  const dragging = useRef(false);
  const sigma = noiseLevel(study);
  if (study.noise.kind === 'none' || sigma === null) return null;
  const bounds = sigmaBounds(study);
  const scale = scaleLog([bounds.min, bounds.max], [INSET, Math.max(width - INSET, INSET + 1)]);
  const at = scale(clamp(sigma, bounds));
  const unit = study.system.units?.[0];
  const move = (value: number) => edit((current) => withSigma(current, clamp(value, bounds)), true);
  const follow = (event: PointerEvent<HTMLDivElement>) => {
    move(threeDigits(scale.invert(event.clientX - event.currentTarget.getBoundingClientRect().left)));
  };
  const press = (event: KeyboardEvent) => {
    const count = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1, PageUp: COARSE, PageDown: -COARSE }[
      event.key
    ];
    const end = { Home: bounds.min, End: bounds.max }[event.key];
    if (count === undefined && end === undefined) return;
    event.preventDefault();
    move(end ?? digitStepper(bounds)(sigma, (count ?? 0) * (event.shiftKey ? COARSE : 1)));
  };
  const decades = scale.ticks().filter((tick) => /^1e/.test(tick.toExponential()));
  return (
    <div ref={ref} className="relative" style={{ height: HEIGHT }}>
      <svg width={width} height={HEIGHT} className="absolute inset-0 max-w-full" aria-hidden="true" fill="none">
        <line x1={INSET} x2={width - INSET} y1="14" y2="14" className="stroke-muted" />
        {scale.ticks().map((tick) => (
          <line
            key={tick}
            x1={scale(tick)}
            x2={scale(tick)}
            y1="14"
            y2={decades.includes(tick) ? 21 : 18}
            className="stroke-muted"
          />
        ))}
        {decades.map((tick) => (
          <text
            key={tick}
            x={scale(tick)}
            y="36"
            textAnchor="middle"
            className="fill-muted figures text-[12px]"
            opacity={Math.abs(scale(tick) - at) < 52 ? 0 : 1}
          >
            {formatTick(tick)}
          </text>
        ))}
      </svg>
      <div
        role="slider"
        tabIndex={0}
        aria-label="Noise level sigma"
        aria-valuemin={plainDecimal(bounds.min) as number}
        aria-valuemax={plainDecimal(bounds.max) as number}
        aria-valuenow={plainDecimal(sigma) as number}
        aria-valuetext={`${formatEntry(sigma)}${unit ? ` ${unit}` : ''}`}
        className="group absolute inset-0 cursor-ew-resize touch-none outline-none"
        onPointerDown={(event) => {
          if (event.button !== 0) return;
          event.currentTarget.setPointerCapture(event.pointerId);
          dragging.current = true;
          follow(event);
        }}
        onPointerMove={(event) => dragging.current && follow(event)}
        onPointerUp={() => {
          dragging.current = false;
          rest();
        }}
        onPointerCancel={() => {
          dragging.current = false;
          rest();
        }}
        onKeyDown={press}
        onKeyUp={rest}
      >
        <span className="absolute top-0 h-7 w-0.5 -translate-x-1/2 bg-rain" style={{ left: at }} />
        <span
          className="figures absolute top-6 -translate-x-1/2 rounded-full bg-rain px-2.5 py-0.5 text-[0.8125rem] text-paper group-focus-visible:outline-2 group-focus-visible:outline-offset-2 group-focus-visible:outline-rain"
          style={{ left: at }}
        >
          {formatEntry(sigma)}
        </span>
      </div>
    </div>
  );
}
