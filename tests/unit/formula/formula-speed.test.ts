import { expect, it } from 'vitest';
import { compileFormula } from '@/kernels/formula/compile-formula';
import { parseFormula } from '@/kernels/formula/parse-formula';

const POINTS = 4096;

/** Least time of many runs, which other work on the machine can only lengthen. */
function least(run: () => void): number {
  for (let i = 0; i < 2000; i++) run();
  let best = Number.POSITIVE_INFINITY;
  for (let k = 0; k < 60; k++) {
    const start = performance.now();
    for (let i = 0; i < 20; i++) run();
    best = Math.min(best, performance.now() - start);
  }
  return best;
}

it('a formula takes at most ten times a hand-written loop, with slopes as well', () => {
  const scope = { variables: ['x'], parameters: ['r'] };
  const x = Float64Array.from({ length: POINTS }, (_, i) => (i + 0.5) / POINTS);
  const [out, slope] = [new Float64Array(POINTS), new Float64Array(POINTS)];
  // Other formulas first: the loops of a long-lived process have seen more than one kind of array use.
  for (const text of ['sin(x)*exp(-x)', 'abs(1 - 2*x)', 'mod(r*x, 1)', 'x < 0.3 ? x^2 : 1/(1 + x)', 'min(x, 1 - x)']) {
    const other = compileFormula(parseFormula(text, scope), scope);
    for (let i = 0; i < 300; i++) other.evaluateWithSlope([x], [3.8], out, slope);
  }
  const formula = compileFormula(parseFormula('r*x*(1 - x)', scope), scope);
  const values = least(() => formula.evaluate([x], [3.8], out));
  const both = least(() => formula.evaluateWithSlope([x], [3.8], out, slope));
  const byHand = (r: number) => {
    for (let i = 0; i < POINTS; i++) out[i] = r * x[i] * (1 - x[i]);
  };
  const bothByHand = (r: number) => {
    for (let i = 0; i < POINTS; i++) {
      out[i] = r * x[i] * (1 - x[i]);
      slope[i] = r * (1 - 2 * x[i]);
    }
  };
  const ratio = values / least(() => byHand(3.8));
  const ratioWithSlope = both / least(() => bothByHand(3.8));
  // A loop over the library's compiled expression would be some 190 times slower.
  expect(ratio).toBeLessThan(10);
  expect(ratioWithSlope).toBeLessThan(10);
});
