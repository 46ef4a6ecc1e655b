import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  ALL_DIGITS,
  COMPACT_DIGITS,
  formatCount,
  formatDigits,
  formatEntry,
  formatNumber,
  formatUncertainty,
  NBSP,
} from '@/lib/shared/format-number';
import { parseNumber } from '@/lib/shared/parse-number';

const spaces = (text: string) => text.replaceAll(NBSP, ' ');

describe('a number with its uncertainty', () => {
  it.each([
    [0.5639380123, 2e-12, 6, '0.563938'],
    [689073.2998, 4e-4, 6, '689 073'],
    [689073.2998, 4e-4, 3, '6.89e5'],
    [689073.2998, 4e-4, 15, '689 073.2998'],
    [2.15748325e23, 4e14, 6, '2.15748e23'],
    [2.15748325e23, 4e14, 3, '2.16e23'],
    [2.15748325e23, 4e14, 15, '2.157483250e23'],
    [1.4512e-6, 3e-11, 3, '1.45e-6'],
    [0.3, 0.05, 6, '0.30'],
    [1536, 100, 6, '1.5e3'],
    [9.996, 0.01, 6, '10.00'],
    [-0.00001, 0.001, 6, '0'],
    [0.00062, 0.001, 6, '0.001'],
    [-0.4041, 1e-9, 6, '-0.404100'],
    [0, 0, 6, '0'],
    [-0, 1e-9, 6, '0'],
    [1, 1e-13, 6, '1.00000'],
    [12345678, 0.001, 6, '1.23457e7'],
  ])('writes %d ± %d to %d digits as %s', (value, uncertainty, digits, text) => {
    expect(spaces(formatDigits(value, { uncertainty, digits }))).toBe(text);
  });

  it('says in words what could not be had', () => {
    expect(formatNumber(null, 'steps')).toBe('not known');
    expect(formatNumber(Number.NaN, 'steps', { absent: 'no exits' })).toBe('no exits');
  });

  it('refuses to leave the unit out', () => {
    expect(() => formatNumber(1, ' ')).toThrow(RangeError);
  });
});

describe('an uncertainty', () => {
  it.each([
    [2e-6, '± 2e-6'],
    [2.01e-6, '± 3e-6'],
    [3e-9, '± 3e-9'],
    [9.6e-5, '± 1e-4'],
    [0.04, '± 0.04'],
    [31, '± 40'],
    [0, '± 0'],
    [null, ''],
  ])('of %d is written %s, never rounded down', (value, text) => {
    expect(spaces(formatUncertainty(value))).toBe(text);
  });
});

describe('an entry', () => {
  it.each([
    [3.8, '3.80'],
    [0.012, '0.0120'],
    [3.82345, '3.82345'],
    [1, '1'],
    [-0.5, '-0.500'],
    [1e-9, '1.00e-9'],
    [1e21, '1.00e21'],
  ])('of %d is shown as %s', (value, text) => {
    expect(formatEntry(value)).toBe(text);
  });

  it('is never changed by showing it', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(parseNumber(formatEntry(value))).toEqual({ value: value === 0 ? 0 : value });
      }),
      { seed: 11, numRuns: 2000 },
    );
  });
});

it('counts are spaced by thousands', () => {
  expect([1, 512, 1024, 3000000].map((count) => spaces(formatCount(count)))).toEqual([
    '1',
    '512',
    '1 024',
    '3 000 000',
  ]);
});

/** The power of ten of the last digit printed. */
function lastPlace(text: string): number {
  const [mantissa, exponent = '0'] = text.split('e');
  const point = mantissa.indexOf('.');
  return Number(exponent) - (point < 0 ? 0 : mantissa.length - point - 1);
}

const magnitude = fc.tuple(fc.double({ min: 1, max: 9.999999, noNaN: true }), fc.integer({ min: -40, max: 40 }));
const valueAndError = fc.record({
  value: fc.tuple(magnitude, fc.boolean()).map(([[m, e], minus]) => (minus ? -1 : 1) * m * 10 ** e),
  relative: fc
    .tuple(fc.double({ min: 1, max: 9.999999, noNaN: true }), fc.integer({ min: -16, max: 2 }))
    .map(([m, e]) => m * 10 ** e),
  digits: fc.integer({ min: 1, max: ALL_DIGITS }),
});

describe('for any value, uncertainty and number of digits', () => {
  const check = (claim: (text: string, value: number, uncertainty: number, digits: number) => void) =>
    fc.assert(
      fc.property(valueAndError, ({ value, relative, digits }) => {
        const uncertainty = Math.abs(value) * relative;
        const text = formatNumber(value, 'V', { uncertainty, digits });
        claim(text, value, uncertainty, digits);
      }),
      { seed: 7, numRuns: 5000 },
    );

  it('no digit stands beyond the uncertainty', () =>
    check((text, _value, uncertainty) => {
      const digits = text.split(NBSP).slice(0, -1).join('');
      if (digits === '0') return;
      // The digit in the place of the uncertainty's own first digit is the last one that may be printed.
      expect(lastPlace(digits)).toBeGreaterThanOrEqual(Number(uncertainty.toExponential().split('e')[1]));
    }));

  it('what is read back lies within half a unit of the last digit', () =>
    check((text, value, uncertainty) => {
      const digits = text.split(NBSP).slice(0, -1).join('');
      const parsed = parseNumber(digits);
      if (!('value' in parsed)) throw new Error(`${digits} cannot be read back`);
      const half =
        digits === '0' ? 0.5 * 10 ** (Math.floor(Math.log10(uncertainty)) + 1) : 0.5 * 10 ** lastPlace(digits);
      expect(Math.abs(parsed.value - value)).toBeLessThanOrEqual(half * (1 + 1e-9) + Math.abs(value) * 4e-16);
    }));

  it('the unit is there, and never more significant digits than asked for', () =>
    check((text, _value, _uncertainty, digits) => {
      expect(text.endsWith(`${NBSP}V`)).toBe(true);
      const significant = text.split(NBSP).slice(0, -1).join('').split('e')[0].replace(/[-.]/g, '').replace(/^0+/, '');
      expect(significant.length).toBeLessThanOrEqual(digits);
      expect(text).not.toMatch(/^-0\D?$/);
    }));

  it('the printed uncertainty is never below the true one, nor twice as large and more', () =>
    check((_text, _value, uncertainty) => {
      const parsed = parseNumber(formatUncertainty(uncertainty).replace('±', ''));
      if (!('value' in parsed)) throw new Error('cannot be read back');
      expect(parsed.value).toBeGreaterThanOrEqual(uncertainty * (1 - 1e-8));
      expect(parsed.value).toBeLessThanOrEqual(2 * uncertainty * (1 + 1e-8));
    }));

  it('the compact form has six digits at most', () => {
    expect(COMPACT_DIGITS).toBe(6);
  });
});
