import { expect, it } from 'vitest';
import { parseNumber } from '@/lib/shared/parse-number';

it.each([
  ['0,012', 0.012],
  ['0.012', 0.012],
  ['1 024', 1024],
  ['1\u202f024', 1024],
  ['\u22123.5', -3.5],
  ['-3.5', -3.5],
  [' 2.16e23 ', 2.16e23],
  ['1e\u22126', 1e-6],
  ['.5', 0.5],
  ['5.', 5],
  ['-0', 0],
])('%s is read as %d', (text, value) => {
  expect(parseNumber(text)).toEqual({ value });
});

it.each(['', '  ', 'abc', '1.2.3', '1,024.5', '1e999', '0x10', 'Infinity', 'NaN', '1e', '--1'])(
  '%j is refused in words',
  (text) => {
    const parsed = parseNumber(text);
    expect(parsed).toHaveProperty('fault');
    expect((parsed as { fault: string }).fault.length).toBeGreaterThan(5);
  },
);
