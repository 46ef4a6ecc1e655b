'use client';

import { useEffect } from 'react';
import { AdjustableNumber } from '@/components/ui/adjustable-number';
import { TypesetView } from '@/components/ui/typeset-view';
import { faultAt } from '@/lib/client/explore-core';
import { digitStepper, linearStepper } from '@/lib/shared/step-number';
import type { TypesetFormula } from '@/lib/shared/typeset-types';
import { useExplore, useSystem } from './explore-context';
import { withParameter } from './study-edits';

export const anywhere = { min: -1e300, max: 1e300 };

/** The right side of the equation with its parameters as numbers that can be changed. */
export function TypesetEquation() {
  const system = useSystem();
  const formula = useTyped();
  const typed = useExplore((state) => state.study.system.formulas?.[0]);
  const shown = system?.typeset ?? formula;
  // A formula with a fault, or one not laid out yet, stands as it was typed.
  if (!shown) return <span className="figures text-[0.7em]">{typed}</span>;
  return <TypesetView formula={shown} slot={(name) => <ParameterNumber name={name} />} />;
}

function ParameterNumber({ name }: { name: string }) {
  const entry = useSystem()?.parameters.find((candidate) => candidate.name === name);
  const value = useExplore((state) => state.study.system.parameters?.[name] ?? entry?.default ?? 0);
  const fault = useExplore((state) => faultAt(state, `system.parameters.${name}`)?.message);
  const edit = useExplore((state) => state.edit);
  const rest = useExplore((state) => state.rest);
  const number = (
    <AdjustableNumber
      label={name}
      value={value}
      bounds={entry ?? anywhere}
      stepper={entry ? linearStepper(entry) : digitStepper(anywhere)}
      onChange={(next, moving) => edit((study) => withParameter(study, name, next), moving)}
      onRest={rest}
      fault={fault}
    />
  );
  return value < 0 ? <>({number})</> : number;
}

/** The typed formula laid out; asked of the worker where nobody has laid it out yet, after an undo or an opened file. */
function useTyped(): TypesetFormula | undefined {
  const kernel = useExplore((state) => state.kernel);
  const keep = useExplore((state) => state.keepTypeset);
  const { id, formulas, variables, parameters } = useExplore((state) => state.study.system);
  const text = id === undefined ? formulas?.[0] : undefined;
  const known = useExplore((state) => (text === undefined ? undefined : state.typesets[text]));
  const missing = text !== undefined && known === undefined;
  useEffect(() => {
    if (!missing) return;
    kernel.typeset(text, variables ?? ['x'], Object.keys(parameters ?? {})).then((reply) => {
      if ('formula' in reply) keep(text, reply.formula);
    });
  }, [missing, text, kernel, keep, variables, parameters]);
  return known;
}
