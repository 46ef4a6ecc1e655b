'use client';

import { useMemo } from 'react';
import { FigureFrame } from '@/components/figures/figure-frame';
import { StepsStrip } from '@/components/figures/steps-strip';
import { StripCanvas } from '@/components/figures/strip-canvas';
import { STRIP_MARGIN, type StripRow, stepNumbers } from '@/components/figures/strip-picture';
import { useWidth } from '@/components/figures/use-width';
import { Button } from '@/components/ui/button';
import { STRIP_STEPS, sideKey, startOf } from '@/lib/client/side-requests';
import { formatDigits, formatUncertainty } from '@/lib/shared/format-number';
import type { StudyFile } from '@/lib/shared/study-types';
import { useExplore, useSide } from './explore-context';
import { resultNotes } from './result-notes';
import { startWords } from './start-words';
import { StepSlider } from './step-slider';
import { useStepPlayer } from './use-step-player';

const ROW = 10;
const title = 'From the start, step by step';

/** The density from its start on, one row a step; one row is chosen, by hand or by playing. */
export function StepsPanel() {
  const study = useExplore((state) => state.study);
  const picture = useExplore((state) => state.picture);
  const steps = useSide((state) => state.steps);
  const [ref, width] = useWidth<HTMLDivElement>(820);
  const last = STRIP_STEPS.length - 1;
  const { step, playing, play, pause, choose } = useStepPlayer(last);
  const shown: StudyFile = steps?.study ?? study;
  const { from, to } = shown.domain[0];
  const name = shown.system.variables?.[0] ?? 'x';
  const unit = shown.system.units?.[0];
  const grid = steps?.case.grid;
  const rows = useMemo<StripRow[]>(
    () =>
      (steps?.case.density ?? []).map(({ at, values }) => ({
        step: at,
        curve: { x: steps?.case.grid.x[0] ?? [], values: values ?? [] },
      })),
    [steps],
  );
  const current = steps !== null && sideKey(steps.study) === sideKey(study);
  const density = steps?.case.density?.[step];
  const numbers = density?.values && grid ? stepNumbers(density.values, grid.x[0], grid.weights[0]) : null;
  const settled = steps?.settled === true && current;
  const withUnit = (text: string) => (unit ? `${text} ${unit}` : text);
  const mass = density?.mass;
  const digits = { digits: 4 };
  const words = numbers && [
    `step ${step}`,
    `mean ${withUnit(formatDigits(numbers.mean, digits))}`,
    `sd ${withUnit(formatDigits(numbers.sd, digits))}`,
    `mass ${formatDigits(mass?.value ?? numbers.mass, {
      uncertainty: mass && mass.uncertainty > 0 ? mass.uncertainty : null,
      digits: mass && mass.uncertainty > 0 ? 10 : 4,
    })}${settled && mass && mass.uncertainty > 0 ? ` ${formatUncertainty(mass.uncertainty)}` : ''}`,
  ];
  return (
    <FigureFrame
      title={title}
      legend={startWords(startOf(study), unit)}
      ledger={words ? words.join('   ') : '…'}
      numbers={() => ({
        columns: [
          { name: 'step', unit: '' },
          { name: 'mean', unit: unit ?? '' },
          { name: 'sd', unit: unit ?? '' },
          { name: 'mass', unit: '' },
          { name: 'uncertainty of the mass', unit: '' },
        ],
        rows: (steps?.case.density ?? []).map(({ at, values, mass: left }) => {
          const row = stepNumbers(values ?? [], grid?.x[0] ?? [], grid?.weights[0] ?? []);
          return [at, row.mean, row.sd, left?.value ?? row.mass, left?.uncertainty ?? null];
        }),
      })}
      notes={() => [...resultNotes(picture), `start: ${JSON.stringify(startOf(shown))}`]}
    >
      <div className="screen-only flex items-center gap-1.5 pl-11">
        <Button low onClick={() => choose(0)}>
          Back to the start
        </Button>
        <Button low className="w-16" onClick={playing ? pause : play}>
          {playing ? 'Pause' : 'Play'}
        </Button>
        <span className="figures ml-2">step {step}</span>
      </div>
      <div ref={ref} className="relative mt-1 h-[200px] overflow-hidden">
        <StepsStrip
          steps={STRIP_STEPS}
          chosen={step}
          from={from}
          to={to}
          variable={unit ? `${name}, ${unit}` : name}
          title={title}
          width={width}
          rowHeight={ROW}
        >
          <StripCanvas rows={rows} from={from} to={to} width={width} stale={steps !== null && !current} />
        </StepsStrip>
        <StepSlider
          step={step}
          last={last}
          text={words?.join(', ') ?? `step ${step}`}
          stepAt={(y) => Math.floor((y - STRIP_MARGIN.top) / ROW)}
          onStep={choose}
        />
      </div>
    </FigureFrame>
  );
}
