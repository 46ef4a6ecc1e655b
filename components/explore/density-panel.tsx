'use client';

import { useState } from 'react';
import { DensityFigure } from '@/components/figures/density-figure';
import { cellValue, nearestIndex } from '@/components/figures/density-path';
import { DENSITY_MARGIN } from '@/components/figures/density-scales';
import { FigureFrame } from '@/components/figures/figure-frame';
import { LegendMark } from '@/components/figures/legend-mark';
import { ReadoutSlider } from '@/components/figures/readout-slider';
import { useWidth } from '@/components/figures/use-width';
import { noiseLevel } from '@/lib/shared/bench-study';
import { formatCount, formatDigits } from '@/lib/shared/format-number';
import { DensityLedger } from './density-ledger';
import { useExplore } from './explore-context';
import { resultNotes } from './result-notes';

// Low enough on a phone to stand above the noise slider; the class of the drawing's box has the same two heights.
const heightFor = (width: number) => (width < 508 ? 260 : 344);

export function DensityPanel() {
  const picture = useExplore((state) => state.picture);
  const draft = useExplore((state) => state.study);
  const [ref, width] = useWidth<HTMLDivElement>(820);
  const [index, setIndex] = useState<number | null>(null);
  const study = picture?.study ?? draft;
  const { from, to } = study.domain[0];
  const name = study.system.variables?.[0] ?? 'x';
  const unit = study.system.units?.[0];
  const stationary = picture?.case.stationary;
  const grid = picture?.case.grid;
  // A result without noise has its density among the noisy ones' place, and is drawn as what it is.
  const quiet = study.noise.kind === 'none';
  const curve = stationary && grid ? { x: grid.x[0], values: stationary.values } : null;
  const noisy = quiet ? null : curve;
  const cells = stationary?.deterministic;
  const without = quiet ? curve : cells ? { x: cells.x[0], values: cells.values } : null;

  // The readout stands on points of the grid: between them a value would not be known to its last digit.
  const places = (noisy ?? without)?.x ?? [];
  const place = index === null ? undefined : places[Math.min(index, places.length - 1)];
  const at = place ?? null;
  const uncertainty = stationary?.uncertainty ?? null;
  const withNoise = at === null || !noisy ? null : noisy.values[nearestIndex(noisy.x, at)];
  const withoutNoise = at === null || !without ? null : cellValue(without, at);
  const words = [
    at === null ? 'no place chosen' : `${name} = ${formatDigits(at)}${unit ? ` ${unit}` : ''}`,
    ...(withNoise === null
      ? []
      : [`with noise ${formatDigits(withNoise, { uncertainty, digits: uncertainty ? 10 : 4 })}`]),
    ...(withoutNoise === null ? [] : [`without ${formatDigits(withoutNoise, { digits: 3 })}`]),
  ];
  const right = at !== null && at > (from + to) / 2;
  const inner = width - DENSITY_MARGIN.left - DENSITY_MARGIN.right;
  const title = 'Density in the long run';
  return (
    <FigureFrame
      title={title}
      legend={
        <>
          {!quiet && <LegendMark mark="line-rain">with noise</LegendMark>}
          <LegendMark mark="line-rust">without{without && `, ${formatCount(without.values.length)} cells`}</LegendMark>
        </>
      }
      ledger={<DensityLedger />}
      numbers={() => ({
        columns: [
          { name, unit: unit ?? '' },
          { name: 'density with noise', unit: unit ? `per ${unit}` : '' },
          { name: 'uncertainty with noise, at most', unit: unit ? `per ${unit}` : '' },
          { name: 'density without noise', unit: unit ? `per ${unit}` : '' },
        ],
        rows: (curve?.x ?? []).map((x, i) => [
          x,
          quiet ? null : (curve?.values[i] ?? null),
          quiet || picture?.settled !== true ? null : uncertainty,
          without ? cellValue(without, x) : null,
        ]),
      })}
      notes={() => resultNotes(picture)}
    >
      <div
        ref={ref}
        data-part="density"
        data-shown-sigma={picture ? noiseLevel(picture.study) : undefined}
        className="relative h-[260px] overflow-hidden min-[540px]:h-[344px]"
      >
        <DensityFigure
          noisy={noisy}
          without={without}
          from={from}
          to={to}
          variable={unit ? `${name}, ${unit}` : name}
          title={title}
          width={width}
          height={heightFor(width)}
          at={at}
        />
        <ReadoutSlider
          label={`Readout along ${name}`}
          now={Math.min(index ?? 0, Math.max(places.length - 1, 0))}
          steps={Math.max(places.length - 1, 0)}
          text={words.join(', ')}
          onPoint={(x) => setIndex(nearestIndex(places, from + ((x - DENSITY_MARGIN.left) / inner) * (to - from)))}
          onStep={setIndex}
          onLeave={() => setIndex(null)}
        />
        {at !== null && (
          <p
            aria-hidden="true"
            className="figures pointer-events-none absolute top-5 bg-paper px-1 text-[0.8125rem]"
            style={right ? { left: DENSITY_MARGIN.left } : { right: DENSITY_MARGIN.right }}
          >
            {words.map((word) => (
              <span key={word} className="block">
                {word}
              </span>
            ))}
          </p>
        )}
      </div>
    </FigureFrame>
  );
}
