'use client';

import { controlLook, Field } from '@/components/ui/field';
import type { End } from '@/lib/shared/study-types';
import { useExplore } from './explore-context';
import { withInterval } from './study-edits';

const kinds: { value: End; label: string }[] = [
  { value: 'absorbing', label: 'absorbing: what leaves is lost' },
  { value: 'reflecting', label: 'reflecting: mirrored back' },
];

/** What happens to a state that noise carries past an end. */
export function EndsPicker() {
  const ends = useExplore((state) => state.study.domain[0].ends);
  const edit = useExplore((state) => state.edit);
  const periodic = ends === 'periodic';
  const [low, high] = Array.isArray(ends) ? ends : [ends, ends];
  const set = (next: typeof ends) =>
    edit((current) => withInterval(current, { ends: Array.isArray(next) && next[0] === next[1] ? next[0] : next }));
  const choose = (side: 'low' | 'high', value: string) => {
    if (value === 'periodic') return set('periodic');
    const kind = value as End;
    const other: End = periodic ? kind : ((side === 'low' ? high : low) as End);
    set(side === 'low' ? [kind, other] : [other, kind]);
  };
  return (
    <>
      {(periodic ? (['low'] as const) : (['low', 'high'] as const)).map((side) => (
        <Field key={side} label={periodic ? 'Ends' : side === 'low' ? 'At the low end' : 'At the high end'}>
          <select
            value={side === 'low' ? low : high}
            onChange={({ target }) => choose(side, target.value)}
            className={controlLook}
          >
            {kinds.map(({ value, label }) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
            <option value="periodic">periodic: a circle</option>
            {(side === 'low' ? low : high) === 'holding' && <option value="holding">holding: not computed yet</option>}
          </select>
        </Field>
      ))}
    </>
  );
}
