'use client';

import type { KeyboardEvent, PointerEvent } from 'react';
import { COARSE } from '@/lib/shared/step-number';

interface StepSliderProps {
  step: number;
  last: number;
  text: string;
  /** The row at a height, pixels from the top of the strip. */
  stepAt(y: number): number;
  onStep(step: number): void;
}

/** Lies over the strip: press or drag to a row, or go by arrow keys; down and right are later. */
export function StepSlider({ step, last, text, stepAt, onStep }: StepSliderProps) {
  const within = (next: number) => Math.min(Math.max(next, 0), last);
  const point = (event: PointerEvent<HTMLDivElement>) => {
    onStep(within(stepAt(event.clientY - event.currentTarget.getBoundingClientRect().top)));
  };
  const press = (event: KeyboardEvent) => {
    const moves: Record<string, number> = {
      ArrowDown: step + 1,
      ArrowRight: step + 1,
      ArrowUp: step - 1,
      ArrowLeft: step - 1,
      PageDown: step + COARSE,
      PageUp: step - COARSE,
      Home: 0,
      End: last,
    };
    if (!(event.key in moves)) return;
    event.preventDefault();
    onStep(within(moves[event.key]));
  };
  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label="Step"
      aria-orientation="vertical"
      aria-valuemin={0}
      aria-valuemax={last}
      aria-valuenow={step}
      aria-valuetext={text}
      className="absolute inset-0 touch-pan-y"
      onPointerDown={(event) => {
        if (event.button !== 0) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        point(event);
      }}
      onPointerMove={(event) => event.buttons === 1 && event.pointerType === 'mouse' && point(event)}
      onKeyDown={press}
    />
  );
}
