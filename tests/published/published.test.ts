import { describe, expect, it } from 'vitest';
import { parseStudy, resultSchema, run } from '@/kernels/index';
import { publishedChecks } from './index';
import { judge, type Verdict } from './judge';
import type { PublishedCheck, Wanted } from './published-check';

const verdicts: (Verdict & { id: string })[] = [];

function compute(check: PublishedCheck) {
  const parsed = parseStudy(check.study);
  if (!parsed.study) throw new Error(`${check.id} refused: ${JSON.stringify(parsed.faults)}`);
  return run(parsed.study, { runtime: 'test' });
}

describe.each([...new Set(publishedChecks.map((c) => c.group))])('%s', (group) => {
  const mine = publishedChecks.filter((c) => c.group === group);
  it.each(mine.map((c) => [c.title, c] as const))('%s: every number within its tolerance', (_, check) => {
    const result = compute(check);
    const found = check.compare.flatMap((wanted) => judge(wanted, result));
    verdicts.push(...found.map((v) => ({ ...v, id: check.id })));
    expect(found.length).toBeGreaterThan(0);
    expect(found.filter((v) => !v.holds)).toEqual([]);
  });
});

describe('stated uncertainties', () => {
  const judged = () =>
    verdicts.filter((v) => v.uncertainty !== null && v.known !== null && v.known <= 1e-9 && Number.isFinite(v.error));

  it('bound the true error of nine numbers in ten', () => {
    const all = judged();
    const broken = all.filter((v) => (v.uncertainty ?? 0) + (v.known ?? 0) + 1e-15 < v.error);
    expect(all.length).toBeGreaterThan(200);
    expect(
      broken.length / all.length,
      broken.map((v) => `${v.id} ${v.what}: ${v.error} > ${v.uncertainty}`).join('\n'),
    ).toBeLessThanOrEqual(0.1);
  });

  it('differ from number to number', () => {
    const all = judged();
    expect(new Set(all.map((v) => v.uncertainty)).size).toBeGreaterThan(all.length / 3);
  });
});

/** On purpose too coarse, so that errors can be seen: [id, numbers of points]. */
const COARSE: [string, number[]][] = [
  ['logistic-absorbing-r-4-sigma-0.1-from-0.3', [32, 48, 64]],
  ['logistic-absorbing-r-4-sigma-0.05-from-0.3', [64, 80, 112]],
  ['logistic-reflecting-r-4-sigma-0.1', [40, 56]],
  ['sine-circle-map', [48, 64]],
  ['bistable-tanh-line', [48, 72]],
];

describe('uncertainties on grids too coarse for the last digits', () => {
  const coarse = COARSE.flatMap(([id, list]) => list.map((points) => ({ id, points }))).flatMap(({ id, points }) => {
    const check = publishedChecks.find((c) => c.id === id);
    if (!check) throw new Error(`no check ${id}`);
    const result = compute({ ...check, study: { ...check.study, grid: { points } } });
    return check.compare
      .flatMap((wanted) => judge(wanted, result))
      .filter((v) => v.uncertainty !== null && v.known !== null && Number.isFinite(v.error) && v.error < 0.1)
      .map((v) => ({ ...v, label: `${id} on ${points} points, ${v.what}: error ${v.error}, stated ${v.uncertainty}` }));
  });
  const visible = coarse.filter((v) => v.error > 1e-12);

  it('bound the true error of nine numbers in ten', () => {
    const broken = coarse.filter((v) => (v.uncertainty ?? 0) + (v.known ?? 0) + 1e-15 < v.error);
    expect(visible.length).toBeGreaterThan(25);
    expect(broken.length / coarse.length, broken.map((v) => v.label).join('\n')).toBeLessThanOrEqual(0.1);
  });

  it('are of the size of the error: the median is at most twenty times it', () => {
    const ratios = visible.map((v) => (v.uncertainty ?? 0) / v.error).sort((a, b) => a - b);
    expect(ratios[ratios.length >> 1], visible.map((v) => v.label).join('\n')).toBeLessThanOrEqual(20);
  });
});

describe('the list of checks', () => {
  it('gives every check an id of its own, a source, and something to compare', () => {
    expect(new Set(publishedChecks.map((c) => c.id)).size).toBe(publishedChecks.length);
    for (const c of publishedChecks) {
      expect(c.source.length, c.id).toBeGreaterThan(20);
      expect(c.compare.length, c.id).toBeGreaterThan(0);
      if (c.source.includes('from memory')) expect(c.seen, c.id).not.toBe('page');
    }
  });

  it('is plain data that survives a round trip through JSON', () => {
    expect(JSON.parse(JSON.stringify(publishedChecks))).toEqual(publishedChecks);
  });

  it('fails a number that is off by ten tolerances, and one that is missing', () => {
    const check = publishedChecks.find((c) => c.id.startsWith('sine-circle')) as PublishedCheck;
    const result = compute(check);
    expect(resultSchema.safeParse(result).success).toBe(true);
    for (const wanted of check.compare) {
      const size = 'absolute' in wanted.tolerance ? wanted.tolerance.absolute : wanted.tolerance.relative;
      const off = shifted(wanted, 10 * size);
      expect(judge(off, result).some((v) => !v.holds)).toBe(true);
      expect(judge({ ...wanted, path: 'cases[3].stationary.mean[0]' }, result).some((v) => !v.holds)).toBe(true);
    }
  });
});

function shifted(wanted: Wanted, by: number): Wanted {
  switch (wanted.kind) {
    case 'eigenvalues':
      return { ...wanted, expected: wanted.expected.map(([re, im]) => [re + by, im] as const) };
    case 'density':
      return { ...wanted, expected: wanted.expected.map((v) => v + by) };
    default:
      return { ...wanted, expected: wanted.expected + by };
  }
}
