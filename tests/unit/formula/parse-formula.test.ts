import { describe, expect, it } from 'vitest';
import { evaluatePoint } from '@/kernels/formula/evaluate-point';
import { FormulaError, parseFormula } from '@/kernels/formula/parse-formula';

const scope = { variables: ['x'], parameters: ['r', 'K', 'Omega'] };

function valueAt(text: string, x = 0): number {
  return evaluatePoint(parseFormula(text, scope), (name) =>
    name === 'x' ? x : ({ r: 3, K: 0.5, Omega: 0.2 }[name] ?? Number.NaN),
  );
}

function faultOf(text: string): FormulaError {
  try {
    parseFormula(text, scope);
  } catch (error) {
    if (error instanceof FormulaError) return error;
    throw error;
  }
  throw new Error(`accepted: ${text}`);
}

describe('the grammar', () => {
  it.each([
    ['1 + 2*3', 7],
    ['(1 + 2)*3', 9],
    ['8/4/2', 1],
    ['8 - 4 - 2', 2],
    ['2^3^2', 512],
    ['-2^2', -4],
    ['(-2)^2', 4],
    ['2^-2', 0.25],
    ['2*-3', -6],
    ['- -3', 3],
    ['+3', 3],
    ['1.5e3 + .5 + 2.', 1502.5],
    ['pi', Math.PI],
    ['e', Math.E],
    ['r*K', 1.5],
    ['1 < 2', 1],
    ['2 < 1', 0],
    ['1 < 2 < 3', 1],
    ['3 > 2 > 2', 0],
    ['1 == 1 and 2 != 2', 0],
    ['1 == 1 or 2 != 2', 1],
    ['not 1 < 2', 0],
    ['not 1 < 2 or 1 == 1', 1],
    ['not 0 and 0', 0],
    ['1 or 0 and 0', 1],
    ['1 < 2 ? 10 : 20', 10],
    ['0 ? 1 : 0 ? 2 : 3', 3],
    ['1 ? 0 ? 5 : 6 : 7', 6],
    ['1 + 1 < 3 ? 1 : 2', 1],
    ['(1 < 2)*5', 5],
  ])('reads %s as %d', (text, value) => {
    expect(valueAt(text)).toBe(value);
  });

  it.each([
    ['log(e)', 1],
    ['log10(1000)', 3],
    ['sqrt(2)', Math.SQRT2],
    ['cbrt(-8)', -2],
    ['abs(-2)', 2],
    ['sign(-2)', -1],
    ['floor(-1.5)', -2],
    ['ceil(-1.5)', -1],
    ['round(2.5)', 3],
    ['round(-2.5)', -3],
    ['round(0.49999999999999994)', 0],
    ['mod(-1, 3)', 2],
    ['mod(5.5, 2)', 1.5],
    ['mod(5, -3)', -1],
    ['min(3, 1, 2)', 1],
    ['max(3, 1, 2)', 3],
    ['atan2(1, -1)', (3 * Math.PI) / 4],
    ['tanh(0.5)', Math.tanh(0.5)],
    // DLMF chapter 7, table: erf(1)
    ['erf(1)', 0.8427007929497149],
  ])('evaluates %s to %d', (text, value) => {
    expect(valueAt(text)).toBeCloseTo(value, 15);
  });

  it('gives real results alone: the logarithm and the root of a negative number are no numbers', () => {
    for (const text of ['log(-1)', 'sqrt(-1)', '(-8)^(1/3)', 'asin(2)', '0/0']) expect(valueAt(text)).toBeNaN();
  });

  it('lets an undefined side make a condition undefined, unless the other side decides', () => {
    expect(valueAt('log(-1) < 1')).toBeNaN();
    expect(valueAt('log(-1) < 1 ? 1 : 2')).toBeNaN();
    expect(valueAt('0 and log(-1) < 1')).toBe(0);
    expect(valueAt('log(-1) < 1 or 1')).toBe(1);
    expect(valueAt('1 < 2 ? 3 : log(-1)')).toBe(3);
  });

  it('compares exactly, without a tolerance for round-off', () => {
    expect(valueAt('0.1 + 0.2 == 0.3')).toBe(0);
    expect(valueAt('0.1 + 0.2 > 0.3')).toBe(1);
  });
});

