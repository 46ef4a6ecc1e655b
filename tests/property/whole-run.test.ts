import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseStudy, type Result, resultSchema, run, type StudyFile } from '@/kernels/index';
import { findSystem, SYSTEMS } from '@/kernels/systems/index';
import { seeded } from '../support/kernel-maps';

function compute(study: StudyFile): Result {
  const parsed = parseStudy(study);
  if (!parsed.study) throw new Error(JSON.stringify(parsed.faults));
  return run(parsed.study, { runtime: 'test' });
}

const unit = fc.double({ min: 0, max: 1, noNaN: true });
const smooth = SYSTEMS.filter((s) => !['gauss', 'pomeau-manneville'].includes(s.id));

/** A catalogue entry at parameters in the middle half of their range, and a noise level of 3 to 30 % of its domain. */
const studies = fc
  .tuple(fc.constantFrom(...smooth), fc.array(unit, { minLength: 3, maxLength: 3 }), unit)
  .map(([entry, parts, level]) => {
    const [{ from, to, ends }] = entry.domain;
    const parameters = Object.fromEntries(
      entry.parameters.map((p, i) => [p.name, p.range[0] + (p.range[1] - p.range[0]) * (0.25 + 0.5 * parts[i % 3])]),
    );
    const study: StudyFile = {
      format: 'smirr-study',
      version: 1,
      system: { type: 'map', id: entry.id, parameters },
      noise: { kind: 'gaussian', sigma: 0.03 * 10 ** level * (to - from) },
      domain: [{ from, to, ends }],
      ask: {
        spectrum: { count: 3 },
        stationary: {},
        lyapunov: {},
        density: { at: [1, 3] },
        ...([ends].flat().includes('absorbing') ? { exit: {} } : {}),
      },
    };
    return study;
  });

const numbersOf = ({ cases: [c] }: Result) => ({
  mean: c.stationary?.mean[0]?.value,
  variance: c.stationary?.covariance[0][0]?.value,
  entropy: c.stationary?.entropy?.value,
  exponent: c.lyapunov?.value?.value,
  time: c.exit?.meanTime?.value,
  mass: c.density?.[1].mass?.value,
});

describe('whole studies of catalogue systems at random parameters', () => {
  it('give the same numbers by the hand-written map and by its formula', () => {
    fc.assert(
      fc.property(studies, (study) => {
        const entry = findSystem(study.system.id ?? '');
        const [a, b] = [
          study,
          {
            ...study,
            system: { ...study.system, id: undefined, formulas: entry?.formulas, variables: entry?.variables },
          },
        ].map((s) => compute(JSON.parse(JSON.stringify(s))));
        const label = JSON.stringify(study.system);
        const [one, two] = [numbersOf(a), numbersOf(b)];
        for (const key of Object.keys(one) as (keyof typeof one)[]) {
          const [p, q] = [one[key], two[key]];
          if (p === undefined || q === undefined) expect(p, `${key} of ${label}`).toBe(q);
          else expect(Math.abs(p - q), `${key} of ${label}`).toBeLessThan(1e-11 * Math.max(1, Math.abs(q)));
        }
        const first = (r: Result) => r.cases[0].spectrum?.noisy?.[0];
        expect(first(a)?.re).toBeCloseTo(first(b)?.re ?? Number.NaN, 11);
      }),
      seeded(15),
    );
  });

  it('give result files that the schema accepts and JSON carries without loss', () => {
    fc.assert(
      fc.property(studies, (study) => {
        const result = compute(study);
        const read = resultSchema.safeParse(JSON.parse(JSON.stringify(result)));
        expect(read.error?.issues ?? []).toEqual([]);
        expect(read.data).toEqual(JSON.parse(JSON.stringify(result)));
      }),
      seeded(12),
    );
  });
});
