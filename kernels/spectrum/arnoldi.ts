import { Matrix } from 'ml-matrix';
import { type Checkpoint, neverStop } from '../core/checkpoint';
import { smallEigen } from './small-eigen';

/** One eigenpair as the iteration found it. */
export interface EigenPair {
  readonly re: number;
  readonly im: number;
  /** eigenvector, unit length in the weighted norm: real part, and imaginary part of a conjugate pair */
  readonly vector: Float64Array;
  readonly imaginary: Float64Array | null;
  /** ‖Lv − λv‖ / ‖v‖ as the iteration knows it */
  readonly residual: number;
  /** estimate of 1/|⟨left, right⟩| from the projected matrix */
  readonly condition: number;
}

export interface ArnoldiOptions {
  /** eigenpairs wanted, largest modulus first; one more is returned rather than a conjugate pair split */
  readonly count: number;
  /** stop when each wanted pair has a residual below this, ≥ 1e-16 */
  readonly tolerance: number;
  /** pairs of modulus below this need not converge: they are lost in round-off anyway. Default 1e-13 */
  readonly floor?: number;
  /** steps before the first restart; default 40 or 3·count + 16, whichever is more */
  readonly space?: number;
  /** restarts at most; default 60 */
  readonly restarts?: number;
  /** start vector, n entries; not zero */
  readonly start: Float64Array;
  readonly checkpoint?: Checkpoint;
}

export interface ArnoldiResult {
  readonly pairs: EigenPair[];
  /** false: the restarts ran out; pairs hold what was reached, with its residuals */
  readonly converged: boolean;
  /** applications of the operator */
  readonly steps: number;
}

/**
 * Leading eigenpairs of a linear action by Arnoldi's method with thick restart.
 *
 *     A V_m = V_m B + v_{m+1} bᵀ,   VᵀWV = 1
 *
 * Each new vector is orthogonalised twice against all before it. At a restart the wanted Ritz vectors (conjugate pairs
 * kept together) are orthonormalised and kept; B and bᵀ are projected onto them. `weights` W makes the inner product.
 *
 * @param apply out ← A v; v must not be changed
 * @param weights inner-product weights, n positive entries
 * @returns status, not an exception, where it does not converge
 * @throws RangeError for a zero start vector or a count below 1
 * @see W. E. Arnoldi, Q. Appl. Math. 9, 1951, 17; K. Wu & H. Simon, SIAM J. Matrix Anal. Appl. 22, 2000, 602 (thick
 *   restart); G. W. Stewart, SIAM J. Matrix Anal. Appl. 23, 2001, 601 (Krylov decompositions)
 */
