import { describe, expect, it } from 'vitest';
import { findBreaks } from '@/kernels/formula/find-breaks';
import { parseFormula } from '@/kernels/formula/parse-formula';
import { isSmooth } from '@/kernels/formula/switches';

const scope = { variables: ['x'], parameters: ['r'] };
const breaksOf = (text: string, from = 0, to = 1, r = 3.7) =>
  findBreaks(parseFormula(text, scope), scope, [r], from, to);

/** Places agree to a few units in the last place of the interval's ends. */
function expectPlaces(found: readonly number[], expected: readonly number[], span = 1) {
  expect(found).toHaveLength(expected.length);
  found.forEach((at, k) => {
    expect(Math.abs(at - expected[k])).toBeLessThan(1e-15 * span);
  });
}

describe('breaks are found where they are', () => {
  const cases: [string, number, number, number[], string[]][] = [
    ['r*x*(1 - x)', 0, 1, [], []],
    ['1 - abs(1 - 2*x)', 0, 1, [0.5], ['kink']],
    ['mod(r*x, 1)', 0, 1, [1 / 3.7, 2 / 3.7, 3 / 3.7], ['jump', 'jump', 'jump']],
    ['x <= 0.3 ? x/0.3 : (1 - x)/0.7', 0, 1, [0.3], ['kink']],
    ['x < 0.3 ? 1 : 0', 0, 1, [0.3], ['jump']],
    ['abs(mod(3*x + 1, 2) - 1)', 0, 1, [1 / 3, 2 / 3], ['kink', 'kink']],
    ['min(x, 1 - x, 0.4)', 0, 1, [0.4, 0.6], ['kink', 'kink']],
    ['max(x, 2*x - 1/4)', 0, 1, [0.25], ['kink']],
    ['floor(3*x)', 0, 1, [1 / 3, 2 / 3], ['jump', 'jump']],
    ['ceil(3*x)', 0, 1, [1 / 3, 2 / 3], ['jump', 'jump']],
    ['round(3*x)', 0, 1, [1 / 6, 0.5, 5 / 6], ['jump', 'jump', 'jump']],
    ['sign(x - 1/7)', 0, 1, [1 / 7], ['jump']],
    ['1/(x - 0.3)', 0, 1, [0.3], ['pole']],
    ['(x - 0.3)^-2', 0, 1, [0.3], ['pole']],
    ['log(abs(x - 0.2))', 0, 1, [0.2], ['pole']],
    ['tan(x)', 0, 10, [Math.PI / 2, (3 * Math.PI) / 2, (5 * Math.PI) / 2], ['pole', 'pole', 'pole']],
    ['cbrt(x - 0.4)', 0, 1, [0.4], ['root']],
    ['abs(x)^r', -1, 1, [0], ['root']],
    ['sqrt((x - 0.5)^2)', 0, 1, [0.5], ['root']],
    ['asin(1 - abs(x))', -1, 1, [0], ['root']],
    ['abs(x)', -1, 2, [0], ['kink']],
    ['atan2(x - 0.5, x - 0.7)', 0, 1, [0.5], ['jump']],
    ['atan2(x - 0.5, x - 0.3)', 0, 1, [], []],
    ['mod(x, 2*pi)', -10, 10, [-2 * Math.PI, 0, 2 * Math.PI], ['jump', 'jump', 'jump']],
    ['0.2 < x < 0.6 or x > 0.9 ? 1 : x', 0, 1, [0.2, 0.6, 0.9], ['jump', 'jump', 'jump']],
    ['x*(x > 0.5)', 0, 1, [0.5], ['jump']],
    ['x > 0.5 ? abs(x - 0.2) : abs(x - 0.7)', 0, 1, [0.5], ['jump']],
    ['x > 0.15 ? mod(1/x, 1) : x', 0, 1, [0.15, 1 / 6, 0.2, 0.25, 1 / 3, 0.5], Array(6).fill('jump')],
    ['sign(mod(2*x, 1) - 0.5)', 0, 1, [0.25, 0.5, 0.75], ['jump', 'jump', 'jump']],
    ['mod(mod(2*x, 1)*2, 1)', 0, 1, [0.25, 0.5, 0.75], ['jump', 'jump', 'jump']],
    ['sin(x)/x', -1, 1, [0], ['kink']],
    ['x^2', -1, 1, [], []],
    ['x^r', 0, 1, [], []],
  ];
  it.each(cases)('%s on %d to %d', (text, from, to, at, kinds) => {
    const found = breaksOf(text, from, to);
    expectPlaces(found.at, at, to - from);
    expect(found.kinds).toEqual(kinds);
    expect(found.accumulations).toEqual([]);
    expect(found.complete).toBe(true);
  });

  it('in the mirror of a shifted circle map', () => {
    const at = breaksOf('mod(x + 0.3 - 0.9/(2*pi)*sin(2*pi*x), 1)').at;
    expect(at).toHaveLength(1);
    const [x] = at;
    expect(x + 0.3 - (0.9 / (2 * Math.PI)) * Math.sin(2 * Math.PI * x)).toBeCloseTo(1, 15);
  });

  it('where a curve only touches what decides', () => {
    expect(breaksOf('mod(4*x*(1 - x), 1)').at).toEqual([0.5]);
    expectPlaces(breaksOf('sqrt(x^2 - x + 0.25)').at, [0.5]);
  });

  it('two close to one another', () => {
    expectPlaces(breaksOf('abs((x - 0.5)^2 - 1e-10)').at, [0.5 - 1e-5, 0.5 + 1e-5], 1e4);
  });

  it('whose exponent is a whole number by its parameter only where it is not', () => {
    expect(breaksOf('(x - 0.5)^r', 0, 1, 2).at).toEqual([]);
    expect(breaksOf('(x - 0.5)^r', 0, 1, -1).kinds).toEqual(['pole']);
    expect(breaksOf('(x - 0.5)^r', 0, 1, 1.5).kinds).toEqual(['root']);
  });
});

