import { describe, expect, it } from 'vitest';
import { compileFormula } from '@/kernels/formula/compile-formula';
import { findBreaks } from '@/kernels/formula/find-breaks';
import { findCriticalPoints } from '@/kernels/formula/find-critical-points';
import { parseFormula } from '@/kernels/formula/parse-formula';

const scope = { variables: ['x'], parameters: [] };

function criticalPoints(text: string, from: number, to: number): number[] {
  const tree = parseFormula(text, scope);
  const formula = compileFormula(tree, scope);
  const evaluate = (x: Float64Array, out: Float64Array, slope?: Float64Array) => {
    if (slope) formula.evaluateWithSlope([x], [], out, slope);
    else formula.evaluate([x], [], out);
  };
  return findCriticalPoints({ evaluate }, from, to, findBreaks(tree, scope, [], from, to).at);
}

describe('critical points', () => {
  const root = Math.acos(1 / 1.1) / (2 * Math.PI);
  const cases: [string, number, number, number[]][] = [
    ['3.8*x*(1 - x)', 0, 1, [0.5]],
    ['4*x^3 - 3*x', -1, 1, [-0.5, 0.5]],
    ['x*exp(2.6*(1 - x))', 0, 6, [1 / 2.6]],
    ['x + 0.2 - 1.1/(2*pi)*sin(2*pi*x)', 0, 1, [root, 1 - root]],
    // the slope touches zero
    ['x^3', -1, 1, [0]],
    ['(x - 0.3)^3', 0, 1, [0.3]],
    ['x + 0.2 - 1/(2*pi)*sin(2*pi*x)', -0.5, 0.5, [0]],
    ['x^5 - x^3', -1, 1, [-Math.sqrt(0.6), 0, Math.sqrt(0.6)]],
    // at an end
    ['x^3', 0, 1, [0]],
    ['x^2', 0, 1, [0]],
    ['x + 0.2 - 1/(2*pi)*sin(2*pi*x)', 0, 1, [0, 1]],
    // the slope runs away
    ['sqrt(x)', 0, 1, [0]],
    ['x*log(x)', 0, 1, [0, Math.exp(-1)]],
    ['abs(x - 0.5)^1.5', 0, 1, [0.5]],
    ['cbrt(x - 0.25)', 0, 1, [0.25]],
    // nowhere
    ['2*x', 0, 1, []],
    ['tanh(x)', -3, 3, []],
    ['1 - abs(1 - 2*x)', 0, 1, []],
    ['mod(3*x, 1)', 0, 1, []],
    ['x < 0.5 ? x : 2 - 2*x', 0, 1, []],
  ];
  it.each(cases)('of %s on %d to %d', (text, from, to, expected) => {
    const found = criticalPoints(text, from, to);
    expect(found).toHaveLength(expected.length);
    found.forEach((at, k) => {
      expect(Math.abs(at - expected[k])).toBeLessThan(1e-14 * Math.max(Math.abs(from), Math.abs(to)));
    });
  });
});
