'use client';

import { useState } from 'react';
import { controlLook, Field } from '@/components/ui/field';
import { NumberField } from '@/components/ui/number-field';
import { DRAWN_PLACES, drawnFormula, drawnHeights } from '@/lib/shared/drawn-density';
import { insideFault, type Start, usualStart, widthFault } from '@/lib/shared/start-density';
import { useExplore, useSystem } from './explore-context';
import { StartDrawing } from './start-drawing';
import { StartFormula } from './start-formula';
import { StartSamples } from './start-samples';
import { withStart } from './study-edits';

const kinds = {
  usual: 'usual: a narrow Gaussian',
  uniform: 'uniform',
  gaussian: 'Gaussian',
  point: 'a point',
  formula: 'a formula',
  drawn: 'drawn by hand',
  samples: 'samples from a file',
};
type Kind = keyof typeof kinds;

/** Where the steps begin: a density of one of six kinds. */
export function StartEditor() {
  const start = useExplore((state) => state.study.ask.density?.start);
  const interval = useExplore((state) => state.study.domain[0]);
  const named = useExplore((state) => state.study.system.variables?.[0]);
  const unit = useExplore((state) => state.study.system.units?.[0]);
  const edit = useExplore((state) => state.edit);
  const rest = useExplore((state) => state.rest);
  const system = useSystem();
  const variable = named ?? system?.variable ?? 'x';
  // Samples are chosen before there are any.
  const [waiting, setWaiting] = useState(false);
  const { from, to } = interval;
  const heights = start?.kind === 'formula' ? drawnHeights(start.formula, variable, from, to) : null;
  const kind: Kind = waiting ? 'samples' : start === undefined ? 'usual' : heights ? 'drawn' : start.kind;
  const set = (next: Start | null, moving = false) => {
    setWaiting(false);
    edit((current) => withStart(current, next), moving);
  };
  const choose = (chosen: Kind) => {
    if (chosen === 'samples') return setWaiting(start?.kind !== 'samples');
    set(firstOf(chosen, variable, from, to));
  };
  return (
    <div className="mt-2">
      <div className="flex flex-wrap items-center gap-x-5 gap-y-2">
        <Field label="Start density">
          <select value={kind} onChange={({ target }) => choose(target.value as Kind)} className={controlLook}>
            {Object.entries(kinds).map(([value, label]) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
          </select>
        </Field>
        {kind === 'gaussian' && start?.kind === 'gaussian' && (
          <>
            <NumberField
              label="Mean"
              unit={unit}
              value={start.mean[0]}
              check={(value) => insideFault(value, interval)}
              onChange={(value) => set({ ...start, mean: [value] }, true)}
              onRest={rest}
            />
            <NumberField
              label="Standard deviation"
              unit={unit}
              value={start.sd[0]}
              check={(value) => widthFault(value, interval)}
              onChange={(value) => set({ ...start, sd: [value] }, true)}
              onRest={rest}
            />
          </>
        )}
        {kind === 'point' && start?.kind === 'point' && (
          <NumberField
            label="At"
            unit={unit}
            value={start.at[0]}
            check={(value) => insideFault(value, interval)}
            onChange={(value) => set({ kind: 'point', at: [value] }, true)}
            onRest={rest}
          />
        )}
        {kind === 'formula' && start?.kind === 'formula' && (
          <StartFormula formula={start.formula} onChange={(formula) => set({ kind: 'formula', formula }, true)} />
        )}
        {kind === 'samples' && (
          <StartSamples
            count={start?.kind === 'samples' ? start.samples.length : null}
            check={(value) => insideFault(value, interval)}
            onChange={(samples) => set({ kind: 'samples', samples })}
          />
        )}
      </div>
      {kind === 'drawn' && heights && (
        <StartDrawing
          heights={heights}
          variable={variable}
          from={from}
          to={to}
          onChange={(next, moving) => set({ kind: 'formula', formula: drawnFormula(next, variable, from, to) }, moving)}
          onRest={rest}
        />
      )}
    </div>
  );
}

/** What a kind begins with. */
function firstOf(kind: Exclude<Kind, 'samples'>, variable: string, from: number, to: number): Start | null {
  const usual = usualStart({ from, to });
  const [mean] = usual.mean;
  switch (kind) {
    case 'usual':
      return null;
    case 'uniform':
      return { kind: 'uniform' };
    case 'gaussian':
      return usual;
    case 'point':
      return { kind: 'point', at: usual.mean };
    case 'formula':
      return { kind: 'formula', formula: `exp(-abs(${variable} - ${mean < 0 ? `(${mean})` : mean})/${usual.sd[0]})` };
    case 'drawn': {
      const hump = Array.from({ length: DRAWN_PLACES }, (_, i) => Math.max(0, 80 - 20 * Math.abs(i - 5)));
      return { kind: 'formula', formula: drawnFormula(hump, variable, from, to) };
    }
  }
}
