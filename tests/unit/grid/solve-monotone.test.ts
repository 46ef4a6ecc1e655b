import { describe, expect, it } from 'vitest';
import { solveMonotone } from '@/kernels/grid/solve-monotone';

const solve = (f: (x: number) => number, df: (x: number) => number, low: number, high: number, targets: number[]) =>
  solveMonotone(
    (x, out, slope) => {
      for (let i = 0; i < x.length; i++) {
        out[i] = f(x[i]);
        slope[i] = df(x[i]);
      }
    },
    new Float64Array(targets.length).fill(low),
    new Float64Array(targets.length).fill(high),
    new Float64Array(targets.length).fill(f(low)),
    Float64Array.from(targets),
  );

describe('monotone equations', () => {
  it('are solved to the last places, many at once, rising and falling', () => {
    const targets = Array.from({ length: 50 }, (_, i) => (i + 0.5) / 50);
    solve(
      (x) => x ** 3,
      (x) => 3 * x * x,
      0,
      1,
      targets,
    ).forEach((x, i) => {
      expect(Math.abs(x - Math.cbrt(targets[i]))).toBeLessThan(1e-15);
    });
    solve(
      (x) => Math.exp(-x),
      (x) => -Math.exp(-x),
      0,
      40,
      targets,
    ).forEach((x, i) => {
      expect(Math.abs(x / -Math.log(targets[i]) - 1)).toBeLessThan(4e-15);
    });
  });

  it('stay in their bracket where the slope is zero, wrong or not a number', () => {
    const [a] = solve(
      (x) => Math.cbrt(x),
      () => Number.NaN,
      -1,
      1,
      [0.5],
    );
    expect(a).toBeCloseTo(0.125, 14);
    const [b] = solve(
      (x) => x ** 9,
      () => 0,
      -1,
      1,
      [0.1],
    );
    expect(b).toBeCloseTo(0.1 ** (1 / 9), 13);
    const [c] = solve(
      (x) => x,
      () => -1,
      0,
      1,
      [0.7],
    );
    expect(c).toBeCloseTo(0.7, 14);
  });
});
