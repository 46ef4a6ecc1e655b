import { compileFormula } from '@/kernels/formula/compile-formula';
import { parseFormula } from '@/kernels/formula/parse-formula';
import type { Result, Study } from '@/kernels/index';
import type { Wanted } from './published-check';

/** What became of one expected number. Error, tolerance and uncertainty are in the tolerance's measure. */
export interface Verdict {
  readonly what: string;
  readonly got: number;
  readonly expected: number;
  readonly error: number;
  readonly allowed: number;
  readonly holds: boolean;
  /** as the result states it; null where it states none */
  readonly uncertainty: number | null;
  readonly known: number | null;
}

const PIECE = /([A-Za-z_]\w*)|\[(\d+)\]|\[(\w+)=([-+.\deE]+)\]/g;

/** The value at a path such as cases[0].density[at=5].mass; undefined where there is none. */
export function valueAt(root: unknown, path: string): unknown {
  let value = root as Record<string, unknown> | unknown[] | undefined | null;
  for (const [, name, index, key, wanted] of path.matchAll(PIECE)) {
    if (value === undefined || value === null) return undefined;
    const next = name
      ? (value as Record<string, unknown>)[name]
      : index !== undefined
        ? (value as unknown[])[Number(index)]
        : (value as Record<string, unknown>[]).find((v) => v[key] === Number(wanted));
    value = next as typeof value;
  }
  return value;
}

/**
 * Compares a result with what it should hold: one verdict per expected number. A number that is missing fails.
 * Pure: no file, no clock, no test framework.
 */
export function judge(wanted: Wanted, result: Result): Verdict[] {
  switch (wanted.kind) {
    case 'number': {
      const found = valueAt(result, wanted.path);
      return [verdict(wanted, wanted.path, numberOf(found), wanted.expected, statedOf(found))];
    }
    case 'eigenvalues':
      return eigenvalues(wanted, result);
    case 'density': {
      const d = densityAt(result, wanted.path);
      return wanted.at.map((x, i) =>
        verdict(wanted, `${wanted.path} at ${x}`, d ? densityValue(d, x) : Number.NaN, wanted.expected[i], null),
      );
    }
    case 'mean': {
      const d = densityAt(result, wanted.path);
      const value = d ? meanOf(d, formulaOf(wanted.of, result.study), wanted.window) : Number.NaN;
      return [verdict(wanted, `${wanted.path} mean of ${wanted.of}`, value, wanted.expected, null)];
    }
    case 'distance': {
      const d = densityAt(result, wanted.path);
      const value = d ? distanceOf(d, formulaOf(wanted.to, result.study)) : Number.NaN;
      return [verdict(wanted, `${wanted.path} distance to ${wanted.to}`, value, wanted.expected, null)];
    }
  }
}

function verdict(w: Wanted, what: string, got: number, expected: number, stated: number | null): Verdict {
  const scale = 'relative' in w.tolerance ? Math.abs(expected) : 1;
  const allowed = 'relative' in w.tolerance ? w.tolerance.relative : w.tolerance.absolute;
  const error = Math.abs(got - expected) / scale;
  const uncertainty = stated === null ? null : stated / scale;
  return { what, got, expected, error, allowed, holds: error <= allowed, uncertainty, known: w.known };
}

const numberOf = (v: unknown): number =>
  typeof v === 'number' ? v : typeof v === 'object' && v && 'value' in v ? Number(v.value) : Number.NaN;

function statedOf(v: unknown): number | null {
  return typeof v === 'object' && v && 'uncertainty' in v && typeof v.uncertainty === 'number' ? v.uncertainty : null;
}

interface Entry {
  re: number;
  im: number;
  uncertainty: number | null;
}

function eigenvalues(w: Wanted & { kind: 'eigenvalues' }, result: Result): Verdict[] {
  const list = [...((valueAt(result, w.path) as Entry[] | undefined) ?? [])];
  const least = Math.min(...w.expected.map(([re, im]) => Math.hypot(re, im)));
  const allowed = 'absolute' in w.tolerance ? w.tolerance.absolute : w.tolerance.relative;
  const verdicts = w.expected.map(([re, im]): Verdict => {
    const what = `${w.path} {${re}${im ? `, ${im}` : ''}}`;
    let nearest = -1;
    let error = Number.POSITIVE_INFINITY;
    list.forEach((e, i) => {
      const d = Math.hypot(e.re - re, e.im - im);
      if (d < error) [nearest, error] = [i, d];
    });
    // an eigenvalue of nothing but round-off need not be reported
    if (nearest < 0 || error > allowed)
      if (Math.hypot(re, im) <= allowed)
        return { what, got: 0, expected: 0, error: 0, allowed, holds: true, uncertainty: null, known: null };
    const [entry] = nearest < 0 ? [null] : list.splice(nearest, 1);
    return {
      what,
      got: entry?.re ?? Number.NaN,
      expected: re,
      error,
      allowed,
      holds: error <= allowed,
      uncertainty: entry?.uncertainty ?? null,
      known: w.known,
    };
  });
  for (const { re, im } of list) {
    const excess = Math.hypot(re, im) - least - 1e-6 * least;
    if (excess > allowed)
      verdicts.push({
        what: `${w.path} {${re}, ${im}} is none of those expected`,
        got: re,
        expected: Number.NaN,
        error: excess,
        allowed,
        holds: false,
        uncertainty: null,
        known: null,
      });
  }
  return verdicts;
}

