'use client';

import { losesMass } from '@/lib/shared/bench-study';
import { EXIT_CAUTION } from './exit-caution';
import { useExplore } from './explore-context';
import { KeyNumber } from './key-number';

/** How long it stays, how fast it forgets, how fast neighbours part. */
export function KeyNumbers() {
  const picture = useExplore((state) => state.picture);
  const absorbing = useExplore((state) => state.study.domain.some(({ ends }) => losesMass(ends)));
  const settled = picture?.settled ?? false;
  const why = (...codes: string[]) => {
    if (picture === null || !settled) return '…';
    return picture.warnings.find(({ code }) => codes.includes(code))?.message ?? 'not known here';
  };
  const { exit, spectrum, lyapunov } = picture?.case ?? {};
  return (
    <section aria-label="Key numbers">
      <dl className="grid grid-cols-2 gap-x-4 gap-y-2">
        <KeyNumber
          id="mean-exit-time"
          label="Mean exit time"
          unit="steps"
          quantity={exit?.meanTime}
          absent={absorbing ? why('exit-not-computed', 'exit-not-settled') : 'nothing leaves: no end absorbs'}
          settled={settled}
        />
        <KeyNumber
          id="relaxation-time"
          label="Relaxation time"
          unit="steps"
          quantity={spectrum?.relaxationTime}
          absent={why('no-second-eigenvalue')}
          settled={settled}
        />
        <KeyNumber
          id="lyapunov-exponent"
          label="Lyapunov exponent"
          unit="per step"
          quantity={lyapunov?.value}
          absent={why('no-exponent')}
          settled={settled}
        />
        {lyapunov?.survivors && (
          <KeyNumber
            id="survivors-exponent"
            label="Exponent of the survivors"
            unit="per step"
            quantity={lyapunov.survivors}
            absent={why('no-exponent')}
            settled={settled}
          />
        )}
      </dl>
      {absorbing && <p className="mt-2 max-w-3xl text-[0.8125rem] text-muted">{EXIT_CAUTION}</p>}
      <Warnings />
    </section>
  );
}

/** What the computation could not give, or gives with a reservation, in its own words. */
function Warnings() {
  const warnings = useExplore((state) => state.picture?.warnings);
  return warnings?.map(({ code, message }) => (
    <p key={`${code} ${message}`} className="mt-2 max-w-3xl border-l-2 border-ink pl-3 text-[0.8125rem]">
      {message}
    </p>
  ));
}
