import type { MapModel } from '../core/map-model';
import { type Boundary, loses } from '../operators/ends';
import { countByNeed, cutByNeed, type Need, type PanelGrid, panelGrid, sampleNeed } from './panels';

/** Nodes of a panel where the count is free. */
export const PANEL_ORDER = 16;
/** Points that "auto" takes at most: an operator step then costs about 3 ms. */
export const MOST_POINTS = 65_536;
/** Panels that the whole domain has at least, so that a density can be drawn and interpolated. */
const LEAST_PANELS = 16;
/** Ratio of neighbouring panels towards a point where F' is unbounded. */
const GRADING = 4;

/**
 * Widths of a 16-point panel, in units of sigma/√(1 + F'²), for a tolerance in eigenvalues.
 *
 * The integrand g(y − F(x)) ρ(x) is a Gaussian of that width; the rule's error is about I₁₆(z)e⁻ᶻ with z = (W/4)²,
 * 1e-14 at W = 6. Measured on the logistic map, r = 3.8, sigma 0.001 to 0.1: 2e-14 at 6, 6e-14 at 7, 8e-13 at 8.
 */
export function panelWidth(tolerance: number): number {
  if (tolerance <= 1e-8) return 6;
  return tolerance <= 1e-6 ? 7 : 8;
}

/** Positions that must be panel edges: ends, breaks, singular points, and a geometric ladder towards unbounded slopes. */
function pieces(model: MapModel, { from, to }: Boundary): number[] {
  const length = to - from;
  const edges = new Set<number>([from, to, ...model.breaks, ...model.singular]);
  for (const c of model.singular) {
    if (!steepAt(model, c, from, to)) continue;
    for (const side of [-1, 1]) {
      const limit =
        side < 0
          ? Math.max(from, ...model.breaks.filter((b) => b < c))
          : Math.min(to, ...model.breaks.filter((b) => b > c));
      for (let step = Math.abs(limit - c) / GRADING; step > 1e-13 * length; step /= GRADING) edges.add(c + side * step);
    }
  }
  const sorted = [...edges].filter((x) => x >= from && x <= to).sort((a, b) => a - b);
  return sorted.filter((x, i) => i === 0 || x - sorted[i - 1] > 1e-14 * length);
}

/** true where |F'| grows without bound towards c, judged by its growth over four decades of distance. */
function steepAt(model: MapModel, c: number, from: number, to: number): boolean {
  const length = to - from;
  const x = Float64Array.of(c - 1e-7 * length, c + 1e-7 * length, c - 1e-3 * length, c + 1e-3 * length);
  const value = new Float64Array(4);
  const slope = new Float64Array(4);
  model.evaluate(x, value, slope);
  return [0, 1].some((k) => x[k] >= from && x[k] <= to && Math.abs(slope[k]) > 10 * Math.abs(slope[k + 2]));
}

/** Panels wanted per unit length for noise of one sigma. */
function needOf(
  model: MapModel,
  boundary: Boundary,
  sigma: number,
  width: number,
  reach: number,
  steepest = Number.POSITIVE_INFINITY,
): Need {
  const { from, to } = boundary;
  const least = LEAST_PANELS / (to - from);
  return sampleNeed(pieces(model, boundary), (x, out) => {
    const value = new Float64Array(x.length);
    const slope = new Float64Array(x.length);
    model.evaluate(x, value, slope);
    for (let i = 0; i < x.length; i++) {
      // what is carried far beyond an absorbing end is lost whatever its slope
      const away = loses(boundary) ? Math.max(from - value[i], value[i] - to, 0) : 0;
      const stretch = Number.isFinite(slope[i]) && away <= 2 * reach ? Math.min(Math.abs(slope[i]), steepest) : 0;
      out[i] = Math.max(least, Math.sqrt(1 + stretch * stretch) / (width * sigma));
    }
  });
}

