'use client';

import type { ReactNode } from 'react';
import type { ExploreBeginning } from '@/lib/client/explore-store';
import type { SystemEntry } from '@/lib/shared/system-entry';
import { Address } from './address';
import { BenchSource } from './bench-source';
import { DensityPanel } from './density-panel';
import { EquationForm } from './equation-form';
import { ExploreProvider, useExplore } from './explore-context';
import { KeyNumbers } from './key-numbers';
import { ModePanel } from './mode-panel';
import { NoisePanel } from './noise-panel';
import { Settings } from './settings';
import { SpectrumPanel } from './spectrum-panel';
import { StepsPanel } from './steps-panel';
import { StudyBar } from './study-bar';
import { StudyFaults } from './study-faults';

interface BenchProps {
  beginning: ExploreBeginning;
  catalogue: SystemEntry[];
  /** What was wrong with the address, where the study is not the one it meant. */
  addressFault?: string;
}

export function Bench({ beginning, catalogue, addressFault }: BenchProps) {
  return (
    <ExploreProvider beginning={beginning} catalogue={catalogue}>
      <BenchState>
        {addressFault && (
          <p role="alert" className="mb-3 border-l-2 border-ink pl-3">
            The address does not hold a study that can be read ({addressFault}). This is the bench’s first study
            instead.
          </p>
        )}
        <StudyBar />
        <EquationForm />
        <Settings />
        <StudyFaults />
        <Address />
        {/* What moves with sigma stands above the rail, so that all of it is in sight while the rail is dragged. */}
        <div className="mt-4 grid gap-x-8 gap-y-8 lg:grid-cols-[minmax(0,1.85fr)_minmax(0,1fr)]">
          <div className="min-w-0 lg:border-r lg:border-rule lg:pr-8">
            <DensityPanel />
          </div>
          <div className="min-w-0">
            <SpectrumPanel />
          </div>
        </div>
        <div className="mt-4 max-sm:contents">
          <NoisePanel />
        </div>
        <div className="mt-6 grid gap-x-8 gap-y-8 lg:grid-cols-[minmax(0,1.85fr)_minmax(0,1fr)]">
          <div className="min-w-0 lg:border-r lg:border-rule lg:pr-8">
            <StepsPanel />
          </div>
          <div className="min-w-0">
            <KeyNumbers />
            <div className="mt-5">
              <ModePanel />
            </div>
          </div>
        </div>
      </BenchState>
    </ExploreProvider>
  );
}

/** Says to assistive technology whether the figures belong to the study as it stands. */
function BenchState({ children }: { children: ReactNode }) {
  const settled = useExplore(
    (state) => !state.computing && state.faults.length === 0 && state.picture?.settled === true,
  );
  return (
    <div className="pt-4" data-bench={settled ? 'settled' : 'moving'} aria-busy={!settled}>
      <BenchSource>{children}</BenchSource>
    </div>
  );
}
