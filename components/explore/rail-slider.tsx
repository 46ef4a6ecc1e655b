'use client';

import { type KeyboardEvent, type PointerEvent, useRef } from 'react';
import { formatEntry } from '@/lib/shared/format-number';
import { plainDecimal } from '@/lib/shared/plain-decimal';
import { type Bounds, COARSE, clamp, digitStepper, threeDigits } from '@/lib/shared/step-number';

interface RailSliderProps {
  sigma: number;
  unit: string | undefined;
  /** What the lanes say at the handle. */
  values: string;
  /** Levels from end to end of the rail, and all that can be computed. */
  window: Bounds;
  limits: Bounds;
  /** The noise level at a place of the rail, pixels from its left edge. */
  level(x: number): number;
  onMove(sigma: number): void;
  onRest(): void;
  onZoom(factor: number | null): void;
}

/** Lies over the rail: its handle is moved by drag, by arrow keys (shift for coarse), by Home and End. */
export function RailSlider(props: RailSliderProps) {
  const { sigma, unit, values, window, limits, level, onMove, onRest, onZoom } = props;
  const dragging = useRef(false);
  const follow = (event: PointerEvent<HTMLDivElement>) => {
    const x = event.clientX - event.currentTarget.getBoundingClientRect().left;
    onMove(clamp(threeDigits(level(x)), window));
  };
  const press = (event: KeyboardEvent) => {
    const zoom = { '+': 0.5, '=': 0.5, '-': 2, '0': null }[event.key];
    if (zoom !== undefined && !event.ctrlKey && !event.metaKey) {
      event.preventDefault();
      return onZoom(zoom);
    }
    const count = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1, PageUp: COARSE, PageDown: -COARSE }[
      event.key
    ];
    const end = { Home: window.min, End: window.max }[event.key];
    if (count === undefined && end === undefined) return;
    event.preventDefault();
    onMove(end ?? digitStepper(limits)(sigma, (count ?? 0) * (event.shiftKey ? COARSE : 1)));
  };
  const release = () => {
    dragging.current = false;
    onRest();
  };
  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label="Noise level sigma"
      aria-valuemin={plainDecimal(Math.min(window.min, sigma)) as number}
      aria-valuemax={plainDecimal(Math.max(window.max, sigma)) as number}
      aria-valuenow={plainDecimal(sigma) as number}
      aria-valuetext={`${formatEntry(sigma)}${unit ? ` ${unit}` : ''}${values ? `: ${values}` : ''}`}
      className="absolute inset-0 cursor-ew-resize touch-pan-y"
      onPointerDown={(event) => {
        if (event.button !== 0) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        dragging.current = true;
        follow(event);
      }}
      onPointerMove={(event) => dragging.current && follow(event)}
      onPointerUp={release}
      onPointerCancel={release}
      onKeyDown={press}
      onKeyUp={onRest}
    />
  );
}
