import { describe, expect, it } from 'vitest';
import {
  parseStudy,
  type RunCache,
  resultSchema,
  run,
  Stopped,
  type Study,
  type StudyFile,
  sweepPoints,
} from '@/kernels/index';
import { StudyRefused } from '@/kernels/study/study-refused';
import versionOne from '../fixtures/studies/version-1.json' with { type: 'json' };

function read(file: unknown): Study {
  const parsed = parseStudy(file);
  if (!parsed.study) throw new Error(JSON.stringify(parsed.faults));
  return parsed.study;
}
const file = (more: Partial<StudyFile> = {}): StudyFile => ({
  format: 'smirr-study',
  version: 1,
  system: { type: 'map', formulas: ['r*x*(1 - x)'], parameters: { r: 3.8 } },
  noise: { kind: 'gaussian', sigma: 0.06 },
  domain: [{ from: 0, to: 1, ends: 'absorbing' }],
  ask: { stationary: {}, spectrum: { count: 3 }, exit: {}, lyapunov: {} },
  ...more,
});
const options = { runtime: 'test' };

describe('studies of version 1', () => {
  it.each(versionOne.map((row) => [row.what, row.study] as const))(
    '%s: is computed, and its result fits the schema',
    (_, study) => {
      const result = run(read(study), options);
      expect(resultSchema.safeParse(JSON.parse(JSON.stringify(result))).error?.issues ?? []).toEqual([]);
      expect(result.cases.length).toBe(sweepPoints(read(study)).length);
    },
  );
});

describe('a run', () => {
  it('goes through a sweep in order, the first axis slow', () => {
    const study = read(
      file({
        ask: { stationary: {} },
        sweep: [
          { over: 'parameters.r', values: [3, 3.5] },
          { over: 'noise.sigma', from: 0.05, to: 0.2, count: 3, scale: 'log' },
        ],
      }),
    );
    const { cases } = run(study, options);
    expect(cases.map((c) => c.at['parameters.r'])).toEqual([3, 3, 3, 3.5, 3.5, 3.5]);
    expect(cases.slice(0, 3).map((c) => c.at['noise.sigma'])).toEqual([0.05, expect.closeTo(0.1, 15), 0.2]);
    const alone = run(
      read(
        file({
          ask: { stationary: {} },
          noise: { kind: 'gaussian', sigma: 0.2 },
          system: { ...file().system, parameters: { r: 3.5 } },
        }),
      ),
      options,
    );
    expect(cases[5].stationary?.mean).toEqual(alone.cases[0].stationary?.mean);
  });

  it('gives the same bits for the same study, alone, again, and from a cache', () => {
    const study = read(file());
    const cache: RunCache = new Map();
    const first = JSON.stringify(run(study, options));
    expect(JSON.stringify(run(study, options))).toBe(first);
    expect(JSON.stringify(run(study, { ...options, cache }))).toBe(first);
    expect(JSON.stringify(run(study, { ...options, cache }))).toBe(first);
    expect(cache.size).toBe(1);
  });

  it('gives the same bits at a noise level whatever was computed into the cache before it', () => {
    const cache: RunCache = new Map();
    for (const sigma of [0.1, 0.0601, 0.07])
      run(read(file({ noise: { kind: 'gaussian', sigma } })), { ...options, cache });
    expect(JSON.stringify(run(read(file()), { ...options, cache }).cases)).toBe(
      JSON.stringify(run(read(file()), options).cases),
    );
  });

  it('keeps at most eight systems in a cache', () => {
    const cache: RunCache = new Map();
    for (let i = 0; i < 12; i++)
      run(read(file({ ask: { stationary: {} }, system: { ...file().system, parameters: { r: 3 + i / 20 } } })), {
        ...options,
        cache,
        uncertainties: false,
      });
    expect(cache.size).toBe(8);
  });

  // Counted, not timed: on an idle machine the longest stretch between two of these calls is 10 to 50 ms. A part that loses
  // its checkpoint (building direct sums, elimination, Arnoldi's steps) takes more than a tenth of them away.
  it.each([
    ['moderate noise', 0.01, 670],
    ['little noise', 0.004, 710],
    ['very little noise, where direct sums are large', 0.002, 930],
  ])('offers a stop often enough to end within 100 ms: %s', (_, sigma, least) => {
    const study = read(
      file({
        ask: {
          exit: {},
          spectrum: { count: 6, deterministic: true },
          stationary: {},
          lyapunov: {},
          density: { at: [50] },
        },
        noise: { kind: 'gaussian', sigma },
      }),
    );
    let calls = 0;
    const count = () => {
      calls++;
    };
    run(study, { ...options, checkpoint: count });
    expect(calls).toBeGreaterThan(least);
  });

  it('that is stopped throws what the checkpoint threw', () => {
    expect(() =>
      run(read(file()), {
        ...options,
        checkpoint: () => {
          throw new Stopped();
        },
      }),
    ).toThrow(Stopped);
  });

  it('reports progress that grows and ends at the number of cases', () => {
    const seen: number[] = [];
    run(read(file({ ask: { stationary: {} }, sweep: [{ over: 'noise.sigma', values: [0.1, 0.2, 0.3] }] })), {
      ...options,
      checkpoint: (done, total) => {
        expect(total).toBe(3);
        seen.push(done);
      },
    });
    expect(seen.at(-1)).toBe(3);
    expect(Math.max(...seen.slice(0, -1))).toBeLessThan(3);
  });

  it('without uncertainties computes the same numbers on one grid', () => {
    const study = read(file());
    const [full] = run(study, options).cases;
    const [bare] = run(study, { ...options, uncertainties: false }).cases;
    expect(bare.grid.compared).toEqual([]);
    expect(bare.stationary?.mean[0]?.value).toBe(full.stationary?.mean[0]?.value);
    expect(bare.spectrum?.noisy?.map((e) => e.re)).toEqual(full.spectrum?.noisy?.map((e) => e.re));
    expect(bare.spectrum?.noisy?.[0].uncertainty).toBeNull();
  });

  it('refuses a formula that leaves the numbers inside the domain, with its path', () => {
    const study = read(file({ system: { type: 'map', formulas: ['log(x - 0.4)'] } }));
    expect(() => run(study, options)).toThrow(StudyRefused);
    expect(() => run(study, options)).toThrow(/system\.formulas\[0\]/);
  });

  it('says so where nothing can leave, rather than giving an exit time', () => {
    const result = run(read(file({ domain: [{ from: 0, to: 1, ends: 'reflecting' }] })), options);
    expect(result.cases[0].exit).toMatchObject({ rate: null, meanTime: null });
    expect(result.warnings.map((w) => w.code)).toContain('nothing-leaves');
    expect(result.warnings.every((w) => w.at === 0)).toBe(true);
  });

  it('says so where the points asked for are too few', () => {
    const result = run(read(file({ grid: { points: 24 } })), options);
    expect(result.cases[0].grid.resolved).toBe(false);
    expect(result.warnings.map((w) => w.code)).toContain('grid-too-coarse');
  });
});
