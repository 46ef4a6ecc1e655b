'use client';

import { type ReactNode, useRef, useState } from 'react';
import { TextButton } from '@/components/ui/text-button';
import { figureSvg } from '@/lib/client/figure-svg';
import { fileName, saveFile } from '@/lib/client/save-file';
import { type NumberTable, numbersCsv } from '@/lib/shared/numbers-csv';
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
  const [open, setOpen] = useState(false);
  const saveSvg = () => {
    const svg = drawing.current?.querySelector('svg');
    if (svg) saveFile(fileName(title, 'svg'), 'image/svg+xml', figureSvg(svg));
  };
  return (
    <figure className="min-w-0">
      <figcaption className="flex flex-wrap items-baseline gap-x-4">
        <span className="font-semibold">{title}</span>
        <span className="flex flex-wrap gap-x-4 text-muted">{legend}</span>
        {numbers && (
          <span className="screen-only ml-auto flex gap-3 text-[0.8125rem]">
            <TextButton aria-expanded={open} onClick={() => setOpen(!open)}>
              Numbers
            </TextButton>
            <TextButton onClick={saveSvg} aria-label={`Save SVG: ${title}`}>
              SVG
            </TextButton>
            <TextButton
              onClick={() => saveFile(fileName(title, 'csv'), 'text/csv', numbersCsv(made(numbers), made(notes)))}
              aria-label={`Save CSV: ${title}`}
            >
              CSV
            </TextButton>
          </span>
        )}
      </figcaption>
      <div ref={drawing} className="mt-1">
        {children}
      </div>
      <p className="figures mt-1 min-h-5 text-[0.8125rem] text-muted">{ledger}</p>
      {open && numbers && <NumberTableView table={made(numbers)} caption={title} />}
    </figure>
  );
}

function made<T>(given: T | (() => T)): T {
  return typeof given === 'function' ? (given as () => T)() : given;
}
