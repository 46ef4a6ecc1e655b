import { type PanelGrid, panelGrid } from './panels';

/** A start density as point masses (a quadrature of it), and as values where it has any. */
export interface StartSources {
  /** positions in the domain */
  readonly x: Float64Array;
  /** mass of each; sum 1 */
  readonly mass: Float64Array;
  /** density at a position, normalised to 1; null for points and samples, which have none */
  readonly density: ((x: Float64Array) => Float64Array) | null;
}

const ORDER = 16;

/**
 * A smooth start density as masses on panels that resolve both the density and the step.
 *
 * Panels of `base` are halved where sixteen nodes do not carry the density to 1e-13 of its largest value, at most
 * fourteen times.
 *
 * @param base grid that resolves the step
 * @param cuts further positions where the density is not smooth or changes quickly
 * @param density values at positions, ≥ 0, of any integral
 * @throws RangeError where the density is negative, not a number, or has no mass
 */
export function smoothSources(
  base: PanelGrid,
  cuts: readonly number[],
  density: (x: Float64Array) => Float64Array,
): StartSources {
  const first = base.panels[0].from;
  const last = base.panels[base.panels.length - 1].to;
  const length = last - first;
  const edges = [...base.panels.map((p) => p.from), last, ...cuts.filter((c) => c > first && c < last)].sort(
    (a, b) => a - b,
  );
  const distinct = edges.filter((x, i) => i === 0 || x - edges[i - 1] > 1e-13 * length);
  const scan = density(panelGrid(distinct, ORDER).x);
  const top = scan.reduce((m, v) => Math.max(m, Math.abs(v)), 0);
  if (!(top > 0) || !Number.isFinite(top))
    throw new RangeError(
      `start density: must be finite and positive somewhere in the domain, its largest value is ${top}`,
    );
  const fine = refine(distinct, density, top, 14);
  const grid = panelGrid(fine, ORDER);
  const values = density(grid.x);
  const mass = new Float64Array(values.length);
  let total = 0;
  for (let i = 0; i < values.length; i++) {
    if (!(values[i] >= -1e-10 * top))
      throw new RangeError(
        `start density: ${values[i]} at ${grid.x[i]}; allowed: 0 and above everywhere in the domain`,
      );
    mass[i] = Math.max(0, values[i]) * grid.weights[i];
    total += mass[i];
  }
  if (!(total > 0)) throw new RangeError('start density: has no mass in the domain');
  return { x: grid.x, mass: mass.map((m) => m / total), density: (x) => density(x).map((v) => Math.max(0, v) / total) };
}

/** Halves intervals until the two halves of a rule give the integral that the whole gave. */
function refine(
  edges: readonly number[],
  density: (x: Float64Array) => Float64Array,
  top: number,
  rounds: number,
): number[] {
  const out = [edges[0]];
  const length = edges[edges.length - 1] - edges[0];
  const settle = (from: number, to: number, left: number) => {
    const whole = panelGrid([from, to], ORDER);
    const halves = panelGrid([from, from + (to - from) / 2, to], ORDER);
    const a = integral(whole, density);
    const b = integral(halves, density);
    if (left === 0 || Math.abs(a - b) <= 1e-14 * top * Math.max(to - from, 1e-3 * length)) out.push(to);
    else {
      settle(from, from + (to - from) / 2, left - 1);
      settle(from + (to - from) / 2, to, left - 1);
    }
  };
  for (let i = 0; i + 1 < edges.length; i++) settle(edges[i], edges[i + 1], rounds);
  return out;
}

function integral({ x, weights }: PanelGrid, density: (x: Float64Array) => Float64Array): number {
  return density(x).reduce((s, v, i) => s + v * weights[i], 0);
}

/** All mass at one position of the domain. */
export function pointSource(at: number): StartSources {
  return { x: Float64Array.of(at), mass: Float64Array.of(1), density: null };
}

/** Equal masses at measured positions. */
export function sampleSources(samples: readonly number[]): StartSources {
  return {
    x: Float64Array.from(samples),
    mass: new Float64Array(samples.length).fill(1 / samples.length),
    density: null,
  };
}

/** Positions that let panels follow a Gaussian: its mean and every standard deviation up to nine, inside the domain. */
export function gaussianCuts(mean: number, sd: number, from: number, to: number): number[] {
  const cuts: number[] = [];
  for (let k = -9; k <= 9; k++) if (mean + k * sd > from && mean + k * sd < to) cuts.push(mean + k * sd);
  return cuts;
}
