'use client';

import { type KeyboardEvent, type PointerEvent, useId, useRef, useState } from 'react';
import { formatEntry, formatTick } from '@/lib/shared/format-number';
import { parseNumber } from '@/lib/shared/parse-number';
import { plainDecimal } from '@/lib/shared/plain-decimal';
import { type Bounds, COARSE, type Stepper } from '@/lib/shared/step-number';

interface AdjustableNumberProps {
  label: string;
  value: number;
  bounds: Bounds;
  stepper: Stepper;
  /** `moving` while dragged or stepped by a held key. */
  onChange(value: number, moving: boolean): void;
  onRest(): void;
  /** What is wrong with the number that stands, from whoever checked it. */
  fault?: string;
  className?: string;
}

const PIXELS_PER_STEP = 3;

/** In widths of a digit; a point takes half of one. */
function widthOf(text: string): number {
  return Math.max(text.length - (text.match(/[.,]/g)?.length ?? 0) * 0.5, 1);
}

/** A number inside an equation: drag it sideways, use the arrow keys (shift for coarse), or type. */
export function AdjustableNumber({
  label,
  value,
  bounds,
  stepper,
  onChange,
  onRest,
  fault,
  className = '',
}: AdjustableNumberProps) {
  const input = useRef<HTMLInputElement>(null);
  const drag = useRef<{ x: number; value: number; steps: number; id: number } | null>(null);
  const [typed, setTyped] = useState<{ text: string; fault?: string } | null>(null);
  const faultId = useId();
  const text = typed?.text ?? formatEntry(value);
  const wrong = typed?.fault ?? fault;

  const enter = (written: string) => {
    const parsed = parseNumber(written);
    if ('fault' in parsed) return setTyped({ text: written, fault: parsed.fault });
    const { min, max } = bounds;
    if (parsed.value < min || parsed.value > max) {
      const allowed = `allowed: ${formatTick(min)} to ${formatTick(max)}`;
      return setTyped({ text: written, fault: `${label} = ${written.trim()}; ${allowed}` });
    }
    setTyped(null);
    if (parsed.value !== value) onChange(parsed.value, false);
  };

  const press = (event: KeyboardEvent) => {
    const steps = { ArrowUp: 1, ArrowDown: -1, PageUp: COARSE, PageDown: -COARSE }[event.key];
    if (steps !== undefined) {
      event.preventDefault();
      setTyped(null);
      onChange(stepper(value, steps * (event.shiftKey ? COARSE : 1)), true);
    } else if (event.key === 'Enter') enter(text);
    else if (event.key === 'Escape') setTyped(null);
  };

  const down = (event: PointerEvent<HTMLInputElement>) => {
    if (event.button !== 0 || document.activeElement === input.current) return;
    // Focus, and with it the keyboard of a phone, waits until it is clear that this is no drag.
    event.preventDefault();
    event.currentTarget.setPointerCapture(event.pointerId);
    drag.current = { x: event.clientX, value, steps: 0, id: event.pointerId };
  };
  const move = (event: PointerEvent) => {
    const from = drag.current;
    if (from === null) return;
    const steps = Math.trunc((event.clientX - from.x) / PIXELS_PER_STEP) * (event.shiftKey ? COARSE : 1);
    if (steps === from.steps) return;
    from.steps = steps;
    setTyped(null);
    onChange(stepper(from.value, steps), true);
  };
  const up = () => {
    const from = drag.current;
    drag.current = null;
    if (from === null) return;
    if (from.steps !== 0) return onRest();
    input.current?.focus();
    input.current?.select();
  };

  return (
    <span className="relative mr-[0.1em] inline-block">
      <input
        ref={input}
        role="spinbutton"
        inputMode="decimal"
        autoComplete="off"
        spellCheck={false}
        aria-label={label}
        aria-valuenow={plainDecimal(value) as number}
        aria-valuemin={plainDecimal(bounds.min) as number}
        aria-valuemax={plainDecimal(bounds.max) as number}
        aria-valuetext={text}
        aria-invalid={wrong !== undefined}
        aria-describedby={wrong === undefined ? undefined : faultId}
        value={text}
        onChange={(event) => setTyped({ text: event.target.value })}
        onBlur={() => typed && enter(text)}
        onKeyDown={press}
        onKeyUp={(event) => event.key.startsWith('Arrow') && onRest()}
        onPointerDown={down}
        onPointerMove={move}
        onPointerUp={up}
        onPointerCancel={up}
        style={{ width: `${widthOf(text)}ch` }}
        className={`box-content cursor-ew-resize touch-pan-y border-b-2 border-dotted bg-transparent text-center leading-tight text-rain ${wrong ? 'border-solid border-ink' : 'border-rain'} ${className}`}
      />
      {wrong !== undefined && (
        <span
          id={faultId}
          role="alert"
          className="absolute left-0 top-full z-10 mt-1 w-max max-w-64 border-l-2 border-ink bg-raised px-2 py-1 font-sans text-[0.8125rem] not-italic leading-snug text-ink"
        >
          {wrong}
        </span>
      )}
    </span>
  );
}
