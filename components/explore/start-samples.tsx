'use client';

import { useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { controlLook, Field } from '@/components/ui/field';
import { formatCount } from '@/lib/shared/format-number';
import type { SampleColumns } from '@/lib/shared/read-samples';

const MOST_BYTES = 20_000_000;

interface StartSamplesProps {
  /** How many samples the study has; null before the first file. */
  count: number | null;
  check(value: number): string | null;
  onChange(samples: number[]): void;
}

/** Samples of the start from a file: one number a line, or a column of a table. */
export function StartSamples({ count, check, onChange }: StartSamplesProps) {
  const input = useRef<HTMLInputElement>(null);
  const [file, setFile] = useState<{ name: string; table: SampleColumns } | null>(null);
  const [column, setColumn] = useState(0);
  const [fault, setFault] = useState<string | null>(null);

  const take = (name: string, table: SampleColumns, chosen: number) => {
    setColumn(chosen);
    const read = table.read(chosen);
    if ('fault' in read) return setFault(`${name}, ${read.fault}`);
    const outside = read.samples.findIndex((value) => check(value) !== null);
    if (outside >= 0) return setFault(`${name}, sample ${outside + 1}: ${check(read.samples[outside])}`);
    setFault(null);
    onChange(read.samples);
  };
  const open = async (chosen: File) => {
    setFault(null);
    if (chosen.size > MOST_BYTES) return setFault(`${chosen.name} is larger than 20 MB`);
    const { readSamples } = await import('@/lib/shared/read-samples');
    const table = readSamples(await chosen.text());
    if ('fault' in table) return setFault(`${chosen.name}: ${table.fault}`);
    setFile({ name: chosen.name, table });
    take(chosen.name, table, 0);
  };
  return (
    <>
      <Button onClick={() => input.current?.click()}>Choose a file…</Button>
      <input
        ref={input}
        type="file"
        accept=".csv,.txt,.tsv,.dat,text/*"
        aria-label="File of samples"
        className="sr-only"
        tabIndex={-1}
        onChange={({ target }) => {
          const chosen = target.files?.[0];
          target.value = '';
          if (chosen) open(chosen);
        }}
      />
      {file && file.table.columns.length > 1 && (
        <Field label="Column">
          <select
            value={column}
            onChange={({ target }) => take(file.name, file.table, Number(target.value))}
            className={controlLook}
          >
            {file.table.columns.map((name, i) => (
              // biome-ignore lint/suspicious/noArrayIndexKey: columns are told apart by their place, names may repeat
              <option key={i} value={i}>
                {name}
              </option>
            ))}
          </select>
        </Field>
      )}
      <span className="text-muted">
        {count === null ? 'one number a line, or a column of a table' : `${formatCount(count)} samples`}
      </span>
      {fault && (
        <p role="alert" className="basis-full border-l-2 border-ink pl-2 text-[0.8125rem]">
          {fault}
        </p>
      )}
    </>
  );
}
