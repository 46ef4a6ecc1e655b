import { nextDown, nextUp } from '../core/neighbours';
import { type Curve, curveOf } from './curve';
import { evaluatePoint } from './evaluate-point';
import { type Crossings, findCrossings, type Levels, nearestLevel as nearest } from './find-crossings';
import type { FormulaScope } from './formula-scope';
import { children, type FormulaTree, varies } from './formula-tree';
import { type BreakKind, switchesOf } from './switches';

export interface Breaks {
  /** places strictly inside the interval where the formula or one of its first derivatives is not smooth, increasing */
  at: number[];
  /** what happens at each: the slope jumps, the value jumps, the value runs away, or the slope runs away */
  kinds: BreakKind[];
  /** places (ends included) where infinitely many breaks pile up, increasing */
  accumulations: number[];
  /** for each accumulation the stretch around it in which breaks are not listed */
  gaps: { from: number; to: number }[];
  /** false where more than `maxBreaks` breaks were left out that do not pile up anywhere */
  complete: boolean;
}

interface Marks {
  breaks: { at: number; kind: BreakKind }[];
  gaps: { at: number; from: number; to: number }[];
  complete: boolean;
}

const SAMPLES = 4096;
const LEAST_SAMPLES = 48;
const OCTAVE_SAMPLES = 2048;
/** Places closer than this part of the interval are one. */
const MERGE = 1e-13;
const STRENGTH: BreakKind[] = ['kink', 'root', 'jump', 'pole'];

interface Search {
  scope: FormulaScope;
  parameters: readonly number[];
  from: number;
  to: number;
  maxBreaks: number;
  value(tree: FormulaTree, x: number): number;
  done: Map<FormulaTree, Marks>;
  /** operations on single numbers that may still be spent */
  work: number;
}

/** Work after which the search stops and says so: half a second or so. */
const MOST_WORK = 5e7;
/** A single evaluation costs as much as this many operations in a block, and so many more per node. */
const SINGLE = 400;
const SINGLE_PER_NODE = 40;
/** Breaks beyond this number are left out. */
const MOST_MARKS = 2000;

/**
 * Where a formula of one variable is not smooth: zeros and whole-number crossings of what its abs, sign, floor, ceil,
 * round, mod, min, max, comparisons, choices, roots, logarithms, fractional powers, divisions, tan, asin, acos and atan2
 * decide by, innermost first, so that each search runs where its function is smooth.
 * @param tree the formula
 * @param scope its names: one variable
 * @param parameters values in the scope's order
 * @param from lower end, finite
 * @param to upper end, above `from`
 * @param options.maxBreaks how many crossings of one part to list at most, default 400
 * @returns the breaks; each to the last bit where its function has a simple zero there. Those of a branch that is not taken
 *   are left out. What happens within (to - from)/4096 and leaves no trace in values or slopes can be missed.
 * @throws RangeError where the interval is empty or the scope has not exactly one variable.
 *   Cost: per deciding part 4096 evaluations, 0.1 ms or so, and some 12 more per break; it stops after half a second or so,
 *   with `complete` false.
 */
export function findBreaks(
  tree: FormulaTree,
  scope: FormulaScope,
  parameters: readonly number[],
  from: number,
  to: number,
  options: { maxBreaks?: number } = {},
): Breaks {
  if (!(Number.isFinite(from) && Number.isFinite(to) && from < to)) {
    throw new RangeError(`The interval is ${from} to ${to}; allowed: two finite numbers, the first smaller`);
  }
  const [variable] = scope.variables;
  const named = new Map(scope.parameters.map((name, k) => [name, parameters[k]]));
  const search: Search = {
    scope,
    parameters,
    from,
    to,
    maxBreaks: options.maxBreaks ?? 400,
    value: (part, x) => evaluatePoint(part, (name) => (name === variable ? x : (named.get(name) as number))),
    done: new Map(),
    work: MOST_WORK,
  };
  const marks = marksOf(tree, search);
  const breaks = merge(marks.breaks, MERGE * (to - from)).filter(({ at }) => inside(at, search));
  const gaps = [...marks.gaps].sort((a, b) => a.at - b.at);
  return {
    at: breaks.map(({ at }) => at),
    kinds: breaks.map(({ at, kind }) =>
      (kind === 'jump' || kind === 'pole') && meets(tree, at, search) ? 'kink' : kind,
    ),
    accumulations: gaps.map(({ at }) => at),
    gaps: gaps.map((gap) => ({ from: gap.from, to: gap.to })),
    complete: marks.complete,
  };
}

function inside(at: number, { from, to }: Search): boolean {
  const margin = MERGE * (to - from);
  return at > from + margin && at < to - margin;
}

