'use client';

import { useExplore } from './explore-context';

/** Paths whose faults stand at their own fields. */
const atField = /^(system\.(parameters|formulas)|noise\.sigma|domain|grid\.points)/;

/** Faults of a study that no field on screen has, in words; the last good picture stays below. */
export function StudyFaults() {
  const faults = useExplore((state) => state.faults);
  if (faults.length === 0) return null;
  const others = faults.filter(({ path }) => !atField.test(path));
  return (
    <div role="alert" className="mt-2 border-l-2 border-ink pl-3">
      <p>Not computed: the figures still show the last study that could be.</p>
      {others.map(({ path, message }) => (
        <p key={`${path} ${message}`}>{path ? `${path}: ${message}` : message}</p>
      ))}
    </div>
  );
}
