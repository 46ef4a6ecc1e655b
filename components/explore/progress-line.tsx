'use client';

import { useEffect, useState } from 'react';
import { Button } from '@/components/ui/button';
import { useExplore, useSide } from './explore-context';

const PATIENCE_MS = 500;

/** Says how far a computation of more than half a second is, and stops it. Takes its room from the start. */
export function ProgressLine() {
  const computing = useExplore((state) => state.computing);
  const progress = useExplore((state) => state.progress);
  const failure = useExplore((state) => state.failure);
  const picture = useExplore((state) => state.picture);
  const stop = useExplore((state) => state.stop);
  const stopSide = useSide((state) => state.stop);
  const [long, setLong] = useState(false);
  useEffect(() => {
    if (!computing) return setLong(false);
    const timer = setTimeout(() => setLong(true), PATIENCE_MS);
    return () => clearTimeout(timer);
  }, [computing]);

  const share = progress && progress.total > 0 ? progress.done / progress.total : null;
  const left = share !== null && progress && share > 0.05 ? (progress.seconds / share) * (1 - share) : null;
  return (
    <div className="ml-auto flex h-8 w-48 items-center leading-tight sm:w-80 gap-3 text-muted" role="status">
      {long && computing ? (
        <>
          <Button
            onClick={() => {
              stop();
              stopSide();
            }}
            className="h-7 py-0"
          >
            Stop
          </Button>
          <span>
            Computing
            {share !== null && `, ${Math.round(share * 100)} %`}
            {left !== null && left >= 1 && `, ${Math.ceil(left)} s left`}
          </span>
        </>
      ) : failure ? (
        <span className="text-ink">The computation failed: {failure}</span>
      ) : (
        picture && !computing && !picture.settled && <span>Stopped: uncertainties are those of an earlier picture</span>
      )}
    </div>
  );
}
