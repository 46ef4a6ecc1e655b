'use client';

import { useState } from 'react';
import { TextButton } from '@/components/ui/text-button';
import { useCatalogue, useExplore, useSystem } from './explore-context';
import { withFormula, withSystem } from './study-edits';
import { SystemAbout } from './system-about';
import { OWN_FORMULA, SystemCombobox } from './system-combobox';

/** A system of the catalogue, or a formula of one's own, which begins as the chosen system's. */
export function SystemPicker() {
  const catalogue = useCatalogue();
  const system = useSystem();
  const edit = useExplore((state) => state.edit);
  const [about, setAbout] = useState(false);
  const choose = (chosen: string) => {
    const entry = catalogue.find(({ id }) => id === chosen);
    if (entry) return edit((current) => withSystem(current, entry));
    if (chosen !== OWN_FORMULA || system === undefined) return;
    edit((current) =>
      withFormula(current, system.formula, system.variable, Object.keys(current.system.parameters ?? {})),
    );
  };
  return (
    <>
      <SystemCombobox catalogue={catalogue} chosen={system?.id ?? OWN_FORMULA} onChoose={choose} />
      {system && (
        <TextButton aria-expanded={about} onClick={() => setAbout(!about)}>
          What is known
        </TextButton>
      )}
      {system && about && (
        <section aria-label={`What is known of: ${system.title}`} className="order-last max-w-3xl basis-full">
          <SystemAbout system={system} />
        </section>
      )}
    </>
  );
}
