import { describe, expect, it } from 'vitest';
import { countByNeed, cutByNeed, interpolationWeights, panelGrid, sampleNeed } from '@/kernels/grid/panels';

describe('panels', () => {
  it('integrate piecewise: a corner at an edge costs nothing', () => {
    const grid = panelGrid([0, 0.3, 1], 12);
    const integral = grid.x.reduce((s, x, i) => s + grid.weights[i] * Math.abs(x - 0.3), 0);
    expect(Math.abs(integral - (0.3 ** 2 + 0.7 ** 2) / 2)).toBeLessThan(1e-15);
    expect(grid.panels.map((p) => [p.first, p.order])).toEqual([
      [0, 12],
      [12, 12],
    ]);
  });

  it('take an order each, and refuse edges that do not increase', () => {
    expect(panelGrid([0, 1, 2], [3, 5]).x.length).toBe(8);
    expect(() => panelGrid([0, 1, 1], 4)).toThrow(/edges 1, 1/);
  });

  it('are cut where the need is: a need ten times as dense gets ten times the panels', () => {
    const need = sampleNeed([0, 1, 2], (x, out) => {
      for (let i = 0; i < x.length; i++) out[i] = x[i] < 1 ? 40 : 4;
    });
    const edges = cutByNeed(need, 1);
    expect(edges.filter((e) => e < 1).length).toBe(40);
    expect(edges.filter((e) => e >= 1 && e < 2).length).toBe(4);
    expect(edges).toContain(1);
    expect(edges.length - 1).toBe(countByNeed(need, 1));
  });

  it('shrink smoothly with a need that varies: each holds the same share', () => {
    const need = sampleNeed([0, 1], (x, out) => {
      for (let i = 0; i < x.length; i++) out[i] = 20 * Math.exp(3 * x[i]);
    });
    const edges = cutByNeed(need, 1);
    const share = (i: number) => (20 / 3) * (Math.exp(3 * edges[i + 1]) - Math.exp(3 * edges[i]));
    for (let i = 0; i + 1 < edges.length; i++) {
      expect(share(i)).toBeLessThanOrEqual(1.02);
      expect(share(i)).toBeGreaterThan(0.9);
    }
  });

  it('interpolate polynomials of degree order − 1 exactly, with weights that sum to one', () => {
    const grid = panelGrid([2, 5], 9);
    const weights = new Float64Array(9);
    for (const at of [2, 2.3, 3.5, 4.99, 5, grid.x[4]]) {
      interpolationWeights(grid.panels[0], at, weights);
      const value = weights.reduce((s, w, i) => s + w * (grid.x[i] - 3) ** 8, 0);
      expect(Math.abs(value - (at - 3) ** 8)).toBeLessThan(1e-12 * 256);
      expect(weights.reduce((s, w) => s + w, 0)).toBeCloseTo(1, 13);
    }
  });
});
