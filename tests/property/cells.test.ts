import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CellOperator } from '@/kernels/operators/cell-operator';
import { dot, noisyMaps, randomValues, seeded, seeds } from '../support/kernel-maps';

const cells = fc.integer({ min: 2, max: 200 });

describe('cells of random maps', () => {
  it('keep every cell’s mass: what arrives and what is lost add up to one', () => {
    fc.assert(
      fc.property(noisyMaps(), cells, ({ model, boundary, name }, n) => {
        const operator = new CellOperator(model, boundary, n);
        const arrived = new Float64Array(n);
        operator.applyAdjoint(new Float64Array(n).fill(1), arrived);
        arrived.forEach((a, j) => {
          expect(Math.abs(a + operator.lost[j] - 1), `${name}, cell ${j} of ${n}`).toBeLessThan(1e-12);
          expect(operator.lost[j]).toBeGreaterThanOrEqual(0);
        });
      }),
      seeded(60),
    );
  });

  it('have an adjoint and stay positive exactly', () => {
    fc.assert(
      fc.property(noisyMaps(), cells, seeds, ({ model, boundary, name }, n, seed) => {
        const operator = new CellOperator(model, boundary, n);
        const rho = randomValues(n, seed);
        const g = randomValues(n, seed + 3, -1, 1);
        const forward = new Float64Array(n);
        const back = new Float64Array(n);
        operator.apply(rho, forward);
        operator.applyAdjoint(g, back);
        const gap = dot(forward, g, operator.weights) - dot(rho, back, operator.weights);
        expect(Math.abs(gap), name).toBeLessThan(1e-13 * n);
        expect(Math.min(...forward)).toBeGreaterThanOrEqual(0);
      }),
      seeded(60),
    );
  });

  it('put mass where points go: a cell’s image is where random points of it land', () => {
    fc.assert(
      fc.property(
        noisyMaps({ lose: true }),
        fc.integer({ min: 4, max: 40 }),
        seeds,
        ({ model, boundary, name }, n, seed) => {
          const operator = new CellOperator(model, boundary, n);
          const { from, to } = boundary;
          const h = (to - from) / n;
          const j = seed % n;
          const unit = new Float64Array(n);
          unit[j] = 1;
          const out = new Float64Array(n);
          operator.apply(unit, out);
          // equidistant points of the cell, counted where they land; the count is right to one point per boundary crossed
          const COUNT = 4000;
          const x = Float64Array.from({ length: COUNT }, (_, k) => from + h * (j + (k + 0.5) / COUNT));
          const y = new Float64Array(COUNT);
          model.evaluate(x, y);
          const seen = new Float64Array(n);
          for (let v of y) {
            if (boundary.low === 'reflecting' && v < from) v = 2 * from - v;
            else if (boundary.high === 'reflecting' && v > to) v = 2 * to - v;
            if (v >= from && v < to) seen[Math.floor((v - from) / h)] += 1 / COUNT;
          }
          out.forEach((share, i) => {
            expect(Math.abs(share - seen[i]), `${name}, from ${j} to ${i} of ${n}`).toBeLessThan(12 / COUNT);
          });
        },
      ),
      seeded(40),
    );
  });
});