/** The marks of a part: those of its own parts and those of its own decisions. */
function marksOf(tree: FormulaTree, search: Search): Marks {
  const known = search.done.get(tree);
  if (known !== undefined) return known;
  const marks: Marks = { breaks: [], gaps: [], complete: true };
  search.done.set(tree, marks);
  if (!varies(tree)) return marks;
  const add = (part: Marks, keep: (at: number) => boolean = () => true) => {
    for (const mark of part.breaks) if (keep(mark.at)) marks.breaks.push(mark);
    for (const gap of part.gaps) if (keep(gap.at)) addGap(marks.gaps, gap);
    marks.complete &&= part.complete;
  };
  for (const { part, keep } of partsOf(tree, search)) add(marksOf(part, search), keep);
  for (const { part, levels, kind, keep } of switchesOf(tree, (uniform) => search.value(uniform, 0))) {
    add(
      crossingsOf(part, levels, kind, search),
      (at) => keep === undefined || nearby(at, search).some((x) => search.value(keep, x) !== 0),
    );
  }
  marks.breaks = merge(marks.breaks, MERGE * (search.to - search.from));
  if (marks.breaks.length > MOST_MARKS) {
    marks.breaks.length = MOST_MARKS;
    marks.complete = false;
  }
  return marks;
}

/** The parts of a node; those of a branch count only where the branch is taken. */
function partsOf(tree: FormulaTree, search: Search): { part: FormulaTree; keep?: (at: number) => boolean }[] {
  const taken = (test: (x: number) => boolean) => (at: number) => nearby(at, search).some(test);
  switch (tree.type) {
    case 'choose':
      return [
        { part: tree.condition },
        { part: tree.yes, keep: taken((x) => search.value(tree.condition, x) !== 0) },
        { part: tree.no, keep: taken((x) => search.value(tree.condition, x) === 0) },
      ];
    case 'unary':
      return [{ part: tree.operand }];
    case 'binary':
      return [{ part: tree.left }, { part: tree.right }];
    case 'comparison':
      // What a comparison does is decided by the differences of its sides alone.
      return [];
    case 'logic':
      return tree.operator === 'not' ? [{ part: tree.operand }] : [{ part: tree.left }, { part: tree.right }];
    case 'call':
      if (tree.name === 'min' || tree.name === 'max') {
        return tree.arguments.map((part) => ({
          part,
          keep: taken((x) => !(Math.abs(search.value(part, x) - search.value(tree, x)) > 0)),
        }));
      }
      return tree.arguments.map((part) => ({ part }));
    default:
      return [];
  }
}

/** Two places just beside one, within the interval. */
function nearby(at: number, { from, to }: Search): number[] {
  const step = 4 * MERGE * (to - from);
  return [Math.max(from, at - step), Math.min(to, at + step)];
}

/** Where a part crosses its levels, between the part's own breaks. */
function crossingsOf(part: FormulaTree, levels: Levels, kind: BreakKind, search: Search): Marks {
  const { from, to, scope, parameters, maxBreaks } = search;
  const own = marksOf(part, search);
  const marks: Marks = { breaks: [], gaps: [...own.gaps], complete: own.complete };
  if (!varies(part)) return marks;
  const span = to - from;
  const curve = curveOf(part, scope, parameters);
  const poles = isPeriodic(part)
    ? new Set(own.breaks.filter((mark) => mark.kind === 'pole').map(({ at }) => at))
    : null;
  const nodes = size(part);
  const searchPanel = (low: number, high: number, lowRuns: boolean, highRuns: boolean): Crossings[] => {
    const middle = (low + high) / 2;
    if (lowRuns && highRuns)
      return [...searchPanel(low, middle, true, false), ...searchPanel(middle, high, false, true)];
    if (lowRuns || highRuns) return [searchOctaves(curve, lowRuns ? low : high, lowRuns ? high : low, levels, search)];
    const samples = Math.max(LEAST_SAMPLES, Math.ceil((SAMPLES * (high - low)) / span));
    return [findCrossings(curve, low, high, levels, samples, maxBreaks, MERGE * span)];
  };
  const bounds = [from, ...own.breaks.map(({ at }) => at).filter((at) => at > from && at < to), to];
  for (let k = 0; k + 1 < bounds.length; k++) {
    const [low, high] = [bounds[k], bounds[k + 1]];
    if (search.work <= 0 || marks.breaks.length > MOST_MARKS) {
      marks.complete = false;
      break;
    }
    if (own.gaps.some((gap) => low >= gap.from && high <= gap.to)) continue;
    const runsAway = (end: number) => poles?.has(end) === true;
    for (const found of searchPanel(low, high, runsAway(low), runsAway(high))) {
      for (const at of found.at) marks.breaks.push({ at, kind });
      for (const gap of found.accumulations) addGap(marks.gaps, gap);
      marks.complete &&= found.complete;
      search.work -= found.samples * nodes + found.singles * (SINGLE + SINGLE_PER_NODE * nodes);
    }
  }
  // At its own breaks a part may jump over a level, or have it as a one-sided value.
  for (const { at } of own.breaks) {
    if (search.work <= 0) marks.complete = false;
    if (search.work <= 0) break;
    search.work -= 2 * (SINGLE_PER_NODE * nodes);
    const [below, above] = nearby(at, search).map((x) => search.value(part, x));
    if (crosses(below, above, levels)) marks.breaks.push({ at, kind });
  }
  // A zero at an end is no crossing, but the search of what lies around this part must know of it.
  for (const end of [from, to]) {
    if (levels.kind === 'zero' && search.value(part, end) === 0) marks.breaks.push({ at: end, kind });
  }
  return marks;
}

