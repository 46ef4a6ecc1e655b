'use client';

import { useId, useState } from 'react';
import { formatEntry } from '@/lib/shared/format-number';
import { parseNumber } from '@/lib/shared/parse-number';
import { controlLook } from './field';

interface NumberFieldProps {
  label: string;
  unit?: string;
  value: number;
  /** What is wrong with a number, in words; null if nothing is. */
  check(value: number): string | null;
  onChange(value: number): void;
  onRest?(): void;
}

/** A number to type. What is right is taken over as it is typed; what is wrong stays in the field and is said below. */
export function NumberField({ label, unit, value, check, onChange, onRest }: NumberFieldProps) {
  const faultId = useId();
  const [typed, setTyped] = useState<string | null>(null);
  const parsed = typed === null ? { value } : parseNumber(typed);
  const fault = 'fault' in parsed ? parsed.fault : check(parsed.value);
  const change = (text: string) => {
    setTyped(text);
    const next = parseNumber(text);
    if ('value' in next && check(next.value) === null) onChange(next.value);
  };
  return (
    <span className="flex flex-wrap items-center gap-x-2">
      <label className="flex items-center gap-x-2">
        <span className="text-[0.8125rem] text-muted">{unit ? `${label}, ${unit}` : label}</span>
        <input
          value={typed ?? formatEntry(value)}
          inputMode="decimal"
          autoComplete="off"
          aria-invalid={fault !== null}
          aria-describedby={fault === null ? undefined : faultId}
          onChange={({ target }) => change(target.value)}
          onBlur={() => {
            if (fault === null) setTyped(null);
            onRest?.();
          }}
          onKeyDown={({ key }) => {
            if (key === 'Escape') setTyped(null);
          }}
          className={`figures w-28 ${controlLook} ${fault === null ? '' : 'border-ink'}`}
        />
      </label>
      {fault !== null && (
        <span id={faultId} role="alert" className="border-l-2 border-ink pl-2 text-[0.8125rem]">
          {fault}
        </span>
      )}
    </span>
  );
}
