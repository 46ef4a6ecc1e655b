import { expect, it } from 'vitest';
import { readColour, rowShades, shadeColour, stepNumbers } from '@/components/figures/strip-picture';

it('a row is darkest where the density peaks, and paper where there is none', () => {
  const x = Array.from({ length: 101 }, (_, i) => i / 100);
  const shades = rowShades({ x, values: x.map((at) => Math.exp(-(((at - 0.3) / 0.05) ** 2))) }, 0, 1, 50);
  expect(shades.indexOf(Math.max(...shades))).toBeGreaterThanOrEqual(14);
  expect(shades.indexOf(Math.max(...shades))).toBeLessThanOrEqual(15);
  expect(Math.max(...shades)).toBeGreaterThan(0.97);
  expect(shades[45]).toBeLessThan(1e-6);
});

it('a linear density is read straight between coarse points', () => {
  const shades = rowShades({ x: [0, 1], values: [0, 2] }, 0, 1, 4);
  for (const [i, shade] of shades.entries()) expect(shade ** 2).toBeCloseTo((i + 0.5) / 4, 6);
});

it('nothing left, or nothing computed, is paper', () => {
  expect([...rowShades({ x: [0, 1], values: [0, 0] }, 0, 1, 3)]).toEqual([0, 0, 0]);
  expect([...rowShades({ x: [], values: [] }, 0, 1, 3)]).toEqual([0, 0, 0]);
});

it('shades go from paper over rain to ink', () => {
  const [paper, rain, ink] = [[250, 250, 250] as const, [40, 100, 140] as const, [20, 30, 40] as const];
  expect(shadeColour(0, paper, rain, ink)).toEqual([250, 250, 250]);
  expect(shadeColour(0.72, paper, rain, ink)).toEqual([40, 100, 140]);
  expect(shadeColour(1, paper, rain, ink)).toEqual([20, 30, 40]);
  expect(readColour(' #256a8c')).toEqual([37, 106, 140]);
  expect(readColour('rgb(1, 2, 3)')).toEqual([1, 2, 3]);
  expect(readColour('CanvasText')).toBeNull();
});

it('mean and standard deviation are those of the mass that is left', () => {
  // A uniform density on [0, 1] with half its mass: mean 1/2, variance 1/12.
  const n = 4000;
  const x = Array.from({ length: n }, (_, i) => (i + 0.5) / n);
  const { mass, mean, sd } = stepNumbers(
    x.map(() => 0.5),
    x,
    x.map(() => 1 / n),
  );
  expect(mass).toBeCloseTo(0.5, 12);
  expect(mean).toBeCloseTo(0.5, 12);
  expect(sd).toBeCloseTo(Math.sqrt(1 / 12), 6);
  expect(stepNumbers([0, 0], [0, 1], [0.5, 0.5])).toEqual({ mass: 0, mean: null, sd: null });
});