/** Whether a part swings to and fro without end when what it depends on runs away. */
function isPeriodic(tree: FormulaTree): boolean {
  const own = tree.type === 'call' && ['sin', 'cos', 'tan', 'mod'].includes(tree.name);
  return own || children(tree).some(isPeriodic);
}

/**
 * Crossings of a part that may swing faster and faster towards `end`: octave by octave from `far`, until there are too
 * many, the samples no longer resolve them, or the distance left is below the resolution.
 */
function searchOctaves(curve: Curve, end: number, far: number, levels: Levels, search: Search): Crossings {
  const all: Crossings = { at: [], accumulations: [], complete: true, samples: 0, singles: 0 };
  const resolution = MERGE * (search.to - search.from);
  let outer = far;
  while (Math.abs(outer - end) > resolution) {
    const inner = end + (outer - end) / 2;
    const [low, high] = inner < outer ? [inner, outer] : [outer, inner];
    const found = findCrossings(curve, low, high, levels, OCTAVE_SAMPLES, search.maxBreaks, resolution);
    all.samples += found.samples;
    all.singles += found.singles;
    if (all.at.length + found.at.length > search.maxBreaks || found.at.length > OCTAVE_SAMPLES / 8) {
      all.accumulations.push({ at: end, from: Math.min(end, outer), to: Math.max(end, outer) });
      return all;
    }
    all.at.push(...found.at);
    if (curve.value(inner) === nearest(curve.value(inner), levels)) all.at.push(inner);
    outer = inner;
  }
  return all;
}

/** Whether two values just beside a break lie on different sides of a level, or on one to round-off. */
function crosses(below: number, above: number, levels: Levels): boolean {
  if (levels.kind === 'zero') return !(below * above > 0) || Math.min(Math.abs(below), Math.abs(above)) < 1e-11;
  const side = (value: number) => Math.floor(value - levels.offset);
  const level = Math.round(below - levels.offset) + levels.offset;
  return side(below) !== side(above) || Math.abs(below - level) < 1e-11 * Math.max(1, Math.abs(level));
}

function size(tree: FormulaTree): number {
  return children(tree).reduce((sum, child) => sum + size(child), 1);
}

function addGap(gaps: Marks['gaps'], gap: Marks['gaps'][number]): void {
  const same = gaps.find(({ at }) => at === gap.at);
  if (same === undefined) gaps.push({ ...gap });
  else {
    same.from = Math.min(same.from, gap.from);
    same.to = Math.max(same.to, gap.to);
  }
}

/** Sorted, with places closer than `distance` made one; the stronger kind stays. */
function merge(breaks: Marks['breaks'], distance: number): Marks['breaks'] {
  const merged: Marks['breaks'] = [];
  for (const next of [...breaks].sort((a, b) => a.at - b.at)) {
    const last = merged[merged.length - 1];
    if (last === undefined || next.at - last.at > distance) merged.push({ ...next });
    else if (STRENGTH.indexOf(next.kind) > STRENGTH.indexOf(last.kind)) merged[merged.length - 1] = { ...next };
  }
  return merged;
}

/** Whether the values on the two sides of a place meet, to round-off, and do not run away: no jump, and no pole but a hole. */
function meets(tree: FormulaTree, at: number, search: Search): boolean {
  const value = (x: number) => search.value(tree, x);
  const [below, above] = [value(nextDown(nextDown(at))), value(nextUp(nextUp(at)))];
  const [left, right] = nearby(at, search).map(value);
  const size = Math.max(Math.abs(left), Math.abs(right));
  return Math.abs(above - below) <= 1e-9 * size && Math.abs(above - right) <= 1e-6 * size;
}
