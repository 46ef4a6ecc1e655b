import { describe, expect, it } from 'vitest';
import { panelGrid } from '@/kernels/grid/panels';
import { gaussian } from '@/kernels/noise/gaussian';
import { DirectOperator } from '@/kernels/operators/direct-operator';
import { boundaryOf, foldImage, imagesOf } from '@/kernels/operators/ends';

const grid = panelGrid([0, 0.4, 1], 10);
const n = grid.x.length;

describe.each(['periodic', 'reflecting', 'absorbing'] as const)('direct sums with %s ends', (ends) => {
  const b = boundaryOf(0, 1, ends);
  it.each([0.03, 0.2, 3])('and sigma %d are the kernel summed over images, entry by entry', (sigma) => {
    const images = grid.x.map((x) => foldImage(b, 3.3 * x * (1 - x) + 0.3));
    const reach = 9 * sigma;
    const dense = new DirectOperator(
      grid.x,
      grid.weights,
      images,
      b,
      (d) => gaussian.density(d, sigma),
      reach,
    ).toDense();
    const list = imagesOf(b, reach);
    for (let i = 0; i < n; i++)
      for (let j = 0; j < n; j++) {
        const expected = list.reduce(
          (s, m) => s + gaussian.density(m.sign * grid.x[i] + m.shift - images[j], sigma),
          0,
        );
        expect(Math.abs(dense[i * n + j] - expected)).toBeLessThan(1e-14 * gaussian.density(0, sigma));
      }
  });
});

describe('direct sums', () => {
  it('leave out images that are not a number', () => {
    const images = grid.x.map(() => Number.NaN);
    const operator = new DirectOperator(grid.x, grid.weights, images, boundaryOf(0, 1, 'absorbing'), () => 1, 1);
    expect(operator.entryCount).toBe(0);
  });

  it('keep a value of 10⁻²⁵⁰ to its digits', () => {
    const sigma = 0.02;
    const images = new Float64Array(n).fill(0.0001);
    const operator = new DirectOperator(
      grid.x,
      grid.weights,
      images,
      boundaryOf(0, 1, 'absorbing'),
      (d) => gaussian.density(d, sigma),
      40 * sigma,
    );
    const out = new Float64Array(n);
    operator.apply(new Float64Array(n).fill(1), out);
    const i = grid.x.findIndex((x) => x > 0.65);
    expect(out[i]).toBeLessThan(1e-200);
    expect(out[i] / gaussian.density(grid.x[i] - 0.0001, sigma)).toBeCloseTo(1, 12);
  });
});
