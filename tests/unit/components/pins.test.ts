import { expect, it } from 'vitest';
import { pinsOf, withPin, withPinSweep } from '@/components/explore/pins';
import { parseStudy, sweepPoints } from '@/kernels';
import { FIRST_STUDY } from '@/lib/shared/bench-study';

it('pins stand in order, each once', () => {
  expect([0.03, 0.01, 0.03, 0.02].reduce(withPin, [] as number[])).toEqual([0.01, 0.02, 0.03]);
});

it('a sweep of the pins is one that the engine takes, case by case', () => {
  const swept = withPinSweep(FIRST_STUDY, [0.01, 0.02]);
  const { study, faults } = parseStudy(swept);
  expect(faults).toBeUndefined();
  expect(study && sweepPoints(study)).toEqual([{ 'noise.sigma': 0.01 }, { 'noise.sigma': 0.02 }]);
  expect(pinsOf(swept)).toEqual([0.01, 0.02]);
});

it('replaces another sweep of the noise level, keeps one of a parameter, and leaves none behind without pins', () => {
  const over = { over: 'parameters.r', from: 3, to: 4, count: 5 };
  const before = { ...FIRST_STUDY, sweep: [{ over: 'noise.sigma', from: 0.01, to: 0.1, count: 3 }, over] };
  expect(withPinSweep(before, [0.02]).sweep).toEqual([{ over: 'noise.sigma', values: [0.02] }, over]);
  expect(withPinSweep(before, []).sweep).toEqual([over]);
  expect(withPinSweep({ ...FIRST_STUDY, sweep: [] }, [])).toEqual(FIRST_STUDY);
});
