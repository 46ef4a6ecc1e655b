import { describe, expect, it } from 'vitest';
import { erf, erfc } from '@/kernels/core/erf';
import { gaussLegendre } from '@/kernels/grid/gauss-legendre';

/** M. Abramowitz & I. A. Stegun, Handbook of Mathematical Functions, 1964, table 7.1 (from memory): x, erf x to ten digits. */
const TABLE_7_1 = [
  [0.02, 0.0225645747],
  [0.1, 0.112462916],
  [0.2, 0.2227025892],
  [0.3, 0.3286267595],
  [0.4, 0.428392355],
  [0.5, 0.5204998778],
  [0.6, 0.6038560908],
  [0.7, 0.6778011938],
  [0.8, 0.7421009647],
  [0.9, 0.7969082124],
  [1.0, 0.8427007929],
  [1.2, 0.9103139782],
  [1.4, 0.9522851198],
  [1.6, 0.9763483833],
  [1.8, 0.9890905016],
  [2.0, 0.995322265],
];

/** The same handbook, table 25.4 (from memory): order, non-negative nodes and weights to fifteen digits. */
const TABLE_25_4: [number, [number, number][]][] = [
  [2, [[0.577350269189626, 1]]],
  [
    3,
    [
      [0, 0.888888888888889],
      [0.774596669241483, 0.555555555555556],
    ],
  ],
  [
    4,
    [
      [0.339981043584856, 0.652145154862546],
      [0.861136311594053, 0.347854845137454],
    ],
  ],
  [
    5,
    [
      [0, 0.568888888888889],
      [0.538469310105683, 0.478628670499366],
      [0.906179845938664, 0.236926885056189],
    ],
  ],
  [
    6,
    [
      [0.238619186083197, 0.467913934572691],
      [0.661209386466265, 0.360761573048139],
      [0.932469514203152, 0.17132449237917],
    ],
  ],
  [
    8,
    [
      [0.18343464249565, 0.362683783378362],
      [0.525532409916329, 0.313706645877887],
      [0.796666477413627, 0.222381034453374],
      [0.960289856497536, 0.101228536290376],
    ],
  ],
];

describe('Abramowitz & Stegun', () => {
  it.each(TABLE_7_1)('table 7.1: erf(%d) to its ten digits, and erfc beside it', (x, value) => {
    expect(Math.abs(erf(x) - value)).toBeLessThan(0.51e-10);
    expect(Math.abs(erfc(x) - (1 - value))).toBeLessThan(0.51e-10);
  });

  it.each(TABLE_25_4)('table 25.4: the %d-point rule to its fifteen digits', (order, rows) => {
    const rule = gaussLegendre(order);
    for (const [node, weight] of rows) {
      const at = rule.nodes.findIndex((x) => Math.abs(x - node) < 1e-9);
      expect(Math.abs(rule.nodes[at] - node)).toBeLessThan(0.6e-15);
      expect(Math.abs(rule.weights[at] - weight)).toBeLessThan(0.8e-15);
      expect(rule.nodes).toContain(at < 0 ? Number.NaN : -rule.nodes[at] + 0);
    }
  });
});
