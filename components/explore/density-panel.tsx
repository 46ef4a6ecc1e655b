'use client';

import { useState } from 'react';
import { DensityFigure } from '@/components/figures/density-figure';
import { valueAt } from '@/components/figures/density-path';
import { DENSITY_MARGIN } from '@/components/figures/density-scales';
import { FigureFrame } from '@/components/figures/figure-frame';
import { LegendMark } from '@/components/figures/legend-mark';
import { ReadoutSlider } from '@/components/figures/readout-slider';
import { useWidth } from '@/components/figures/use-width';
import { formatCount, formatDigits } from '@/lib/shared/format-number';
import { DensityLedger } from './density-ledger';
import { useExplore } from './explore-context';
import { resultNotes } from './result-notes';

const HEIGHT = 352;
const STEPS = 200;

export function DensityPanel() {
  const picture = useExplore((state) => state.picture);
  const draft = useExplore((state) => state.study);
  const [ref, width] = useWidth<HTMLDivElement>(820);
  const [share, setShare] = useState<number | null>(null);
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

  const at = share === null ? null : from + share * (to - from);
  const withNoise = at === null || !noisy ? null : valueAt(noisy, at, false);
  const withoutNoise = at === null || !without ? null : valueAt(without, at, true);
  const uncertainty = stationary?.uncertainty ?? null;
  const words = [
    at === null ? 'no place chosen' : `${name} = ${formatDigits(at, { digits: 4 })}${unit ? ` ${unit}` : ''}`,
    ...(withNoise === null ? [] : [`with noise ${formatDigits(withNoise, { uncertainty, digits: 10 })}`]),
    ...(withoutNoise === null ? [] : [`without ${formatDigits(withoutNoise, { digits: 3 })}`]),
  ];
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
          { name: 'density without noise', unit: unit ? `per ${unit}` : '' },
        ],
        rows: (curve?.x ?? []).map((place, i) => [
          place,
          quiet ? null : (curve?.values[i] ?? null),
          without ? valueAt(without, place, true) : null,
        ]),
      })}
      notes={() => resultNotes(picture)}
    >
      <div ref={ref} className="relative" style={{ height: HEIGHT }}>
        <DensityFigure
          noisy={noisy}
          without={without}
          from={from}
          to={to}
          variable={unit ? `${name}, ${unit}` : name}
          title={title}
          width={width}
          height={HEIGHT}
          at={at}
        />
        <ReadoutSlider
          label={`Readout along ${name}`}
          now={Math.round((share ?? 0.5) * STEPS)}
          steps={STEPS}
          text={words.join(', ')}
          onPoint={(x) => setShare(Math.min(Math.max((x - DENSITY_MARGIN.left) / inner, 0), 1))}
          onStep={(now) => setShare(now / STEPS)}
          onLeave={() => setShare(null)}
        />
        {at !== null && (
          <p
            aria-hidden="true"
            className="figures pointer-events-none absolute top-5 bg-paper px-1 text-[0.8125rem]"
            style={share !== null && share > 0.5 ? { left: DENSITY_MARGIN.left } : { right: DENSITY_MARGIN.right }}
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
