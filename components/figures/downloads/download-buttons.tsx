'use client';

import { type RefObject, useState } from 'react';
import { TextButton } from '@/components/ui/text-button';
import type { NumberTable } from '@/lib/shared/numbers-csv';
import { useFigureSource } from '../figure-source';
import { DownloadChoices, firstChoices, optionsOf } from './download-choices';
import type { SavedFigure } from './save-figure';

interface DownloadButtonsProps {
  title: string;
  drawing: RefObject<HTMLElement | null>;
  words: () => string;
  numbers: () => NumberTable;
  notes: () => string[];
}

/** What a figure can be taken away as. What makes the files is loaded when the first one is asked for. */
export function DownloadButtons({ title, drawing, words, numbers, notes }: DownloadButtonsProps) {
  const source = useFigureSource();
  const [choices, setChoices] = useState(firstChoices);
  const [open, setOpen] = useState(false);
  const [said, setSaid] = useState<string | null>(null);
  const options = optionsOf(choices);
  const save = async (kind: 'svg' | 'png' | 'csv') => {
    setSaid(null);
    try {
      const { saveFigureCsv, saveFigurePng, saveFigureSvg } = await import('./save-figure');
      if (kind === 'csv') return await saveFigureCsv(title, numbers(), notes(), source());
      if (drawing.current === null) return;
      const figure: SavedFigure = { title, drawing: drawing.current, words: words(), study: source() };
      if ('fault' in options) return setOpen(true);
      await (kind === 'svg' ? saveFigureSvg(figure, options) : saveFigurePng(figure, options));
    } catch (error) {
      setSaid(`Not saved: ${error instanceof Error ? error.message : String(error)}`);
    }
  };
  return (
    <>
      {(['svg', 'png', 'csv'] as const).map((kind) => (
        <TextButton key={kind} onClick={() => save(kind)} aria-label={`Save ${kind.toUpperCase()}: ${title}`}>
          {kind.toUpperCase()}
        </TextButton>
      ))}
      <TextButton aria-expanded={open} aria-label={`File options: ${title}`} onClick={() => setOpen(!open)}>
        Options
      </TextButton>
      {open && (
        <DownloadChoices choices={choices} onChange={setChoices} fault={'fault' in options ? options.fault : ''} />
      )}
      {said && (
        <p role="alert" className="basis-full border-l-2 border-ink pl-2 text-ink">
          {said}
        </p>
      )}
    </>
  );
}
