'use client';

import { type ReactNode, useState } from 'react';
import { Button } from '@/components/ui/button';
import { controlLook } from '@/components/ui/field';
import { TextButton } from '@/components/ui/text-button';
import { LANES, type LaneId } from '@/lib/client/rail-lanes';
import { formatCount } from '@/lib/shared/format-number';
import { parseNumber } from '@/lib/shared/parse-number';

interface RailControlsProps {
  lanes: readonly LaneId[];
  onLanes(lanes: LaneId[]): void;
  onZoom(factor: number | null): void;
  limit: number | null;
  onLimit(steps: number | null): void;
  /** What the limit means for the noise level, in words. */
  limitWords: string;
  progress: ReactNode;
  children: ReactNode;
}

/** Which lanes, how near, which limit. On a phone behind one button, so that the rail stays low. */
export function RailControls({
  lanes,
  onLanes,
  onZoom,
  limit,
  onLimit,
  limitWords,
  progress,
  children,
}: RailControlsProps) {
  const [open, setOpen] = useState(false);
  const toggle = (id: LaneId) => {
    const next = LANES.map((lane) => lane.id).filter((other) => (other === id) !== lanes.includes(other));
    if (next.length > 0) onLanes(next);
  };
  return (
    <div className="screen-only flex flex-wrap items-center gap-x-8 gap-y-2 text-[0.8125rem] max-sm:gap-x-3">
      <TextButton className="px-2 sm:hidden" aria-expanded={open} onClick={() => setOpen(!open)}>
        Lanes, limit, pins
      </TextButton>
      <div
        className={`flex flex-wrap items-center gap-x-8 gap-y-2 max-sm:max-h-[38dvh] max-sm:basis-full max-sm:overflow-auto max-sm:px-2 max-sm:pb-2 ${open ? '' : 'max-sm:hidden'}`}
      >
        <fieldset className="flex flex-wrap items-center gap-x-4 gap-y-1">
          <legend className="sr-only">Lanes of the noise rail</legend>
          {LANES.map(({ id, name }) => (
            <label key={id} className="flex items-center gap-1.5">
              <input
                type="checkbox"
                checked={lanes.includes(id)}
                onChange={() => toggle(id)}
                className="accent-[var(--ink)]"
              />
              {name}
            </label>
          ))}
        </fieldset>
        <div className="flex gap-1.5">
          <Button low onClick={() => onZoom(0.5)}>
            Zoom in
          </Button>
          <Button low onClick={() => onZoom(2)}>
            Zoom out
          </Button>
          <Button low onClick={() => onZoom(null)}>
            Whole rail
          </Button>
        </div>
        <LimitField limit={limit} onLimit={onLimit} words={limitWords} />
        {children}
      </div>
      {progress}
    </div>
  );
}

function LimitField({
  limit,
  onLimit,
  words,
}: {
  limit: number | null;
  onLimit(steps: number | null): void;
  words: string;
}) {
  const [fault, setFault] = useState<string | null>(null);
  const read = (text: string) => {
    if (text.trim() === '') {
      setFault(null);
      return onLimit(null);
    }
    const parsed = parseNumber(text);
    if ('fault' in parsed) return setFault(parsed.fault);
    if (!(parsed.value > 1)) return setFault(`${parsed.value} steps; allowed: more than 1`);
    setFault(null);
    onLimit(parsed.value);
  };
  return (
    <span className="flex flex-wrap items-center gap-x-2">
      <label className="flex items-center gap-2">
        Limit: stays at least
        <input
          type="text"
          inputMode="decimal"
          defaultValue={limit ?? ''}
          placeholder="none"
          aria-invalid={fault !== null}
          onChange={({ target }) => read(target.value)}
          className={`${controlLook} figures h-7 w-24`}
        />
        steps on average
      </label>
      {fault ? <span role="alert">{fault}</span> : <span className="text-muted">{words}</span>}
    </span>
  );
}

export function limitText(steps: number): string {
  return `limit: stays ${Number.isInteger(steps) && steps < 1e7 ? formatCount(steps) : String(steps)} steps on average`;
}
