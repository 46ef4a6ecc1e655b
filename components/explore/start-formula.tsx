'use client';

import { useId, useRef, useState } from 'react';
import { controlLook } from '@/components/ui/field';
import { useExplore, useExploreStore } from './explore-context';
import { withStart } from './study-edits';

interface StartFormulaProps {
  formula: string;
  onChange(formula: string): void;
}

/** A start density as a formula of any mass. What can be read is taken over; a fault is said below the field. */
export function StartFormula({ formula, onChange }: StartFormulaProps) {
  const store = useExploreStore();
  const rest = useExplore((state) => state.rest);
  const [typed, setTyped] = useState<{ text: string; fault: string | null } | null>(null);
  const latest = useRef(0);
  const faultId = useId();
  const fault = typed?.fault ?? null;
  const read = async (text: string) => {
    const turn = ++latest.current;
    setTyped({ text, fault });
    const { kernel, study } = store.getState();
    const reply = await kernel.check(withStart(study, { kind: 'formula', formula: text }));
    if (turn !== latest.current) return;
    const found = 'faults' in reply ? reply.faults.find(({ path }) => path.startsWith('ask.density')) : undefined;
    if (found) return setTyped({ text, fault: found.message });
    setTyped(null);
    onChange(text);
  };
  return (
    <div className="min-w-0 grow basis-72">
      <label className="flex items-center gap-x-2">
        <span className="shrink-0 text-[0.8125rem] text-muted">proportional to</span>
        <input
          value={typed?.text ?? formula}
          spellCheck={false}
          autoComplete="off"
          autoCapitalize="off"
          maxLength={2000}
          aria-invalid={fault !== null}
          aria-describedby={fault === null ? undefined : faultId}
          onChange={({ target }) => read(target.value)}
          onBlur={rest}
          className={`figures grow ${controlLook} ${fault === null ? '' : 'border-ink'}`}
        />
      </label>
      {fault !== null && (
        <p id={faultId} role="alert" className="mt-1 border-l-2 border-ink pl-2 text-[0.8125rem]">
          {fault}
        </p>
      )}
    </div>
  );
}
