import { gaussLegendre } from './gauss-legendre';

/** A stretch of the domain that carries one Gauss–Legendre rule. */
export interface Panel {
  readonly from: number;
  readonly to: number;
  /** index of its first node */
  readonly first: number;
  /** number of its nodes */
  readonly order: number;
}

/** Composite Gauss–Legendre rule: nodes increasing, weights positive, panels side by side. */
export interface PanelGrid {
  readonly x: Float64Array;
  readonly weights: Float64Array;
  readonly panels: readonly Panel[];
}

/**
 * Places one Gauss–Legendre rule on each interval between consecutive edges.
 *
 * @param edges increasing positions, at least two
 * @param orders number of nodes of each interval (edges.length − 1 entries), or one number for all
 * @returns nodes and weights; ∫ f ≈ Σ weights·f with the error of each rule on its interval
 * @throws RangeError where edges do not increase
 */
export function panelGrid(edges: readonly number[], orders: number | readonly number[]): PanelGrid {
  const panels: Panel[] = [];
  let first = 0;
  for (let i = 0; i + 1 < edges.length; i++) {
    if (!(edges[i] < edges[i + 1])) throw new RangeError(`edges ${edges[i]}, ${edges[i + 1]}: must increase`);
    const order = typeof orders === 'number' ? orders : orders[i];
    panels.push({ from: edges[i], to: edges[i + 1], first, order });
    first += order;
  }
  const x = new Float64Array(first);
  const weights = new Float64Array(first);
  for (const p of panels) {
    const rule = gaussLegendre(p.order);
    const half = (p.to - p.from) / 2;
    const middle = p.from + half;
    for (let k = 0; k < p.order; k++) {
      x[p.first + k] = middle + half * rule.nodes[k];
      weights[p.first + k] = half * rule.weights[k];
    }
  }
  return { x, weights, panels };
}

/** How much of a need lies below each of the samples of a piece; made once, cut as often as wanted. */
export interface Need {
  readonly pieces: readonly number[];
  /** per piece SAMPLES + 1 increasing entries, first 0 */
  readonly cumulative: readonly Float64Array[];
}

const SAMPLES = 256;

/**
 * Samples a need, in intervals wanted per unit length, over pieces of the domain.
 *
 * @param pieces increasing positions that must be edges (domain ends, breaks, singular points)
 * @param need out ← the need at each position, > 0 and finite; it may jump at edges
 * @returns cumulative need per piece, by the midpoint rule over neighbours' maxima, so that a steep rise is not averaged away
 */
export function sampleNeed(pieces: readonly number[], need: (x: Float64Array, out: Float64Array) => void): Need {
  const count = pieces.length - 1;
  const x = new Float64Array(count * SAMPLES);
  for (let i = 0; i < count; i++) {
    const width = pieces[i + 1] - pieces[i];
    for (let k = 0; k < SAMPLES; k++) x[i * SAMPLES + k] = pieces[i] + (width * (k + 0.5)) / SAMPLES;
  }
  const raw = new Float64Array(x.length);
  need(x, raw);
  const cumulative = Array.from({ length: count }, (_, i) => {
    const own = raw.subarray(i * SAMPLES, (i + 1) * SAMPLES);
    const step = (pieces[i + 1] - pieces[i]) / SAMPLES;
    const sums = new Float64Array(SAMPLES + 1);
    for (let k = 0; k < SAMPLES; k++) {
      const local = Math.max(own[k], own[Math.max(0, k - 1)], own[Math.min(SAMPLES - 1, k + 1)]);
      sums[k + 1] = sums[k] + local * step;
    }
    return sums;
  });
  return { pieces, cumulative };
}

const intervalsOf = (sums: Float64Array, factor: number) => Math.max(1, Math.ceil(factor * sums[SAMPLES] - 1e-9));

/** Number of intervals that `cutByNeed` makes for a factor. */
export function countByNeed({ cumulative }: Need, factor: number): number {
  return cumulative.reduce((sum, sums) => sum + intervalsOf(sums, factor), 0);
}

/**
 * Cuts pieces into intervals so that each holds about the same share of the need.
 *
 * @param factor multiplies the need; a larger factor gives more intervals
 * @returns edges, pieces among them
 */
export function cutByNeed({ pieces, cumulative }: Need, factor: number): number[] {
  const edges = [pieces[0]];
  cumulative.forEach((sums, i) => {
    const step = (pieces[i + 1] - pieces[i]) / SAMPLES;
    const count = intervalsOf(sums, factor);
    let k = 0;
    for (let c = 1; c < count; c++) {
      const wanted = (c * sums[SAMPLES]) / count;
      while (sums[k + 1] < wanted) k++;
      edges.push(pieces[i] + step * (k + (wanted - sums[k]) / (sums[k + 1] - sums[k])));
    }
    edges.push(pieces[i + 1]);
  });
  return edges;
}

/**
 * Lagrange interpolation inside one panel, as weights on its nodes.
 *
 * Barycentric form of the second kind on Gauss–Legendre nodes: weights (−1)^k √((1 − x_k²) w_k).
 *
 * @param panel the panel; `at` must lie in it
 * @param out receives panel.order weights that sum to 1
 * @see J.-P. Berrut & L. N. Trefethen, Barycentric Lagrange interpolation, SIAM Rev. 46, 2004, 501, eq. (4.2) and §5;
 *   H. Wang, D. Huybrechs & S. Vandewalle, Math. Comp. 83, 2014, 2893 (weights on Legendre nodes)
 */
export function interpolationWeights(panel: Panel, at: number, out: Float64Array): void {
  const rule = gaussLegendre(panel.order);
  const t = (2 * at - panel.from - panel.to) / (panel.to - panel.from);
  let sum = 0;
  for (let k = 0; k < panel.order; k++) {
    const x = rule.nodes[k];
    if (t === x) {
      out.fill(0);
      out[k] = 1;
      return;
    }
    out[k] = ((k % 2 ? -1 : 1) * Math.sqrt((1 - x * x) * rule.weights[k])) / (t - x);
    sum += out[k];
  }
  for (let k = 0; k < panel.order; k++) out[k] /= sum;
}
