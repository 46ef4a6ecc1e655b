/**
 * The one place where numbers become text. Notation is that of the files (a point, a plain minus, `2.16e23`), so that
 * what is copied from a page can be pasted anywhere. `parseNumber` reads everything written here.
 */

export interface FormatOptions {
  /** Largest half-width of the true value's interval; null where none is known (then `digits` alone limits the text). */
  uncertainty?: number | null;
  /** Most significant digits shown: 6 in running places, 15 in readouts and tables. */
  digits?: number;
  /** Words for a number that could not be had. */
  absent?: string;
}

export const COMPACT_DIGITS = 6;
export const ALL_DIGITS = 15;
export const NBSP = '\u00a0';

/**
 * Digits of a number without its unit: no digit beyond the uncertainty, at most `digits` significant ones, thousands
 * spaced, never "-0". Plain notation from 1e-4 up to the last known digit, else scientific.
 */
export function formatDigits(value: number | null | undefined, options: FormatOptions = {}): string {
  const { uncertainty = null, digits = COMPACT_DIGITS, absent = 'not known' } = options;
  if (value === null || value === undefined || !Number.isFinite(value)) return absent;
  if (value === 0) return '0';
  const place = uncertainty !== null && uncertainty > 0 ? uncertaintyPlace(uncertainty) : Number.NEGATIVE_INFINITY;
  const exponent = decimalExponent(value);
  const known = exponent - place + 1;
  if (known < 1) return roundsToOne(value, place) ? signed(value, layOut(`1e${place}`)) : '0';
  let text = Math.abs(value).toExponential(Math.min(digits, known) - 1);
  // 9.996 ± 0.01 is carried to 10.00: the last known place stays where it was.
  if (exponentOf(text) > exponent && known < digits)
    text = known === 1 ? text.replace('e', '.0e') : text.replace('e', '0e');
  return signed(value, layOut(text));
}

/** A number with its unit, as every place on screen shows it. The unit may be a word such as "steps". */
export function formatNumber(value: number | null | undefined, unit: string, options: FormatOptions = {}): string {
  if (unit.trim() === '')
    throw new RangeError(`unit: ${JSON.stringify(unit)} is empty; a number is shown with its unit`);
  const digits = formatDigits(value, options);
  return value === null || value === undefined || !Number.isFinite(value) ? digits : `${digits}${NBSP}${unit}`;
}

/** "± 3e-9": one significant digit, rounded up, so that the printed interval holds what the computed one held. */
export function formatUncertainty(uncertainty: number | null | undefined): string {
  if (uncertainty === null || uncertainty === undefined || !Number.isFinite(uncertainty)) return '';
  if (uncertainty === 0) return `±${NBSP}0`;
  const [digit, exponent] = roundedUp(uncertainty);
  return `±${NBSP}${exponent >= -2 && exponent <= 2 ? plain(String(digit), exponent) : scientific(String(digit), exponent)}`;
}

/** A count: exact, thousands spaced ("1 024"). */
export function formatCount(count: number): string {
  return spaced(String(Math.round(count)));
}

/** A number that somebody entered: at least three significant digits, all that were given, nothing rounded away. */
export function formatEntry(value: number): string {
  const shortest = String(value).replace('e+', 'e');
  if (value === 0) return '0';
  if (Number.isInteger(value) && Math.abs(value) < 1e6) return shortest;
  const three = signed(value, layOut(Math.abs(value).toExponential(2)));
  return Number(three) === value ? three : shortest;
}

/** The power of ten of the last digit that an uncertainty leaves known. */
export function uncertaintyPlace(uncertainty: number): number {
  return roundedUp(uncertainty)[1];
}

function roundedUp(uncertainty: number): [digit: number, exponent: number] {
  const exponent = decimalExponent(uncertainty);
  // toPrecision instead of a division: 3e-9 / 1e-9 is not 3, and would be rounded up to 4.
  const leading = Number(uncertainty.toExponential(9).split('e')[0]);
  const digit = Math.ceil(leading - 1e-8);
  return digit >= 10 ? [1, exponent + 1] : [Math.max(digit, 1), exponent];
}

function decimalExponent(value: number): number {
  return exponentOf(Math.abs(value).toExponential());
}

function exponentOf(exponential: string): number {
  return Number(exponential.slice(exponential.indexOf('e') + 1));
}

function roundsToOne(value: number, place: number): boolean {
  return place - decimalExponent(value) === 1 && Number(Math.abs(value).toExponential().split('e')[0]) >= 5;
}

/** Lays out d.ddde±n: plain where every digit before the point is known, scientific elsewhere. */
function layOut(exponential: string): string {
  const exponent = exponentOf(exponential);
  const digits = exponential.slice(0, exponential.indexOf('e')).replace('.', '');
  return exponent >= -4 && exponent < Math.max(digits.length, 1)
    ? plain(digits, exponent)
    : scientific(digits, exponent);
}

function plain(digits: string, exponent: number): string {
  if (exponent < 0) return `0.${'0'.repeat(-exponent - 1)}${digits}`;
  const whole = digits.slice(0, exponent + 1).padEnd(exponent + 1, '0');
  const rest = digits.slice(exponent + 1);
  return rest === '' ? spaced(whole) : `${spaced(whole)}.${rest}`;
}

function scientific(digits: string, exponent: number): string {
  return `${digits[0]}${digits.length > 1 ? `.${digits.slice(1)}` : ''}e${exponent}`;
}

function signed(value: number, text: string): string {
  return value < 0 ? `-${text}` : text;
}

function spaced(whole: string): string {
  return whole.length < 4 ? whole : whole.replace(/\B(?=(\d{3})+$)/g, NBSP);
}

/** A tick of an axis: as short as it can be ("0.25", "1 000", "1e6"). Round-off of the tick's own sum is dropped. */
export function formatTick(value: number): string {
  const rounded = Number(value.toPrecision(10));
  if (rounded === 0) return '0';
  const size = Math.abs(rounded);
  if (size >= 1e-4 && size < 1e5) {
    const [whole, rest] = String(size).split('.');
    return signed(rounded, rest === undefined ? spaced(whole) : `${spaced(whole)}.${rest}`);
  }
  return signed(rounded, size.toExponential().replace('e+', 'e'));
}
