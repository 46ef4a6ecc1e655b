'use client';

import { useMemo, useState } from 'react';
import { FigureFrame } from '@/components/figures/figure-frame';
import { LegendMark } from '@/components/figures/legend-mark';
import { ReadoutSlider } from '@/components/figures/readout-slider';
import { SpectrumFigure, spectrumScale } from '@/components/figures/spectrum-figure';
import { useWidth } from '@/components/figures/use-width';
import { trailsThrough } from '@/lib/client/trails';
import { noiseLevel } from '@/lib/shared/bench-study';
import { eigenvalueRows } from '@/lib/shared/eigenvalue-rows';
import type { Eigenvalue } from '@/lib/shared/study-types';
import { complexText } from './complex-text';
import { useExplore, useSide } from './explore-context';
import { resultNotes } from './result-notes';
import { SpectrumLedger } from './spectrum-ledger';
import { SpectrumTable } from './spectrum-table';

const SIZE = 248;
const none: Eigenvalue[] = [];
const resolvedOf = (all: Eigenvalue[]) => all.filter(({ resolved }) => resolved !== false);

export function SpectrumPanel() {
  const picture = useExplore((state) => state.picture);
  const [ref, width] = useWidth<HTMLDivElement>(SIZE);
  const [pointed, setPointed] = useState<number | null>(null);
  const kept = useSide((state) => state.chosen);
  const keep = useSide((state) => state.choose);
  const levels = useSide((state) => state.trails);
  const chosen = pointed ?? kept;
  const size = Math.max(Math.min(width, SIZE), 120);
  const spectrum = picture?.case.spectrum;
  const noisy = spectrum?.noisy ?? none;
  const without = spectrum?.deterministic ?? none;
  const rows = eigenvalueRows(noisy.length > 0 ? noisy : without);
  const sigma = picture ? noiseLevel(picture.study) : null;
  const trails = useMemo(
    () => (sigma === null || levels.length === 0 ? [] : trailsThrough(levels, sigma, resolvedOf(noisy))),
    [levels, sigma, noisy],
  );
  const nearest = (x: number, y: number) => {
    const scale = spectrumScale(size);
    const distances = noisy.map(({ re, im }) => Math.hypot(scale(re) - x, scale(-im) - y));
    const index = distances.indexOf(Math.min(...distances));
    setPointed(index >= 0 && distances[index] < 24 ? index : null);
  };
  const toggle = (index: number) => keep(index === kept ? null : index);
  const marked = chosen === null ? undefined : noisy[chosen];
  // A pair stands in the row of its first member.
  const shownRow =
    (rows.find(({ index }) => index === chosen) ?? rows.find(({ pair, index }) => pair && index + 1 === chosen))
      ?.index ?? null;
  const title = 'Spectrum';
  return (
    <FigureFrame
      title={title}
      legend={
        <>
          <LegendMark mark="dot">with noise</LegendMark>
          {noisy.length > 0 && <LegendMark mark="line-trail">as σ changes</LegendMark>}
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
      <div ref={ref} data-part="spectrum" data-shown-sigma={sigma ?? undefined}>
        <div className="relative mx-auto" style={{ width: size, height: size, maxWidth: '100%' }}>
          <SpectrumFigure noisy={noisy} without={without} title={title} size={size} chosen={chosen} trails={trails} />
          <ReadoutSlider
            label="Readout among the eigenvalues"
            now={chosen ?? 0}
            steps={Math.max(noisy.length - 1, 0)}
            text={marked ? `${(chosen ?? 0) + 1} of ${noisy.length}: ${complexText(marked)}` : 'none chosen'}
            onPoint={nearest}
            onStep={setPointed}
            onLeave={() => setPointed(null)}
            onChoose={() => pointed !== null && toggle(pointed)}
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
        <SpectrumTable
          rows={rows}
          sigma={sigma}
          settled={picture?.settled ?? false}
          chosen={shownRow}
          onPoint={setPointed}
          kept={kept}
          onKeep={toggle}
        />
      </div>
    </FigureFrame>
  );
}
