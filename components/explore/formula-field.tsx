'use client';

import { useId, useRef, useState } from 'react';
import { controlLook } from '@/components/ui/field';
import type { StudyFault } from '@/lib/client/kernel-protocol';
import { formulaNames } from '@/lib/shared/formula-names';
import { useExplore, useSystem } from './explore-context';
import { withFormula } from './study-edits';

/** The next state as a formula. What can be read is taken over as it is typed; a fault is pointed out in its place. */
export function FormulaField() {
  const system = useSystem();
  const study = useExplore((state) => state.study);
  const edit = useExplore((state) => state.edit);
  const rest = useExplore((state) => state.rest);
  const keep = useExplore((state) => state.keepTypeset);
  const kernel = useExplore((state) => state.kernel);
  const computed = useExplore((state) => state.faults).find(({ path }) => path.startsWith('system.formulas'));
  const [typed, setTyped] = useState<{ text: string; fault?: StudyFault } | null>(null);
  const latest = useRef(0);
  const faultId = useId();
  const variable = study.system.variables?.[0] ?? system?.variable ?? 'x';
  const text = typed?.text ?? study.system.formulas?.[0] ?? system?.formula ?? '';
  const fault = typed ? typed.fault : computed;

  const read = async (written: string) => {
    const turn = ++latest.current;
    setTyped({ text: written, fault: typed?.fault });
    const names = formulaNames(written, variable);
    const reply = await kernel.typeset(written, [variable], names);
    if (turn !== latest.current) return;
    if ('faults' in reply) return setTyped({ text: written, fault: reply.faults[0] });
    setTyped(null);
    keep(written, reply.formula);
    edit((current) => withFormula(current, written, variable, names), true);
  };

  return (
    <div className="min-w-0 grow basis-72">
      <label className="flex items-center gap-x-2">
        <span className="shrink-0 text-[0.8125rem] text-muted">
          Next state <span className="math italic">{variable}′</span>
        </span>
        <input
          value={text}
          spellCheck={false}
          autoComplete="off"
          autoCapitalize="off"
          maxLength={2000}
          aria-invalid={fault !== undefined}
          aria-describedby={fault ? faultId : undefined}
          onChange={({ target }) => read(target.value)}
          onBlur={rest}
          className={`figures grow ${controlLook} ${fault ? 'border-ink' : ''}`}
        />
      </label>
      {fault && (
        <div id={faultId} role="alert" className="mt-1 border-l-2 border-ink pl-2 text-[0.8125rem]">
          {fault.at !== undefined && <Pointed text={text} at={fault.at} length={fault.length ?? 1} />}
          <p>{fault.message}</p>
        </div>
      )}
    </div>
  );
}

/** The formula with its fault marked; a mark behind the end where something is missing. */
function Pointed({ text, at, length }: { text: string; at: number; length: number }) {
  const end = at + Math.max(length, 1);
  return (
    <p className="figures overflow-x-auto whitespace-pre">
      {text.slice(Math.max(at - 40, 0), at)}
      <mark className="bg-transparent font-semibold text-ink underline decoration-wavy decoration-2 underline-offset-4">
        {text.slice(at, end) || ' '}
      </mark>
      {text.slice(end, end + 40)}
    </p>
  );
}
