'use client';

import { useExplore } from './explore-context';
import { NoiseSlider } from './noise-slider';
import { ProgressLine } from './progress-line';

export function NoisePanel() {
  const quiet = useExplore((state) => state.study.noise.kind === 'none');
  return (
    <section
      aria-label="Noise"
      className="max-sm:sticky max-sm:bottom-0 max-sm:z-10 max-sm:-mx-4 max-sm:border-t max-sm:border-rule max-sm:bg-paper max-sm:px-2 max-sm:pt-1"
    >
      <div className="flex flex-wrap items-center gap-x-4 max-sm:px-2">
        <h2 className="font-sans text-sm font-semibold">Noise</h2>
        <p className="text-muted max-sm:hidden">
          {quiet ? (
            'none: choose a kind of noise in the settings'
          ) : (
            <>
              drag <span className="math italic">σ</span>, or use the arrow keys
            </>
          )}
        </p>
        <ProgressLine />
      </div>
      <NoiseSlider />
    </section>
  );
}
