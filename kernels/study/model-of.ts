import type { MapModel } from '../core/map-model';
import { checkDomain } from '../formula/check-domain';
import { compileFormula } from '../formula/compile-formula';
import { findBreaks } from '../formula/find-breaks';
import { findCriticalPoints } from '../formula/find-critical-points';
import { parseFormula } from '../formula/parse-formula';
import { type TailBranch, tailBranch } from '../grid/branch-tail';
import type { Study } from '../spec';
import { findSystem } from '../systems/index';
import { StudyRefused } from './study-refused';

/**
 * The map of a study at given parameters: values, slopes, breaks, points where ln|F'| is singular.
 *
 * @param parameters values by name, all of the system's
 * @throws StudyRefused where the formula is not a finite number on part of the domain
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
    const tidy = (v: number) => (Math.abs(v) < 1e-12 * (to - from) ? 0 : Number(v.toPrecision(6)));
    const [a, b] = [tidy(wrong.from), tidy(wrong.to)];
    const where = a === b ? `at ${a}` : `from ${a} to ${b}`;
    throw new StudyRefused(
      'system.formulas[0]',
      `${wrong.reason} ${where}; choose a domain where the formula is a finite number`,
    );
  }
  const found = findBreaks(tree, scope, values, from, to);
  const evaluate = evaluator(study, values, scope);
  const inside = (x: number) => x > from && x < to;
  const listed = (system.breaks?.[0] ?? []).filter(inside);
  const gaps = found.accumulations.flatMap((at) =>
    gapsAround(
      at,
      [...found.at, from, to].sort((a, b) => a - b),
    ),
  );
  const filled = gaps.length > 0 ? fillGaps(evaluate, gaps) : evaluate;
  const breaks = merge([...found.at, ...listed, ...gaps.flatMap((g) => [g.point, g.near]).filter(inside)], to - from);
  const rough = found.at.filter((_, i) => found.kinds[i] === 'root' || found.kinds[i] === 'pole');
  const flat = findCriticalPoints({ evaluate: filled }, from, to, breaks);
  const ends = [from, to].filter((end) => singularEnd(filled, end, from, to));
  return {
    evaluate: filled,
    stretch: (x, out) => {
      const value = new Float64Array(x.length);
      evaluate(x, value, out);
      for (let i = 0; i < x.length; i++) out[i] = Math.log(Math.abs(out[i]));
    },
    breaks,
    complete: found.complete,
    singular: merge([...rough, ...flat, ...ends], to - from),
    // ln|F'| of the branches themselves is singular where they pile up
    stretchSingular: merge([...rough, ...flat, ...ends, ...gaps.map((g) => g.point)], to - from),
  };
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

interface Gap {
  point: number;
  near: number;
  far: number;
}

/** On either side of an accumulation point: the gap that the listed breaks leave, and the last branch before it. */
function gapsAround(point: number, edges: readonly number[]): Gap[] {
  const below = edges.filter((b) => b < point);
  const above = edges.filter((b) => b > point);
  const gaps: Gap[] = [];
  if (below.length > 1) gaps.push({ point, near: below[below.length - 1], far: below[below.length - 2] });
  if (above.length > 1) gaps.push({ point, near: above[0], far: above[1] });
  return gaps;
}

/** Replaces the map inside each gap by one branch: the exact sum of its branches, or one that covers their range evenly. */
function fillGaps(evaluate: MapModel['evaluate'], gaps: readonly Gap[]): MapModel['evaluate'] {
  const one = (x: number) => {
    const value = new Float64Array(1);
    const slope = new Float64Array(1);
    evaluate(Float64Array.of(x), value, slope);
    return { value: value[0], slope: slope[0] };
  };
  const branches = gaps.map((g) => tailBranch(one, g.point, g.near, g.far) ?? evenBranch(evaluate, g));
  return (x, out, slope) => {
    evaluate(x, out, slope);
    for (let i = 0; i < x.length; i++) {
      for (const b of branches) {
        if (x[i] < b.from || x[i] > b.to) continue;
        const there = b.at(x[i]);
        out[i] = there.value;
        if (slope) slope[i] = there.slope;
      }
    }
  };
}

/** One straight branch over the range of values found in a gap; right to the order of the gap's width. */
function evenBranch(evaluate: MapModel['evaluate'], { point, near }: Gap): TailBranch {
  const SAMPLES = 4096;
  const from = Math.min(point, near);
  const to = Math.max(point, near);
  const x = Float64Array.from({ length: SAMPLES }, (_, i) => from + ((to - from) * (i + 0.5)) / SAMPLES);
  const y = new Float64Array(SAMPLES);
  evaluate(x, y);
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (const v of y) {
    if (v < low) low = v;
    if (v > high) high = v;
  }
  const slope = (high - low) / (to - from);
  return { from, to, at: (position) => ({ value: low + slope * (position - from), slope }) };
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
