import { describe, expect, it } from 'vitest';
import { gaussLegendre } from '@/kernels/grid/gauss-legendre';

describe('Gauss–Legendre rules', () => {
  it.each([1, 2, 3, 5, 8, 16, 20, 33])('of %d points are exact up to degree 2n − 1 and no further', (order) => {
    const { nodes, weights } = gaussLegendre(order);
    const integral = (power: number) => nodes.reduce((s, x, i) => s + weights[i] * x ** power, 0);
    for (let p = 0; p < 2 * order; p++) expect(Math.abs(integral(p) - (p % 2 ? 0 : 2 / (p + 1)))).toBeLessThan(4e-15);
    // error of degree 2n: 2^(2n+1) (n!)^4 / ((2n+1) (2n)!^2), Abramowitz & Stegun 25.4.30 with f = x^2n (from memory)
    let error = 2 / (2 * order + 1);
    for (let k = 1; k <= order; k++) error *= (2 * k * k) ** 2 / (2 * k * (2 * k - 1)) ** 2;
    if (order <= 16) expect((2 / (2 * order + 1) - integral(2 * order)) / error).toBeCloseTo(1, order <= 8 ? 6 : 3);
  });

  it.each([64, 200, 512])(
    'of %d points keep their digits: cos over [-1, 1], weights that sum to 2, symmetric nodes',
    (order) => {
      const { nodes, weights } = gaussLegendre(order);
      const integral = nodes.reduce((s, x, i) => s + weights[i] * Math.cos(x), 0);
      expect(Math.abs(integral - 2 * Math.sin(1))).toBeLessThan(1e-13);
      nodes.forEach((x, i) => {
        expect(x).toBe(-nodes[order - 1 - i] + 0);
        if (i > 0) expect(x).toBeGreaterThan(nodes[i - 1]);
      });
    },
  );

  it.each([0, -1, 1.5, 513, Number.NaN])('of %d points do not exist: the allowed orders are named', (order) => {
    expect(() => gaussLegendre(order)).toThrow(/whole numbers from 1 to 512/);
  });
});
