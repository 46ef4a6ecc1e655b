import { type Checkpoint, neverStop } from '../core/checkpoint';
import type { MapModel } from '../core/map-model';
import { type ExitSolution, solveExit } from '../exits/exit-solution';
import { panelGrid } from '../grid/panels';
import type { StartSources } from '../grid/start-sources';
import type { CellOperator } from '../operators/cell-operator';
import { type Boundary, loses } from '../operators/ends';
import { stretchGrid, stretchWeight } from '../operators/noisy-plan';
import { type ArnoldiResult, arnoldi } from '../spectrum/arnoldi';
import { seededStart } from './noisy-solver';

/** Residual at which cells' eigenpairs count as found; far below what moving the cell edges does. */
const RESIDUAL = 1e-11;

/** One map without noise on equal cells; each number is computed when first asked for. */
export class CellSolver {
  readonly operator: CellOperator;
  readonly loses: boolean;
  private readonly model: MapModel;
  private readonly boundary: Boundary;
  private readonly checkpoint: Checkpoint;
  private pairs: ArnoldiResult | null = null;
  private solved: ExitSolution | null = null;
  private stretches: Float64Array | null = null;

  constructor(operator: CellOperator, model: MapModel, boundary: Boundary, checkpoint: Checkpoint = neverStop) {
    this.operator = operator;
    this.model = model;
    this.boundary = boundary;
    this.loses = loses(boundary) && operator.lost.some((p) => p > 0);
    this.checkpoint = checkpoint;
  }

  /** Leading eigenpairs of the cell matrix. */
  spectrum(count: number): ArnoldiResult {
    if (!this.pairs || this.pairs.pairs.length < count) {
      const { operator } = this;
      this.pairs = arnoldi((v, out) => operator.apply(v, out), operator.weights, {
        count,
        tolerance: RESIDUAL,
        restarts: 30,
        start: seededStart(operator.size),
        checkpoint: this.checkpoint,
      });
    }
    return this.pairs;
  }

  /** Density of the leading real positive eigenvalue, integral 1, per cell; round-off below zero is clipped. */
  stationary(): Float64Array {
    const { pairs } = this.spectrum(1);
    const { vector } = pairs.find((p) => p.im === 0 && p.re > 0) ?? pairs[0];
    const total = this.integral(vector);
    return vector.map((v) => Math.max(0, v / total));
  }

  kept(): number {
    return this.spectrum(1).pairs[0].re;
  }

  /** Exits by positive sums; throws RangeError where nothing can leave. */
  exit(): ExitSolution {
    if (!this.solved) {
      const { pairs } = this.spectrum(2);
      const second = pairs[1] ? Math.hypot(pairs[1].re, pairs[1].im) / Math.hypot(pairs[0].re, pairs[0].im) : 0;
      this.solved = solveExit(
        this.operator,
        this.operator.lost,
        this.stationary(),
        Math.min(1, second),
        this.checkpoint,
      );
    }
    return this.solved;
  }

  /** Mass of a start in each cell, as a density (mass / cell length). */
  binned(start: StartSources): Float64Array {
    const { size, weights } = this.operator;
    const { from, to } = this.boundary;
    const out = new Float64Array(size);
    for (let i = 0; i < start.x.length; i++) {
      const cell = Math.min(size - 1, Math.max(0, Math.floor(((start.x[i] - from) / (to - from)) * size)));
      out[cell] += start.mass[i] / weights[cell];
    }
    return out;
  }

  /** ∫ ln|F'| f dx for a density given per cell; singular points integrated on a ladder of panels. */
  meanStretch(f: Float64Array): number {
    this.stretches ??= cellStretches(this.model, this.boundary, this.operator.size);
    let sum = 0;
    for (let i = 0; i < f.length; i++) if (f[i] !== 0) sum += this.stretches[i] * f[i];
    return sum;
  }

  integral(f: Float64Array): number {
    let sum = 0;
    for (let i = 0; i < f.length; i++) sum += f[i] * this.operator.weights[i];
    return sum;
  }
}

/** ∫ ln|F'| dx over each cell. */
function cellStretches(model: MapModel, boundary: Boundary, cells: number): Float64Array {
  const { from, to } = boundary;
  const h = (to - from) / cells;
  const edges = [
    ...Array.from({ length: cells }, (_, i) => from + i * h),
    to,
    ...model.breaks,
    ...model.stretchSingular,
  ].sort((a, b) => a - b);
  const distinct = edges.filter((x, i) => i === 0 || x - edges[i - 1] > 1e-12 * h);
  const grid = stretchGrid(panelGrid(distinct, 6), model.stretchSingular);
  const logs = new Float64Array(grid.x.length);
  model.stretch(grid.x, logs);
  const out = new Float64Array(cells);
  for (let i = 0; i < grid.x.length; i++) {
    const cell = Math.min(cells - 1, Math.max(0, Math.floor((grid.x[i] - from) / h)));
    out[cell] += stretchWeight(grid.weights[i], logs[i], grid.x[i], model, boundary);
  }
  return out;
}
