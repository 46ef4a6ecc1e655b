import { describe, expect, it } from 'vitest';
import { laneTicks } from '@/components/figures/rail-geometry';
import type { RailPoint } from '@/lib/client/kernel-protocol';
import {
  DRAWN_MOST,
  drawnValue,
  LANES,
  type LaneId,
  laneDomain,
  laneValueAt,
  limitLevel,
} from '@/lib/client/rail-lanes';

const lane = (id: LaneId) => {
  const found = LANES.find((other) => other.id === id);
  if (!found) throw new Error(id);
  return found;
};
const point = (sigma: number, values: Partial<RailPoint> = {}): RailPoint => ({
  sigma,
  meanTime: null,
  relaxationTime: null,
  gap: null,
  lyapunov: null,
  entropy: null,
  lostPerStep: null,
  ...values,
});

describe('a lane', () => {
  it('draws exit times up to 1e12, and keeps the number itself', () => {
    const points = [point(0.001, { meanTime: 1e40 }), point(0.1, { meanTime: 20 })];
    expect(drawnValue(lane('meanTime'), 1e40)).toBe(DRAWN_MOST);
    expect(laneDomain(lane('meanTime'), points)[1]).toBeLessThan(1e14);
    expect(laneValueAt(lane('meanTime'), points, 0.001)).toBe(1e40);
  });

  it('draws no loss of zero on a logarithmic scale, and no number that is not there', () => {
    expect(drawnValue(lane('lostPerStep'), 0)).toBeNull();
    expect(drawnValue(lane('lostPerStep'), 1e-30)).toBe(1e-12);
    expect(drawnValue(lane('gap'), null)).toBeNull();
    expect(drawnValue(lane('entropy'), -0.4)).toBe(-0.4);
  });

  it('of the exponent holds zero, whatever its values', () => {
    const [low, high] = laneDomain(lane('lyapunov'), [point(0.1, { lyapunov: 0.4 }), point(0.2, { lyapunov: 0.3 })]);
    expect(low).toBeLessThan(0);
    expect(high).toBeGreaterThan(0.4);
  });

  it('spans a constant and an empty curve without dividing by nothing', () => {
    for (const { id } of LANES) {
      const [low, high] = laneDomain(lane(id), [point(0.1, { [id]: 0.25 }), point(0.2, { [id]: 0.25 })]);
      expect(low).toBeLessThan(0.25);
      expect(high).toBeGreaterThan(0.25);
      const [from, to] = laneDomain(lane(id), []);
      expect(from).toBeLessThan(to);
    }
  });

  it('has two to four ticks inside its span', () => {
    for (const [id, low, high] of [
      ['meanTime', 0.9, 1.5e12],
      ['relaxationTime', 0.2, 4.2],
      ['lyapunov', -0.03, 0.43],
      ['lostPerStep', 1e-12, 0.4],
    ] as const) {
      const ticks = laneTicks(lane(id), [low, high]);
      expect(ticks.length, id).toBeGreaterThanOrEqual(2);
      expect(ticks.length, id).toBeLessThanOrEqual(4);
      for (const tick of ticks) expect(tick >= low && tick <= high, id).toBe(true);
    }
  });
});

describe('between two points', () => {
  const power = [0.01, 0.02, 0.08].map((sigma) => point(sigma, { meanTime: sigma ** -3, gap: Math.log(sigma) }));

  it('a power law of the noise level is met exactly by a logarithmic lane', () => {
    expect(laneValueAt(lane('meanTime'), power, 0.04)).toBeCloseTo(0.04 ** -3, 6);
  });

  it('a logarithm is met exactly by a linear lane', () => {
    expect(laneValueAt(lane('gap'), power, 0.03)).toBeCloseTo(Math.log(0.03), 12);
  });

  it('nothing is read off outside the points or beside a gap', () => {
    expect(laneValueAt(lane('meanTime'), power, 0.005)).toBeNull();
    expect(laneValueAt(lane('meanTime'), power, 0.09)).toBeNull();
    expect(laneValueAt(lane('lyapunov'), power, 0.03)).toBeNull();
  });

  it('the limit lies where the power law says, and nowhere when it is not crossed', () => {
    expect(limitLevel(power, 0.05 ** -3)).toBeCloseTo(0.05, 12);
    expect(limitLevel(power, 1e9)).toBeNull();
    expect(limitLevel(power, 1.5)).toBeNull();
  });

  it('of several crossings the limit is the first: below it every level complies', () => {
    const dip = [100, 10, 100, 10].map((meanTime, i) => point(0.01 * 2 ** i, { meanTime }));
    expect(limitLevel(dip, 50)).toBeLessThan(0.02);
  });
});
