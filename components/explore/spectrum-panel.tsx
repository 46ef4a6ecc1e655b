'use client';

import { useState } from 'react';
import { FigureFrame } from '@/components/figures/figure-frame';
import { LegendMark } from '@/components/figures/legend-mark';
import { ReadoutSlider } from '@/components/figures/readout-slider';
import { SpectrumFigure, spectrumScale } from '@/components/figures/spectrum-figure';
import { useWidth } from '@/components/figures/use-width';
import { eigenvalueRows } from '@/lib/shared/eigenvalue-rows';
import type { Eigenvalue } from '@/lib/shared/study-types';
import { complexText } from './complex-text';
import { useExplore } from './explore-context';
import { resultNotes } from './result-notes';
import { SpectrumLedger } from './spectrum-ledger';
import { SpectrumTable } from './spectrum-table';

const SIZE = 320;
const none: Eigenvalue[] = [];

export function SpectrumPanel() {
  const picture = useExplore((state) => state.picture);
  const [ref, width] = useWidth<HTMLDivElement>(SIZE);
  const [chosen, setChosen] = useState<number | null>(null);
  const size = Math.max(Math.min(width, SIZE), 120);
  const spectrum = picture?.case.spectrum;
  const noisy = spectrum?.noisy ?? none;
  const without = spectrum?.deterministic ?? none;
  const rows = eigenvalueRows(noisy.length > 0 ? noisy : without);
  const nearest = (x: number, y: number) => {
    const scale = spectrumScale(size);
    const distances = noisy.map(({ re, im }) => Math.hypot(scale(re) - x, scale(-im) - y));
    const index = distances.indexOf(Math.min(...distances));
    setChosen(index >= 0 && distances[index] < 24 ? index : null);
  };
  const marked = chosen === null ? undefined : noisy[chosen];
  const shownRow =
    chosen === null ? null : (rows.find((row) => row.index === chosen || row.index === chosen - 1)?.index ?? null);
  const title = 'Spectrum';
  return (
    <FigureFrame
      title={title}
      legend={
        <>
          <LegendMark mark="dot">with noise</LegendMark>
          <LegendMark mark="diamond">without{without[0]?.method && `, by ${without[0].method}`}</LegendMark>
        </>
      }
      ledger={<SpectrumLedger />}
      numbers={() => ({
        columns: ['number', 'noise', 're', 'im', 'modulus', 'uncertainty', 'resolved'].map((name) => ({
          name,
          unit: '',
        })),
        rows: [
          ...noisy.map((value) => ['with', value] as const),
          ...without.map((value) => ['without', value] as const),
        ].map(([noise, value], i) => [
          i + 1,
          noise,
          value.re,
          value.im,
          value.modulus,
          value.uncertainty,
          value.resolved === false ? 'no' : 'yes',
        ]),
      })}
      notes={() => resultNotes(picture)}
    >
      <div ref={ref}>
        <div className="relative mx-auto" style={{ width: size, height: size, maxWidth: '100%' }}>
          <SpectrumFigure noisy={noisy} without={without} title={title} size={size} chosen={chosen} />
          <ReadoutSlider
            label="Readout among the eigenvalues"
            now={chosen ?? 0}
            steps={Math.max(noisy.length - 1, 0)}
            text={marked ? `${(chosen ?? 0) + 1} of ${noisy.length}: ${complexText(marked)}` : 'none chosen'}
            onPoint={nearest}
            onStep={setChosen}
            onLeave={() => setChosen(null)}
          />
          {marked && (
            <p
              aria-hidden="true"
              className="figures pointer-events-none absolute bottom-0 left-0 bg-paper px-1 text-[0.8125rem]"
            >
              {complexText(marked)}
            </p>
          )}
        </div>
      </div>
      <div className="mt-2 min-h-60">
        <SpectrumTable rows={rows} settled={picture?.settled ?? false} chosen={shownRow} onChoose={setChosen} />
      </div>
    </FigureFrame>
  );
}
