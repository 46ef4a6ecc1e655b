import { describe, expect, it } from 'vitest';
import { gaussian } from '@/kernels/noise/gaussian';
import { boundaryOf, exitProbability, foldImage, imagesOf, loses } from '@/kernels/operators/ends';
import type { Ends } from '@/kernels/spec';

const [from, to] = [-0.7, 1.6];
const length = to - from;

/** One reflection at a time, as the rule is stated; null: lost at an absorbing end. */
function byRule(ends: Ends, y: number): number | null {
  if (ends === 'periodic') {
    while (y < from) y += length;
    while (y >= to) y -= length;
    return y;
  }
  const [low, high] = typeof ends === 'string' ? [ends, ends] : ends;
  for (;;) {
    if (y < from) {
      if (low === 'absorbing') return null;
      y = 2 * from - y;
    } else if (y > to) {
      if (high === 'absorbing') return null;
      y = 2 * to - y;
    } else return y;
  }
}

const KINDS: Ends[] = ['periodic', 'reflecting', 'absorbing', ['reflecting', 'absorbing'], ['absorbing', 'reflecting']];

describe.each(KINDS.map((ends) => [String(ends), ends] as const))('%s ends', (_, ends) => {
  const b = boundaryOf(from, to, ends);
  const sigma = 0.8;

  it('give a position the density of all its images: brute force agrees', () => {
    // noise drawn on a fine grid, folded one reflection at a time, counted in bins
    const y = 0.4;
    const BINS = 23;
    const STEPS = 400_000;
    const seen = new Float64Array(BINS);
    let lost = 0;
    for (let i = 0; i < STEPS; i++) {
      const d = -8 * sigma + (16 * sigma * (i + 0.5)) / STEPS;
      const p = (gaussian.density(d, sigma) * 16 * sigma) / STEPS;
      const end = byRule(ends, y + d);
      if (end === null) lost += p;
      else seen[Math.min(BINS - 1, Math.floor(((end - from) / length) * BINS))] += p;
    }
    const images = imagesOf(b, 8.9 * sigma);
    seen.forEach((mass, k) => {
      const [lo, hi] = [from + (k * length) / BINS, from + ((k + 1) * length) / BINS];
      // mass of the images in the bin, from tails
      const expected = images.reduce((s, { sign, shift }) => {
        const edges = [sign * lo + shift - y, sign * hi + shift - y].sort((p, q) => p - q);
        return s + gaussian.tail(edges[0], sigma) - gaussian.tail(edges[1], sigma);
      }, 0);
      expect(Math.abs(mass - expected)).toBeLessThan(1e-5);
    });
    expect(Math.abs(exitProbability(b, y, (d) => gaussian.tail(d, sigma)) - lost)).toBeLessThan(1e-5);
  });

  it('fold an image to where the same noise lands in the end', () => {
    for (const y of [-9.3, -3.1, -1.9, -0.7, -0.69, 0, 1.6, 1.61, 2.9, 14.2]) {
      const folded = foldImage(b, y);
      for (const d of [-1.3, -0.2, 0, 0.4, 2.2]) {
        // symmetric noise: y + d or, mirrored, y − d
        const ways = [byRule(ends, folded + d), byRule(ends, folded - d)];
        const wanted = byRule(ends, y + d);
        // an image beyond a reflecting end of a mixed pair may meet the absorbing one first: only noise decides there
        if (wanted === null || (typeof ends !== 'string' && Math.abs(y) > 2.5)) continue;
        expect(
          ways.some((w) => w !== null && Math.abs(w - wanted) < 1e-12),
          `${y} + ${d}`,
        ).toBe(true);
      }
    }
    expect(foldImage(b, Number.NaN)).toBeNaN();
  });
});

describe('ends', () => {
  it('lose mass only where one absorbs', () => {
    expect(KINDS.map((ends) => loses(boundaryOf(0, 1, ends)))).toEqual([false, false, true, true, true]);
  });

  it('keep the digits of a probability that is nearly nothing', () => {
    const b = boundaryOf(0, 1, 'absorbing');
    const p = exitProbability(b, 0.5, (d) => gaussian.tail(d, 0.02));
    // 2·½·erfc(25/√2): 6.1133e-138, by erfc's asymptotic series
    const z = 25;
    const series = 1 - 1 / z ** 2 + 3 / z ** 4 - 15 / z ** 6 + 105 / z ** 8;
    expect(p / ((2 * Math.exp(-0.5 * z * z) * series) / (z * Math.sqrt(2 * Math.PI)))).toBeCloseTo(1, 8);
  });

  it('refuse a domain that is none, and the kind that is not known here', () => {
    expect(() => boundaryOf(1, 1, 'periodic')).toThrow(/domain 1 to 1/);
    expect(() => boundaryOf(0, 1, 'holding')).toThrow(/not computed yet/);
  });
});
