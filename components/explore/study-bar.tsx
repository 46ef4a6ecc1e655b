'use client';

import { useEffect, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { fileName, saveFile } from '@/lib/client/save-file';
import { useExplore } from './explore-context';
import { OpenStudy } from './open-study';

/** The study's title and what can be done with the study as a whole. */
export function StudyBar() {
  const study = useExplore((state) => state.study);
  const edit = useExplore((state) => state.edit);
  const rest = useExplore((state) => state.rest);
  const undo = useExplore((state) => state.undo);
  const redo = useExplore((state) => state.redo);
  const canUndo = useExplore((state) => state.past.length > 0);
  const canRedo = useExplore((state) => state.future.length > 0);
  return (
    <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
      <h1 className="min-w-0 grow">
        <input
          aria-label="Title of the study"
          value={study.title ?? ''}
          placeholder="Untitled study"
          maxLength={200}
          onChange={({ target }) => edit((current) => ({ ...current, title: target.value }), true)}
          onBlur={rest}
          className="w-full text-ellipsis bg-transparent text-2xl font-semibold placeholder:text-muted"
        />
      </h1>
      <div className="screen-only flex flex-wrap gap-1.5 sm:gap-2">
        <Button onClick={undo} disabled={!canUndo}>
          Undo
        </Button>
        <Button onClick={redo} disabled={!canRedo}>
          Redo
        </Button>
        <CopyLink />
        <OpenStudy />
        <Button
          main
          onClick={() =>
            saveFile(fileName(study.title ?? '', 'json'), 'application/json', `${JSON.stringify(study, null, 2)}\n`)
          }
        >
          Save file
        </Button>
      </div>
    </div>
  );
}

function CopyLink() {
  const [said, setSaid] = useState<string | null>(null);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(timer.current), []);
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(location.href);
      setSaid('Copied');
    } catch {
      setSaid('Copy the address bar');
    }
    clearTimeout(timer.current);
    timer.current = setTimeout(() => setSaid(null), 2000);
  };
  return (
    <Button onClick={copy} aria-live="polite">
      {said ?? 'Copy link'}
    </Button>
  );
}
