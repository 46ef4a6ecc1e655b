'use client';

import { useState } from 'react';
import { controlLook, Field } from '@/components/ui/field';
import { TextButton } from '@/components/ui/text-button';
import { formatCount } from '@/lib/shared/format-number';
import type { StudyFile } from '@/lib/shared/study-types';
import { EndsPicker } from './ends-picker';
import { useExplore } from './explore-context';
import { FormulaField } from './formula-field';
import { StartEditor } from './start-editor';
import { withKind, withPoints } from './study-edits';
import { SystemPicker } from './system-picker';

const grids = [256, 512, 1024, 2048, 4096, 8192, 16384];

/** What the equation cannot say: the system, its formula, ends, kind of noise, grid. */
export function Settings() {
  const typed = useExplore((state) => state.study.system.id === undefined);
  const kind = useExplore((state) => state.study.noise.kind);
  const points = useExplore((state) => state.study.grid?.points ?? 'auto');
  const edit = useExplore((state) => state.edit);
  const [opened, setOpened] = useState(false);
  const open = opened || typed;
  return (
    <div className="screen-only mt-2 grow">
      <div className="relative flex flex-wrap items-start gap-x-5 gap-y-2">
        <SystemPicker />
        {open && <FormulaField />}
        {!typed && (
          <TextButton aria-expanded={open} onClick={() => setOpened(!opened)}>
            {open ? 'Fewer settings' : 'Formula, ends, grid, start density'}
          </TextButton>
        )}
      </div>
      {open && (
        <div className="mt-2 flex flex-wrap items-center gap-x-5 gap-y-2">
          <EndsPicker />
          <Field label="Noise">
            <select
              value={kind}
              onChange={({ target }) =>
                edit((current) => withKind(current, target.value as StudyFile['noise']['kind']))
              }
              className={controlLook}
            >
              <option value="gaussian">Gaussian</option>
              <option value="none">none</option>
            </select>
          </Field>
          <Field label="Grid">
            <select
              value={String(points)}
              onChange={({ target }) =>
                edit((current) => withPoints(current, target.value === 'auto' ? 'auto' : Number(target.value)))
              }
              className={controlLook}
            >
              <option value="auto">as fine as needed</option>
              {[...new Set([...grids, ...(typeof points === 'number' ? [points] : [])])].map((count) => (
                <option key={count} value={count}>
                  {formatCount(count)} points
                </option>
              ))}
            </select>
          </Field>
        </div>
      )}
      {open && <StartEditor />}
    </div>
  );
}
