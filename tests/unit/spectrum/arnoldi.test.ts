import { EigenvalueDecomposition, Matrix } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { arnoldi } from '@/kernels/spectrum/arnoldi';
import { randomValues } from '../../support/kernel-maps';

const apply = (rows: number[][]) => (v: Float64Array, out: Float64Array) => {
  rows.forEach((row, i) => {
    out[i] = row.reduce((s, a, j) => s + a * v[j], 0);
  });
};
const one = (n: number) => new Float64Array(n).fill(1);
const start = (n: number) => randomValues(n, 17, 0.5, 1.5);

/** Random matrix with entries from −1 to 1, scaled to a spectral radius of about one. */
function randomMatrix(n: number, seed: number): number[][] {
  const values = randomValues(n * n, seed, -1, 1);
  return Array.from({ length: n }, (_, i) =>
    [...values.subarray(i * n, i * n + n)].map((v) => (v * Math.sqrt(3)) / Math.sqrt(n)),
  );
}

const moduli = (list: readonly { re: number; im: number }[]) => list.map((p) => Math.hypot(p.re, p.im));

describe('Arnoldi’s method', () => {
  it.each([30, 80, 200])(
    'finds the leading eigenvalues of a random matrix of %d rows, restarting where it must',
    (n) => {
      const rows = randomMatrix(n, n);
      const all = new EigenvalueDecomposition(new Matrix(rows));
      const exact = all.realEigenvalues.map((re, i) => ({ re, im: all.imaginaryEigenvalues[i] }));
      const result = arnoldi(apply(rows), one(n), {
        count: 6,
        tolerance: 1e-12,
        start: start(n),
        space: 36,
        restarts: 300,
      });
      expect(result.converged).toBe(true);
      if (n > 36) expect(result.steps).toBeGreaterThan(36);
      const wanted = exact.sort((a, b) => Math.hypot(b.re, b.im) - Math.hypot(a.re, a.im)).slice(0, 6);
      for (const w of wanted)
        expect(Math.min(...result.pairs.map((p) => Math.hypot(p.re - w.re, p.im - w.im)))).toBeLessThan(1e-9);
    },
  );

  it('gives vectors that are what it says, within the residual it states', () => {
    const n = 60;
    const rows = randomMatrix(n, 5);
    const { pairs } = arnoldi(apply(rows), one(n), { count: 5, tolerance: 1e-12, start: start(n), restarts: 300 });
    for (const { re, im, vector, imaginary, residual } of pairs) {
      const a = new Float64Array(n);
      const b = new Float64Array(n);
      apply(rows)(vector, a);
      const w = imaginary ?? new Float64Array(n);
      apply(rows)(w, b);
      let rest = 0;
      for (let i = 0; i < n; i++)
        rest += (a[i] - re * vector[i] + im * w[i]) ** 2 + (b[i] - im * vector[i] - re * w[i]) ** 2;
      expect(Math.sqrt(rest)).toBeLessThan(2 * residual + 1e-13);
    }
  });

  it('keeps conjugate pairs together: one more is given rather than half a pair', () => {
    // rotations by different angles, shrunk differently: moduli 0.9, 0.9, 0.7, 0.7, …
    const n = 12;
    const rows = Array.from({ length: n }, () => new Array<number>(n).fill(0));
    for (let k = 0; k < n / 2; k++) {
      const [c, s] = [Math.cos(1 + k), Math.sin(1 + k)].map((v) => v * (0.9 - 0.13 * k));
      rows[2 * k][2 * k] = rows[2 * k + 1][2 * k + 1] = c;
      rows[2 * k][2 * k + 1] = -s;
      rows[2 * k + 1][2 * k] = s;
    }
    for (const count of [1, 2, 3, 5]) {
      const { pairs } = arnoldi(apply(rows), one(n), { count, tolerance: 1e-13, start: start(n) });
      expect(pairs.length).toBe(count + (count % 2));
      for (let j = 0; j < pairs.length; j += 2) {
        expect(pairs[j].im).toBeGreaterThan(0);
        expect(pairs[j + 1].im).toBe(-pairs[j].im);
        expect(moduli(pairs)[j]).toBeCloseTo(0.9 - 0.13 * (j / 2), 12);
      }
    }
  });

  it('sees how sensitive eigenvalues of a far from normal matrix are', () => {
    // triangular: eigenvalues 1, 0.9, …; condition of the first by its left and right vectors
    const n = 8;
    const rows = Array.from({ length: n }, (_, i) =>
      Array.from({ length: n }, (_, j) => (j === i ? 1 - 0.1 * i : j > i ? 3 : 0)),
    );
    const { pairs } = arnoldi(apply(rows), one(n), { count: 2, tolerance: 1e-13, start: start(n) });
    expect(pairs[0].re).toBeCloseTo(1, 8);
    expect(pairs[0].condition).toBeGreaterThan(1e3);
    const normal = arnoldi((v, out) => out.set(v.map((x, i) => x * 0.8 ** i)), one(n), {
      count: 2,
      tolerance: 1e-13,
      start: start(n),
    });
    expect(normal.pairs[0].condition).toBeCloseTo(1, 10);
  });

  it('on a nilpotent shift finds nothing but zeros of the size that round-off’s root makes', () => {
    const n = 6;
    const { pairs, converged } = arnoldi(
      (v, out) => {
        for (let i = 0; i < n; i++) out[i] = i + 1 < n ? v[i + 1] : 0;
      },
      one(n),
      { count: 3, tolerance: 1e-13, start: start(n) },
    );
    expect(converged).toBe(true);
    for (const size of moduli(pairs)) expect(size).toBeLessThan(1e-2);
  });

  it('measures by its weights: a weighted symmetric operator keeps condition one', () => {
    const n = 40;
    const weights = randomValues(n, 3, 0.1, 2);
    const x = randomValues(n, 8);
    const { pairs } = arnoldi(
      (v, out) => {
        for (let i = 0; i < n; i++) {
          out[i] = 0;
          for (let j = 0; j < n; j++) out[i] += Math.exp(-8 * (x[i] - x[j]) ** 2) * weights[j] * v[j];
        }
      },
      weights,
      { count: 3, tolerance: 1e-13, start: start(n) },
    );
    for (const { condition, im, vector } of pairs) {
      expect(im).toBe(0);
      expect(condition).toBeCloseTo(1, 8);
      expect(vector.reduce((s, v, i) => s + weights[i] * v * v, 0)).toBeCloseTo(1, 12);
    }
  });

  it('says where it did not converge, and what it has', () => {
    const n = 300;
    // 300 eigenvalues crowded between 1 and 0.99
    const result = arnoldi((v, out) => out.set(v.map((x, i) => x * (1 - (0.01 * i) / n))), one(n), {
      count: 4,
      tolerance: 1e-14,
      start: start(n),
      space: 12,
      restarts: 1,
    });
    expect(result.converged).toBe(false);
    expect(Math.max(...result.pairs.map((p) => p.residual))).toBeGreaterThan(1e-14);
  });

  it('refuses a zero start and a count below one', () => {
    const zero = { count: 1, tolerance: 1e-12, start: new Float64Array(5) };
    expect(() => arnoldi((v, out) => out.set(v), one(5), zero)).toThrow(/start vector/);
    expect(() => arnoldi((v, out) => out.set(v), one(5), { ...zero, count: 0, start: one(5) })).toThrow(/count 0/);
  });
});
