import { describe, expect, it } from 'vitest';
import { MOST_POINTS, planPanels } from '@/kernels/grid/plan-panels';
import { boundaryOf } from '@/kernels/operators/ends';
import { plainModel } from '../../support/kernel-maps';

const model = (slope: number, breaks: number[] = []) =>
  plainModel((x, out, s) => {
    for (let i = 0; i < x.length; i++) {
      out[i] = slope * x[i];
      if (s) s[i] = slope;
    }
  }, breaks);
const closed = boundaryOf(0, 1, 'reflecting');
const plan = (request: { points: number } | { tolerance: number }, sigma = 0.01, factor = 1, m = model(2)) =>
  planPanels(m, closed, sigma, request, factor, 8.9 * sigma);

describe('the plan of panels', () => {
  it.each([64, 100, 257, 1000])('takes exactly the %d points asked for', (points) => {
    expect(plan({ points }).grid.x.length).toBe(points);
    expect(plan({ points }, 0.01, 1.2).grid.x.length).toBe(Math.round(1.2 * points));
  });

  it('says whether the points asked for resolve the noise', () => {
    const { enough } = plan({ tolerance: 1e-8 });
    expect(plan({ points: enough }).resolved).toBe(true);
    expect(plan({ points: Math.round(enough / 2) }).resolved).toBe(false);
  });

  it('grows with the slope and shrinks with the noise', () => {
    const count = (sigma: number, slope: number) => plan({ tolerance: 1e-8 }, sigma, 1, model(slope)).grid.x.length;
    expect(count(0.005, 2) / count(0.01, 2)).toBeCloseTo(2, 0);
    expect(count(0.001, 8) / count(0.001, 1)).toBeCloseTo(Math.sqrt(65 / 2), 0);
  });

  it('puts breaks on panel edges', () => {
    const { panels } = plan({ tolerance: 1e-8 }, 0.05, 1, model(2, [0.3, 0.61803])).grid;
    const edges = panels.map((p) => p.from);
    expect(edges).toContain(0.3);
    expect(edges).toContain(0.61803);
  });

  it('refuses noise too small for any affordable grid, and says from where on it would do', () => {
    let message = '';
    try {
      plan({ tolerance: 1e-8 }, 1e-5);
    } catch (error) {
      expect(error).toBeInstanceOf(RangeError);
      message = (error as Error).message;
    }
    expect(message).toContain('sigma 0.00001');
    expect(message).toContain(`${MOST_POINTS}`);
    const from = Number(/from (?:about )?([\d.e-]+)/.exec(message)?.[1]);
    expect(plan({ tolerance: 1e-8 }, 1.05 * from).grid.x.length).toBeLessThanOrEqual(MOST_POINTS);
  });
});
