import { Matrix } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { smallEigen } from '@/kernels/spectrum/small-eigen';

describe('eigenpairs of a small matrix', () => {
  it('come largest modulus first, pairs side by side, with vectors that satisfy Av = λv', () => {
    const A = new Matrix([
      [0.1, -0.9, 0, 0],
      [0.9, 0.1, 0, 0.3],
      [0, 0, 0.5, 1],
      [0, 0, 0, -0.7],
    ]);
    const { re, im, vectors } = smallEigen(A);
    expect(im[0]).toBeGreaterThan(0);
    expect(im[1]).toBe(-im[0]);
    expect([...re].map((v) => Math.round(v * 1e12) / 1e12)).toEqual([0.1, 0.1, -0.7, 0.5]);
    const image = A.mmul(vectors);
    for (let i = 0; i < 4; i++) {
      // (a + ib): A a = re a − im b, A b = im a + re b
      expect(image.get(i, 0)).toBeCloseTo(re[0] * vectors.get(i, 0) - im[0] * vectors.get(i, 1), 12);
      expect(image.get(i, 1)).toBeCloseTo(im[0] * vectors.get(i, 0) + re[0] * vectors.get(i, 1), 12);
      expect(image.get(i, 2)).toBeCloseTo(re[2] * vectors.get(i, 2), 12);
    }
  });

  it('have condition one where the matrix is symmetric, and 1/cos of the angle between left and right elsewhere', () => {
    const symmetric = smallEigen(
      new Matrix([
        [2, 1],
        [1, 0],
      ]),
    );
    for (const c of symmetric.condition) expect(c).toBeCloseTo(1, 12);
    // [[1, a], [0, 0]]: right (1, 0), left (1, a): condition √(1 + a²)
    const a = 30;
    for (const c of smallEigen(
      new Matrix([
        [1, a],
        [0, 0],
      ]),
    ).condition)
      expect(c).toBeCloseTo(Math.hypot(1, a), 8);
  });

  it('have a condition without bound where the matrix is defective', () => {
    const { condition } = smallEigen(
      new Matrix([
        [1, 1],
        [0, 1],
      ]),
    );
    expect(Math.min(...condition)).toBeGreaterThan(1e12);
  });
});
