import { erf } from '../core/erf';

/**
 * The remainder with the sign of the divisor, mod(a, b) = a - b*floor(a/b), without the rounding of a/b: it jumps exactly
 * where a is a multiple of b.
 * @param a any number
 * @param b the divisor, not 0 (gives not-a-number)
 * @returns from 0 up to b (down to b where b < 0); exact but for a tiny a on the far side of 0, which may round to b
 */
export function modulo(a: number, b: number): number {
  // For a divisor of 1 the difference is exact, and much faster than the remainder operator.
  if (b === 1) return a - Math.floor(a);
  const rest = a % b;
  return rest !== 0 && rest < 0 !== b < 0 ? rest + b : rest;
}

/**
 * The nearest integer, halves away from zero: round(2.5) = 3, round(-2.5) = -3.
 * @param a any number
 * @returns an integer of a's sign; exact
 */
export function roundHalfAway(a: number): number {
  // Adding 1/2 would carry 0.49999999999999994 up to 1.
  const whole = Math.trunc(a);
  return Math.abs(a - whole) >= 0.5 ? whole + Math.sign(a) : whole;
}

/** Integer powers up to this size are products; beyond it their round-off would exceed that of the library's power. */
const MOST_FACTORS = 16;

/**
 * The real power a^p; integer powers up to 16 by multiplication.
 * @param a the base; negative with an integer p only (else not-a-number)
 * @param p the exponent; a^0 = 1 for every a
 * @returns the power, to a few units in the last place
 */
export function power(a: number, p: number): number {
  if (p === 2) return a * a;
  if (p === 3) return a * a * a;
  if (!Number.isInteger(p) || Math.abs(p) > MOST_FACTORS) return a ** p;
  let result = 1;
  let square = a;
  for (let rest = Math.abs(p); rest > 0; rest >>= 1) {
    if (rest & 1) result *= square;
    square *= square;
  }
  return p < 0 ? 1 / result : result;
}

/**
 * Both of two conditions: 0 where one fails, even if the other is not a number; not-a-number where that leaves it open.
 * @param a a condition: 0 fails, other numbers hold
 * @param b another
 * @returns 1, 0 or not-a-number
 */
export function both(a: number, b: number): number {
  if (a === 0 || b === 0) return 0;
  return Number.isNaN(a) || Number.isNaN(b) ? Number.NaN : 1;
}

/**
 * One of two conditions: 1 where one holds, even if the other is not a number; not-a-number where that leaves it open.
 * @param a a condition: 0 fails, other numbers hold
 * @param b another
 * @returns 1, 0 or not-a-number
 */
export function either(a: number, b: number): number {
  if ((a !== 0 && !Number.isNaN(a)) || (b !== 0 && !Number.isNaN(b))) return 1;
  return Number.isNaN(a) || Number.isNaN(b) ? Number.NaN : 0;
}

/** The functions of one argument, real: not-a-number outside their domain. */
export const UNARY = {
  exp: Math.exp,
  log: Math.log,
  log10: Math.log10,
  sqrt: Math.sqrt,
  cbrt: Math.cbrt,
  abs: Math.abs,
  sign: Math.sign,
  floor: Math.floor,
  ceil: Math.ceil,
  round: roundHalfAway,
  sin: Math.sin,
  cos: Math.cos,
  tan: Math.tan,
  asin: Math.asin,
  acos: Math.acos,
  atan: Math.atan,
  sinh: Math.sinh,
  cosh: Math.cosh,
  tanh: Math.tanh,
  erf,
} as const;
