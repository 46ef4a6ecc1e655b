import { EXIT_CAUTION } from '@/components/explore/exit-caution';
import { KeyNumber } from '@/components/explore/key-number';
import { DensityFigure } from '@/components/figures/density-figure';
import { cellValue } from '@/components/figures/density-path';
import { FigureFrame } from '@/components/figures/figure-frame';
import { FigureSource } from '@/components/figures/figure-source';
import { LegendMark } from '@/components/figures/legend-mark';
import { FIRST_RESULT } from '@/components/first-study/first-result';
import { formatCount, formatDigits, formatUncertainty } from '@/lib/shared/format-number';

const title = 'Logistic map, r = 3.8: density in the long run';

/** One computed figure, drawn on the server: wide, and once more for narrow screens. */
export function FirstFigure() {
  const { grid, stationary, exit, spectrum, lyapunov } = FIRST_RESULT.cases[0];
  if (!stationary?.deterministic) return null;
  const noisy = { x: grid.x[0], values: stationary.values };
  const without = { x: stationary.deterministic.x[0], values: stationary.deterministic.values };
  const drawing = { noisy, without, from: 0, to: 1, variable: 'x', title };
  const lost = stationary.lostPerStep;
  return (
    <div className="grid gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,900px)_minmax(0,1fr)]">
      <FigureSource study={FIRST_RESULT.study}>
        <FigureFrame
          title={title}
          legend={
            <>
              <LegendMark mark="line-rain">with noise, σ = 0.0120</LegendMark>
              <LegendMark mark="line-rust">without, {formatCount(without.values.length)} cells</LegendMark>
            </>
          }
          ledger={
            <span className="flex flex-wrap gap-x-5">
              {lost && (
                <span>mass lost per step {formatDigits(lost.value, { uncertainty: lost.uncertainty, digits: 3 })}</span>
              )}
              <span>
                density {formatUncertainty(stationary.uncertainty)}, {formatCount(grid.points[0])} against{' '}
                {formatCount(grid.compared[0][0])} points
              </span>
            </span>
          }
          numbers={{
            columns: [
              { name: 'x', unit: '' },
              { name: 'density with noise', unit: '' },
              { name: 'uncertainty with noise, at most', unit: '' },
              { name: 'density without noise', unit: '' },
            ],
            rows: noisy.x.map((x, i) => [x, noisy.values[i], stationary.uncertainty, cellValue(without, x)]),
          }}
          notes={[
            `Smirr, study: ${JSON.stringify(FIRST_RESULT.study)}`,
            `engine ${FIRST_RESULT.engine}, ${FIRST_RESULT.runtime}`,
          ]}
        >
          <div className="hidden sm:block">
            <DensityFigure {...drawing} width={900} height={340} />
          </div>
          <div className="sm:hidden">
            <DensityFigure {...drawing} width={328} height={260} />
          </div>
        </FigureFrame>
      </FigureSource>
      <div className="lg:border-l lg:border-rule lg:pl-8">
        <dl className="grid grid-cols-2 gap-x-4 gap-y-3 sm:flex sm:flex-wrap sm:gap-x-12 lg:block lg:space-y-5">
          <KeyNumber
            id="mean-exit-time"
            label="Mean exit time"
            unit="steps"
            quantity={exit?.meanTime}
            absent=""
            settled
          />
          <KeyNumber
            id="relaxation-time"
            label="Relaxation time"
            unit="steps"
            quantity={spectrum?.relaxationTime}
            absent=""
            settled
          />
          <KeyNumber
            id="lyapunov-exponent"
            label="Lyapunov exponent"
            unit="per step"
            quantity={lyapunov?.value}
            absent=""
            settled
          />
        </dl>
        <p className="mt-3 text-[0.8125rem] text-muted lg:mt-6">{EXIT_CAUTION}</p>
      </div>
    </div>
  );
}
