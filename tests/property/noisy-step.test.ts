import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gaussian } from '@/kernels/noise/gaussian';
import { boundaryOf, exitProbability } from '@/kernels/operators/ends';
import { arnoldi } from '@/kernels/spectrum/arnoldi';
import {
  dot,
  largestGap,
  modelOn,
  type NoisyMap,
  noisyMaps,
  peak,
  planOf,
  randomValues,
  seeded,
  seeds,
  sines,
} from '../support/kernel-maps';

const ones = (n: number) => new Float64Array(n).fill(1);

/** A random density that integrates to one, rough from node to node. */
function densityOn(weights: Float64Array, seed: number) {
  const rho = randomValues(weights.length, seed);
  const total = dot(rho, ones(rho.length), weights);
  return rho.map((v) => v / total);
}

function applied(operator: { apply(rho: Float64Array, out: Float64Array): void }, rho: Float64Array) {
  const out = new Float64Array(rho.length);
  operator.apply(rho, out);
  return out;
}

/** The peak, or the mean density of the whole mass where nearly all of it has left. */
const scaleOf = ({ boundary }: NoisyMap, density: Float64Array) =>
  Math.max(peak(density), 1 / (boundary.to - boundary.from));

describe('one noisy step of random maps', () => {
  it('keeps the mass to 1e-13 where no end is absorbing', () => {
    fc.assert(
      fc.property(noisyMaps({ lose: false }), seeds, (map, seed) => {
        const plan = planOf(map);
        const { weights } = plan.grid;
        const after = applied(plan.spreadOperator(map.sigma), densityOn(weights, seed));
        expect(Math.abs(dot(after, ones(after.length), weights) - 1), map.name).toBeLessThan(1e-13);
      }),
      seeded(40),
    );
  });

  it('loses at absorbing ends exactly what the exit probability says: kept + lost = 1 to 1e-13', () => {
    fc.assert(
      fc.property(noisyMaps({ lose: true }), seeds, (map, seed) => {
        const plan = planOf(map);
        const { weights } = plan.grid;
        const rho = densityOn(weights, seed);
        const after = applied(plan.spreadOperator(map.sigma), rho);
        const leave = plan.images.map((y) => exitProbability(map.boundary, y, (d) => gaussian.tail(d, map.sigma)));
        const total = dot(after, ones(after.length), weights) + dot(rho, leave, weights);
        expect(Math.abs(total - 1), map.name).toBeLessThan(1e-13);
      }),
      seeded(40),
    );
  });

  it('has an adjoint: ⟨Lρ, g⟩ = ⟨ρ, L†g⟩ to round-off, by FFT and by direct sums', () => {
    fc.assert(
      fc.property(noisyMaps(), seeds, (map, seed) => {
        const plan = planOf(map);
        const { weights } = plan.grid;
        const n = weights.length;
        const rho = randomValues(n, seed, -1, 1);
        const g = randomValues(n, seed + 7, -1, 1);
        for (const operator of [plan.spreadOperator(map.sigma), plan.directOperator(map.sigma)]) {
          const forward = applied(operator, rho);
          const back = new Float64Array(n);
          operator.applyAdjoint(g, back);
          const size = Math.sqrt(dot(forward, forward, weights) * dot(g, g, weights)) + dot(ones(n), ones(n), weights);
          expect(Math.abs(dot(forward, g, weights) - dot(rho, back, weights)) / size, map.name).toBeLessThan(1e-14);
        }
      }),
      seeded(30),
    );
  });

  it('leaves densities positive: to round-off by FFT, exactly by direct sums', () => {
    fc.assert(
      fc.property(noisyMaps(), seeds, (map, seed) => {
        const plan = planOf(map);
        const rho = densityOn(plan.grid.weights, seed);
        const after = applied(plan.spreadOperator(map.sigma), rho);
        expect(Math.min(...after) / scaleOf(map, after), map.name).toBeGreaterThan(-1e-13);
        expect(Math.min(...applied(plan.directOperator(map.sigma), rho)), map.name).toBeGreaterThanOrEqual(0);
      }),
      seeded(30),
    );
  });

  it('is the same by FFT and by direct sums, to 1e-13 of the peak', () => {
    fc.assert(
      fc.property(noisyMaps(), seeds, (map, seed) => {
        const plan = planOf(map);
        const rho = densityOn(plan.grid.weights, seed);
        const direct = applied(plan.directOperator(map.sigma), rho);
        const gap = largestGap(applied(plan.spreadOperator(map.sigma), rho), direct);
        expect(gap / scaleOf(map, direct), map.name).toBeLessThan(1e-13);
      }),
      seeded(40),
    );
  });

  it('taken twice is the square of its dense matrix', () => {
    fc.assert(
      fc.property(noisyMaps({ least: 0.1 }), seeds, (map, seed) => {
        const plan = planOf(map);
        const { weights } = plan.grid;
        const n = weights.length;
        const dense = plan.directOperator(map.sigma).toDense();
        const square = new Float64Array(n * n);
        for (let i = 0; i < n; i++)
          for (let k = 0; k < n; k++) {
            const factor = dense[i * n + k] * weights[k];
            for (let j = 0; j < n; j++) square[i * n + j] += factor * dense[k * n + j];
          }
        const rho = densityOn(weights, seed);
        const operator = plan.spreadOperator(map.sigma);
        const twice = applied(operator, applied(operator, rho));
        const expected = Float64Array.from({ length: n }, (_, i) =>
          dot(square.subarray(i * n, i * n + n), rho, weights),
        );
        expect(largestGap(twice, expected) / Math.max(1e-3, peak(expected)), map.name).toBeLessThan(2e-13);
      }),
      seeded(15),
    );
  });

  it('taken twice has the squares of its eigenvalues', () => {
    fc.assert(
      fc.property(noisyMaps({ circle: true }), (map) => {
        const plan = planOf(map);
        const operator = plan.spreadOperator(map.sigma);
        const { weights } = plan.grid;
        const start = randomValues(weights.length, 5, 0.5, 1.5);
        const options = { count: 3, tolerance: 1e-13, start };
        const once = arnoldi((v, out) => operator.apply(v, out), weights, options);
        // more are looked for: an eigenvalue that the square has twice may take two places
        const twice = arnoldi((v, out) => operator.apply(applied(operator, v), out), weights, { ...options, count: 7 });
        for (const { re, im, condition } of once.pairs.slice(0, 3)) {
          const square = { re: re * re - im * im, im: 2 * re * im };
          const gap = Math.min(...twice.pairs.map((p) => Math.hypot(p.re - square.re, p.im - square.im)));
          // a sum of residuals, enlarged by how sensitive the eigenvalue is
          expect(gap, map.name).toBeLessThan(1e-11 * Math.max(1, condition));
        }
      }),
      seeded(15),
    );
  });

  it('on the circle moves along when map and density are moved', () => {
    fc.assert(
      fc.property(sines, fc.double({ min: 0.03, max: 0.4, noNaN: true }), fc.nat(98), (map, sigma, turn) => {
        const shift = (turn + 1) / 100;
        const boundary = boundaryOf(0, 1, 'periodic');
        const moved = {
          ...map,
          value: (u: number) => map.value(u - shift) + shift,
          slope: (u: number) => map.slope(u - shift),
        };
        const start = (x: number) => 1 + 0.7 * Math.sin(2 * Math.PI * x) + 0.2 * Math.cos(6 * Math.PI * x);
        const at = Float64Array.from({ length: 33 }, (_, i) => i / 33);
        const [here, there] = [
          { model: modelOn(map, 0, 1), by: 0 },
          { model: modelOn(moved, 0, 1), by: shift },
        ].map(({ model, by }) => {
          const plan = planOf({ name: map.name, model, boundary, sigma });
          const out = new Float64Array(at.length);
          const targets = plan.targetsAt(at.map((x) => (x + by) % 1));
          plan.spreadOperator(sigma).read(
            plan.grid.x.map((x) => start(x - by)),
            targets,
            out,
          );
          return out;
        });
        expect(largestGap(here, there), `${map.name}, sigma ${sigma}, moved by ${shift}`).toBeLessThan(2e-11);
      }),
      seeded(30),
    );
  });
});
