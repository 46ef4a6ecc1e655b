import type { MapModel } from '../core/map-model';
import { checkDomain } from '../formula/check-domain';
import { compileFormula } from '../formula/compile-formula';
import { findBreaks } from '../formula/find-breaks';
import { findCriticalPoints } from '../formula/find-critical-points';
import { parseFormula } from '../formula/parse-formula';
import type { Study } from '../spec';
import { findSystem } from '../systems/index';
import { StudyRefused } from './study-refused';

/**
 * The map of a study at given parameters: values, slopes, breaks, points where ln|F'| is singular.
 *
 * @param parameters values by name, all of the system's
 * @throws StudyRefused where the formula is not a finite number on part of the domain, or a catalogue parameter is out of range
 */
export function modelOf(study: Study, parameters: Readonly<Record<string, number>>): MapModel {
  const { system, domain } = study;
  const [{ from, to }] = domain;
  const names = Object.keys(system.parameters);
  const scope = { variables: system.variables ?? ['x'], parameters: names };
  const tree = parseFormula(system.formulas?.[0] ?? '', scope);
  const values = names.map((n) => parameters[n]);
  const wrong = checkDomain(tree, scope, values, from, to);
  if (wrong) {
    const where = wrong.from === wrong.to ? `at ${wrong.from}` : `from ${wrong.from} to ${wrong.to}`;
    throw new StudyRefused(
      'system.formulas[0]',
      `${wrong.reason} ${where}; choose a domain where the formula is a finite number`,
    );
  }
  const found = findBreaks(tree, scope, values, from, to);
  const evaluate = evaluator(study, values, scope);
  const inside = (x: number) => x > from && x < to;
  const listed = (system.breaks?.[0] ?? []).filter(inside);
  const accumulations = found.accumulations.map((at) => gapAround(at, found.at, from, to));
  const smeared = accumulations.length > 0 ? smearGaps(evaluate, accumulations) : evaluate;
  const breaks = merge(
    [...found.at, ...listed, ...accumulations.flatMap((g) => [g.from, g.to]).filter(inside)],
    to - from,
  );
  const rough = found.at.filter((_, i) => found.kinds[i] === 'root' || found.kinds[i] === 'pole');
  const flat = findCriticalPoints({ evaluate: smeared }, from, to, breaks);
  const ends = [from, to].filter((end) => singularEnd(smeared, end, from, to));
  return { evaluate: smeared, breaks, singular: merge([...rough, ...flat, ...ends], to - from), accumulations };
}

function evaluator(
  study: Study,
  values: number[],
  scope: { variables: string[]; parameters: string[] },
): MapModel['evaluate'] {
  const entry = study.system.id === undefined ? undefined : findSystem(study.system.id);
  if (entry) {
    const ordered = entry.parameters.map((p) => values[scope.parameters.indexOf(p.name)]);
    return (x, out, slope) => entry.map(x, ordered, out, slope);
  }
  const compiled = compileFormula(parseFormula(study.system.formulas?.[0] ?? '', scope), scope);
  return (x, out, slope) => {
    if (slope) compiled.evaluateWithSlope([x], values, out, slope);
    else compiled.evaluate([x], values, out);
  };
}

const merge = (list: number[], length: number): number[] =>
  [...list].sort((a, b) => a - b).filter((x, i, all) => i === 0 || x - all[i - 1] > 1e-13 * length);

/** The stretch around an accumulation point that the listed breaks leave open. */
function gapAround(
  at: number,
  breaks: readonly number[],
  from: number,
  to: number,
): { at: number; from: number; to: number } {
  const below = breaks.filter((b) => b < at);
  const above = breaks.filter((b) => b > at);
  return { at, from: at > from ? Math.max(from, ...below) : from, to: at < to ? Math.min(to, ...above) : to };
}

/**
 * Replaces the map inside each gap, where infinitely many branches each cover the same range, by one branch that covers
 * it evenly: the images of the gap's mass are spread over the range, right to the order of the gap's width squared.
 */
function smearGaps(
  evaluate: MapModel['evaluate'],
  gaps: readonly { at: number; from: number; to: number }[],
): MapModel['evaluate'] {
  const ranges = gaps.map((g) => {
    const x = Float64Array.from({ length: 4096 }, (_, i) => g.from + ((g.to - g.from) * (i + 0.5)) / 4096);
    const y = new Float64Array(4096);
    evaluate(x, y);
    const finite = y.filter(Number.isFinite);
    return { low: Math.min(...finite), high: Math.max(...finite) };
  });
  return (x, out, slope) => {
    evaluate(x, out, slope);
    for (let i = 0; i < x.length; i++) {
      const g = gaps.findIndex((gap) => x[i] > gap.from && x[i] < gap.to);
      if (g < 0) continue;
      const steep = (ranges[g].high - ranges[g].low) / (gaps[g].to - gaps[g].from);
      out[i] = ranges[g].low + steep * (x[i] - gaps[g].from);
    }
  };
}

/** true where |F'| tends to zero or grows without bound towards an end of the domain. */
function singularEnd(evaluate: MapModel['evaluate'], end: number, from: number, to: number): boolean {
  const length = to - from;
  const side = end === from ? 1 : -1;
  const x = Float64Array.from([1e-9, 1e-6, 1e-3], (d) => end + side * d * length);
  const value = new Float64Array(3);
  const slope = new Float64Array(3);
  evaluate(x, value, slope);
  const [near, middle, far] = slope.map(Math.abs);
  return near > 5 * middle && middle > 5 * far ? true : near < 0.2 * middle && middle < 0.2 * far;
}
