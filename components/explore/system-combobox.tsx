'use client';

import { type KeyboardEvent, useId, useRef, useState } from 'react';
import { controlLook } from '@/components/ui/field';
import { findSystems } from '@/lib/shared/find-systems';
import type { SystemEntry } from '@/lib/shared/system-entry';
import { SystemAbout } from './system-about';

export const OWN_FORMULA = '';
const OWN_TITLE = 'A formula of your own';

interface SystemComboboxProps {
  catalogue: SystemEntry[];
  /** Id of the chosen system. */
  chosen: string;
  onChoose(id: string): void;
}

/**
 * A field with a list below it, as the ARIA practices describe it (combobox with list autocompletion): focus stays in
 * the field, arrows walk through the list, Enter chooses, Escape leaves all as it was.
 */
export function SystemCombobox({ catalogue, chosen, onChoose }: SystemComboboxProps) {
  const id = useId();
  const list = useRef<HTMLDivElement>(null);
  const [typed, setTyped] = useState<string | null>(null);
  const [active, setActive] = useState<string | null>(null);
  const open = typed !== null;
  const found = findSystems(catalogue, typed ?? '');
  const groups = [...new Set(found.map(({ group }) => group))];
  // In the order in which they stand on screen.
  const order = [
    ...groups.flatMap((group) => found.filter((entry) => entry.group === group).map((entry) => entry.id)),
    OWN_FORMULA,
  ];
  const title = catalogue.find((entry) => entry.id === chosen)?.title ?? OWN_TITLE;
  const shown = catalogue.find((entry) => entry.id === active);
  const optionId = (option: string) => `${id}option-${option || 'own'}`;

  const show = (text: string) => {
    setTyped(text);
    const matches = findSystems(catalogue, text);
    // Who types the beginning of a title means that system, wherever else the word occurs.
    const meant =
      matches.find((entry) => entry.title.toLowerCase().startsWith(text.trim().toLowerCase())) ?? matches[0];
    move(text === '' ? chosen : (meant?.id ?? OWN_FORMULA));
  };
  const hide = () => {
    setTyped(null);
    setActive(null);
  };
  const choose = (option: string) => {
    hide();
    if (option !== chosen) onChoose(option);
  };
  const move = (to: string) => {
    setActive(to);
    requestAnimationFrame(() =>
      list.current?.querySelector('[aria-selected="true"]')?.scrollIntoView({ block: 'nearest' }),
    );
  };
  const key = (event: KeyboardEvent) => {
    const step = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    if (step !== undefined) {
      event.preventDefault();
      if (!open) return show('');
      const at = active === null ? -1 : order.indexOf(active);
      move(order[(at + step + order.length) % order.length]);
    } else if (event.key === 'Enter' && open && active !== null) {
      event.preventDefault();
      choose(active);
    } else if (event.key === 'Escape' && open) {
      event.preventDefault();
      hide();
    }
  };
  const option = (value: string, name: string, summary: string) => (
    // biome-ignore lint/a11y/useKeyWithClickEvents: focus and keys stay in the field
    <div
      key={value}
      id={optionId(value)}
      role="option"
      tabIndex={-1}
      aria-selected={value === active}
      className={`cursor-pointer px-3 py-1.5 ${value === active ? 'bg-rain-soft outline-1 -outline-offset-1 outline-rain' : ''}`}
      // The field keeps the focus.
      onPointerDown={(event) => event.preventDefault()}
      onPointerMove={() => setActive(value)}
      onClick={() => choose(value)}
    >
      <span className="block font-medium">
        {name}
        {value === chosen && <span className="font-normal text-muted"> · chosen</span>}
      </span>
      <span className={`block text-[0.8125rem] ${value === active ? 'text-ink' : 'text-muted'}`}>{summary}</span>
    </div>
  );

  return (
    <div className="w-full max-w-72">
      <label htmlFor={`${id}field`} className="flex items-center gap-x-2">
        <span className="text-[0.8125rem] text-muted">System</span>
        <input
          id={`${id}field`}
          role="combobox"
          aria-expanded={open}
          aria-controls={open ? `${id}list` : undefined}
          aria-autocomplete="list"
          aria-activedescendant={open && active !== null ? optionId(active) : undefined}
          autoComplete="off"
          spellCheck={false}
          value={typed ?? title}
          placeholder={title}
          onChange={({ target }) => show(target.value)}
          onClick={() => {
            if (!open) show('');
          }}
          onKeyDown={key}
          onBlur={hide}
          className={`grow ${controlLook}`}
        />
      </label>
      <span role="status" className="sr-only">
        {open && `${found.length} systems`}
      </span>
      {open && (
        <div className="absolute inset-x-0 top-9 z-20 grid max-w-4xl border border-rule bg-raised md:grid-cols-2">
          <div
            ref={list}
            id={`${id}list`}
            role="listbox"
            tabIndex={-1}
            aria-label="Systems"
            className="max-h-72 overflow-y-auto py-1 md:max-h-96"
            onPointerDown={(event) => event.preventDefault()}
          >
            {groups.map((group, i) => (
              // biome-ignore lint/a11y/useSemanticElements: a list box holds groups, not fieldsets
              <div key={group} role="group" aria-labelledby={`${id}group-${i}`}>
                <div id={`${id}group-${i}`} className="px-3 pt-2 text-[0.8125rem] text-muted first-letter:uppercase">
                  {group}
                </div>
                {found
                  .filter((entry) => entry.group === group)
                  .map((entry) => option(entry.id, entry.title, entry.summary))}
              </div>
            ))}
            {option(OWN_FORMULA, OWN_TITLE, 'Typed, with parameters of any name; it begins as the chosen system’s.')}
          </div>
          <div
            className="border-t border-rule p-3 md:border-t-0 md:border-l"
            onPointerDown={(event) => event.preventDefault()}
          >
            {shown ? <SystemAbout system={shown} /> : <p className="text-muted">Nothing is known of it beforehand.</p>}
          </div>
        </div>
      )}
    </div>
  );
}