describe('infinitely many breaks', () => {
  it('of the continued fraction map are listed down to 1/401 and pile up at 0', () => {
    const { at, accumulations, gaps, complete } = breaksOf('mod(1/x, 1)');
    expectPlaces(
      at,
      Array.from({ length: 400 }, (_, k) => 1 / (401 - k)),
    );
    expect(accumulations).toEqual([0]);
    expect(gaps).toEqual([{ from: 0, to: at[0] }]);
    expect(complete).toBe(true);
  });

  it('pile up on both sides of a pole', () => {
    const { at, accumulations, gaps } = breaksOf('floor(1/(x - 0.5))');
    expect(accumulations).toEqual([0.5]);
    expect(gaps[0].from).toBeLessThan(0.5);
    expect(gaps[0].to).toBeGreaterThan(0.5);
    expect(at.filter((x) => x > 0.5 && x < 1).length).toBeGreaterThan(398);
  });

  it('of an oscillation pile up too', () => {
    const { at, accumulations } = breaksOf('abs(sin(1/x))');
    expect(accumulations).toEqual([0]);
    const last = Array.from({ length: 100 }, (_, k) => 1 / (Math.PI * (100 - k)));
    expectPlaces(at.slice(-100), last, 4);
  });

  it('as many as asked for', () => {
    expect(findBreaks(parseFormula('mod(1/x, 1)', scope), scope, [0], 0, 1, { maxBreaks: 50 }).at).toHaveLength(50);
    const many = breaksOf('mod(1000000*x, 1)');
    expect(many.at).toHaveLength(400);
    expect(many.complete).toBe(false);
  });
});

describe('a formula is smooth everywhere', () => {
  it.each(['r*x*(1 - x)', 'exp(-x^2)*sin(x)', 'x^3/2', 'erf(x) + atan(tanh(x))', '2^x'])('%s', (text) => {
    expect(isSmooth(parseFormula(text, scope))).toBe(true);
  });
  it.each(['abs(x)', 'x^r', '1/x', 'x < 1 ? 1 : 2', 'sqrt(x)', 'sin(mod(x, 1))', 'x^-1', 'log(x)', 'tan(x)'])(
    'not %s',
    (text) => {
      expect(isSmooth(parseFormula(text, scope))).toBe(false);
    },
  );
});

it('an interval without length is refused', () => {
  expect(() => breaksOf('x', 1, 1)).toThrow(/1 to 1; allowed/);
  expect(() => breaksOf('x', 0, Number.POSITIVE_INFINITY)).toThrow(RangeError);
});