export function arnoldi(
  apply: (v: Float64Array, out: Float64Array) => void,
  weights: Float64Array,
  options: ArnoldiOptions,
): ArnoldiResult {
  const n = weights.length;
  const { count, tolerance, floor = 1e-13, restarts = 60, checkpoint = neverStop } = options;
  if (!(count >= 1)) throw new RangeError(`count ${count}: at least one eigenpair must be asked for`);
  const space = Math.min(n, options.space ?? Math.max(40, 3 * count + 16));
  // coordinates scaled by √W make the inner product plain
  const root = weights.map(Math.sqrt);
  const basis: Float64Array[] = [];
  const plain = new Float64Array(n);
  const image = new Float64Array(n);
  const first = options.start.map((v, i) => v * root[i]);
  const size = norm(first);
  if (!(size > 0) || !Number.isFinite(size)) throw new RangeError('start vector: must be finite and not zero');
  basis.push(first.map((v) => v / size));
  let B = new Matrix(space, space);
  let b: Float64Array = new Float64Array(space); // bᵀ of the decomposition with `kept` columns
  let kept = 0;
  let steps = 0;
  for (let restart = 0; ; restart++) {
    let m = kept;
    let exact = false;
    let nextCheck = kept + Math.max(12, Math.min(16, 2 * count));
    let found: ReturnType<typeof ritz> | null = null;
    while (m < space) {
      const v = basis[m];
      for (let i = 0; i < n; i++) plain[i] = v[i] / root[i];
      apply(plain, image);
      steps++;
      checkpoint(steps, steps + space - m);
      const w = new Float64Array(n);
      for (let i = 0; i < n; i++) w[i] = image[i] * root[i];
      const before = norm(w);
      if (m === kept && kept > 0) for (let j = 0; j < kept; j++) B.set(kept, j, b[j]);
      for (let pass = 0; pass < 2; pass++) {
        const h = takeOut(w, basis, m + 1);
        for (let j = 0; j <= m; j++) B.set(j, m, B.get(j, m) + h[j]);
      }
      const rest = norm(w);
      m++;
      if (rest <= 1e-15 * Math.max(before, 1e-300) || before < 1e-300 || m === n) exact = true;
      b = new Float64Array(space);
      b[m - 1] = exact ? 0 : rest;
      if (!exact) {
        for (let i = 0; i < n; i++) w[i] /= rest;
        basis[m] = w;
        if (m < space) B.set(m, m - 1, rest);
      }
      if (exact) break;
      if (m >= nextCheck && m < space) {
        found = ritz(B, b, m);
        if (settled(found, count, tolerance, floor)) break;
        found = null;
        nextCheck = m + Math.max(6, Math.round(m / 4));
      }
    }
    found ??= ritz(B, b, m);
    const done = exact || settled(found, count, tolerance, floor);
    if (done || restart >= restarts) return { pairs: collect(found, basis, root, m, count), converged: done, steps };
    // thick restart: keep the wanted pairs and some more, never half a conjugate pair
    let keep = Math.min(m - 2, Math.max(count + 4, Math.floor(m / 2)));
    if (found.im[keep - 1] > 0) keep++;
    const Q = orthonormalColumns(found.vectors, keep);
    B = project(B, Q, m, keep, space);
    const last = basis[m];
    const fresh = combine(basis, Q, m, keep);
    const kb = new Float64Array(space);
    for (let j = 0; j < keep; j++) for (let i = 0; i < m; i++) kb[j] += b[i] * Q[j][i];
    b = kb;
    basis.length = 0;
    basis.push(...fresh, last);
    kept = keep;
  }
}

function ritz(B: Matrix, b: Float64Array, m: number) {
  const eigen = smallEigen(B.subMatrix(0, m - 1, 0, m - 1));
  const residual = new Float64Array(m);
  for (let j = 0; j < m; j++) {
    const pair = eigen.im[j] > 0;
    let re = 0;
    let im = 0;
    for (let i = 0; i < m; i++) {
      re += b[i] * eigen.vectors.get(i, j);
      if (pair) im += b[i] * eigen.vectors.get(i, j + 1);
    }
    residual[j] = Math.hypot(re, im);
    if (pair) residual[++j] = Math.hypot(re, im);
  }
  return { ...eigen, residual };
}

function settled(found: ReturnType<typeof ritz>, count: number, tolerance: number, floor: number): boolean {
  const m = found.re.length;
  if (m < count) return false;
  for (let j = 0; j < count; j++) {
    if (found.residual[j] > tolerance && Math.hypot(found.re[j], found.im[j]) > floor) return false;
  }
  return true;
}

function collect(
  found: ReturnType<typeof ritz>,
  basis: Float64Array[],
  root: Float64Array,
  m: number,
  count: number,
): EigenPair[] {
  const pairs: EigenPair[] = [];
  const n = root.length;
  let j = 0;
  while (j < m && j < count) {
    const pair = found.im[j] > 0;
    const columns = pair ? [j, j + 1] : [j];
    const parts = columns.map((c) => {
      const v = new Float64Array(n);
      for (let i = 0; i < m; i++) addTo(v, found.vectors.get(i, c), basis[i]);
      for (let i = 0; i < n; i++) v[i] /= root[i];
      return v;
    });
    const common = { residual: found.residual[j], condition: found.condition[j], vector: parts[0] };
    pairs.push({ re: found.re[j], im: found.im[j], imaginary: parts[1] ?? null, ...common });
    if (pair) pairs.push({ re: found.re[j], im: -found.im[j], imaginary: parts[1].map((v) => -v), ...common });
    j += columns.length;
  }
  return pairs;
}

