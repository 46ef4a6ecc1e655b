import { describe, expect, it } from 'vitest';
import { compileFormula } from '@/kernels/formula/compile-formula';
import { parseFormula } from '@/kernels/formula/parse-formula';

const scope = { variables: ['x'], parameters: ['r'] };

function run(text: string, x: number[], r = 3.7) {
  const formula = compileFormula(parseFormula(text, scope), scope);
  const points = Float64Array.from(x);
  const [out, slope, alone] = [0, 1, 2].map(() => new Float64Array(x.length));
  formula.evaluateWithSlope([points], [r], out, slope);
  formula.evaluate([points], [r], alone);
  expect(alone).toEqual(out);
  return { values: [...out], slopes: [...slope] };
}

describe('derivatives of the functions', () => {
  const a = 0.37;
  // Abramowitz & Stegun 1964, 3.3, 4.2.5, 4.3.105-110, 4.4.52-57, 4.5.71-76, 7.1.19 (from memory)
  it.each([
    ['exp(x)', Math.exp(a)],
    ['log(x)', 1 / a],
    ['log10(x)', 1 / (a * Math.LN10)],
    ['sqrt(x)', 0.5 / Math.sqrt(a)],
    ['cbrt(x)', 1 / (3 * Math.cbrt(a) ** 2)],
    ['abs(x - 1)', -1],
    ['sign(x)', 0],
    ['floor(5*x)', 0],
    ['ceil(5*x)', 0],
    ['round(5*x)', 0],
    ['mod(5*x, 1)', 5],
    ['mod(1, x)', -2],
    ['min(x^2, x)', 2 * a],
    ['max(x^2, x)', 1],
    ['sin(x)', Math.cos(a)],
    ['cos(x)', -Math.sin(a)],
    ['tan(x)', 1 / Math.cos(a) ** 2],
    ['asin(x)', 1 / Math.sqrt(1 - a * a)],
    ['acos(x)', -1 / Math.sqrt(1 - a * a)],
    ['atan(x)', 1 / (1 + a * a)],
    ['atan2(x, 2)', 2 / (4 + a * a)],
    ['atan2(2, x)', -2 / (4 + a * a)],
    ['sinh(x)', Math.cosh(a)],
    ['cosh(x)', Math.sinh(a)],
    ['tanh(x)', 1 / Math.cosh(a) ** 2],
    ['erf(x)', (2 / Math.sqrt(Math.PI)) * Math.exp(-a * a)],
    ['x^3', 3 * a * a],
    ['x^-2', -2 / a ** 3],
    ['x^r', 3.7 * a ** 2.7],
    ['r^x', 3.7 ** a * Math.log(3.7)],
    ['x^x', a ** a * (Math.log(a) + 1)],
    ['x/(1 + x)', 1 / (1 + a) ** 2],
    ['1/x', -1 / (a * a)],
    ['r*x*(1 - x)', 3.7 * (1 - 2 * a)],
    ['x < 0.5 ? x^2 : 7', 2 * a],
    ['(x < 0.5)*x', 1],
    ['r', 0],
    ['x', 1],
  ])('%s', (text, expected) => {
    expect(run(text, [a]).slopes[0]).toBeCloseTo(expected, 13);
  });

  it('keep their digits where the textbook form would lose them', () => {
    const { slopes } = run('tanh(x)', [20]);
    expect(slopes[0] / (4 * Math.exp(-40))).toBeCloseTo(1, 12);
  });

  it('are those of the branch taken, and no branch not taken spoils them', () => {
    expect(run('x > 0 ? log(x) : 1 - x', [-2, 2]).slopes).toEqual([-1, 0.5]);
    expect(run('x > 0 ? sqrt(x) : 0', [-1, 4]).values).toEqual([0, 2]);
  });

  it('at 0 of powers are the limits', () => {
    expect(run('x^2', [0]).slopes).toEqual([0]);
    expect(run('x^1', [0]).slopes).toEqual([1]);
    expect(run('x^0', [0])).toEqual({ values: [1], slopes: [0] });
    expect(run('x^r', [0], 1)).toEqual({ values: [0], slopes: [1] });
  });
});

