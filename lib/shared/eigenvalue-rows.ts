import type { Eigenvalue } from './study-types';

export interface EigenvalueRow {
  /** "2", or "2, 3" for a conjugate pair, which stands in one row. */
  place: string;
  /** Index among the eigenvalues given. */
  index: number;
  modulus: number;
  /** In units of pi, 0 to 1; a pair has plus and minus this. */
  phase: number;
  pair: boolean;
  /** -1/ln(modulus), steps; null where the modulus is 1 within its uncertainty. */
  lasts: number | null;
  uncertainty: number | null;
  /** Of `phase` and of `lasts`, by first order from that of the eigenvalue. */
  phaseUncertainty: number | null;
  lastsUncertainty: number | null;
}

/** Rows of the table of eigenvalues: resolved ones only, in the order given, conjugate pairs once. */
export function eigenvalueRows(eigenvalues: Eigenvalue[]): EigenvalueRow[] {
  const rows: EigenvalueRow[] = [];
  let place = 0;
  for (const [index, { re, im, modulus, uncertainty, resolved, multiplicity }] of eigenvalues.entries()) {
    if (resolved === false) continue;
    const counts = multiplicity ?? 1;
    const previous = rows.at(-1);
    const other = previous && eigenvalues[previous.index];
    if (other && previous.pair && im !== 0 && other.im === -im && other.re === re && !previous.place.includes(',')) {
      place += counts;
      previous.place = `${previous.place}, ${place}`;
      continue;
    }
    place += counts;
    const logarithm = -Math.log(modulus);
    const error = uncertainty ?? 0;
    const stays = modulus >= 1 || logarithm <= error;
    rows.push({
      place: counts > 1 ? `${place - counts + 1} to ${place}` : String(place),
      index,
      modulus,
      phase: Math.abs(Math.atan2(im, re)) / Math.PI,
      pair: im !== 0,
      lasts: stays ? null : 1 / logarithm,
      uncertainty,
      // A real eigenvalue's phase is 0 or pi exactly: a small error cannot take it off the axis without its partner.
      phaseUncertainty: uncertainty === null ? null : im === 0 ? 0 : error / modulus / Math.PI,
      lastsUncertainty: uncertainty === null || stays ? null : error / modulus / logarithm ** 2,
    });
  }
  return rows;
}
