import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { byElimination, bySweeps } from '@/kernels/exits/exit-solution';
import { boundaryOf } from '@/kernels/operators/ends';
import { NoisySolver } from '@/kernels/solve/noisy-solver';
import { dot, modelOn, type NoisyMap, noisyMaps, planOf, seeded } from '../support/kernel-maps';

function both(map: NoisyMap) {
  const plan = planOf(map);
  const solver = new NoisySolver(plan, map.sigma);
  const leave = solver.leaveProbability();
  const direct = plan.directOperator(map.sigma);
  const density = solver.stationary();
  return { solver, leave, one: byElimination(direct, leave, density), two: bySweeps(direct, leave, density) };
}

const relative = (a: number, b: number) => Math.abs(a / b - 1);

describe('exits of random maps', () => {
  it('are the same by elimination and by sweeps, to 1e-11 of themselves', () => {
    let compared = 0;
    fc.assert(
      fc.property(noisyMaps({ lose: true, least: 0.06 }), (map) => {
        const { one, two, leave } = both(map);
        if (!two.converged || !one.converged || one.perStep > 0.999) return;
        compared++;
        expect(relative(one.perStep, two.perStep), map.name).toBeLessThan(1e-11);
        one.field.forEach((t, i) => {
          expect(relative(t, two.field[i]), map.name).toBeLessThan(1e-11);
          expect(t).toBeGreaterThanOrEqual(1 - 1e-12);
          // nobody leaves later than the least hasty place allows
          expect(t * Math.min(...leave)).toBeLessThanOrEqual(1 + 1e-9);
        });
      }),
      seeded(30),
    );
    expect(compared).toBeGreaterThan(15);
  });

  it('keep their digits where they are rare: a contracting map that leaves once in 10⁶ to 10³⁰ steps', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.05, max: 0.11, noNaN: true }),
        fc.double({ min: -0.5, max: 0.4, noNaN: true }),
        (sigma, b) => {
          const line = { name: '', value: (u: number) => 0.5 + b * (u - 0.5), slope: () => b, breaks: [] };
          const map = {
            name: `${b}, ${sigma}`,
            model: modelOn(line, 0, 1),
            boundary: boundaryOf(0, 1, 'absorbing'),
            sigma,
          };
          const { one, two } = both(map);
          expect(one.perStep, map.name).toBeLessThan(1e-4);
          expect(one.perStep, map.name).toBeGreaterThan(0);
          expect(relative(one.perStep, two.perStep), map.name).toBeLessThan(1e-11);
          expect(relative(Math.max(...one.field), Math.max(...two.field)), map.name).toBeLessThan(1e-11);
        },
      ),
      seeded(15),
    );
  });

  it('obey τ = 1 + L†τ, and the mean from the quasi-stationary density is 1/rate', () => {
    fc.assert(
      fc.property(noisyMaps({ lose: true, least: 0.06 }), (map) => {
        const plan = planOf(map);
        const { one } = both(map);
        fc.pre(one.converged && one.perStep > 1e-6 && one.perStep < 0.99);
        const pulled = new Float64Array(one.field.length);
        plan.directOperator(map.sigma).applyAdjoint(one.field, pulled);
        one.field.forEach((t, i) => {
          expect(relative(t, 1 + pulled[i]), map.name).toBeLessThan(1e-12);
        });
        expect(relative(dot(one.field, one.density, plan.grid.weights), 1 / one.perStep), map.name).toBeLessThan(1e-9);
      }),
      seeded(15),
    );
  });
});
