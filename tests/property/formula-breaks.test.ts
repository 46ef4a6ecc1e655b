import fc from 'fast-check';
import { expect, it } from 'vitest';
import { checkDomain } from '@/kernels/formula/check-domain';
import { compileFormula } from '@/kernels/formula/compile-formula';
import { findBreaks } from '@/kernels/formula/find-breaks';
import { findCriticalPoints } from '@/kernels/formula/find-critical-points';
import { parseFormula } from '@/kernels/formula/parse-formula';

const scope = { variables: ['x'], parameters: ['a', 'b'] };
const SEED = { seed: 20240612 };
const breaksOf = (text: string, from: number, to: number, p = [0, 0]) =>
  findBreaks(parseFormula(text, scope), scope, p, from, to);

/** Places inside 0 to 1 at least a thousandth apart, so that none is lost between samples, and their count. */
const places = fc
  .uniqueArray(fc.integer({ min: 1, max: 996 }), { minLength: 1, maxLength: 8 })
  .map((list) => [...list].sort((p, q) => p - q).map((k) => k / 997));

function expectPlaces(found: readonly number[], expected: readonly number[], tolerance = 1e-14) {
  expect(found.length).toBe(expected.length);
  found.forEach((at, k) => {
    expect(Math.abs(at - expected[k])).toBeLessThan(tolerance);
  });
}

it('a sum of kinks, a chain of choices, and nested least values break exactly where they were put', () => {
  fc.assert(
    fc.property(places, (at) => {
      expectPlaces(breaksOf(at.map((c, k) => `${k + 1}*abs(x - ${c})`).join(' + '), 0, 1).at, at);
      expectPlaces(breaksOf(`${at.map((c, k) => `x < ${c} ? ${k}*x : `).join('')}${at.length}*x`, 0, 1).at, at);
      expectPlaces(breaksOf(at.map((c) => `(x >= ${c})`).join(' + '), 0, 1).at, at);
      expectPlaces(breaksOf(at.map((c) => `sign(exp(x) - exp(${c}))`).join(' + '), 0, 1).at, at);
    }),
    { ...SEED, numRuns: 40 },
  );
});

it('mod(a*x + b, 1) breaks at the whole numbers of a*x + b', () => {
  const coefficient = fc.integer({ min: -12_000, max: 12_000 }).map((k) => k / 1000);
  fc.assert(
    fc.property(coefficient, coefficient, (a, b) => {
      const [low, high] = [Math.min(b, a + b), Math.max(b, a + b)];
      const expected: number[] = [];
      for (let k = Math.ceil(low); k <= high; k++) expected.push((k - b) / a);
      expected.sort((p, q) => p - q);
      const interior = expected.filter((x) => x > 1e-12 && x < 1 - 1e-12);
      const found = breaksOf('mod(a*x + b, 1)', 0, 1, [a, b]);
      // The rounding of a*x + b moves a crossing by its own last place over a.
      expectPlaces(found.at, a === 0 ? [] : interior, 1e-13 + (4e-16 * (1 + Math.abs(b))) / Math.abs(a || 1));
    }),
    { ...SEED, numRuns: 200 },
  );
});

it('between two breaks values and slopes have no step', () => {
  const shapes = [
    'abs(sin(a*x) - 0.3)',
    'min(x, a*x^2, 0.7 - x)',
    'mod(a*x + b*x^2, 1)',
    'x < b ? cos(a*x) : 1 - x',
    'max(sin(a*x), cos(b*x))',
    'round(a*x) + abs(x - b)',
    'sqrt(abs(x - b))*a',
  ];
  const number = fc.integer({ min: 100, max: 9000 }).map((k) => k / 1000);
  fc.assert(
    fc.property(fc.constantFrom(...shapes), number, number, (text, a, b) => {
      const p = [a, b / 9];
      const tree = parseFormula(text, scope);
      const { at } = findBreaks(tree, scope, p, 0, 1);
      const formula = compileFormula(tree, scope);
      const bounds = [0, ...at, 1];
      for (let k = 0; k + 1 < bounds.length; k++) {
        const length = bounds[k + 1] - bounds[k];
        if (length < 1e-6) continue;
        // The largest step between neighbours shrinks with their distance; across a break it would not.
        const largest = (n: number) => {
          const x = Float64Array.from({ length: n }, (_, i) => bounds[k] + length * (0.01 + (0.98 * i) / (n - 1)));
          const [y, slope] = [new Float64Array(n), new Float64Array(n)];
          formula.evaluateWithSlope([x], p, y, slope);
          const step = (of: Float64Array) =>
            of.reduce((most, v, i) => (i === 0 ? 0 : Math.max(most, Math.abs(v - of[i - 1]))), 0);
          return [step(y), step(slope)];
        };
        const [coarse, fine] = [largest(400), largest(1597)];
        expect(fine[0]).toBeLessThan(0.5 * coarse[0] + 1e-12);
        expect(fine[1]).toBeLessThan(0.5 * coarse[1] + 1e-12);
      }
    }),
    { ...SEED, numRuns: 100 },
  );
});

it('critical points of a polynomial with given ones are found to 1e-14, touching ones too', () => {
  fc.assert(
    fc.property(fc.integer({ min: 50, max: 450 }), fc.integer({ min: 500, max: 950 }), (m, n) => {
      const [c, d] = [m / 1000, n / 1000];
      // dF/dx = (x - c)(x - d)
      const simple = parseFormula(`x^3/3 - (${c} + ${d})*x^2/2 + ${c}*${d}*x`, scope);
      const touching = parseFormula(`(x - ${c})^3 + (x - ${c})^5`, scope);
      for (const [tree, expected] of [
        [simple, [c, d]],
        [touching, [c]],
      ] as const) {
        const formula = compileFormula(tree, scope);
        const evaluate = (x: Float64Array, out: Float64Array, slope = new Float64Array(x.length)) =>
          formula.evaluateWithSlope([x], [0, 0], out, slope);
        expectPlaces(
          findCriticalPoints({ evaluate }, 0, 1, []),
          expected,
          tree === simple ? (4e-16 / (d - c)) * 4 : 1e-14,
        );
      }
    }),
    { ...SEED, numRuns: 60 },
  );
});

it('hostile formulas are answered, not searched for ever', () => {
  const nest = (levels: number, wrap: (inner: string) => string) =>
    Array.from({ length: levels }).reduce<string>(wrap, 'x');
  const hostile = [
    nest(29, (inner) => `mod(2*${inner}, 1)`),
    nest(28, (inner) => `abs(${inner}*2 - 1)`),
    nest(20, (inner) => `1/sin(${inner})`),
    nest(15, (inner) => `mod(1/${inner}, 1)`),
    nest(7, (inner) => `tan(30*${inner})`),
    'mod(1e300*x, 1)',
    'mod(exp(1/x), 1)',
    'floor(exp(exp(7*x)))',
    'abs(x^99^9 - 1)',
    'sign(sin(1/x))*sign(sin(1/(1 - x)))',
  ];
  for (const text of hostile) {
    const tree = parseFormula(text, scope);
    const start = performance.now();
    const { at, kinds } = findBreaks(tree, scope, [0, 0], 0, 1);
    checkDomain(tree, scope, [0, 0], 0, 1);
    expect(performance.now() - start, text).toBeLessThan(15_000);
    expect(at.length).toBeLessThanOrEqual(2000);
    expect(kinds.length).toBe(at.length);
    expect(at.every((x, k) => x > 0 && x < 1 && (k === 0 || x > at[k - 1]))).toBe(true);
  }
}, 150_000);
