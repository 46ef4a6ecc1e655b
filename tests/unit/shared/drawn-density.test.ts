import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { run } from '@/kernels';
import { parseStudy } from '@/kernels/study/parse-study';
import { DRAWN_PLACES, drawnFormula, drawnHeights, drawnPlace, MOST_HEIGHT } from '@/lib/shared/drawn-density';
import type { StudyFile } from '@/lib/shared/study-types';

const heights = fc.array(fc.integer({ min: 0, max: MOST_HEIGHT }), {
  minLength: DRAWN_PLACES,
  maxLength: DRAWN_PLACES,
});
const domain = fc
  .tuple(fc.double({ min: -1e4, max: 1e4, noNaN: true }), fc.double({ min: 1, max: 1e4, noNaN: true }))
  .map(([from, length]) => ({ from: Number(from.toPrecision(4)), to: Number((from + length).toPrecision(4)) }))
  .filter(({ from, to }) => (to - from) / Math.max(Math.abs(from), Math.abs(to)) > 1e-2);

function study(formula: string, from: number, to: number): StudyFile {
  return {
    format: 'smirr-study',
    version: 1,
    system: { type: 'map', formulas: ['x/2'], variables: ['x'], parameters: {} },
    noise: { kind: 'gaussian', sigma: 0.05 * (to - from) },
    domain: [{ from, to, ends: 'reflecting' }],
    ask: { density: { start: { kind: 'formula', formula }, at: [0] } },
  };
}

describe('a density drawn by hand', () => {
  it('is a formula that a study takes, from which the drawing comes back', () => {
    fc.assert(
      fc.property(heights, domain, (drawn, { from, to }) => {
        const formula = drawnFormula(drawn, 'x', from, to);
        expect(formula.length).toBeLessThanOrEqual(2000);
        expect(parseStudy(study(formula, from, to)).faults).toBeUndefined();
        expect(drawnHeights(formula, 'x', from, to)).toEqual(drawn);
      }),
      { seed: 11, numRuns: 100 },
    );
  });

  it('is no drawing on another domain, with another name or by another hand', () => {
    const formula = drawnFormula(Array(DRAWN_PLACES).fill(10), 'x', 0, 1);
    expect(drawnHeights(formula, 'x', 0, 2)).toBeNull();
    expect(drawnHeights(formula, 'y', 0, 1)).toBeNull();
    expect(drawnHeights('exp(-x)', 'x', 0, 1)).toBeNull();
  });

  it('has the heights that were drawn, made a density', () => {
    const drawn = Array.from({ length: DRAWN_PLACES }, (_, i) => Math.max(0, 80 - 20 * Math.abs(i - 5)));
    const { study: parsed } = parseStudy(study(drawnFormula(drawn, 'x', 0, 1), 0, 1));
    if (!parsed) throw new Error('refused');
    const { density, grid } = run(parsed, { runtime: 'test' }).cases[0];
    // By hand: a triangle of height 80 and half-width 4/20 has area 16; its density at the peak is 80/16 = 5.
    const values = density?.[0].values ?? [];
    const near = (place: number) => {
      const x = grid.x[0];
      const at = x.reduce((best, value, i) => (Math.abs(value - place) < Math.abs(x[best] - place) ? i : best), 0);
      return [x[at], values[at]];
    };
    for (const place of [drawnPlace(3, 0, 1), drawnPlace(5, 0, 1), drawnPlace(8, 0, 1), 0.9]) {
      const [x, value] = near(place);
      expect(value).toBeCloseTo(Math.max(0, (80 - 400 * Math.abs(x - 0.25)) / 16), 6);
    }
  });
});
