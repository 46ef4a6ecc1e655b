'use client';

import { FigureFrame } from '@/components/figures/figure-frame';
import { LegendMark } from '@/components/figures/legend-mark';
import { ModeFigure } from '@/components/figures/mode-figure';
import { useWidth } from '@/components/figures/use-width';
import { formatDigits } from '@/lib/shared/format-number';
import { useExplore, useSide } from './explore-context';
import { resultNotes } from './result-notes';

const HEIGHT = 190;

/** The eigenfunctions of the chosen eigenvalue. */
export function ModePanel() {
  const study = useExplore((state) => state.study);
  const picture = useExplore((state) => state.picture);
  const chosen = useSide((state) => state.chosen);
  const shown = useSide((state) => state.mode);
  const [ref, width] = useWidth<HTMLDivElement>(440);
  const name = study.system.variables?.[0] ?? 'x';
  const unit = study.system.units?.[0];
  const { from, to } = study.domain[0];
  const title = 'Eigenfunctions';
  if (chosen === null || study.noise.kind === 'none') {
    return (
      <p className="text-muted">
        {study.noise.kind === 'none'
          ? 'Eigenfunctions are computed with noise.'
          : 'Choose an eigenvalue in the table or the circle to see its eigenfunctions.'}
      </p>
    );
  }
  const mode = shown?.index === chosen ? shown.mode : null;
  const current = mode !== null && shown?.current === true;
  const value =
    mode &&
    `${formatDigits(mode.re, { digits: 4 })}${
      mode.im === 0 ? '' : ` ${mode.im < 0 ? '-' : '+'} ${formatDigits(Math.abs(mode.im), { digits: 4 })} i`
    }`;
  return (
    <FigureFrame
      title={title}
      legend={
        <>
          <LegendMark mark="line-rain">of densities</LegendMark>
          <LegendMark mark="line-plum">of observables</LegendMark>
        </>
      }
      ledger={
        mode === null
          ? '…'
          : current
            ? `eigenvalue ${value}${mode.im === 0 ? '' : '; dotted: modulus'}`
            : `out of date: eigenvalue ${value}`
      }
      numbers={() => ({
        columns: [
          { name, unit: unit ?? '' },
          ...['density, re', 'density, im', 'observable, re', 'observable, im'].map((column) => ({
            name: column,
            unit: '',
          })),
        ],
        rows: (mode?.x ?? []).map((x, i) => [
          x,
          mode?.density.re[i] ?? null,
          mode?.density.im?.[i] ?? 0,
          mode?.observable.re[i] ?? null,
          mode?.observable.im?.[i] ?? 0,
        ]),
      })}
      notes={() => [...resultNotes(picture), 'eigenfunctions: largest modulus 1, real and positive there']}
    >
      <div
        ref={ref}
        className={`h-[190px] overflow-hidden ${current ? '' : 'opacity-50'}`}
        data-mode={mode ? chosen : 'none'}
      >
        {mode && (
          <ModeFigure
            x={mode.x}
            density={mode.density}
            observable={mode.observable}
            from={from}
            to={to}
            variable={unit ? `${name}, ${unit}` : name}
            title={title}
            width={width}
            height={HEIGHT}
          />
        )}
      </div>
    </FigureFrame>
  );
}
