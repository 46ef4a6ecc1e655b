'use client';

import { useEffect, useState } from 'react';

const PER_STEP_MS = 450;

/** Which step is chosen, and its going on by itself. It never plays unless asked to. */
export function useStepPlayer(last: number) {
  const [step, setStep] = useState(0);
  const [playing, setPlaying] = useState(false);
  useEffect(() => {
    if (!playing) return;
    const timer = setInterval(() => setStep((current) => Math.min(current + 1, last)), PER_STEP_MS);
    return () => clearInterval(timer);
  }, [playing, last]);
  useEffect(() => {
    if (step >= last) setPlaying(false);
  }, [step, last]);
  return {
    step,
    playing,
    play() {
      if (step >= last) setStep(0);
      setPlaying(true);
    },
    pause: () => setPlaying(false),
    choose(next: number) {
      setPlaying(false);
      setStep(next);
    },
  };
}
