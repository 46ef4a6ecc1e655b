import { type Checkpoint, neverStop } from '../core/checkpoint';
import type { MapModel } from '../core/map-model';
import { solveMonotone } from '../grid/solve-monotone';
import type { Boundary } from './ends';
import type { OperatorPair } from './operator-pair';

/**
 * The step without noise on n equal cells: the fraction of each cell's mass that the map carries into every other.
 *
 *     P_ij = |C_j ∩ F⁻¹(C_i)| / |C_j|
 *
 * Images are exact: every cell is cut at breaks and critical points, and where an image crosses a cell edge the
 * preimage is solved for. Densities are cell averages. Mass is conserved, what an absorbing end takes is in `lost`.
 * Cost: |F'| solves a cell to build, about |F'| + 1 multiplications a cell to apply.
 *
 * @see S. M. Ulam, A Collection of Mathematical Problems, Interscience 1960, ch. VI §4
 */
export class CellOperator implements OperatorPair {
  readonly size: number;
  readonly weights: Float64Array;
  /** middles of the cells */
  readonly x: Float64Array;
  /** fraction of each cell's mass that leaves the domain in one step; a sum of positive parts */
  readonly lost: Float64Array;
  private readonly column: Int32Array;
  private readonly row: Int32Array;
  private readonly share: Float64Array;

  /**
   * @param cells number of cells, 2 up
   * @throws RangeError where an image crosses more than 64 times the domain in one cell (a slope without bound)
   */
  constructor(model: MapModel, boundary: Boundary, cells: number, checkpoint: Checkpoint = neverStop) {
    const { from, to } = boundary;
    const h = (to - from) / cells;
    this.size = cells;
    this.weights = new Float64Array(cells).fill(h);
    this.x = Float64Array.from({ length: cells }, (_, i) => from + h * (i + 0.5));
    this.lost = new Float64Array(cells);
    const parts = monotoneParts(model, boundary, cells);
    const crossings = crossingsOf(parts, boundary, cells);
    const solved = solveMonotone(
      (x, out, slope) => model.evaluate(x, out, slope),
      crossings.low,
      crossings.high,
      crossings.atLow,
      crossings.target,
      checkpoint,
    );
    this.column = new Int32Array(cells + 1);
    const row: number[] = [];
    const share: number[] = [];
    // parts come cell by cell: entries of one column are gathered, then sorted and added up
    let gathered: { row: number; share: number }[] = [];
    const close = (column: number) => {
      gathered.sort((a, b) => a.row - b.row);
      gathered.forEach((entry, i) => {
        if (i > 0 && gathered[i - 1].row === entry.row) share[share.length - 1] += entry.share;
        else {
          row.push(entry.row);
          share.push(entry.share);
        }
      });
      gathered = [];
      this.column[column + 1] = row.length;
    };
    const put = (column: number, image: number, length: number) => {
      const target = cellOf(image, boundary, cells);
      if (target < 0) this.lost[column] += length / h;
      else gathered.push({ row: target, share: length / h });
    };
    let c = 0;
    let open = 0;
    for (const part of parts) {
      while (open < part.cell) close(open++);
      const rising = part.valueHigh >= part.valueLow;
      let left = part.low;
      let k = part.first;
      for (let q = 0; q < part.count; q++) {
        // between two crossings the image stays in one cell, whose index is known without rounding
        put(part.cell, rising ? k - 1 : k, Math.max(0, solved[c] - left));
        left = Math.max(left, solved[c]);
        k += rising ? 1 : -1;
        c++;
      }
      put(part.cell, part.count === 0 ? part.only : rising ? k - 1 : k, Math.max(0, part.high - left));
    }
    while (open < cells) close(open++);
    checkpoint(cells, cells);
    this.row = Int32Array.from(row);
    this.share = Float64Array.from(share);
  }

  apply(rho: Float64Array, out: Float64Array): void {
    const { column, row, share } = this;
    out.fill(0);
    for (let j = 0; j < this.size; j++) {
      const m = rho[j];
      if (m === 0) continue;
      for (let e = column[j]; e < column[j + 1]; e++) out[row[e]] += share[e] * m;
    }
  }

  applyAdjoint(observable: Float64Array, out: Float64Array): void {
    const { column, row, share } = this;
    for (let j = 0; j < this.size; j++) {
      let sum = 0;
      for (let e = column[j]; e < column[j + 1]; e++) sum += share[e] * observable[row[e]];
      out[j] = sum;
    }
  }

  /** Entry [i·n + j]: density carried to cell i by mass at the middle of cell j, per unit; as `DirectOperator.toDense`. */
  toDense(): Float64Array {
    const n = this.size;
    const dense = new Float64Array(n * n);
    for (let j = 0; j < n; j++)
      for (let e = this.column[j]; e < this.column[j + 1]; e++)
        dense[this.row[e] * n + j] += this.share[e] / this.weights[j];
    return dense;
  }
}

/**
 * How often the images of all cells together cross the domain: entries of a cell matrix are about this times the cells.
 *
 * @param model the map; sampled at 1024 cells
 * @param boundary domain and ends
 * @returns total variation of the map over the length of the domain, what lies beyond absorbing ends left out
 */
