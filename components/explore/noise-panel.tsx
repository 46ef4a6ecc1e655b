'use client';

import { useEffect, useState } from 'react';
import { FigureFrame } from '@/components/figures/figure-frame';
import { NoiseRail } from '@/components/figures/noise-rail';
import { railX } from '@/components/figures/rail-geometry';
import { useWidth } from '@/components/figures/use-width';
import { FIRST_LANES, LANES, type LaneId, limitLevel } from '@/lib/client/rail-lanes';
import { holding, zoomed } from '@/lib/client/rail-window';
import { noiseLevel } from '@/lib/shared/bench-study';
import { formatCount, formatDigits } from '@/lib/shared/format-number';
import type { Bounds } from '@/lib/shared/step-number';
import { useExplore, useSide } from './explore-context';
import { pinsOf } from './pins';
import { ProgressLine } from './progress-line';
import { limitText, RailControls } from './rail-controls';
import { RailPins } from './rail-pins';
import { RailSlider } from './rail-slider';
import { railValues } from './rail-values';
import { resultNotes } from './result-notes';
import { sigmaBounds, sigmaLimits, withSigma } from './study-edits';

const NARROW = 560;

/** The noise rail: the noise level's slider, drawn as what changes along it. */
export function NoisePanel() {
  const study = useExplore((state) => state.study);
  const picture = useExplore((state) => state.picture);
  const edit = useExplore((state) => state.edit);
  const rest = useExplore((state) => state.rest);
  const rail = useSide((state) => state.rail);
  const failure = useSide((state) => state.failure);
  const show = useSide((state) => state.show);
  const [ref, width] = useWidth<HTMLDivElement>(1344);
  const [chosenLanes, setLanes] = useState<LaneId[] | null>(null);
  const [zoom, setZoom] = useState<Bounds | null>(null);
  const [limit, setLimit] = useState<number | null>(null);
  const [pins, setPins] = useState<number[]>(() => pinsOf(study));
  const quiet = study.noise.kind === 'none';
  const sigma = quiet ? null : noiseLevel(study);
  const limits = sigmaLimits(study);
  const whole = sigmaBounds(study);
  const inLimits = zoom !== null && zoom.min >= limits.min && zoom.max <= limits.max;
  const wanted = inLimits ? zoom : whole;
  const window = sigma === null ? wanted : holding(wanted, sigma, limits);
  const { min, max } = window;
  useEffect(() => show({ min, max }, { min: limits.min, max: limits.max }), [show, min, max, limits.min, limits.max]);

  if (sigma === null) {
    return (
      <section aria-label="Noise">
        <h2 className="font-sans text-sm font-semibold">Noise</h2>
        <p className="text-muted">none: choose a kind of noise in the settings</p>
        <ProgressLine />
      </section>
    );
  }
  const narrow = width < NARROW;
  const ids = chosenLanes ?? (narrow ? FIRST_LANES.slice(0, 1) : FIRST_LANES);
  const lanes = LANES.filter(({ id }) => ids.includes(id));
  const laneHeight = narrow ? 52 : 46;
  const unit = study.system.units?.[0];
  const values = railValues(lanes, picture, rail, sigma);
  const level = limit === null || rail.stale ? null : limitLevel(rail.points, limit);
  const zoomBy = (factor: number | null) => setZoom(factor === null ? null : zoomed(window, sigma, factor, limits));
  const complete = rail.done >= rail.of;
  return (
    <section
      aria-label="Noise"
      data-rail={rail.stale ? 'stale' : complete && rail.of > 0 ? 'complete' : 'drawing'}
      className="max-sm:sticky max-sm:bottom-0 max-sm:z-10 max-sm:-mx-4 max-sm:border-t max-sm:border-rule max-sm:bg-paper max-sm:px-2 max-sm:pt-1"
    >
      <FigureFrame
        title="Noise"
        legend={
          <span className="max-sm:hidden">
            drag <span className="math italic">σ</span>, or use the arrow keys; + and − zoom
          </span>
        }
        ledger={
          failure
            ? `the rail could not be computed: ${failure}`
            : rail.stale
              ? `out of date, of the earlier study: ${rail.done} of ${rail.of} computed`
              : complete
                ? `${formatCount(rail.of)} noise levels; curves without error bars`
                : `${rail.done} of ${rail.of} noise levels computed`
        }
        numbers={() => ({
          columns: [
            { name: 'sigma', unit: unit ?? '' },
            ...LANES.map(({ name, unit: laneUnit }) => ({ name, unit: laneUnit })),
          ],
          rows: rail.points.map((point) => [point.sigma, ...LANES.map(({ id }) => point[id])]),
        })}
        notes={() => [...resultNotes(picture), 'noise rail: computed without uncertainties']}
      >
        <div
          ref={ref}
          className="relative h-[calc(var(--lanes-narrow)*52px+52px)] overflow-hidden sm:h-[calc(var(--lanes)*46px+52px)]"
          style={
            {
              '--lanes': (chosenLanes ?? FIRST_LANES).length,
              '--lanes-narrow': chosenLanes?.length ?? 1,
            } as React.CSSProperties
          }
        >
          <NoiseRail
            lanes={lanes}
            points={rail.points}
            window={window}
            sigma={sigma}
            values={values}
            limit={level === null || limit === null ? null : { sigma: level, text: limitText(limit) }}
            pins={pins}
            stale={rail.stale}
            title="Noise"
            axisName={unit ? `σ, ${unit}` : 'σ'}
            width={width}
            laneHeight={laneHeight}
          />
          <RailSlider
            sigma={sigma}
            unit={unit}
            values={lanes.map(({ name }, i) => `${name} ${values[i].spoken}`).join(', ')}
            window={window}
            limits={limits}
            level={(x) => railX({ width, laneHeight, window }).invert(x)}
            onMove={(value) => edit((current) => withSigma(current, value), true)}
            onRest={rest}
            onZoom={zoomBy}
          />
        </div>
      </FigureFrame>
      <RailControls
        lanes={ids}
        onLanes={setLanes}
        onZoom={zoomBy}
        limit={limit}
        onLimit={setLimit}
        limitWords={limitWords(limit, level, rail.stale)}
        progress={<ProgressLine />}
      >
        <RailPins sigma={sigma} pins={pins} onPins={setPins} />
      </RailControls>
    </section>
  );
}

function limitWords(limit: number | null, level: number | null, stale: boolean): string {
  if (limit === null || stale) return '';
  return level === null ? 'not crossed on this rail' : `up to σ of about ${formatDigits(level, { digits: 3 })}`;
}
