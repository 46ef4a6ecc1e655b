import { type Checkpoint, neverStop } from '../core/checkpoint';
import type { MapModel } from '../core/map-model';
import { panelGrid } from '../grid/panels';
import type { NoiseKind } from '../noise/noise-kind';
import { DirectOperator } from '../operators/direct-operator';
import { type Boundary, foldImage } from '../operators/ends';
import { arnoldi, type EigenPair } from '../spectrum/arnoldi';
import { seededStart } from './noisy-solver';

/** Nodes beyond which the second way is not run: its matrix is dense. */
export const SECOND_WAY_POINTS = 900;

/** The operator on one Gauss–Legendre rule per smooth piece, its kernel as a dense matrix. */
export interface DenseWay {
  readonly points: number;
  readonly pairs: EigenPair[];
  /** first eigenfunction, integral 1, at any positions (Nyström's interpolation) */
  density(x: Float64Array): Float64Array;
}

/**
 * Spectrum and stationary density by Nyström's method on other nodes, without FFT, spreading or panels: an independent
 * check of the main path for small problems.
 *
 * @param points about how many nodes, shared among the pieces by length; null is returned above SECOND_WAY_POINTS
 * @param count eigenpairs wanted
 * @returns null where the problem is too large or has panels graded towards unbounded slopes
 * @see E. J. Nyström, Acta Math. 54, 1930, 185; K. E. Atkinson, The Numerical Solution of Integral Equations of the
 *   Second Kind, 1997, §4.1
 */
export function denseWay(
  model: MapModel,
  boundary: Boundary,
  noise: NoiseKind,
  sigma: number,
  points: number,
  count: number,
  checkpoint: Checkpoint = neverStop,
): DenseWay | null {
  if (points > SECOND_WAY_POINTS) return null;
  const { from, to } = boundary;
  const cuts = [from, ...model.breaks, ...model.singular, to]
    .sort((a, b) => a - b)
    .filter((x, i, all) => i === 0 || x - all[i - 1] > 1e-13 * (to - from));
  if (cuts.length > 20) return null;
  const orders = cuts
    .slice(1)
    .map((end, i) => Math.min(512, Math.max(16, Math.round((points * (end - cuts[i])) / (to - from)))));
  const grid = panelGrid(cuts, orders);
  const images = new Float64Array(grid.x.length);
  model.evaluate(grid.x, images);
  const folded = images.map((y) => foldImage(boundary, y));
  const kernel = (d: number) => noise.density(d, sigma);
  const reach = noise.reach * sigma;
  const operator = new DirectOperator(grid.x, grid.weights, folded, boundary, kernel, reach, grid.weights, checkpoint);
  const found = arnoldi((v, out) => operator.apply(v, out), grid.weights, {
    count,
    tolerance: 2e-14,
    start: seededStart(grid.x.length),
    checkpoint,
  });
  const { vector, re } = found.pairs[0];
  const total = vector.reduce((s, v, i) => s + v * grid.weights[i], 0);
  return {
    points: grid.x.length,
    pairs: found.pairs,
    density: (x) => {
      const at = new DirectOperator(
        x,
        new Float64Array(x.length).fill(1),
        folded,
        boundary,
        kernel,
        reach,
        grid.weights,
      );
      const out = new Float64Array(x.length);
      at.apply(
        vector.map((v) => v / (total * re)),
        out,
      );
      return out;
    },
  };
}
