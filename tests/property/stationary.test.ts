import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boundaryOf } from '@/kernels/operators/ends';
import { NoisySolver } from '@/kernels/solve/noisy-solver';
import { largestGap, modelOn, noisyMaps, peak, planOf, seeded } from '../support/kernel-maps';

describe('stationary densities of random noisy maps', () => {
  it('stay what they are under one more step, but for what leaves', () => {
    fc.assert(
      fc.property(noisyMaps(), (map) => {
        const solver = new NoisySolver(planOf(map), map.sigma);
        const kept = solver.kept();
        fc.pre(kept > 1e-6); // a map that throws everything out has no long run
        const rho = solver.stationary();
        const next = new Float64Array(rho.length);
        solver.operator.apply(rho, next);
        expect(solver.integral(rho)).toBeCloseTo(1, 12);
        expect(
          largestGap(
            next,
            rho.map((v) => v * kept),
          ) / peak(rho),
          map.name,
        ).toBeLessThan(1e-11);
        if (!solver.loses) expect(Math.abs(kept - 1), map.name).toBeLessThan(1e-12);
      }),
      seeded(30),
    );
  });

  it('are positive to round-off', () => {
    fc.assert(
      fc.property(noisyMaps({ lose: false }), (map) => {
        const rho = new NoisySolver(planOf(map), map.sigma).stationary();
        expect(Math.min(...rho) / peak(rho), map.name).toBeGreaterThan(-1e-11);
      }),
      seeded(20),
    );
  });
});

describe('reflecting ends', () => {
  it('have the even half of the spectrum of the doubled circle, where the map is continued oddly', () => {
    const shapes = fc.tuple(
      fc.double({ min: 0.1, max: 0.9, noNaN: true }),
      fc.double({ min: -2, max: 2, noNaN: true }),
      fc.double({ min: 0.05, max: 0.3, noNaN: true }),
    );
    fc.assert(
      fc.property(shapes, ([a, b, sigma]) => {
        // F(x) = a + b x (1 − x) on [0, 1]; −F(−x) on [−1, 0]
        const half = {
          name: '',
          value: (u: number) => a + b * u * (1 - u),
          slope: (u: number) => b * (1 - 2 * u),
          breaks: [],
        };
        const whole = {
          ...half,
          value: (u: number) => (u < 0.5 ? 0.5 - half.value(1 - 2 * u) / 2 : 0.5 + half.value(2 * u - 1) / 2),
          slope: (u: number) => half.slope(u < 0.5 ? 1 - 2 * u : 2 * u - 1),
          breaks: [0.5],
        };
        const solve = (
          map: typeof whole | typeof half,
          from: number,
          ends: 'reflecting' | 'periodic',
          count: number,
        ) => {
          const one = { name: '', model: modelOn(map, from, 1), boundary: boundaryOf(from, 1, ends), sigma };
          return new NoisySolver(planOf(one), sigma).spectrum(count).pairs;
        };
        const circle = solve(whole, -1, 'periodic', 12);
        for (const p of solve(half, 0, 'reflecting', 3).slice(0, 3)) {
          if (Math.hypot(p.re, p.im) < 1e-2) continue; // further down the circle's odd half crowds the list
          const gap = Math.min(...circle.map((q) => Math.hypot(p.re - q.re, p.im - q.im)));
          expect(gap, `a ${a}, b ${b}, sigma ${sigma}`).toBeLessThan(1e-11 * Math.max(1, p.condition));
        }
      }),
      seeded(15),
    );
  });
});