/** The grid that a noise level needs is beyond what is affordable. */
export class TooManyPoints extends RangeError {
  readonly points: number;
  /** noise level from which the grid is affordable, about */
  readonly allowed: number;

  constructor(sigma: number, points: number) {
    const allowed = (sigma * points) / MOST_POINTS;
    super(
      `sigma ${sigma}: needs ${points} points; allowed are at most ${MOST_POINTS}, enough for sigma from ${allowed} up`,
    );
    this.name = 'TooManyPoints';
    this.points = points;
    this.allowed = allowed;
  }
}

const slopeUnbounded = (model: MapModel, { from, to }: Boundary) =>
  model.singular.some((c) => steepAt(model, c, from, to));

/**
 * The grid where a slope grows without bound and the ends fold every image back: panels follow slopes up to the steepest
 * that is affordable, and what little mass lies beyond is carried to images that are right only in number.
 */
function blurred(
  model: MapModel,
  boundary: Boundary,
  sigma: number,
  width: number,
  reach: number,
  factor: number,
  enough: number,
): PanelPlan {
  for (let steepest = 1e8; steepest >= 10; steepest /= 2) {
    const need = needOf(model, boundary, sigma, width, reach, steepest);
    if (PANEL_ORDER * countByNeed(need, factor) > MOST_POINTS / 4) continue;
    return { grid: panelGrid(cutByNeed(need, factor), PANEL_ORDER), resolved: false, enough };
  }
  throw new TooManyPoints(sigma, enough);
}

export interface PanelPlan {
  readonly grid: PanelGrid;
  /** false: the asked number of points is below what the noise and the map need */
  readonly resolved: boolean;
  /** points that the default tolerance would take */
  readonly enough: number;
}

/**
 * Chooses a composite Gauss–Legendre grid for a noisy map: panels as wide as noise and slope allow, edges where the map
 * is not smooth, finer towards unbounded slopes.
 *
 * @param sigma noise level, > 0, units of the variable
 * @param request number of points, or the tolerance that "auto" shall meet
 * @param factor multiplies the number of panels or points; 1.2 makes the finer grid that uncertainties come from
 * @param reach absolute distance beyond which the noise counts as zero
 * @returns grid; for a number of points exactly that many (times factor, rounded) unless the edges alone need more
 * @throws TooManyPoints where "auto" would need more than MOST_POINTS points
 */
export function planPanels(
  model: MapModel,
  boundary: Boundary,
  sigma: number,
  request: { points: number } | { tolerance: number },
  factor: number,
  reach: number,
): PanelPlan {
  const auto = 'tolerance' in request;
  const width = panelWidth(auto ? request.tolerance : 1e-8);
  const need = needOf(model, boundary, sigma, width, reach);
  const enough = PANEL_ORDER * countByNeed(need, 1);
  if (auto) {
    if (enough > MOST_POINTS) {
      if (slopeUnbounded(model, boundary)) return blurred(model, boundary, sigma, width, reach, factor, enough);
      throw new TooManyPoints(sigma, enough);
    }
    return { grid: panelGrid(cutByNeed(need, factor), PANEL_ORDER), resolved: true, enough };
  }
  const pieceCount = need.pieces.length - 1;
  const points = Math.max(Math.round(request.points * factor), 4 * pieceCount);
  const wanted = Math.max(pieceCount, Math.round(points / PANEL_ORDER));
  let low = 1e-9;
  let high = 1e9;
  while (high / low > 1.0001) {
    const middle = Math.sqrt(low * high);
    if (countByNeed(need, middle) > wanted) high = middle;
    else low = middle;
  }
  const edges = cutByNeed(need, low);
  const count = edges.length - 1;
  const orders = Array.from(
    { length: count },
    (_, i) => Math.floor(((i + 1) * points) / count) - Math.floor((i * points) / count),
  );
  return { grid: panelGrid(edges, orders), resolved: points >= 0.75 * factor * enough, enough };
}
