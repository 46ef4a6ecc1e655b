'use client';

import { type ReactNode, useRef, useState } from 'react';
import { TextButton } from '@/components/ui/text-button';
import type { NumberTable } from '@/lib/shared/numbers-csv';
import { DownloadButtons } from './downloads/download-buttons';
import { NumberTableView } from './number-table';

interface FigureFrameProps {
  title: string;
  /** Says with words and marks what each colour stands for. */
  legend?: ReactNode;
  ledger?: ReactNode;
  /** The figure's numbers, or what makes them when somebody asks. */
  numbers?: NumberTable | (() => NumberTable);
  /** Lines at the head of a CSV: where its numbers come from. */
  notes?: string[] | (() => string[]);
  children: ReactNode;
}

/** What every figure has: caption, legend, the drawing with its readout, ledger line, numbers, files. */
export function FigureFrame({ title, legend, ledger, numbers, notes, children }: FigureFrameProps) {
  const drawing = useRef<HTMLDivElement>(null);
  const legendWords = useRef<HTMLSpanElement>(null);
  const ledgerWords = useRef<HTMLParagraphElement>(null);
  const [open, setOpen] = useState(false);
  // Legend and ledger are elements; a file takes their words, entry by entry.
  const words = () =>
    [legendWords.current, ledgerWords.current]
      // biome-ignore lint/performance/useDomNodeTextContent: only what is laid out tells entries from one another
      .flatMap((element) => element?.innerText.split('\n') ?? [])
      .map((line) => line.trim())
      .filter((line) => line !== '')
      .join('; ');
  return (
    <figure className="min-w-0">
      <figcaption className="flex flex-wrap items-baseline gap-x-4">
        <span className="font-semibold">{title}</span>
        <span ref={legendWords} className="flex flex-wrap gap-x-4 text-muted">
          {legend}
        </span>
        {numbers && (
          <span className="screen-only ml-auto flex flex-wrap justify-end gap-x-3 text-[0.8125rem]">
            <TextButton aria-expanded={open} onClick={() => setOpen(!open)}>
              Numbers
            </TextButton>
            <DownloadButtons
              title={title}
              drawing={drawing}
              words={words}
              numbers={() => made(numbers)}
              notes={() => made(notes) ?? []}
            />
          </span>
        )}
      </figcaption>
      <div ref={drawing} className="mt-1">
        {children}
      </div>
      <p ref={ledgerWords} className="figures mt-1 min-h-5 text-[0.8125rem] text-muted">
        {ledger}
      </p>
      {open && numbers && <NumberTableView table={made(numbers)} caption={title} />}
    </figure>
  );
}

function made<T>(given: T | (() => T)): T {
  return typeof given === 'function' ? (given as () => T)() : given;
}
