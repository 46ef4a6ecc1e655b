import { describe, expect, it } from 'vitest';
import { coarseCount, railKey, railLevels, trailLevels } from '@/lib/client/rail-levels';
import { FIRST_STUDY } from '@/lib/shared/bench-study';

const whole = { min: 0.001, max: 0.5 };

describe('the levels of a rail', () => {
  const levels = railLevels(whole);

  it('go from end to end, each once, none too far from the next', () => {
    const sorted = [...levels].sort((a, b) => a - b);
    expect(sorted[0]).toBe(0.001);
    expect(sorted.at(-1)).toBe(0.5);
    expect(new Set(levels).size).toBe(levels.length);
    for (let i = 1; i < sorted.length; i++)
      expect(sorted[i] / sorted[i - 1]).toBeLessThanOrEqual(10 ** (1 / 24) + 1e-9);
  });

  it('begin with a coarse set that spans the window', () => {
    const coarse = levels.slice(0, coarseCount(levels)).sort((a, b) => a - b);
    expect(coarse.length).toBeLessThan(levels.length / 5);
    expect(coarse[0]).toBe(0.001);
    expect(coarse.at(-1)).toBe(0.5);
    for (let i = 1; i < coarse.length; i++) expect(coarse[i] / coarse[i - 1]).toBeLessThanOrEqual(10 ** (9 / 24));
  });

  it('of a zoomed window hold those of the whole one that lie in it', () => {
    const near = railLevels({ min: 0.01, max: 0.04 });
    expect(near.length).toBeGreaterThanOrEqual(40);
    const shared = levels.filter((level) => level > 0.01 && level < 0.04);
    expect(shared.length).toBeGreaterThan(10);
    for (const level of shared) expect(near).toContain(level);
  });
});

it('trails lie about the noise level, inside what can be computed', () => {
  const levels = trailLevels(0.012, { min: 1e-5, max: 1000 });
  expect(Math.min(...levels)).toBeLessThan(0.0075);
  expect(Math.max(...levels)).toBeGreaterThan(0.02);
  expect(Math.min(...trailLevels(0.012, { min: 0.01, max: 1000 }))).toBeGreaterThanOrEqual(0.01);
});

it('the rail is the same whatever the noise level, another one for another parameter', () => {
  const louder = { ...FIRST_STUDY, noise: { ...FIRST_STUDY.noise, sigma: 0.3 } };
  const other = { ...FIRST_STUDY, system: { ...FIRST_STUDY.system, parameters: { r: 3.7 } } };
  expect(railKey(louder)).toBe(railKey(FIRST_STUDY));
  expect(railKey(other)).not.toBe(railKey(FIRST_STUDY));
});
