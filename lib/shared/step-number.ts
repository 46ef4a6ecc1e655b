/** Moves a number by whole steps; a coarse step is ten fine ones. The result has no digits that the step has not. */
export type Stepper = (value: number, steps: number) => number;

export interface Bounds {
  min: number;
  max: number;
}

export const COARSE = 10;

/** A thousandth of `size`, rounded down to a power of ten: 0.001 for a range of 0 to 4. */
export function linearStepper(bounds: Bounds, size = bounds.max - bounds.min): Stepper {
  const exponent = Number.isFinite(size) && size > 0 ? Math.floor(Math.log10(size)) - 3 : -3;
  const decimals = Math.min(Math.max(-exponent, 0), 20);
  return (value, steps) => clamp(Number((value + steps * 10 ** exponent).toFixed(decimals)), bounds);
}

/** A step is one in the third significant digit: 0.012 goes to 0.0121, 0.999 to 1. */
export function digitStepper({ min, max }: Bounds): Stepper {
  return (value, steps) => {
    let moved = value === 0 ? Math.sign(steps) * 1e-3 : value;
    for (let left = value === 0 ? Math.abs(steps) - 1 : Math.abs(steps); left > 0; left--) {
      const up = steps > 0 === moved > 0;
      // At a power of ten the step below is ten times finer: 0.1 goes down to 0.0999.
      const exponent = Number(Math.abs(moved).toExponential(2).split('e')[1]);
      const mantissa = Math.round(Math.abs(moved) / 10 ** (exponent - 2));
      const fine = !up && mantissa === 100 ? exponent - 3 : exponent - 2;
      const size = Math.round(Math.abs(moved) / 10 ** fine) + (up ? 1 : -1);
      moved = Math.sign(moved) * threeDigits(size * 10 ** fine);
    }
    return clamp(moved, { min, max });
  };
}

export function threeDigits(value: number): number {
  return Number(value.toPrecision(3));
}

export function clamp(value: number, { min, max }: Bounds): number {
  return Math.min(Math.max(value, min), max);
}
