import { expect, it } from 'vitest';
import { holding, zoomed } from '@/lib/client/rail-window';

const limits = { min: 1e-5, max: 1000 };
const whole = { min: 0.001, max: 0.5 };

it('zooming keeps the level it is about in its place', () => {
  const near = zoomed(whole, 0.012, 0.5, limits);
  const place = ({ min, max }: typeof whole) => Math.log(0.012 / min) / Math.log(max / min);
  expect(place(near)).toBeCloseTo(place(whole), 1);
  expect(Math.log(near.max / near.min)).toBeCloseTo(Math.log(500) / 2, 1);
});

it('zooming ends at a factor of 1.5 and at all that can be computed', () => {
  let window = whole;
  for (let i = 0; i < 20; i++) window = zoomed(window, 0.012, 0.5, limits);
  expect(window.max / window.min).toBeGreaterThan(1.45);
  expect(window.min).toBeLessThan(0.012);
  expect(window.max).toBeGreaterThan(0.012);
  for (let i = 0; i < 20; i++) window = zoomed(window, 0.012, 2, limits);
  expect(window).toEqual(limits);
});

it('the window follows a level that leaves it, at its width', () => {
  expect(holding(whole, 0.2, limits)).toBe(whole);
  for (const sigma of [0.0004, 3, 1e-5, 1000]) {
    const moved = holding(whole, sigma, limits);
    expect(moved.min).toBeLessThanOrEqual(sigma);
    expect(moved.max).toBeGreaterThanOrEqual(sigma);
    expect(Math.log(moved.max / moved.min)).toBeCloseTo(Math.log(500), 1);
  }
});
