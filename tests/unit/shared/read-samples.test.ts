import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { MOST_SAMPLES, readSamples } from '@/lib/shared/read-samples';

function read(text: string, column = 0) {
  const table = readSamples(text);
  return 'fault' in table ? table : { columns: table.columns, ...table.read(column) };
}

describe('samples from a file', () => {
  it('any list of numbers, one a line, comes back as it was', () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.double({ noNaN: true, noDefaultInfinity: true }).map((value) => (value === 0 ? 0 : value)),
          {
            minLength: 1,
            maxLength: 50,
          },
        ),
        fc.constantFrom('\n', '\r\n'),
        (samples, end) => {
          expect(read(samples.join(end) + end)).toMatchObject({ columns: ['column 1'], samples });
        },
      ),
      { seed: 7 },
    );
  });

  it.each([
    ['a head line', 'V\n0.1\n0.2\n', 0, ['V'], [0.1, 0.2]],
    ['a column of a table', 't,V\n0,0.1\n1,0.2\n', 1, ['t', 'V'], [0.1, 0.2]],
    ['semicolons and decimal commas', 't;V\n0;0,1\n1;0,2\n', 1, ['t', 'V'], [0.1, 0.2]],
    ['tabs', '0\t0,1\n1\t0,2', 1, ['column 1', 'column 2'], [0.1, 0.2]],
    ['notes and empty lines', '# from the bench\n\n0.1\n\n0.2\n', 0, ['column 1'], [0.1, 0.2]],
    ['quoted cells', '"t","V, mean"\n"0","0.1"', 1, ['t', 'V, mean'], [0.1]],
    ['a byte order mark', '\ufeff0.5\n', 0, ['column 1'], [0.5]],
  ])('%s', (_, text, column, columns, samples) => {
    expect(read(text, column)).toEqual({ columns, samples });
  });

  it.each([
    ['0.1\n0.2\nabc\n', 0, 'line 3: abc is not a number'],
    ['# note\n0.1\n\nx\n', 0, 'line 4: x is not a number'],
    ['V\n0.1\n1e999\n', 0, 'line 3: 1e999 is too large'],
    ['t,V\n0,0.1\n1\n', 1, 'line 3: has 1 columns, column 2 is missing'],
    ['t,V\n0,\n', 1, 'line 2: a number is needed'],
    ['\n\n# nothing\n', 0, 'holds no numbers'],
    ['', 0, 'holds no numbers'],
  ])('%j is refused with its line', (text, column, words) => {
    expect(read(text, column)).toMatchObject({ fault: expect.stringContaining(words) });
  });

  it('more than can be carried is refused, not cut', () => {
    expect(read('1\n'.repeat(MOST_SAMPLES))).toMatchObject({ samples: { length: MOST_SAMPLES } });
    expect(read('1\n'.repeat(MOST_SAMPLES + 1))).toMatchObject({
      fault: `line ${MOST_SAMPLES + 1}: more than ${MOST_SAMPLES} samples; leave some out`,
    });
  });
});
