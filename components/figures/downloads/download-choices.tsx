'use client';

import { useId } from 'react';
import { controlLook, Field } from '@/components/ui/field';
import { parseNumber } from '@/lib/shared/parse-number';
import { PRINT_WIDTHS } from './print-widths';
import type { DownloadOptions } from './save-figure';

export interface Choices {
  text: DownloadOptions['text'];
  colours: DownloadOptions['colours'];
  png: '1' | '2' | 'print';
  /** As typed. */
  millimetres: string;
}

export const firstChoices: Choices = { text: 'outlines', colours: 'light', png: '2', millimetres: '85' };

export function optionsOf({ text, colours, png, millimetres }: Choices): DownloadOptions | { fault: string } {
  if (png !== 'print') return { text, colours, png: { scale: png === '1' ? 1 : 2 } };
  const parsed = parseNumber(millimetres);
  if ('fault' in parsed) return parsed;
  const { min, max } = PRINT_WIDTHS;
  if (!(parsed.value >= min && parsed.value <= max))
    return { fault: `${millimetres.trim()} mm; allowed: ${min} to ${max} mm` };
  return { text, colours, png: { millimetres: parsed.value } };
}

interface DownloadChoicesProps {
  choices: Choices;
  onChange(choices: Choices): void;
  fault: string;
}

/** How files are made: letters of an SVG, size of a PNG, colours of both. */
export function DownloadChoices({ choices, onChange, fault }: DownloadChoicesProps) {
  const faultId = useId();
  return (
    <span className="flex basis-full flex-wrap items-center gap-x-4 gap-y-1">
      <Field label="SVG text">
        <select
          value={choices.text}
          onChange={({ target }) => onChange({ ...choices, text: target.value as Choices['text'] })}
          className={controlLook}
        >
          <option value="outlines">as outlines: looks the same everywhere</option>
          <option value="editable">editable: needs the fonts</option>
        </select>
      </Field>
      <Field label="PNG size">
        <select
          value={choices.png}
          onChange={({ target }) => onChange({ ...choices, png: target.value as Choices['png'] })}
          className={controlLook}
        >
          <option value="1">as on screen</option>
          <option value="2">twice as on screen</option>
          <option value="print">for print, 300 dpi</option>
        </select>
      </Field>
      {choices.png === 'print' && (
        <Field label="Width, mm">
          <input
            value={choices.millimetres}
            inputMode="decimal"
            aria-invalid={fault !== ''}
            aria-describedby={fault === '' ? undefined : faultId}
            onChange={({ target }) => onChange({ ...choices, millimetres: target.value })}
            className={`figures w-20 ${controlLook} ${fault === '' ? '' : 'border-ink'}`}
          />
        </Field>
      )}
      <Field label="Colours">
        <select
          value={choices.colours}
          onChange={({ target }) => onChange({ ...choices, colours: target.value as Choices['colours'] })}
          className={controlLook}
        >
          <option value="light">for paper</option>
          <option value="screen">as on screen</option>
        </select>
      </Field>
      {fault !== '' && (
        <span id={faultId} role="alert" className="basis-full border-l-2 border-ink pl-2 text-ink">
          {fault}
        </span>
      )}
    </span>
  );
}
