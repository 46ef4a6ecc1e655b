import { type Checkpoint, neverStop } from '../core/checkpoint';
import type { OperatorPair } from '../operators/operator-pair';
import { Elimination } from './elimination';

/** Exits of one operator; densities and fields on its nodes. */
export interface ExitSolution {
  /** quasi-stationary density, integral 1 */
  readonly density: Float64Array;
  /** probability of leaving per step from that density, 0 to 1; relative accuracy kept at any rarity */
  readonly perStep: number;
  /** mean number of steps to the exit from each node, the exiting step counted */
  readonly field: Float64Array;
  /** false: density and rate did not settle; the field stands nevertheless where it came from elimination */
  readonly converged: boolean;
  readonly fieldConverged: boolean;
}

/** An operator whose entries are at hand as positive numbers. */
export interface PositiveOperator extends OperatorPair {
  toDense(): Float64Array;
}

/** Nodes up to which elimination is always used, and up to which it is used where sweeps would be slow. */
const ALWAYS = 260;
const AT_MOST = 3000;

/**
 * Rate, mean times and quasi-stationary density of an operator that loses mass, by positive sums only.
 *
 *     rate per step = Σ w ρ p,   (1 − L†) τ = 1
 *
 * Small problems, and those with a second slow mode, by elimination without subtractions; large ones by sweeps of the
 * positive operator from a good start: ρ ← Lρ/|Lρ|, and τ = h/rate + Σ L†ⁿ g with h the invariant observable.
 *
 * @param operator direct sums or cells: every entry positive
 * @param leave probability of leaving in one step from each node, 0 to 1
 * @param density estimate of the first eigenfunction (any sign and size; negative round-off is clipped)
 * @param second modulus of the second eigenvalue relative to the first, 0 to 1
 * @throws RangeError where nothing can leave
 */
export function solveExit(
  operator: PositiveOperator,
  leave: Float64Array,
  density: Float64Array,
  second: number,
  checkpoint: Checkpoint = neverStop,
): ExitSolution {
  if (!leave.some((p) => p > 0))
    throw new RangeError(
      'exit: no probability of leaving anywhere; the ends let nothing out, or exits are rarer than 1e-300',
    );
  const n = operator.size;
  const slow = second > 0.98;
  if (n <= ALWAYS || (slow && n <= AT_MOST)) return byElimination(operator, leave, density, checkpoint);
  const swept = bySweeps(operator, leave, density, checkpoint);
  if ((swept.converged && swept.fieldConverged) || n > AT_MOST) return swept;
  return byElimination(operator, leave, density, checkpoint);
}

/**
 * Exits by elimination, n³/3 multiplications; see `Elimination`.
 *
 * @param operator every entry positive; read as a dense matrix
 * @param leave probability of leaving in one step from each node
 * @param density estimate of the quasi-stationary density, improved by inverse iteration
 */
export function byElimination(
  operator: PositiveOperator,
  leave: Float64Array,
  density: Float64Array,
  checkpoint: Checkpoint = neverStop,
): ExitSolution {
  const { size: n, weights } = operator;
  const dense = operator.toDense();
  const P = new Float64Array(n * n);
  for (let i = 0; i < n; i++) for (let j = 0; j < n; j++) P[j * n + i] = weights[i] * dense[i * n + j];
  const elimination = new Elimination(P, leave, checkpoint);
  const field = elimination.times(new Float64Array(n).fill(1));
  let mass: Float64Array = clip(density, weights).map((v, i) => v * weights[i]);
  let perStep = 0;
  let converged = false;
  for (let pass = 0; pass < 200 && !converged; pass++) {
    const next = elimination.visits(mass);
    const total = sum(next);
    let change = 0;
    let out = 0;
    for (let i = 0; i < n; i++) {
      next[i] /= total;
      out += next[i] * leave[i];
      change = Math.max(change, Math.abs(next[i] - mass[i]));
    }
    // the sum that leaves is carried by the tails: both it and the bulk must stand
    converged = pass > 1 && Math.abs(out - perStep) <= 4e-15 * out && change <= 1e-14;
    mass = next;
    perStep = out;
  }
  return { density: mass.map((m, i) => m / weights[i]), perStep, field, converged, fieldConverged: true };
}

/** Sweeps at most; a second mode of 0.98 has died to round-off by then. */
const MOST_SWEEPS = 4000;

