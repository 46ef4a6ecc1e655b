'use client';

import { type KeyboardEvent, type PointerEvent, useId, useRef, useState } from 'react';
import { drawnPlace, MOST_HEIGHT } from '@/lib/shared/drawn-density';

const WIDTH = 420;
const HEIGHT = 110;
const EDGE = 10;

interface StartDrawingProps {
  heights: number[];
  variable: string;
  from: number;
  to: number;
  onChange(heights: number[], moving: boolean): void;
  onRest(): void;
}

/** A density to draw with the pointer, or handle by handle with the arrow keys. */
export function StartDrawing({ heights, variable, from, to, onChange, onRest }: StartDrawingProps) {
  const svg = useRef<SVGSVGElement>(null);
  const last = useRef<number | null>(null);
  const [chosen, setChosen] = useState(0);
  const helpId = useId();
  const x = (index: number) => EDGE + ((WIDTH - 2 * EDGE) * index) / (heights.length - 1);
  const y = (height: number) => HEIGHT - EDGE - ((HEIGHT - 2 * EDGE) * height) / MOST_HEIGHT;

  const set = (next: number[], moving: boolean) => {
    // A density without mass is none: the last stroke is then not taken.
    if (next.some((height) => height > 0)) onChange(next, moving);
  };
  const draw = ({ clientX, clientY }: PointerEvent) => {
    const box = svg.current?.getBoundingClientRect();
    if (!box) return;
    const share = ((clientX - box.left) * WIDTH) / box.width;
    const index = clampWhole(((share - EDGE) / (WIDTH - 2 * EDGE)) * (heights.length - 1), heights.length - 1);
    const down = ((clientY - box.top) * HEIGHT) / box.height;
    const height = clampWhole(((HEIGHT - EDGE - down) / (HEIGHT - 2 * EDGE)) * MOST_HEIGHT, MOST_HEIGHT);
    const before = last.current ?? index;
    const next = [...heights];
    // A fast stroke passes places between two events.
    for (let i = Math.min(before, index); i <= Math.max(before, index); i++) {
      const part = before === index ? 1 : (i - before) / (index - before);
      next[i] = Math.round(heights[before] + part * (height - heights[before]));
    }
    last.current = index;
    setChosen(index);
    set(next, true);
  };
  const end = () => {
    if (last.current === null) return;
    last.current = null;
    onRest();
  };
  const key = (event: KeyboardEvent, index: number) => {
    const step = event.shiftKey ? 10 : 1;
    const height = heights[index];
    const value = {
      ArrowUp: height + step,
      ArrowDown: height - step,
      PageUp: height + 10,
      PageDown: height - 10,
      Home: 0,
      End: MOST_HEIGHT,
    }[event.key];
    const move = { ArrowLeft: index - 1, ArrowRight: index + 1 }[event.key];
    if (value === undefined && move === undefined) return;
    event.preventDefault();
    if (move !== undefined) {
      const next = clampWhole(move, heights.length - 1);
      setChosen(next);
      svg.current?.querySelector<SVGElement>(`[data-place="${next}"]`)?.focus();
      return;
    }
    const raised = [...heights];
    raised[index] = clampWhole(value ?? height, MOST_HEIGHT);
    set(raised, false);
  };

  return (
    <fieldset className="mt-2 max-w-[420px]" aria-label="Start density, drawn by hand" aria-describedby={helpId}>
      <svg
        ref={svg}
        viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
        className="block w-full touch-none bg-raised"
        fill="none"
        onPointerDown={(event) => {
          event.currentTarget.setPointerCapture(event.pointerId);
          draw(event);
        }}
        onPointerMove={(event) => {
          if (last.current !== null) draw(event);
        }}
        onPointerUp={end}
        onPointerCancel={end}
      >
        <title>Heights of the start density</title>
        <path d={`M${EDGE} ${HEIGHT - EDGE}H${WIDTH - EDGE}`} className="stroke-rule" />
        <path
          d={`M${x(0)} ${y(0)}${heights.map((height, i) => `L${x(i)} ${y(height)}`).join('')}L${x(heights.length - 1)} ${y(0)}Z`}
          className="fill-rain-soft stroke-rain"
          strokeWidth="2"
          strokeLinejoin="round"
        />
        {heights.map((height, i) => {
          const place = drawnPlace(i, from, to);
          return (
            <circle
              key={place}
              data-place={i}
              role="slider"
              tabIndex={i === chosen ? 0 : -1}
              aria-label={`Height at ${variable} = ${place}`}
              aria-orientation="vertical"
              aria-valuemin={0}
              aria-valuemax={MOST_HEIGHT}
              aria-valuenow={height}
              cx={x(i)}
              cy={y(height)}
              r="5"
              className="fill-rain"
              onFocus={() => setChosen(i)}
              onKeyDown={(event) => key(event, i)}
              onKeyUp={onRest}
            />
          );
        })}
      </svg>
      <p id={helpId} className="text-[0.8125rem] text-muted">
        Draw from {from} to {to}, or use the arrow keys: left and right choose a handle, up and down move it. The mass
        is made 1.
      </p>
    </fieldset>
  );
}

function clampWhole(value: number, most: number): number {
  return Math.min(Math.max(Math.round(value), 0), most);
}
