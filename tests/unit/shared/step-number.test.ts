import fc from 'fast-check';
import { expect, it } from 'vitest';
import { digitStepper, linearStepper } from '@/lib/shared/step-number';

const positive = { min: 1e-12, max: 1e300 };

it.each([
  [0.012, 1, 0.0121],
  [0.012, -1, 0.0119],
  [0.1, -1, 0.0999],
  [0.0999, 1, 0.1],
  [0.999, 1, 1],
  [1, 1, 1.01],
  [0.012, 10, 0.013],
])('sigma %d moves by %i steps to %d', (value, steps, moved) => {
  expect(digitStepper(positive)(value, steps)).toBe(moved);
});

it('steps up and down cancel, in three significant digits', () => {
  fc.assert(
    fc.property(
      fc.integer({ min: 100, max: 999 }),
      fc.integer({ min: -6, max: 4 }),
      fc.integer({ min: 1, max: 40 }),
      (digits, power, steps) => {
        const value = Number(`${digits}e${power}`);
        const stepper = digitStepper(positive);
        expect(stepper(stepper(value, steps), -steps)).toBeCloseTo(value, 12);
      },
    ),
    { seed: 2 },
  );
});

it('a linear step is a thousandth of the range and leaves no round-off behind', () => {
  const stepper = linearStepper({ min: 0, max: 4 });
  expect(stepper(3.8, 1)).toBe(3.801);
  expect(stepper(3.8, -3)).toBe(3.797);
  expect(stepper(3.999, 5)).toBe(4);
  expect(stepper(0.001, -5)).toBe(0);
});
