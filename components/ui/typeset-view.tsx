import { Fragment, type ReactNode } from 'react';
import type { TypesetFormula } from '@/lib/shared/typeset-types';

interface TypesetViewProps {
  formula: TypesetFormula;
  /** What stands where a parameter is: its symbol, its value, or a control. */
  slot(parameter: string, symbol: ReactNode): ReactNode;
}

const fences = { round: ['(', ')'], bars: ['|', '|'], floor: ['⌊', '⌋'], ceil: ['⌈', '⌉'] } as const;

/** A formula as mathematics is set: variables slanted, numbers and functions upright, fractions and cases built up. */
export function TypesetView({ formula, slot }: TypesetViewProps): ReactNode {
  const view = (part: TypesetFormula) => <TypesetView formula={part} slot={slot} />;
  switch (formula.kind) {
    case 'row':
      // A formula's parts never change places: it is laid out anew as a whole.
      return formula.items.map((item, place) => <Fragment key={String(place)}>{view(item)}</Fragment>);
    case 'number':
      return formula.text;
    case 'name':
      return <NameView text={formula.text} lowered={formula.lowered} />;
    case 'slot':
      return slot(formula.parameter, <NameView text={formula.text} lowered={formula.lowered} />);
    case 'operator':
      return formula.text === ',' ? ', ' : <span className="mx-[0.22em]">{formula.text}</span>;
    case 'sign':
      return formula.text;
    case 'function':
      return (
        <span className="mr-[0.05em]">
          {formula.text}
          {formula.lowered && <sub className="text-[0.7em]">{formula.lowered}</sub>}
        </span>
      );
    case 'word':
      return <span className="mx-[0.3em]">{formula.text}</span>;
    case 'gap':
      return <span className="inline-block w-[0.17em]" />;
    case 'fraction':
      return (
        <span className="mx-[0.1em] inline-flex flex-col items-center align-middle text-[0.86em] leading-[1.35]">
          <span className="border-b border-current px-1">{view(formula.top)}</span>
          <span className="px-1">{view(formula.bottom)}</span>
        </span>
      );
    case 'power':
      return (
        <>
          {view(formula.base)}
          <sup className="text-[0.7em]">{view(formula.exponent)}</sup>
        </>
      );
    case 'root':
      return (
        <span>
          {formula.degree && <sup className="-mr-[0.3em] text-[0.5em]">{formula.degree}</sup>}√
          <span className="border-t border-current px-0.5">{view(formula.inside)}</span>
        </span>
      );
    case 'brackets': {
      const [open, close] = fences[formula.shape];
      const stretched = isTall(formula.inside) ? 'inline-block scale-y-[1.8]' : '';
      return (
        <>
          <span className={stretched}>{open}</span>
          {view(formula.inside)}
          <span className={stretched}>{close}</span>
        </>
      );
    }
    case 'cases':
      return (
        <span className="inline-flex items-stretch align-middle">
          <span className="mr-2 w-1.5 rounded-l-md border-y border-l border-current" />
          <span className="grid grid-cols-[auto_auto] items-baseline gap-x-4 text-[0.86em] leading-[1.5]">
            {formula.lines.map(({ value, condition }, line) => (
              <Fragment key={String(line)}>
                <span>{view(value)}</span>
                <span>{condition ? <>if {view(condition)}</> : 'otherwise'}</span>
              </Fragment>
            ))}
          </span>
        </span>
      );
  }
}

function NameView({ text, lowered }: { text: string; lowered: string | null }) {
  return (
    <>
      <i>{text}</i>
      {lowered && <sub className="text-[0.7em]">{lowered}</sub>}
    </>
  );
}

function isTall(formula: TypesetFormula): boolean {
  if (formula.kind === 'row') return formula.items.some(isTall);
  if (formula.kind === 'power') return isTall(formula.base);
  if (formula.kind === 'root' || formula.kind === 'brackets') return isTall(formula.inside);
  return formula.kind === 'fraction' || formula.kind === 'cases';
}
