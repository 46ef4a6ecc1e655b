import type { Eigenvalue, Quantity } from '../result';
import type { EigenPair } from '../spectrum/arnoldi';
import { bound } from './quantity';

const EPS = 2.220446049250313e-16;

/**
 * Eigenvalues as a result states them, largest modulus first; one whose modulus is below its uncertainty is left out.
 *
 * Uncertainty: residual and round-off times the condition number, and the distance to the partner that the other grid
 * gave, times two while the two agree well and five where they do not. An eigenvalue so ill-conditioned that round-off alone
 * may have made it is left out as well.
 *
 * @param pairs from the grid that is reported
 * @param other from the second grid; null: no uncertainties
 * @param norm of the operator, about 1, for the round-off part
 */
export function spectrumEntries(
  pairs: readonly EigenPair[],
  other: readonly EigenPair[] | null,
  norm: number,
): Eigenvalue[] {
  const free = other ? [...other] : null;
  const entries: Eigenvalue[] = [];
  for (const p of pairs) {
    const modulus = Math.hypot(p.re, p.im);
    // round-off times condition is a first-order estimate; where it nears the eigenvalue itself, a nilpotent part has been
    // turned into a ring of small eigenvalues, none of which exists
    if (EPS * norm * p.condition > 0.01 * modulus) continue;
    let uncertainty: number | null = null;
    if (free) {
      const distance = takeNearest(free, p);
      const roundOff = (p.residual + EPS * norm) * Math.max(1, p.condition);
      uncertainty = (distance <= 1e-9 ? 2 : 5) * distance + roundOff;
      if (!(uncertainty < modulus)) continue;
    } else if (modulus < 1e-13 * norm) continue;
    entries.push({ re: p.re, im: p.im, modulus, residual: p.residual, uncertainty, multiplicity: 1 });
  }
  return entries;
}

/**
 * Distance to the nearest eigenvalue of another computation, which is then taken off the list: each serves once.
 *
 * @param partners eigenvalues not yet taken; the nearest is removed
 * @param p the eigenvalue that looks for its partner
 * @returns at most 1, the operator's norm
 */
export function takeNearest(partners: { re: number; im: number }[], p: { re: number; im: number }): number {
  let nearest = -1;
  let least = 1;
  partners.forEach((q, i) => {
    const d = Math.hypot(p.re - q.re, p.im - q.im);
    if (d < least) [nearest, least] = [i, d];
  });
  if (nearest >= 0) partners.splice(nearest, 1);
  return least;
}

/**
 * Spectral gap 1 − |λ₂|/|λ₁| and relaxation time −1/ln(|λ₂|/|λ₁|) in steps, with propagated uncertainties.
 *
 * @param entries eigenvalues, largest modulus first; null for both where there is no second one above its uncertainty
 */
export function gapOf(entries: readonly Eigenvalue[]): { gap: Quantity | null; relaxationTime: Quantity | null } {
  const [first, second] = entries;
  if (!first || !second) return { gap: null, relaxationTime: null };
  const ratio = second.modulus / first.modulus;
  const blur =
    first.uncertainty === null || second.uncertainty === null
      ? null
      : (second.uncertainty + ratio * first.uncertainty) / first.modulus;
  const log = Math.log(ratio);
  return {
    gap: bound(1 - ratio, blur),
    relaxationTime: bound(-1 / log, blur === null ? null : blur / (ratio * log * log)),
  };
}
