import { type Checkpoint, neverStop } from '../core/checkpoint';

/**
 * Mean absorption times and quasi-stationary law of an absorbing chain without a subtraction.
 *
 * States are eliminated one by one; each state's escape probability is summed, not taken as 1 − P_kk, so every number
 * keeps its relative accuracy (about n·eps) however rare the exit is.
 *
 * - P[j·n + i] probability j → i per step, ≥ 0; overwritten by the factors
 * - exit[j] probability that j leaves per step, ≥ 0; Σ_i P_ji + exit_j = 1 up to rounding
 *
 * Cost: n³/3 multiplications, memory the matrix itself.
 *
 * @see W. K. Grassmann, M. I. Taksar & D. P. Heyman, Regenerative analysis and steady state distributions for Markov
 *   chains, Oper. Res. 33, 1985, 1107; C. A. O'Cinneide, Numer. Math. 65, 1993, 109 (entrywise accuracy)
 */
export class Elimination {
  private readonly n: number;
  private readonly P: Float64Array;
  private readonly leaving: Float64Array;

  /** @throws RangeError where the sizes do not fit, or some state can never leave */
  constructor(P: Float64Array, exit: Float64Array, checkpoint: Checkpoint = neverStop) {
    const n = exit.length;
    if (P.length !== n * n) throw new RangeError(`matrix of ${P.length} entries for ${n} states: allowed is n·n`);
    const leave = Float64Array.from(exit);
    this.n = n;
    this.P = P;
    this.leaving = new Float64Array(n);
    for (let k = n - 1; k >= 0; k--) {
      let leaving = leave[k];
      const row = k * n;
      for (let i = 0; i < k; i++) leaving += P[row + i];
      if (!(leaving > 0)) throw new RangeError(`state ${k}: can never leave the domain`);
      this.leaving[k] = leaving;
      for (let j = 0; j < k; j++) {
        const to = j * n;
        const p = P[to + k];
        if (p === 0) continue;
        const factor = p / leaving;
        P[to + k] = factor;
        for (let i = 0; i < k; i++) P[to + i] += factor * P[row + i];
        leave[j] += factor * leave[k];
      }
      if ((k & 15) === 0) checkpoint(n - k, n);
    }
  }

  /** Solves (1 − P) τ = b for b ≥ 0: with b = 1 the mean number of steps to the exit, the exiting one counted. */
  times(b: Float64Array): Float64Array {
    const { n, P, leaving } = this;
    const t = Float64Array.from(b);
    for (let k = n - 1; k > 0; k--) for (let j = 0; j < k; j++) t[j] += P[j * n + k] * t[k];
    for (let k = 0; k < n; k++) {
      let sum = t[k];
      for (let i = 0; i < k; i++) sum += P[k * n + i] * t[i];
      t[k] = sum / leaving[k];
    }
    return t;
  }

  /** Solves m (1 − P) = c for c ≥ 0: expected visits from an initial law c. */
  visits(c: Float64Array): Float64Array {
    const { n, P, leaving } = this;
    const m = Float64Array.from(c);
    for (let k = n - 1; k >= 0; k--) {
      m[k] /= leaving[k];
      const row = k * n;
      for (let i = 0; i < k; i++) m[i] += m[k] * P[row + i];
    }
    for (let k = 1; k < n; k++) {
      let sum = m[k];
      for (let j = 0; j < k; j++) sum += m[j] * P[j * n + k];
      m[k] = sum;
    }
    return m;
  }
}
