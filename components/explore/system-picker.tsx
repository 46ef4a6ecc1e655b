'use client';

import { controlLook, Field } from '@/components/ui/field';
import { useCatalogue, useExplore } from './explore-context';
import { withFormula, withSystem } from './study-edits';

/** A system of the catalogue, or a formula of one's own, which begins as the chosen system's. */
export function SystemPicker() {
  const catalogue = useCatalogue();
  const id = useExplore((state) => state.study.system.id);
  const edit = useExplore((state) => state.edit);
  const choose = (chosen: string) => {
    const entry = catalogue.find((candidate) => candidate.id === chosen);
    if (entry) return edit((current) => withSystem(current, entry));
    const before = catalogue.find((candidate) => candidate.id === id) ?? catalogue[0];
    edit((current) =>
      withFormula(current, before.formula, before.variable, Object.keys(current.system.parameters ?? {})),
    );
  };
  return (
    <Field label="System">
      <select value={id ?? ''} onChange={({ target }) => choose(target.value)} className={controlLook}>
        {[...new Set(catalogue.map(({ group }) => group))].map((group) => (
          <optgroup key={group} label={group}>
            {catalogue
              .filter((entry) => entry.group === group)
              .map((entry) => (
                <option key={entry.id} value={entry.id}>
                  {entry.title}
                </option>
              ))}
          </optgroup>
        ))}
        <option value="">A formula of your own</option>
      </select>
    </Field>
  );
}