interface Density {
  readonly x: readonly number[];
  readonly weights: readonly number[];
  readonly values: readonly number[];
  readonly cells: boolean;
  readonly period: number | null;
}

function densityAt(result: Result, path: string): Density | null {
  const values = (valueAt(result, path) as { values?: number[] | null } | undefined)?.values;
  const grid = valueAt(result, `${path.slice(0, path.indexOf(']') + 1)}.grid`) as
    | { x: number[][]; weights: number[][] }
    | undefined;
  if (!values || !grid) return null;
  const [{ from, to, ends }] = result.study.domain;
  const cells = result.study.noise.kind === 'none';
  return { x: grid.x[0], weights: grid.weights[0], values, cells, period: ends === 'periodic' ? to - from : null };
}

/** Nodes that a local polynomial goes through. */
const NEIGHBOURS = 14;

function densityValue(d: Density, at: number): number {
  if (d.cells) return d.values[d.x.findIndex((x, i) => Math.abs(at - x) <= d.weights[i] / 2)];
  const turns = d.period === null ? [0] : [-d.period, 0, d.period];
  const near = d.x
    .flatMap((x, i) => turns.map((t) => ({ x: x + t - at, value: d.values[i] })))
    .sort((a, b) => Math.abs(a.x) - Math.abs(b.x))
    .slice(0, NEIGHBOURS);
  const hit = near.find((n) => n.x === 0);
  if (hit) return hit.value;
  const scale = Math.abs(near[near.length - 1].x);
  let top = 0;
  let bottom = 0;
  for (const n of near) {
    const weight = near.reduce((p, m) => (m === n ? p : p / ((n.x - m.x) / scale)), 1) / n.x;
    top += weight * n.value;
    bottom += weight;
  }
  return top / bottom;
}

/** Gauss–Legendre, 5 points on [−1, 1] (Abramowitz & Stegun 1964, table 25.4, from memory). */
const NODES = [0, -0.538469310105683, 0.538469310105683, -0.906179845938664, 0.906179845938664];
const WEIGHTS = [0.568888888888889, 0.478628670499366, 0.478628670499366, 0.236926885056189, 0.236926885056189];

type Curve = (x: number) => number;

function meanOf(d: Density, g: Curve, window?: readonly [number, number]): number {
  if (!d.cells) return d.x.reduce((s, x, i) => s + d.weights[i] * d.values[i] * g(x), 0);
  return d.x.reduce((s, x, i) => {
    const low = Math.max(x - d.weights[i] / 2, window?.[0] ?? Number.NEGATIVE_INFINITY);
    const high = Math.min(x + d.weights[i] / 2, window?.[1] ?? Number.POSITIVE_INFINITY);
    if (!(high > low)) return s;
    const half = (high - low) / 2;
    return s + d.values[i] * NODES.reduce((t, node, k) => t + WEIGHTS[k] * half * g(low + half * (1 + node)), 0);
  }, 0);
}

/** Each cell by 200 midpoints: the difference changes sign inside cells. */
function distanceOf(d: Density, g: Curve): number {
  return d.x.reduce((s, x, i) => {
    let sum = 0;
    for (let k = 0; k < 200; k++) sum += Math.abs(d.values[i] - g(x + d.weights[i] * ((k + 0.5) / 200 - 0.5)));
    return s + (sum / 200) * d.weights[i];
  }, 0);
}

function formulaOf(text: string, study: Study): Curve {
  const names = Object.keys(study.system.parameters);
  const scope = { variables: study.system.variables ?? ['x'], parameters: names };
  const compiled = compileFormula(parseFormula(text, scope), scope);
  const parameters = names.map((n) => study.system.parameters[n]);
  const out = new Float64Array(1);
  return (x) => {
    compiled.evaluate([Float64Array.of(x)], parameters, out);
    return out[0];
  };
}