describe('errors point at the character', () => {
  it.each([
    ['', 0, 0, /empty/],
    ['   ', 0, 0, /empty/],
    ['2x', 1, 1, /write 2\*x/],
    ['x(1-x)', 1, 1, /not a function.*x\*\(/],
    ['(x+1)(x-1)', 5, 1, /multiplication needs its sign/],
    ['r*xx', 2, 2, /did you mean x/],
    ['r*omega*x', 2, 5, /did you mean Omega/],
    ['sinn(x)', 0, 4, /did you mean sin\?/],
    ['ln(x)', 0, 2, /log/],
    ['sin', 0, 3, /write sin\(/],
    ['sin x', 0, 3, /write sin\(/],
    ['sin()', 4, 1, /needs its argument/],
    ['x + mod(x)', 4, 3, /2 arguments, not 1/],
    ['atan2(1, 2, 3)', 0, 5, /2 arguments, not 3/],
    ['min(x)', 0, 3, /2 to 8/],
    ['x = 3', 2, 1, /==/],
    ['x ** 2', 2, 2, /\^/],
    ['x!', 1, 1, /not/],
    ["x'", 1, 1, /prime/],
    ['x % 2', 2, 1, /mod/],
    ['x; 1', 1, 1, /one value/],
    ['"x"', 0, 1, /no text/],
    ['[x]', 0, 1, /round/],
    ['x.y', 1, 1, /inside a number/],
    ['x && r', 2, 2, /and/],
    ['x − 1', 2, 1, /minus/],
    ['x ≤ 1', 2, 1, /<=/],
    ['x + 😀', 4, 2, /no part/],
    ['x \u0000', 2, 1, /U\+0000/],
    ['(x', 0, 1, /never closed/],
    ['sin(x', 0, 3, /never closed/],
    ['x)', 1, 1, /closes nothing/],
    ['x +', 3, 0, /missing after \+/],
    ['x + * 2', 4, 1, /missing after \+/],
    ['x ? 1', 2, 1, /no : after/],
    ['x : 1', 2, 1, /no \? before/],
    ['min(x ? 1, 2)', 6, 1, /no : after/],
    ['0,5*x', 1, 1, /point/],
    ['1.2.3', 3, 2, /Two numbers/],
    ['1 + not x', 4, 3, /brackets around/],
    ['x mod 2', 2, 3, /mod\(a, b\)/],
    ['1e999', 0, 5, /too large/],
    ['1e-999', 0, 6, /too small/],
    ['x*t', 2, 1, /continuous time/],
    [`x + ${'a'.repeat(33)}`, 4, 33, /32/],
  ])('%j: character %d', (text, at, length, message) => {
    const fault = faultOf(text);
    expect(fault).toMatchObject({ at, length, text });
    expect(fault.message).toMatch(message);
    expect(fault).toBeInstanceOf(RangeError);
  });

  it.each([
    'constructor',
    '__proto__',
    'toString',
    'valueOf',
    'hasOwnProperty',
    'prototype',
    'constructor(x)',
    'x.constructor',
    'toString()',
    'eval(x)',
    'import(x)',
    'parse(x)',
    'evaluate("1")',
    'i',
    'Infinity',
    'NaN',
    'true',
    'null',
    'end',
    'undefined',
    'sin.constructor',
    'x[0]',
    'f(x) = 2',
    '{a: 1}',
    'x => x',
    '`1`',
    '1:2',
    'x.^2',
    "x'",
    '5 to 3',
    'unit(x)',
    '2 cm',
    '50%',
    '#',
    '@',
    '\\',
    '$x',
    '~x',
    'x ?? 1',
    'x?.y',
    'x << 2',
    'x | 1',
    '0x10',
    '0b1',
    '1_000',
  ])('refuses %s', (text) => {
    expect(faultOf(text).message.length).toBeGreaterThan(5);
  });

  it('allows t where time runs', () => {
    expect(parseFormula('t', { ...scope, time: true })).toEqual({ type: 'time' });
  });

  it.each([
    [['sin'], [], /function/],
    [['x'], ['e'], /constant/],
    [['x'], ['t'], /time/],
    [['x'], ['and'], /conditions/],
    [['x'], ['x'], /twice/],
    [['x'], ['constructor'], /cannot be used/],
    [['__proto__'], [], /no name/],
    [['a b'], [], /no name/],
    [['x'], ['toString'], /cannot be used/],
  ])('refuses the names %j, %j', (variables, parameters, message) => {
    expect(() => parseFormula('1', { variables, parameters })).toThrow(message as RegExp);
  });
});

describe('hostile text', () => {
  const deep = (n: number) => `${'('.repeat(n)}x${')'.repeat(n)}`;
  it.each([
    ['10 000 characters', `${'x+'.repeat(5000)}x`],
    ['10 000 letters', 'x'.repeat(10_000)],
    ['a million characters', '1'.repeat(1_000_000)],
    ['500 brackets', deep(500)],
    ['500 opening brackets', '('.repeat(500)],
    ['500 signs', `${'-'.repeat(500)}x`],
    ['500 nested calls', `${'sin('.repeat(450)}x${')'.repeat(450)}`],
    ['500 open conditions', `${'x?'.repeat(290)}x`],
    ['61 times not', `${'not '.repeat(61)}x`],
    ['a tower of powers', '9^9^9^9^9^9^9^9'],
    ['a tower in brackets', '9^(9^(9^(9^(9^9))))'],
    ['a tower behind signs', '9^-(9^-(9^-(9^-(9^9))))'],
    ['601 tokens', `${'x+'.repeat(300)}x`],
  ])('%s: a message in less than 50 ms', (_, text) => {
    parseFormula('x', scope);
    const start = performance.now();
    const fault = faultOf(text);
    expect(performance.now() - start).toBeLessThan(50);
    expect(fault.message.length).toBeLessThan(300);
  });

  it('reads what just keeps to the limits', () => {
    expect(parseFormula(deep(60), scope)).toEqual({ type: 'variable', name: 'x' });
    expect(valueAt(`${'1+'.repeat(299)}1`)).toBe(300);
    expect(valueAt(`${'x == 1 ? 1 : '.repeat(85)}2`)).toBe(2);
    expect(valueAt('2^2^1^1^1')).toBe(4);
    expect(valueAt(`${'1'.repeat(300)} > 1`)).toBe(1);
  });
});
