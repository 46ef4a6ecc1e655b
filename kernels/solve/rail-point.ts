import type { NoisySolver } from './noisy-solver';

/** What is drawn along the noise axis at one noise level; null where it does not exist. */
export interface RailPoint {
  readonly sigma: number;
  /** mean exit time from the quasi-stationary density, steps; null where nothing leaves */
  readonly meanTime: number | null;
  /** relaxation time, steps; null without a second eigenvalue */
  readonly relaxationTime: number | null;
  /** spectral gap 1 − |λ₂|/|λ₁|; null without a second eigenvalue */
  readonly gap: number | null;
  /** Lyapunov exponent, per step, natural logarithm */
  readonly lyapunov: number | null;
  /** entropy −∫ρ ln ρ of the (quasi-)stationary density */
  readonly entropy: number | null;
  /** probability of leaving per step from that density; 0 where nothing leaves */
  readonly lostPerStep: number | null;
}

/** Relative accuracy of the exit time on the rail: far below what a plot shows. */
const RAIL_TOLERANCE = 1e-7;

/**
 * Mean exit time, relaxation time, exponent and entropy at one noise level, without error bars.
 *
 * @param solver at that noise level, on a grid of any tolerance
 * @param roughAbove mean exit times above it are only bounded: an upper bound is given, at a tenth of the cost
 * @returns numbers to about 1e-7 relative; exit times at any rarity
 */
export function railPoint(solver: NoisySolver, roughAbove = Number.POSITIVE_INFINITY): RailPoint {
  const { pairs } = solver.spectrum(2);
  const ratio = pairs[1] ? Math.hypot(pairs[1].re, pairs[1].im) / Math.hypot(pairs[0].re, pairs[0].im) : 0;
  const leaving = solver.loses ? leavingRate(solver, roughAbove) : 0;
  const density = solver.stationary();
  const exponent = solver.meanStretch(density, solver.kept());
  return {
    sigma: solver.sigma,
    meanTime: leaving > 0 ? 1 / leaving : null,
    gap: ratio > 1e-12 ? 1 - ratio : null,
    entropy: -solver.integral(density.map((v) => (v > 0 ? v * Math.log(v) : 0))),
    lostPerStep: leaving,
    relaxationTime: ratio > 1e-12 ? -1 / Math.log(ratio) : null,
    lyapunov: Number.isFinite(exponent) ? exponent : null,
  };
}

function leavingRate(solver: NoisySolver, roughAbove: number): number {
  const rate = 1 - solver.kept();
  // the eigenvalue tells the rate to 1e-13: enough to know that the time is far above
  if (rate < 0.1 / roughAbove && solver.sureRate() < 0.1 / roughAbove) return solver.sureRate();
  return solver.leavingPerStep(RAIL_TOLERANCE);
}
