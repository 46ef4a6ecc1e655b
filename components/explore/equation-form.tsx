'use client';

import { AdjustableNumber } from '@/components/ui/adjustable-number';
import { faultAt } from '@/lib/client/explore-core';
import { noiseLevel } from '@/lib/shared/bench-study';
import { formatCount } from '@/lib/shared/format-number';
import { digitStepper, linearStepper } from '@/lib/shared/step-number';
import { useExplore, useSystem } from './explore-context';
import { sigmaLimits, withInterval, withSigma } from './study-edits';
import { anywhere, TypesetEquation } from './typeset-equation';

/** The study as its equation; every number in it can be changed where it stands. */
export function EquationForm() {
  const study = useExplore((state) => state.study);
  const points = useExplore((state) => state.picture?.case.grid.points[0]);
  const edit = useExplore((state) => state.edit);
  const rest = useExplore((state) => state.rest);
  const system = useSystem();
  const variable = study.system.variables?.[0] ?? system?.variable ?? 'x';
  const { from, to, ends } = study.domain[0];
  const sigma = noiseLevel(study);
  const limits = sigmaLimits(study);
  const sigmaFault = useExplore((state) => faultAt(state, 'noise.sigma')?.message);
  const domainFault = useExplore((state) => faultAt(state, 'domain')?.message);
  const step = linearStepper(anywhere, to - from);
  return (
    <div
      data-equation
      className="math mt-2 flex flex-wrap items-baseline gap-x-10 gap-y-2 text-[1.625rem] leading-[1.7]"
    >
      <span>
        <i>{variable}</i>′ = <TypesetEquation />
        {sigma !== null && (
          <>
            {' + '}
            <i>ξ</i>
          </>
        )}
      </span>
      {sigma !== null && (
        <span>
          <i>ξ</i> ∼ N(0, <i>σ</i>²), <i>σ</i> ={' '}
          <AdjustableNumber
            label="sigma"
            value={sigma}
            bounds={limits}
            stepper={digitStepper(limits)}
            onChange={(next, moving) => edit((current) => withSigma(current, next), moving)}
            onRest={rest}
            fault={sigmaFault}
          />
        </span>
      )}
      <span>
        <span className="font-sans text-sm text-muted">on </span>[
        <AdjustableNumber
          label="from"
          value={from}
          bounds={anywhere}
          stepper={step}
          onChange={(next, moving) => edit((current) => withInterval(current, { from: next }), moving)}
          onRest={rest}
          fault={domainFault}
        />
        ,{' '}
        <AdjustableNumber
          label="to"
          value={to}
          bounds={anywhere}
          stepper={step}
          onChange={(next, moving) => edit((current) => withInterval(current, { to: next }), moving)}
          onRest={rest}
        />
        ]
        <span className="font-sans text-sm text-muted">
          {' '}
          ends {[ends].flat().join(' and ')}
          {points !== undefined && `, ${formatCount(points)} points`}
        </span>
      </span>
    </div>
  );
}