describe('evaluation', () => {
  it('crosses block borders without a seam', () => {
    for (const n of [1, 2, 511, 512, 513, 1500]) {
      const x = Array.from({ length: n }, (_, i) => i / n);
      const { values, slopes } = run('r*x*(1 - x)', x);
      x.forEach((v, i) => {
        expect(values[i]).toBeCloseTo(3.7 * v * (1 - v), 14);
        expect(slopes[i]).toBeCloseTo(3.7 * (1 - 2 * v), 14);
      });
    }
  });

  it('may write over its input', () => {
    const formula = compileFormula(parseFormula('x*x + x', scope), scope);
    const x = Float64Array.from([1, 2, 3]);
    formula.evaluate([x], [0], x);
    expect([...x]).toEqual([2, 6, 12]);
  });

  it('differentiates by the variable asked for', () => {
    const two = { variables: ['x', 'y'], parameters: [] };
    const formula = compileFormula(parseFormula('x^2*y + sin(y)', two), two);
    const [out, slope] = [new Float64Array(1), new Float64Array(1)];
    formula.evaluateWithSlope([Float64Array.of(3), Float64Array.of(2)], [], out, slope, 0);
    expect(slope[0]).toBe(12);
    formula.evaluateWithSlope([Float64Array.of(3), Float64Array.of(2)], [], out, slope, 1);
    expect(slope[0]).toBeCloseTo(9 + Math.cos(2), 14);
    formula.evaluateWithSlope([Float64Array.of(3), Float64Array.of(2)], [], out, slope);
    expect([...out]).toEqual([18 + Math.sin(2)]);
  });

  it('knows the time', () => {
    const timed = { variables: ['x'], parameters: [], time: true };
    const formula = compileFormula(parseFormula('x + t', timed), timed);
    const out = new Float64Array(1);
    formula.evaluate([Float64Array.of(1)], [], out, 2);
    expect(out[0]).toBe(3);
    formula.evaluate([Float64Array.of(1)], [], out);
    expect(out[0]).toBe(1);
  });

  it('survives numbers that end in not-a-number or infinity', () => {
    expect(run('log(x)', [-1, 0, 1]).values).toEqual([Number.NaN, Number.NEGATIVE_INFINITY, 0]);
    expect(run('exp(1000*x)', [1]).values).toEqual([Number.POSITIVE_INFINITY]);
  });

  it('refuses what does not fit, in numbers', () => {
    const formula = compileFormula(parseFormula('r*x', scope), scope);
    const x = new Float64Array(3);
    expect(() => formula.evaluate([], [1], x)).toThrow(/0 inputs given, needed: 1/);
    expect(() => formula.evaluate([x], [], x)).toThrow(/0 parameters given, needed: 1 \(r\)/);
    expect(() => formula.evaluate([new Float64Array(2)], [1], x)).toThrow(/2 points given, needed: 3/);
    expect(() => formula.evaluateWithSlope([x], [1], x, new Float64Array(3), 1)).toThrow(/by is 1; allowed: 0 to 0/);
    expect(() => compileFormula({ type: 'variable', name: 'y' }, scope)).toThrow(/no variable/);
    expect(() => compileFormula({ type: 'parameter', name: 'q' }, scope)).toThrow(/no parameter/);
  });

  it('takes a tree at the limits of length', () => {
    const text = Array.from({ length: 85 }, (_, k) => `sin(${k})*x`).join('+');
    const { values } = run(text, [0.5]);
    const expected = Array.from({ length: 85 }, (_, k) => Math.sin(k) / 2).reduce((a, b) => a + b);
    expect(values[0]).toBeCloseTo(expected, 13);
  });
});