/**
 * Probability of leaving per step from the quasi-stationary density, by sweeps of positive sums ρ ← Lρ/|Lρ|.
 *
 *     rate per step = Σ w ρ p
 *
 * Keeps its relative accuracy at any rarity: nothing is subtracted. Where the start is good in the bulk, a sweep mends
 * the tails by one jump; a handful serve for 1e-8, some tens for the last digit.
 *
 * @param leave probability of leaving in one step from each node
 * @param density estimate of the quasi-stationary density, any sign and size
 * @param tolerance relative change per sweep below which the rate counts as settled, four times over
 * @returns density of integral 1, rate, and whether it settled
 */
export function rateBySweeps(
  operator: OperatorPair,
  leave: Float64Array,
  density: Float64Array,
  tolerance = 1e-14,
  checkpoint: Checkpoint = neverStop,
): { density: Float64Array; perStep: number; converged: boolean } {
  const { size: n, weights } = operator;
  let rho: Float64Array = clip(density, weights);
  let next: Float64Array = new Float64Array(n);
  let perStep = 0;
  let steady = 0;
  for (let pass = 0; pass < MOST_SWEEPS && steady < 4; pass++) {
    operator.apply(rho, next);
    const total = dot(next, weights);
    for (let i = 0; i < n; i++) next[i] /= total;
    const out = dot(next, weights, leave);
    steady = Math.abs(out - perStep) <= tolerance * out ? steady + 1 : 0;
    perStep = out;
    [rho, next] = [next, rho];
    checkpoint(pass, MOST_SWEEPS);
  }
  return { density: rho, perStep, converged: steady >= 4 };
}

/**
 * Exits by sweeps of positive sums: n·band multiplications a sweep, as many sweeps as the second mode takes to die.
 *
 * @param operator every entry positive
 * @param leave probability of leaving in one step from each node
 * @param density estimate of the quasi-stationary density
 */
export function bySweeps(
  operator: OperatorPair,
  leave: Float64Array,
  density: Float64Array,
  checkpoint: Checkpoint = neverStop,
): ExitSolution {
  const { size: n, weights } = operator;
  const rate = rateBySweeps(operator, leave, density, 1e-14, checkpoint);
  const { density: rho, perStep } = rate;
  // the invariant observable by the same sweeps of the adjoint, scaled to ⟨h, ρ⟩ = 1
  let h: Float64Array = new Float64Array(n).fill(1);
  let fresh: Float64Array = new Float64Array(n);
  let gap = 1;
  for (let pass = 0; pass < MOST_SWEEPS && gap > 2e-15; pass++) {
    operator.applyAdjoint(h, fresh);
    const size = dot(fresh, weights, rho);
    gap = 0;
    for (let i = 0; i < n; i++) {
      fresh[i] /= size;
      gap = Math.max(gap, Math.abs(fresh[i] - h[i]) / Math.max(1e-3, h[i]));
    }
    [h, fresh] = [fresh, h];
    checkpoint(pass, MOST_SWEEPS);
  }
  // what 1 has beside h dies like the second mode
  let term: Float64Array = h.map((v) => 1 - v);
  const field = h.map((v) => v / perStep);
  let largest = 1;
  for (let pass = 0; pass < MOST_SWEEPS && largest > 1e-17; pass++) {
    largest = 0;
    const drift = dot(term, weights, rho);
    for (let i = 0; i < n; i++) {
      term[i] -= drift * h[i];
      field[i] += term[i];
      largest = Math.max(largest, Math.abs(term[i]) / Math.max(1, field[i]));
    }
    operator.applyAdjoint(term, fresh);
    [term, fresh] = [fresh, term];
    checkpoint(pass, MOST_SWEEPS);
  }
  const fieldConverged = rate.converged && gap <= 1e-13 && largest <= 1e-13;
  return { density: rho, perStep, field, converged: rate.converged, fieldConverged };
}

/** Positive part of an eigenfunction, whatever sign it came with, as a density of integral 1. */
function clip(density: Float64Array, weights: Float64Array): Float64Array {
  const sign = dot(density, weights) < 0 ? -1 : 1;
  const positive = density.map((v) => Math.max(0, sign * v));
  const total = dot(positive, weights);
  return total > 0 ? positive.map((v) => v / total) : weights.map(() => 1 / sum(weights));
}

const sum = (a: Float64Array) => a.reduce((s, v) => s + v, 0);

/** Σ a·weights, or Σ a·weights·b. */
function dot(a: Float64Array, weights: Float64Array, b?: Float64Array): number {
  let s = 0;
  if (b) for (let i = 0; i < a.length; i++) s += a[i] * weights[i] * b[i];
  else for (let i = 0; i < a.length; i++) s += a[i] * weights[i];
  return s;
}
