'use client';

import { useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { useExplore } from './explore-context';

const MOST_BYTES = 20_000_000;

/** Opens a study file; one that is wrong is refused in words and leaves the bench as it is. */
export function OpenStudy() {
  const input = useRef<HTMLInputElement>(null);
  const kernel = useExplore((state) => state.kernel);
  const edit = useExplore((state) => state.edit);
  const [fault, setFault] = useState<string | null>(null);
  const open = async (file: File) => {
    setFault(null);
    if (file.size > MOST_BYTES) return setFault(`${file.name} is larger than 20 MB`);
    let content: unknown;
    try {
      content = JSON.parse(await file.text());
    } catch {
      return setFault(`${file.name} is not a study file: it cannot be read as JSON`);
    }
    const reply = await kernel.check(content);
    if ('study' in reply) edit(() => reply.study);
    else
      setFault(
        `${file.name}: ${reply.faults.map(({ path, message }) => (path ? `${path}: ${message}` : message)).join('; ')}`,
      );
  };
  return (
    <>
      <Button onClick={() => input.current?.click()}>Open…</Button>
      <input
        ref={input}
        type="file"
        accept=".json,application/json"
        aria-label="Study file to open"
        className="sr-only"
        tabIndex={-1}
        onChange={({ target }) => {
          const file = target.files?.[0];
          // The same file can be chosen again once it is mended.
          target.value = '';
          if (file) open(file);
        }}
      />
      {fault && (
        <p role="alert" className="order-last basis-full border-l-2 border-ink pl-2 text-[0.8125rem]">
          {fault}
        </p>
      )}
    </>
  );
}
