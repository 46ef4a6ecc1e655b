import { type Checkpoint, neverStop } from '../core/checkpoint';
import type { Boundary } from './ends';
import { imagesOf } from './ends';
import type { OperatorPair } from './operator-pair';

/**
 * The noisy step as direct sums over nodes: out_i = Σ_j K(x_i, y_j) w_j ρ_j, K the noise's density summed over images.
 *
 * Every term is positive, so sums keep their relative accuracy however small they are; exits are computed on it.
 * Columns are stored as stretches of the band |x_i − y_j| ≤ reach.
 *
 * - `x` increasing nodes (n), `weights` their quadrature weights (n)
 * - `images` folded images y_j of the nodes (n, see `foldImage`)
 * - `density` noise density at a distance, per unit; even
 * - `reach` distance beyond which it is left out, > 0
 * - `sourceWeights` quadrature weights of the images where these do not belong to the nodes; then `x` may be any
 *   increasing positions and `apply` takes values at the sources (`applyAdjoint` and `toDense` are for the square case)
 *
 * Cost: one density evaluation a stored entry to build, one multiplication an entry to apply. Accuracy: that of the
 * quadrature; nothing is added to it.
 */
export class DirectOperator implements OperatorPair {
  readonly size: number;
  readonly weights: Float64Array;
  /** stretch s of column source[s] covers rows low[s] … high[s] − 1 with entries from offset[s] on */
  private readonly source: Int32Array;
  private readonly low: Int32Array;
  private readonly high: Int32Array;
  private readonly offset: Int32Array;
  private readonly entries: Float64Array;
  private readonly mass: Float64Array;
  private readonly sourceWeights: Float64Array;

  constructor(
    x: Float64Array,
    weights: Float64Array,
    images: Float64Array,
    boundary: Boundary,
    density: (d: number) => number,
    reach: number,
    sourceWeights = weights,
    checkpoint: Checkpoint = neverStop,
  ) {
    const n = x.length;
    this.size = n;
    this.weights = weights;
    this.sourceWeights = sourceWeights;
    this.mass = new Float64Array(n);
    const list = imagesOf(boundary, reach);
    const whole = reach > boundary.to - boundary.from; // images overlap: one full column is cheaper than many stretches
    const source: number[] = [];
    const low: number[] = [];
    const high: number[] = [];
    const centre: number[] = [];
    for (let j = 0; j < images.length; j++) {
      const y = images[j];
      if (Number.isNaN(y)) continue;
      for (const { sign, shift } of whole ? [list[0]] : list) {
        const c = sign * (y - shift);
        const lo = whole ? 0 : lowerBound(x, c - reach);
        const hi = whole ? n : lowerBound(x, c + reach);
        if (hi <= lo) continue;
        source.push(j);
        low.push(lo);
        high.push(hi);
        centre.push(c);
      }
    }
    this.source = Int32Array.from(source);
    this.low = Int32Array.from(low);
    this.high = Int32Array.from(high);
    this.offset = new Int32Array(source.length);
    let used = 0;
    for (let s = 0; s < source.length; s++) {
      this.offset[s] = used;
      used += high[s] - low[s];
    }
    const entries = new Float64Array(used);
    for (let s = 0; s < source.length; s++) {
      if ((s & 31) === 0) checkpoint(s, source.length);
      const shift = this.offset[s] - low[s];
      const c = centre[s];
      if (whole) {
        for (const { sign, shift: by } of list)
          for (let i = 0; i < n; i++) entries[i + shift] += density(sign * x[i] + by - c);
      } else for (let i = low[s]; i < high[s]; i++) entries[i + shift] = density(x[i] - c);
    }
    this.entries = entries;
  }

  /** number of stored entries: multiplications of one `apply` */
  get entryCount(): number {
    return this.entries.length;
  }

  apply(rho: Float64Array, out: Float64Array): void {
    const { source, low, high, offset, entries, sourceWeights } = this;
    out.fill(0);
    for (let s = 0; s < source.length; s++) {
      const m = rho[source[s]] * sourceWeights[source[s]];
      if (m === 0) continue;
      const shift = offset[s] - low[s];
      for (let i = low[s]; i < high[s]; i++) out[i] += m * entries[i + shift];
    }
  }

  applyAdjoint(observable: Float64Array, out: Float64Array): void {
    const { source, low, high, offset, entries, weights, mass } = this;
    for (let i = 0; i < this.size; i++) mass[i] = observable[i] * weights[i];
    out.fill(0);
    for (let s = 0; s < source.length; s++) {
      const shift = offset[s] - low[s];
      let sum = 0;
      for (let i = low[s]; i < high[s]; i++) sum += mass[i] * entries[i + shift];
      out[source[s]] += sum;
    }
  }

  /** The kernel as a dense matrix, row-major: entry [i·n + j] takes mass at node j to the density at node i. Memory n² numbers. */
  toDense(): Float64Array {
    const n = this.size;
    const dense = new Float64Array(n * n);
    for (let s = 0; s < this.source.length; s++) {
      const shift = this.offset[s] - this.low[s];
      for (let i = this.low[s]; i < this.high[s]; i++) dense[i * n + this.source[s]] += this.entries[i + shift];
    }
    return dense;
  }
}

/** Index of the first entry of an increasing array that is not below `value`. */
function lowerBound(x: Float64Array, value: number): number {
  let lo = 0;
  let hi = x.length;
  while (lo < hi) {
    const middle = (lo + hi) >> 1;
    if (x[middle] < value) lo = middle + 1;
    else hi = middle;
  }
  return lo;
}
