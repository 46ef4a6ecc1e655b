import type { Quantity } from '../result';

/**
 * A quantity with an error bar from a second computation; null where either number is not finite.
 *
 * @param value the number itself
 * @param uncertainty its error bar, ≥ 0; null where none was computed (uncertainties switched off): then 0 is stored
 */
export function bound(value: number, uncertainty: number | null): Quantity | null {
  if (!Number.isFinite(value) || (uncertainty !== null && !Number.isFinite(uncertainty))) return null;
  return { value, uncertainty: uncertainty ?? 0, kind: 'bound' };
}

/**
 * Error bar of a number that two grids gave: twice their difference while they agree well, five times where they do not
 * (then convergence is slow and the difference understates the error), and never below a few units in the last place.
 *
 * @param value from the grid that is reported
 * @param other from the finer grid; null: none
 * @param floor what round-off alone may do, absolute
 */
export function errorBar(value: number, other: number | null, floor: number): number | null {
  if (other === null) return null;
  const difference = Math.abs(value - other);
  const close = difference <= 1e-9 * Math.max(Math.abs(value), 1e-9);
  return (close ? 2 : 5) * difference + floor;
}