export function crossingsOfDomain(model: MapModel, boundary: Boundary): number {
  const SAMPLES = 1024;
  const parts = monotoneParts(model, boundary, SAMPLES);
  const { from, to } = boundary;
  const clip = (v: number) =>
    boundary.low === 'absorbing' && boundary.high === 'absorbing' ? Math.min(to, Math.max(from, v)) : v;
  return parts.reduce((sum, p) => sum + Math.abs(clip(p.valueHigh) - clip(p.valueLow)), 0) / (to - from);
}

/** A stretch inside one cell on which the map is monotone. */
interface Part {
  cell: number;
  low: number;
  high: number;
  valueLow: number;
  valueHigh: number;
  /** first crossed edge, counted from the lower end of the stretch; count of crossed edges; cell of the image where none is */
  first: number;
  count: number;
  only: number;
}

function monotoneParts(model: MapModel, { from, to }: Boundary, cells: number): Part[] {
  const h = (to - from) / cells;
  const scale = Math.max(Math.abs(from), Math.abs(to));
  const step = 4e-16 * scale;
  const cuts = [from, ...[...model.breaks, ...model.singular].sort((a, b) => a - b), to].filter(
    (x, i, all) => i === 0 || x - all[i - 1] > 8 * step,
  );
  const low: number[] = [];
  const high: number[] = [];
  for (let i = 0; i + 1 < cuts.length; i++) {
    let left = cuts[i];
    for (let j = Math.floor((cuts[i] - from) / h) + 1; j < cells; j++) {
      const edge = from + j * h;
      if (edge <= left + 8 * step) continue;
      if (edge >= cuts[i + 1] - 8 * step) break;
      low.push(left);
      high.push(edge);
      left = edge;
    }
    low.push(left);
    high.push(cuts[i + 1]);
  }
  // one-sided values: a hair inside, so that a jump at a break is seen from the right side
  const inner = (x: number, towards: number) =>
    towards > x ? Math.min(x + step, (x + towards) / 2) : Math.max(x - step, (x + towards) / 2);
  const at = Float64Array.from([...low.map((x, i) => inner(x, high[i])), ...high.map((x, i) => inner(x, low[i]))]);
  const value = new Float64Array(at.length);
  model.evaluate(at, value);
  return low.map((x, i) => ({
    cell: Math.min(cells - 1, Math.max(0, Math.floor(((x + high[i]) / 2 - from) / h))),
    low: x,
    high: high[i],
    valueLow: value[i],
    valueHigh: value[low.length + i],
    first: 0,
    count: 0,
    only: 0,
  }));
}

/** Edges (from + k·h) that each part's image crosses; fills in the parts' counts. */
function crossingsOf(parts: Part[], boundary: Boundary, cells: number) {
  const { from, to } = boundary;
  const h = (to - from) / cells;
  const bothLose = !boundary.periodic && boundary.low === 'absorbing' && boundary.high === 'absorbing';
  const low: number[] = [];
  const high: number[] = [];
  const atLow: number[] = [];
  const target: number[] = [];
  const hair = 1e-9; // of a cell, far above rounding of an edge's number: an image that only touches an edge does not cross it
  for (const part of parts) {
    const a = (part.valueLow - from) / h;
    const b = (part.valueHigh - from) / h;
    let bottom = Math.ceil(Math.min(a, b) + hair);
    let top = Math.floor(Math.max(a, b) - hair);
    part.only = Math.floor((a + b) / 2);
    if (bothLose) {
      bottom = Math.max(bottom, 0);
      top = Math.min(top, cells);
    }
    const count = top - bottom + 1;
    if (!(count > 0)) continue;
    if (!(count <= 64 * cells))
      throw new RangeError(
        `slope of the map near ${part.low}: its image crosses the domain more than 64 times within one cell`,
      );
    part.count = count;
    part.first = b >= a ? bottom : top;
    for (let q = 0; q < count; q++) {
      low.push(part.low);
      high.push(part.high);
      atLow.push(part.valueLow);
      target.push(from + h * (b >= a ? bottom + q : top - q));
    }
  }
  return {
    low: Float64Array.from(low),
    high: Float64Array.from(high),
    atLow: Float64Array.from(atLow),
    target: Float64Array.from(target),
  };
}

/** Folds the index of a cell on the unfolded line into the domain; −1 where it is lost. */
function cellOf(index: number, boundary: Boundary, cells: number): number {
  if (index >= 0 && index < cells) return index;
  if (boundary.periodic) return ((index % cells) + cells) % cells;
  const { low, high } = boundary;
  if (low === 'reflecting' && high === 'reflecting') {
    const u = ((index % (2 * cells)) + 2 * cells) % (2 * cells);
    return u < cells ? u : 2 * cells - 1 - u;
  }
  const mirrored =
    index < 0 && low === 'reflecting'
      ? -1 - index
      : index >= cells && high === 'reflecting'
        ? 2 * cells - 1 - index
        : -1;
  return mirrored >= 0 && mirrored < cells ? mirrored : -1;
}
