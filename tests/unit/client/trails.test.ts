import { expect, it } from 'vitest';
import { trailsThrough } from '@/lib/client/trails';

const value = (re: number, im: number) => ({ re, im, modulus: Math.hypot(re, im) });

// Two eigenvalues that cross on the real axis at sigma = 0.5, beside a pair that turns; each list in another order.
const at = (sigma: number) => ({
  sigma,
  eigenvalues: [
    value(0.2 + 0.1 * sigma, 0),
    value(-0.5 * Math.cos(sigma), 0.5 * Math.sin(sigma)),
    value(0.3 - 0.1 * sigma, 0.01),
    value(-0.5 * Math.cos(sigma), -0.5 * Math.sin(sigma)),
  ].sort((a, b) => Math.sin(99 * sigma) * (a.re - b.re)),
});

it('follows each eigenvalue through levels that list them in any order', () => {
  const levels = [0.4, 0.2, 0.3, 0.1].map(at);
  const here = at(0.25).eigenvalues;
  for (const [i, { points }] of trailsThrough(levels, 0.25, here).entries()) {
    expect(points).toHaveLength(5);
    expect(points[2]).toEqual({ re: here[i].re, im: here[i].im });
    const kind = here[i].re < 0 ? Math.sign(here[i].im) * 2 : here[i].im;
    for (const point of points) expect(point.re < 0 ? Math.sign(point.im) * 2 : point.im).toBe(kind);
  }
});

it('ends where none is near, and takes no eigenvalue twice', () => {
  const here = [value(0.5, 0), value(0.52, 0)];
  const [first, second] = trailsThrough([{ sigma: 2, eigenvalues: [value(0.53, 0), value(-0.9, 0)] }], 1, here);
  expect(first.points).toEqual([{ re: 0.5, im: 0 }]);
  expect(second.points).toEqual([
    { re: 0.52, im: 0 },
    { re: 0.53, im: 0 },
  ]);
});
