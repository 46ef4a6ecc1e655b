'use client';

import { useExplore } from './explore-context';
import { NoiseSlider } from './noise-slider';

export function NoisePanel() {
  const quiet = useExplore((state) => state.study.noise.kind === 'none');
  return (
    <section
      aria-label="Noise"
      className="max-sm:sticky max-sm:bottom-0 max-sm:z-10 max-sm:-mx-4 max-sm:border-t max-sm:border-rule max-sm:bg-paper max-sm:px-2 max-sm:pt-1"
    >
      <h2 className="flex flex-wrap items-baseline gap-x-4 font-sans text-sm font-normal max-sm:px-2">
        <span className="font-semibold">Noise</span>
        <span className="text-muted">
          {quiet ? (
            'none: choose a kind of noise in the settings'
          ) : (
            <>
              drag <span className="math italic">σ</span>, or use the arrow keys
            </>
          )}
        </span>
      </h2>
      <NoiseSlider />
    </section>
  );
}
