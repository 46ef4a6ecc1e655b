'use client';

import type { KeyboardEvent, PointerEvent } from 'react';

interface ReadoutSliderProps {
  label: string;
  /** Position along the readout, 0 to `steps`. */
  now: number;
  steps: number;
  text: string;
  onPoint(x: number, y: number): void;
  onStep(now: number): void;
  onLeave(): void;
  /** A click or Enter: what the readout speaks of is chosen. */
  onChoose?(): void;
}

/** Lies over a plot: the pointer or the arrow keys choose the place that the readout speaks of. */
export function ReadoutSlider({ label, now, steps, text, onPoint, onStep, onLeave, onChoose }: ReadoutSliderProps) {
  const point = (event: PointerEvent<HTMLDivElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    onPoint(event.clientX - box.left, event.clientY - box.top);
  };
  const press = (event: KeyboardEvent) => {
    const coarse = event.shiftKey ? Math.max(Math.round(steps / 20), 1) : 1;
    const next: Record<string, number> = {
      ArrowLeft: now - coarse,
      ArrowDown: now - coarse,
      ArrowRight: now + coarse,
      ArrowUp: now + coarse,
      Home: 0,
      End: steps,
    };
    if (event.key === 'Escape') onLeave();
    if (event.key === 'Enter') onChoose?.();
    if (!(event.key in next)) return;
    event.preventDefault();
    onStep(Math.min(Math.max(next[event.key], 0), steps));
  };
  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={steps}
      aria-valuenow={now}
      aria-valuetext={text}
      className="absolute inset-0 touch-pan-y"
      onPointerMove={point}
      onPointerDown={point}
      onClick={onChoose}
      onPointerLeave={onLeave}
      onBlur={onLeave}
      onKeyDown={press}
    />
  );
}
