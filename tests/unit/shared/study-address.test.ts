import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { studySchema } from '@/kernels/spec';
import { BENCH_ASK, FIRST_STUDY } from '@/lib/shared/bench-study';
import { decodeStudy } from '@/lib/shared/decode-study';
import { encodeStudy } from '@/lib/shared/encode-study';
import type { StudyFile } from '@/lib/shared/study-types';

/** As the server reads an address. */
function read(query: string) {
  const found: Record<string, string | string[]> = {};
  for (const [key, value] of new URLSearchParams(query)) found[key] = key in found ? [found[key], value].flat() : value;
  return decodeStudy(found);
}

const finite = fc.double({ min: -1e6, max: 1e6, noNaN: true }).map((value) => (value === 0 ? 0 : value));
const positive = fc.double({ min: 1e-9, max: 1e6, noNaN: true });
const name = fc.stringMatching(/^[A-Za-z][A-Za-z0-9_]{0,8}$/);
const text = fc.string({ minLength: 1, maxLength: 60, unit: 'grapheme' }).filter((words) => words.trim() !== '');
const end = fc.constantFrom('reflecting', 'absorbing', 'holding');

const study = fc.record(
  {
    format: fc.constant('smirr-study'),
    version: fc.constant(1),
    title: text,
    notes: text,
    system: fc.record(
      {
        type: fc.constantFrom('map', 'sde'),
        id: fc.constantFrom('logistic', 'sine-circle'),
        variables: fc.array(name, { minLength: 1, maxLength: 2 }),
        formulas: fc.array(text, { minLength: 1, maxLength: 2 }),
        units: fc.array(fc.constantFrom('V', 'm/s', 'µm', ''), { minLength: 1, maxLength: 2 }),
        parameters: fc.dictionary(name, finite, { maxKeys: 4 }),
        breaks: fc.array(fc.array(finite, { maxLength: 3 }), { minLength: 1, maxLength: 1 }),
      },
      { requiredKeys: ['type', 'parameters'] },
    ),
    noise: fc.record(
      {
        kind: fc.constantFrom('gaussian', 'uniform', 'laplace', 'cauchy', 'none'),
        sigma: fc.oneof(positive, fc.array(positive, { minLength: 2, maxLength: 2 })),
        factor: fc.array(text, { minLength: 1, maxLength: 1 }),
      },
      { requiredKeys: ['kind'] },
    ),
    domain: fc.array(
      fc.record({
        from: finite,
        to: finite,
        ends: fc.oneof(fc.constant('periodic'), end, fc.tuple(end, end)),
      }),
      { minLength: 1, maxLength: 2 },
    ),
    grid: fc.record({
      points: fc.oneof(fc.constant('auto'), fc.integer({ min: 8, max: 4096 })),
      tolerance: fc.constantFrom(1e-8, 1e-10),
    }),
    ask: fc.oneof(
      fc.constant(BENCH_ASK),
      fc.constant({ stationary: {} }),
      fc.record({
        density: fc.record({ at: fc.array(fc.integer({ min: 0, max: 50 }), { minLength: 1, maxLength: 5 }) }),
      }),
    ),
  },
  { requiredKeys: ['format', 'version', 'system', 'noise', 'domain', 'ask'] },
) as fc.Arbitrary<StudyFile>;

describe('the study in an address', () => {
  it('comes back as it was, for any study that the schema takes', () => {
    fc.assert(
      fc.property(study, (written) => {
        fc.pre(studySchema.safeParse(written).success);
        expect(read(encodeStudy(written))).toEqual({ study: JSON.parse(JSON.stringify(written)) });
      }),
      { seed: 3, numRuns: 500 },
    );
  });

  it('is readable for the first study', () => {
    expect(encodeStudy(FIRST_STUDY)).toBe(
      'system=logistic&p.r=3.8&sigma=0.012&on=0,1,absorbing&title=Logistic%20map%20under%20noise',
    );
  });

  it('never throws, and says in words what is wrong, for any junk', () => {
    fc.assert(
      fc.property(
        fc.dictionary(
          fc.oneof(fc.constantFrom('system', 'on', 'sigma', 'more', 'f', 'p.r', 'noise'), fc.string()),
          fc.oneof(fc.string(), fc.array(fc.string()), fc.json()),
        ),
        (query) => {
          const decoded = decodeStudy(query);
          if (decoded === null) expect(Object.keys(query)).toEqual([]);
          else if ('fault' in decoded) expect(decoded.fault.length).toBeGreaterThan(5);
          else expect(studySchema.safeParse(decoded.study).success).toBe(true);
        },
      ),
      { seed: 5, numRuns: 2000 },
    );
  });

  it.each([
    ['sigma=abc&system=logistic&on=0,1,absorbing', 'sigma: abc is not a number'],
    ['sigma=0.1&system=logistic&on=0,1,sticky', 'domain'],
    ['sigma=0.1&system=logistic', 'domain'],
    ['sigma=-1&system=logistic&on=0,1,absorbing', 'noise.sigma'],
    ['colour=red', 'colour: no such key'],
    ['system=logistic&sigma=0.1&on=0,1,absorbing&more={', 'more'],
    ['system=logistic&sigma=0.1&on=0,1,absorbing&more={"system":{"constructor":1}}', 'system'],
  ])('%s is refused with "%s"', (query, words) => {
    expect(read(query)).toMatchObject({ fault: expect.stringContaining(words) });
  });

  it('an empty query holds no study', () => {
    expect(decodeStudy({})).toBeNull();
  });
});
