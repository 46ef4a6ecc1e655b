import { Matrix, solve } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { Elimination } from '@/kernels/exits/elimination';
import { randomValues } from '../../support/kernel-maps';

/** A random chain whose every state leaves with about the given probability. */
function chain(n: number, seed: number, leaving: number) {
  const values = randomValues(n * n, seed);
  const exit = randomValues(n, seed + 1, 0.5 * leaving, leaving);
  const P = new Float64Array(n * n);
  for (let j = 0; j < n; j++) {
    let sum = 0;
    for (let i = 0; i < n; i++) sum += values[j * n + i];
    for (let i = 0; i < n; i++) P[j * n + i] = (values[j * n + i] * (1 - exit[j])) / sum;
  }
  return { P, exit };
}

describe('elimination without subtractions', () => {
  it.each([2, 3, 17, 60])('of %d states gives the times and visits that a linear solver gives', (n) => {
    const { P, exit } = chain(n, n, 0.2);
    const A = Matrix.eye(n).sub(new Matrix(Array.from({ length: n }, (_, j) => [...P.subarray(j * n, j * n + n)])));
    const b = randomValues(n, 5);
    const c = randomValues(n, 6);
    const column = (v: Float64Array) => Matrix.columnVector([...v]);
    const times = solve(A, column(b)).to1DArray();
    const visits = solve(A.transpose(), column(c)).to1DArray();
    const elimination = new Elimination(P.slice(), exit);
    elimination.times(b).forEach((t, i) => {
      expect(Math.abs(t / times[i] - 1)).toBeLessThan(1e-12);
    });
    elimination.visits(c).forEach((t, i) => {
      expect(Math.abs(t / visits[i] - 1)).toBeLessThan(1e-12);
    });
  });

  it('keeps twelve digits of a time of 10²⁰⁰ steps', () => {
    // two states: 0 → 1 with p, back with q, only 1 leaves, with e: τ₁ = (1 + q/p)/e, τ₀ = τ₁ + 1/p
    const [p, q, e] = [0.25, 0.5, 1e-200];
    const times = new Elimination(Float64Array.of(1 - p, p, q, 1 - q - e), Float64Array.of(0, e)).times(
      Float64Array.of(1, 1),
    );
    expect(Math.abs(times[1] / ((1 + q / p) / e) - 1)).toBeLessThan(1e-14);
    expect(times[0]).toBe(times[1]);
  });

  it('refuses sizes that do not fit and a state that cannot leave', () => {
    expect(() => new Elimination(new Float64Array(5), new Float64Array(2))).toThrow(/5 entries for 2 states/);
    expect(() => new Elimination(Float64Array.of(1, 0, 0, 1), Float64Array.of(0, 0.5))).toThrow(
      /state 0: can never leave/,
    );
  });

  it('lets the host stop it', () => {
    const { P, exit } = chain(64, 1, 0.1);
    expect(
      () =>
        new Elimination(P, exit, () => {
          throw new Error('stop');
        }),
    ).toThrow('stop');
  });
});