/** Columns 0 … keep − 1 of `vectors`, orthonormalised twice over; array of columns. */
function orthonormalColumns(vectors: Matrix, keep: number): Float64Array[] {
  const columns: Float64Array[] = [];
  for (let j = 0; j < keep; j++) {
    const v = Float64Array.from({ length: vectors.rows }, (_, i) => vectors.get(i, j));
    for (let pass = 0; pass < 2; pass++) for (const q of columns) addTo(v, -dot(q, v), q);
    const size = norm(v);
    if (size < 1e-14) {
      // dependent on those before it (a defective pair): any direction outside their span serves as well
      v.fill(0);
      v[j] = 1;
      for (let pass = 0; pass < 2; pass++) for (const q of columns) addTo(v, -dot(q, v), q);
    }
    const unit = norm(v);
    columns.push(v.map((c) => c / unit));
  }
  return columns;
}

/** QᵀBQ in the corner of a zero matrix of the full space. */
function project(B: Matrix, Q: Float64Array[], m: number, keep: number, space: number): Matrix {
  const out = new Matrix(space, space);
  for (let c = 0; c < keep; c++) {
    const column = new Float64Array(m);
    for (let i = 0; i < m; i++) for (let k = 0; k < m; k++) column[i] += B.get(i, k) * Q[c][k];
    for (let r = 0; r < keep; r++) out.set(r, c, dot(Q[r], column));
  }
  return out;
}

function combine(basis: Float64Array[], Q: Float64Array[], m: number, keep: number): Float64Array[] {
  const n = basis[0].length;
  return Q.slice(0, keep).map((q) => {
    const v = new Float64Array(n);
    for (let i = 0; i < m; i++) addTo(v, q[i], basis[i]);
    return v;
  });
}

/**
 * w ← w − Σ h_j basis_j with h_j = ⟨basis_j, w⟩ (classical Gram–Schmidt; twice over it is as good as the modified one).
 * Works through the vectors in blocks that stay in the processor's cache, two basis vectors at a time.
 */
function takeOut(w: Float64Array, basis: readonly Float64Array[], count: number): Float64Array {
  const BLOCK = 1024;
  const n = w.length;
  const h = new Float64Array(count);
  for (let from = 0; from < n; from += BLOCK) {
    const to = Math.min(n, from + BLOCK);
    let j = 0;
    for (; j + 1 < count; j += 2) {
      const a = basis[j];
      const b = basis[j + 1];
      let s = 0;
      let t = 0;
      for (let i = from; i < to; i++) {
        s += a[i] * w[i];
        t += b[i] * w[i];
      }
      h[j] += s;
      h[j + 1] += t;
    }
    if (j < count) {
      const a = basis[j];
      let s = 0;
      for (let i = from; i < to; i++) s += a[i] * w[i];
      h[j] += s;
    }
  }
  for (let from = 0; from < n; from += BLOCK) {
    const to = Math.min(n, from + BLOCK);
    let j = 0;
    for (; j + 1 < count; j += 2) {
      const a = basis[j];
      const b = basis[j + 1];
      const s = h[j];
      const t = h[j + 1];
      for (let i = from; i < to; i++) w[i] -= s * a[i] + t * b[i];
    }
    if (j < count) {
      const a = basis[j];
      const s = h[j];
      for (let i = from; i < to; i++) w[i] -= s * a[i];
    }
  }
  return h;
}

function dot(a: Float64Array, b: Float64Array): number {
  let s0 = 0;
  let s1 = 0;
  let i = 0;
  for (; i + 1 < a.length; i += 2) {
    s0 += a[i] * b[i];
    s1 += a[i + 1] * b[i + 1];
  }
  return i < a.length ? s0 + s1 + a[i] * b[i] : s0 + s1;
}

function norm(a: Float64Array): number {
  return Math.sqrt(dot(a, a));
}

function addTo(out: Float64Array, factor: number, a: Float64Array): void {
  for (let i = 0; i < out.length; i++) out[i] += factor * a[i];
}
