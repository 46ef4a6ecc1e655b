import { expect, it } from 'vitest';
import { numbersCsv } from '@/lib/shared/numbers-csv';

it('units stand in the head, every digit in the rows, nothing where there is none', () => {
  const table = {
    columns: [
      { name: 'x', unit: 'V' },
      { name: 'density', unit: '' },
    ],
    rows: [
      [0.1, 0.123456789012345],
      [-0.2, null],
    ],
  };
  expect(numbersCsv(table, ['first\nnote'])).toBe(
    '# first note\r\nx (V),density\r\n0.1,0.123456789012345\r\n-0.2,\r\n',
  );
});

it('a text that a spreadsheet would run stays a text', () => {
  expect(numbersCsv({ columns: [{ name: 'a', unit: '' }], rows: [['=1+1'], ['say "so", yes']] })).toBe(
    'a\r\n\'=1+1\r\n"say ""so"", yes"\r\n',
  );
});
