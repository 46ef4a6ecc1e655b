/*
 * erf and erfc to the last digits, from three expansions whose terms are all of one sign or nearly so:
 *   |x| < 1/2      erf by its power series (Abramowitz & Stegun 1964, 7.1.5; seen from memory)
 *   1/2 <= x < 9   erfcx(x) = exp(x^2) erfc(x) by Taylor's series around the nearest multiple of 1/4. Its coefficients are
 *                  the repeated integrals of erfc (7.2.1, 7.2.9), c_n = (-2)^n exp(x^2) i^n erfc(x), whose ratios come from
 *                  the three-term recurrence (7.2.5) run downwards, where every term is positive and no digit is lost
 *   9 <= x         the continued fraction (7.1.14), which is the same recurrence
 */

const TWO_OVER_ROOT_PI = 2 / Math.sqrt(Math.PI);
const SPACING = 0.25;
const FIRST = 0.5;
const LAST = 9;
const TERMS = 18;

/** exp(x^2) i^n erfc(x) for n = 0 … count-1, x > 0: i^(n-1)/i^n = 2x + 2(n+1) * (i^(n+1)/i^n), from n = start downwards. */
function repeatedIntegrals(x: number, count: number, start: number): Float64Array {
  const values = new Float64Array(count);
  let ratio = 0;
  for (let n = start; n >= 0; n--) {
    ratio = 1 / (2 * x + 2 * (n + 1) * ratio);
    if (n < count) values[n] = ratio;
  }
  let value = TWO_OVER_ROOT_PI;
  for (let n = 0; n < count; n++) {
    value *= values[n];
    values[n] = value;
  }
  return values;
}

function buildTable(): Float64Array {
  const nodes = Math.round((LAST - FIRST) / SPACING) + 1;
  const table = new Float64Array(nodes * TERMS);
  for (let k = 0; k < nodes; k++) {
    // A start at n is forgotten by n = 0 as exp(-2 x sqrt(2n)): 800/x^2 steps down leave exp(-80).
    const x = FIRST + k * SPACING;
    const integrals = repeatedIntegrals(x, TERMS, Math.ceil(800 / (x * x)) + TERMS);
    for (let n = 0; n < TERMS; n++) table[k * TERMS + n] = (-2) ** n * integrals[n];
  }
  return table;
}

const TABLE = buildTable();

/** exp(-x^2) without the error of rounding x^2: x = head + rest, head of 24 bits, so that head^2 is exact. */
function gaussian(x: number): number {
  const head = Math.fround(x);
  return Math.exp(-head * head) * Math.exp(-(x - head) * (x + head));
}

/** The power series of erf, |x| < 1/2: (2/sqrt(pi)) sum (-1)^n x^(2n+1) / (n! (2n+1)). */
function series(x: number): number {
  const square = x * x;
  let sum = 0;
  let power = 1;
  for (let n = 1; n < 16; n++) {
    power *= -square / n;
    sum += power / (2 * n + 1);
  }
  return TWO_OVER_ROOT_PI * (x + x * sum);
}

/**
 * The scaled complementary error function, erfcx(x) = exp(x^2) erfc(x), for x >= 0.
 * @param x 0 to Infinity, no unit
 * @returns a number from 1 down to 0, relative error below 4e-16 or so; not-a-number where x is negative.
 *   Cost: 18 multiplications and additions up to 9, some 30 divisions beyond.
 * Source: Abramowitz & Stegun, Handbook of Mathematical Functions, 1964, 7.1.14, 7.2.5 and 7.2.9 (from memory).
 */
export function erfcx(x: number): number {
  if (!(x >= 0)) return Number.NaN;
  if (x < FIRST) return Math.exp(x * x) * (1 - series(x));
  if (x >= LAST) {
    let ratio = 0;
    for (let n = 28; n >= 0; n--) ratio = 1 / (2 * x + 2 * (n + 1) * ratio);
    return TWO_OVER_ROOT_PI * ratio;
  }
  const k = Math.round((x - FIRST) / SPACING);
  const step = x - FIRST - k * SPACING;
  const row = k * TERMS;
  let sum = 0;
  for (let n = TERMS - 1; n >= 1; n--) sum = (sum + TABLE[row + n]) * step;
  return TABLE[row] + sum;
}

/**
 * The error function, erf(x) = 2/sqrt(pi) * integral of exp(-t^2) from 0 to x.
 * @param x any number, no unit
 * @returns -1 to 1, odd in x; relative error below 3e-16 or so everywhere, also close to 0. Cost: some 20 multiplications.
 * Source: Abramowitz & Stegun, Handbook of Mathematical Functions, 1964, 7.1.1, 7.1.5 (from memory).
 */
export function erf(x: number): number {
  const size = Math.abs(x);
  if (size < FIRST) return series(x);
  if (size > 6) return Math.sign(x);
  const value = 1 - gaussian(size) * erfcx(size);
  return x < 0 ? -value : value;
}

/**
 * The complementary error function, erfc(x) = 1 - erf(x), without the subtraction: true to the last digits however small.
 * @param x any number, no unit
 * @returns 0 to 2; relative error below 1e-15 down to values of 1e-300 (x = 26.2), 0 from x = 27.3 on.
 *   Cost: two exponentials and 18 multiplications.
 * Source: Abramowitz & Stegun, Handbook of Mathematical Functions, 1964, 7.1.2, 7.1.14, 7.2.5 (from memory).
 */
export function erfc(x: number): number {
  if (x < FIRST) return x > -FIRST ? 1 - series(x) : x < -6 ? 2 : 2 - gaussian(x) * erfcx(-x);
  return x > 28 ? 0 : gaussian(x) * erfcx(x);
}
