import { compileFormula } from './compile-formula';
import { findBreaks } from './find-breaks';
import type { FormulaScope } from './formula-scope';
import type { FormulaTree } from './formula-tree';

/** A stretch on which a formula gives no number. */
export interface DomainFault {
  from: number;
  to: number;
  /** in words: "the formula is not a number", "the formula is infinite" */
  reason: string;
}

const SAMPLES = 4096;
const LEAST_SAMPLES = 16;

/**
 * Whether a formula of one variable is a finite real number on an interval. Single places without a value, such as a pole
 * or the hole of sin(x)/x at 0, are allowed; two neighbouring samples without one are not.
 * @param tree the formula
 * @param scope its names: one variable
 * @param parameters values in the scope's order
 * @param from lower end, finite
 * @param to upper end, above `from`
 * @returns null where it is; else the first stretch where it is not, its ends to the last bit. Between any two breaks at
 *   least 16 places are looked at, and one in (to - from)/4096.
 * @throws RangeError where the interval is empty or the scope has not exactly one variable.
 *   Cost: that of `findBreaks` and 4096 evaluations.
 */
export function checkDomain(
  tree: FormulaTree,
  scope: FormulaScope,
  parameters: readonly number[],
  from: number,
  to: number,
): DomainFault | null {
  const { at, gaps } = findBreaks(tree, scope, parameters, from, to);
  const compiled = compileFormula(tree, scope);
  const evaluate = (x: Float64Array) => {
    const out = new Float64Array(x.length);
    compiled.evaluate([x], parameters, out);
    return out;
  };
  const bounds = [from, ...at, to].filter((place) => !gaps.some((gap) => place > gap.from && place < gap.to));
  const places: number[] = [];
  for (let k = 0; k + 1 < bounds.length; k++) {
    const [low, high] = [bounds[k], bounds[k + 1]];
    const samples = Math.max(LEAST_SAMPLES, Math.ceil((SAMPLES * (high - low)) / (to - from)));
    for (let i = 0; i < samples; i++) places.push(low + (high - low) * ((i + 0.5) / samples));
  }
  const x = Float64Array.from(places);
  const values = evaluate(x);
  for (let i = 0; i < x.length; i++) {
    if (Number.isFinite(values[i])) continue;
    let last = i;
    while (last + 1 < x.length && !Number.isFinite(values[last + 1])) last++;
    const alone = last === i;
    if (alone && isHole(evaluate, x[i], to - from)) continue;
    const finite = (place: number) => Number.isFinite(evaluate(Float64Array.of(place))[0]);
    const start = i === 0 ? from : edge(finite, x[i - 1], x[i]);
    const end = last === x.length - 1 ? to : edge(finite, x[last + 1], x[last]);
    const infinite = values.subarray(i, last + 1).every((value) => !Number.isNaN(value));
    return { from: start, to: end, reason: infinite ? 'the formula is infinite' : 'the formula is not a number' };
  }
  return null;
}

/** Whether a place without a value has values right beside it. */
function isHole(evaluate: (x: Float64Array) => Float64Array, at: number, span: number): boolean {
  const beside = evaluate(Float64Array.of(at - 1e-12 * span, at + 1e-12 * span, at - 1e-9 * span, at + 1e-9 * span));
  return beside.every(Number.isFinite);
}

/** The last place, walking from `good` to `bad`, that has a value. */
function edge(finite: (x: number) => boolean, good: number, bad: number): number {
  for (let i = 0; i < 200; i++) {
    const middle = good + (bad - good) / 2;
    if (middle === good || middle === bad) break;
    if (finite(middle)) good = middle;
    else bad = middle;
  }
  return good;
}
