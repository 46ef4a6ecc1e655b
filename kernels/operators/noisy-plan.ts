import { type Checkpoint, neverStop } from '../core/checkpoint';
import type { MapModel } from '../core/map-model';
import { prepareSpread, type Spread } from '../fft/spread-kernel';
import { type PanelGrid, panelGrid } from '../grid/panels';
import { planPanels } from '../grid/plan-panels';
import type { NoiseKind } from '../noise/noise-kind';
import { DirectOperator } from './direct-operator';
import { type Boundary, foldImage } from './ends';
import { Push, SpreadOperator } from './spread-operator';

/** Noise levels within this ratio share a plan, so that a drag of sigma reuses the push. */
const LEVEL = Math.SQRT2;

/**
 * All of a noisy map that does not depend on the exact noise level: grid, images, push, and the quadrature of ln|F'|.
 *
 * Made for the range of sigma that shares its level (half an octave); operators for any sigma in it cost little more.
 */
export class NoisyPlan {
  readonly grid: PanelGrid;
  readonly images: Float64Array;
  readonly push: Push;
  readonly resolved: boolean;
  readonly enough: number;
  readonly boundary: Boundary;
  readonly noise: NoiseKind;
  readonly model: MapModel;
  private stretching: { x: Float64Array; targets: Spread; weights: Float64Array } | null = null;

  /**
   * @param sigma a noise level of the range; > 0
   * @param request number of points or tolerance, see `planPanels`
   * @param factor 1, or the refinement of the comparing grid
   */
  constructor(
    model: MapModel,
    boundary: Boundary,
    noise: NoiseKind,
    sigma: number,
    request: { points: number } | { tolerance: number },
    factor: number,
    checkpoint: Checkpoint = neverStop,
  ) {
    const [smallest, largest] = levelOf(sigma);
    // a grid of a stated size is laid out for the very sigma; "auto" for the smallest of the level
    const laidFor = 'points' in request ? sigma : smallest;
    const plan = planPanels(model, boundary, laidFor, request, factor, noise.reach * largest);
    checkpoint(1, 3);
    this.model = model;
    this.boundary = boundary;
    this.noise = noise;
    this.grid = plan.grid;
    this.resolved = plan.resolved;
    this.enough = plan.enough;
    const images = new Float64Array(plan.grid.x.length);
    model.evaluate(plan.grid.x, images);
    this.images = images.map((y) => foldImage(boundary, y));
    checkpoint(2, 3);
    this.push = new Push(
      plan.grid.x,
      plan.grid.weights,
      this.images,
      extentOf(model, boundary, plan.grid),
      boundary,
      smallest,
      largest,
      noise.reach,
    );
  }

  /** The noisy step for one sigma of the range, by FFT. */
  spreadOperator(sigma: number): SpreadOperator {
    return new SpreadOperator(this.push, (q) => this.noise.transform(q, sigma));
  }

  /** The same step by direct sums, keeping entries as far as `multiples` of sigma; the noise's full reach by default. */
  directOperator(sigma: number, multiples = this.noise.fullReach, checkpoint: Checkpoint = neverStop): DirectOperator {
    const { x, weights } = this.grid;
    return new DirectOperator(
      x,
      weights,
      this.images,
      this.boundary,
      (d) => this.noise.density(d, sigma),
      multiples * sigma,
      weights,
      checkpoint,
    );
  }

  /** Reading stencils of any positions of the domain, for `SpreadOperator.read`. */
  targetsAt(positions: Float64Array): Spread {
    return prepareSpread(
      positions.map((x) => (x - this.push.anchor) / this.push.spacing),
      this.push.convolution.length,
    );
  }

  /**
   * Nodes and weights with ∫ ln|F'(x)| ρ(x) dx ≈ Σ weights·ρ(nodes): panels of the grid, graded geometrically towards
   * each point where F' is zero or unbounded. Error 1e-15 of ∫|ln|F'|| for a smooth ρ.
   */
  stretch(): { x: Float64Array; targets: Spread; weights: Float64Array } {
    if (!this.stretching) {
      const fine = stretchGrid(this.grid, this.model.stretchSingular);
      const logs = new Float64Array(fine.x.length);
      this.model.stretch(fine.x, logs);
      const weights = fine.weights.map((w, i) => stretchWeight(w, logs[i], fine.x[i], this.model, this.boundary));
      this.stretching = { x: fine.x, targets: this.targetsAt(fine.x), weights };
    }
    return this.stretching;
  }
}

/** Lowest and highest folded image of the domain; extremes lie at panel edges, seen from inside either panel. */
function extentOf(model: MapModel, boundary: Boundary, { panels }: PanelGrid): [number, number] {
  const hair = 1e-12 * (boundary.to - boundary.from);
  const x = Float64Array.from(panels.flatMap((p) => [p.from + hair, p.to - hair]));
  const y = new Float64Array(x.length);
  model.evaluate(x, y);
  let low = Number.POSITIVE_INFINITY;
  let high = Number.NEGATIVE_INFINITY;
  for (const image of y) {
    const folded = foldImage(boundary, image);
    if (folded < low) low = folded;
    if (folded > high) high = folded;
  }
  return [low, high];
}

/**
 * Weight of a node in the quadrature of ln|F'|. A slope that rounds to zero beside a critical point weighs nothing; one
 * that is zero elsewhere belongs to a flat stretch, where the mean is −∞.
 *
 * @param weight quadrature weight of the node
 * @param log ln|F'| there, −∞ where the slope rounds to zero
 * @param x the node
 */
export function stretchWeight(weight: number, log: number, x: number, model: MapModel, { from, to }: Boundary): number {
  if (log !== Number.NEGATIVE_INFINITY) return weight * log;
  return model.stretchSingular.some((c) => Math.abs(c - x) <= 1e-9 * (to - from)) ? 0 : Number.NEGATIVE_INFINITY;
}

/** Number of the half octave of noise levels that holds sigma: noise levels with the same number share a plan. */
export function levelIndex(sigma: number): number {
  return Math.floor(2 * Math.log2(sigma) + 1e-12);
}

/** The half octave of noise levels that holds sigma, as [smallest, largest]. */
export function levelOf(sigma: number): [number, number] {
  const level = levelIndex(sigma);
  return [Math.min(sigma, LEVEL ** level), Math.max(sigma, LEVEL ** (level + 1))];
}

/** The grid's panels, those that touch a singular point replaced by a ladder of panels four times smaller at each rung. */
export function stretchGrid(grid: PanelGrid, singular: readonly number[]): PanelGrid {
  if (singular.length === 0) return grid;
  const RUNGS = 25; // 4^-25 = 9e-16 of the panel is left out
  const edges: number[] = [grid.panels[0].from];
  const orders: number[] = [];
  const scale = grid.panels[grid.panels.length - 1].to - grid.panels[0].from;
  const touches = (x: number) => singular.some((s) => Math.abs(s - x) <= 1e-13 * scale);
  for (const p of grid.panels) {
    const width = p.to - p.from;
    const low = touches(p.from);
    const high = touches(p.to);
    const inner: number[] = [];
    const reach = low && high ? width / 2 : width;
    if (low) for (let k = RUNGS; k >= 1; k--) inner.push(p.from + reach / 4 ** k);
    if (low && high) inner.push(p.from + reach);
    if (high) for (let k = 1; k <= RUNGS; k++) inner.push(p.to - reach / 4 ** k);
    for (const edge of [...inner, p.to]) {
      if (!(edge > edges[edges.length - 1])) continue;
      edges.push(edge);
      orders.push(low || high ? 20 : p.order);
    }
  }
  return panelGrid(edges, orders);
}
