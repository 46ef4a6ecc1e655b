import { expect, it } from 'vitest';
import { FIRST_RESULT, firstPicture } from '@/components/first-study/first-result';
import file from '@/components/first-study/study.json';
import { parseStudy, resultSchema, run } from '@/kernels';
import { FIRST_STUDY } from '@/lib/shared/bench-study';
import type { Quantity } from '@/lib/shared/study-types';

it('the picture that stands ahead is that of the bench’s first study', () => {
  expect(file).toEqual(FIRST_STUDY);
  expect(resultSchema.parse(FIRST_RESULT).study).toEqual(parseStudy(FIRST_STUDY).study);
  expect(firstPicture().study).toBe(FIRST_STUDY);
});

it('its numbers are what this engine computes now', () => {
  const { study } = parseStudy(file);
  if (!study) throw new Error('the first study is refused');
  const [now] = run(study, { runtime: 'test' }).cases;
  const [then] = FIRST_RESULT.cases;
  const agree = (a: Quantity | null | undefined, b: Quantity | null | undefined) => {
    if (!a || !b) throw new Error('a number is missing');
    expect(Math.abs(a.value - b.value)).toBeLessThanOrEqual(a.uncertainty + b.uncertainty);
  };
  agree(now.exit?.meanTime, then.exit?.meanTime);
  agree(now.spectrum?.relaxationTime, then.spectrum?.relaxationTime);
  agree(now.lyapunov?.value, then.lyapunov?.value);
  agree(now.stationary?.lostPerStep, then.stationary?.lostPerStep);
  expect(now.stationary?.values.length).toBe(then.stationary?.values.length);
});
