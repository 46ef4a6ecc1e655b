import fc from 'fast-check';
import { all, create } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { compileFormula } from '@/kernels/formula/compile-formula';
import { evaluatePoint } from '@/kernels/formula/evaluate-point';
import { type FormulaTree, FUNCTIONS, type FunctionName } from '@/kernels/formula/formula-tree';
import { FormulaError, parseFormula } from '@/kernels/formula/parse-formula';
import { toTex } from '@/kernels/formula/to-tex';
import { toText } from '@/kernels/formula/to-text';
import { typeset } from '@/kernels/formula/typeset';

const scope = { variables: ['x', 'y'], parameters: ['a', 'b'], time: true };
const SEED = { seed: 20240611 };

/** Random formulas. `smooth` leaves out whatever has a break. */
function formulas(options: { smooth: boolean; depth: number }): fc.Arbitrary<FormulaTree> {
  const leaf: fc.Arbitrary<FormulaTree> = fc.oneof(
    fc
      .oneof(fc.integer({ min: 0, max: 9 }), fc.double({ min: 1e-3, max: 1e3, noNaN: true }))
      .map((value) => ({ type: 'number' as const, value })),
    fc.constantFrom('x', 'y').map((name) => ({ type: 'variable' as const, name })),
    fc.constantFrom('a', 'b').map((name) => ({ type: 'parameter' as const, name })),
    fc.constantFrom('pi' as const, 'e' as const).map((name) => ({ type: 'constant' as const, name })),
    fc.constant({ type: 'time' as const }),
  );
  const smoothCalls: FunctionName[] = ['exp', 'sin', 'cos', 'atan', 'sinh', 'cosh', 'tanh', 'erf'];
  const names = options.smooth ? smoothCalls : (Object.keys(FUNCTIONS) as FunctionName[]);
  const grow = (part: fc.Arbitrary<FormulaTree>): fc.Arbitrary<FormulaTree> => {
    const smooth: fc.Arbitrary<FormulaTree>[] = [
      part.map((operand) => ({ type: 'unary' as const, operator: '-' as const, operand })),
      fc
        .tuple(fc.constantFrom('+' as const, '-' as const, '*' as const), part, part)
        .map(([operator, left, right]) => ({ type: 'binary' as const, operator, left, right })),
      fc.tuple(part, fc.integer({ min: 0, max: 4 })).map(([left, p]) => ({
        type: 'binary' as const,
        operator: '^' as const,
        left,
        right: { type: 'number' as const, value: p },
      })),
      fc
        .constantFrom(...names)
        .chain((name) =>
          fc
            .array(part, { minLength: FUNCTIONS[name][0], maxLength: Math.min(3, FUNCTIONS[name][1]) })
            .map((given) => ({ type: 'call' as const, name, arguments: given })),
        ),
    ];
    if (options.smooth) return fc.oneof(...smooth);
    const comparison = fc.constantFrom(
      '<' as const,
      '<=' as const,
      '>' as const,
      '>=' as const,
      '==' as const,
      '!=' as const,
    );
    return fc.oneof(
      ...smooth,
      fc
        .tuple(fc.constantFrom('/' as const, '^' as const), part, part)
        .map(([operator, left, right]) => ({ type: 'binary' as const, operator, left, right })),
      fc
        .array(comparison, { minLength: 1, maxLength: 2 })
        .chain((operators) =>
          fc
            .array(part, { minLength: operators.length + 1, maxLength: operators.length + 1 })
            .map((operands) => ({ type: 'comparison' as const, operators, operands })),
        ),
      fc
        .tuple(fc.constantFrom('and' as const, 'or' as const), part, part)
        .map(([operator, left, right]) => ({ type: 'logic' as const, operator, left, right })),
      part.map((operand) => ({ type: 'logic' as const, operator: 'not' as const, operand })),
      fc.tuple(part, part, part).map(([condition, yes, no]) => ({ type: 'choose' as const, condition, yes, no })),
    );
  };
  let tree = leaf;
  for (let k = 0; k < options.depth; k++)
    tree = fc.oneof({ weight: 1, arbitrary: leaf }, { weight: 3, arbitrary: grow(tree) });
  return tree;
}

/** Number of powers in the longest tower, as the reader counts them. */
function towers(tree: FormulaTree): number {
  const text = toText(tree);
  return (text.match(/\^/g) ?? []).length;
}

const point = fc.double({ min: -3, max: 3, noNaN: true });
const finite = fc.record({ x: point, y: point, a: point, b: point, t: point });
type Point = { x: number; y: number; a: number; b: number; t: number };

function compiled(tree: FormulaTree, values: Point, by = 0) {
  const [out, slope, alone] = [0, 1, 2].map(() => new Float64Array(1));
  const formula = compileFormula(tree, scope);
  const inputs = [Float64Array.of(values.x), Float64Array.of(values.y)];
  formula.evaluateWithSlope(inputs, [values.a, values.b], out, slope, by, values.t);
  formula.evaluate(inputs, [values.a, values.b], alone, values.t);
  return { value: alone[0], dual: out[0], slope: slope[0] };
}

const fits = (tree: FormulaTree) => towers(tree) <= 4 && toText(tree).length <= 1500;

describe('random formulas', () => {
  it('come back from their text as the same tree', () => {
    fc.assert(
      fc.property(formulas({ smooth: false, depth: 4 }).filter(fits), (tree) => {
        let read: FormulaTree;
        try {
          read = parseFormula(toText(tree), scope);
        } catch (error) {
          // Only the limit on the number of tokens may stand in the way.
          expect((error as Error).message).toMatch(/more than 600/);
          return;
        }
        expect(read).toEqual(tree);
      }),
      { ...SEED, numRuns: 600 },
    );
  });

  it('have the same value compiled, compiled with slopes, and by recursion', () => {
    fc.assert(
      fc.property(formulas({ smooth: false, depth: 4 }), finite, (tree, values) => {
        const direct = evaluatePoint(tree, (name) => values[name as keyof Point], values.t);
        const { value, dual } = compiled(tree, values);
        // The sign of zero may differ; a rounding may not.
        expect(value + 0).toBe(direct + 0);
        expect(dual + 0).toBe(direct + 0);
      }),
      { ...SEED, numRuns: 1500 },
    );
  });

  it('have the value that another program gives them, where both mean the same', () => {
    // Its comparisons, also those inside min and max, allow a relative and an absolute tolerance: make them small, and keep
    // the values apart by thousandths.
    const math = create(all, { relTol: 1e-14, absTol: 1e-300 });
    const coarse = fc.integer({ min: -3000, max: 3000 }).map((k) => k / 1000);
    const apart = fc.record({ x: coarse, y: coarse, a: coarse, b: coarse, t: coarse });
    let compared = 0;
    fc.assert(
      fc.property(formulas({ smooth: false, depth: 3 }), apart, (tree, values) => {
        const ours = evaluatePoint(tree, (name) => values[name as keyof Point], values.t);
        let theirs: unknown;
        try {
          // There, comparisons round and sides of "and" are not numbers: such formulas are left out.
          if (/[<=>?]|\b(and|or|not)\b/.test(toText(tree))) return;
          theirs = math.evaluate(toText(tree), { ...values });
        } catch {
          return;
        }
        if (typeof theirs !== 'number' || !Number.isFinite(theirs) || !Number.isFinite(ours)) return;
        const steep = compiled(tree, values).slope;
        const tolerance = 1e-9 * Math.max(1, Math.abs(theirs)) + 1e-12 * Math.abs(steep || 0);
        // A step function right at its step may fall on either side.
        if (/floor|ceil|round|mod|sign/.test(toText(tree)) && Math.abs(ours - theirs) > tolerance) return;
        compared++;
        expect(Math.abs(ours - theirs)).toBeLessThanOrEqual(tolerance);
      }),
      { ...SEED, numRuns: 3000 },
    );
    expect(compared).toBeGreaterThan(1000);
  });

  it('have slopes that finite differences confirm', () => {
    let checked = 0;
    fc.assert(
      fc.property(formulas({ smooth: true, depth: 3 }), finite, fc.constantFrom(0, 1), (tree, values, by) => {
        const name = by === 0 ? 'x' : 'y';
        const f = (d: number) =>
          evaluatePoint(tree, (key) => (key === name ? values[name] + d : values[key as keyof Point]), values.t);
        const { slope } = compiled(tree, values, by);
        // Two central differences; their disagreement bounds what they are worth.
        const [h, g] = [1e-4, 5e-5];
        const [wide, narrow] = [(f(h) - f(-h)) / (2 * h), (f(g) - f(-g)) / (2 * g)];
        if (!Number.isFinite(wide) || !Number.isFinite(narrow) || !Number.isFinite(slope)) return;
        const better = narrow + (narrow - wide) / 3;
        const scale = Math.max(1, Math.abs(slope), Math.abs(f(0)));
        if (Math.abs(narrow - wide) > 1e-6 * scale) return;
        checked++;
        expect(Math.abs(slope - better)).toBeLessThan(2e-7 * scale + Math.abs(narrow - wide));
      }),
      { ...SEED, numRuns: 1500 },
    );
    expect(checked).toBeGreaterThan(700);
  });

  it('can be typeset, and the result survives JSON', () => {
    fc.assert(
      fc.property(formulas({ smooth: false, depth: 4 }), (tree) => {
        const laidOut = typeset(tree);
        expect(JSON.parse(JSON.stringify(laidOut))).toEqual(laidOut);
        const tex = toTex(tree);
        expect(tex).not.toMatch(/undefined|NaN|[^\x20-\x7e]/);
        expect((tex.match(/{/g) ?? []).length).toBe((tex.match(/}/g) ?? []).length);
        expect((tex.match(/\\left/g) ?? []).length).toBe((tex.match(/\\right/g) ?? []).length);
      }),
      { ...SEED, numRuns: 400 },
    );
  });
});

describe('no text whatever', () => {
  const words = [
    ...Object.keys(FUNCTIONS),
    'x',
    'y',
    'a',
    'b',
    't',
    'pi',
    'e',
    'and',
    'or',
    'not',
    'constructor',
    '__proto__',
  ];
  const signs = [
    '+',
    '-',
    '*',
    '/',
    '^',
    '(',
    ')',
    ',',
    '?',
    ':',
    '<',
    '<=',
    '==',
    '!=',
    '.',
    '=',
    '!',
    ' ',
    '1',
    '0.5',
    '1e3',
    '"',
    "'",
    '[',
    ']',
    '{',
    '}',
    ';',
    '%',
    '\\',
    '\n',
    '²',
    '𝑥',
  ];
  const texts = fc.oneof(
    fc.string({ maxLength: 200 }),
    fc.string({ unit: 'binary', maxLength: 100 }),
    fc.array(fc.constantFrom(...words, ...signs), { maxLength: 80 }).map((parts) => parts.join('')),
    fc.array(fc.constantFrom(...words, ...signs), { maxLength: 80 }).map((parts) => parts.join(' ')),
    // valid formulas with one character changed
    fc
      .tuple(formulas({ smooth: false, depth: 3 }).map(toText), fc.nat(), fc.constantFrom(...signs))
      .map(([text, at, sign]) => {
        const k = at % (text.length + 1);
        return text.slice(0, k) + sign + text.slice(k + 1);
      }),
    fc
      .tuple(fc.constantFrom(...words, ...signs), fc.integer({ min: 100, max: 3000 }))
      .map(([part, n]) => part.repeat(n)),
  );

  it('makes the reader throw anything but a FormulaError with a place inside the text, nor take long', () => {
    let read = 0;
    fc.assert(
      fc.property(texts, (text) => {
        const start = performance.now();
        try {
          const tree = parseFormula(text, scope);
          read++;
          evaluatePoint(tree, () => 0.5);
          compiled(tree, { x: 0.5, y: 0.5, a: 0.5, b: 0.5, t: 0 });
          expect(parseFormula(toText(tree), scope)).toEqual(tree);
        } catch (error) {
          expect(error).toBeInstanceOf(FormulaError);
          const { at, length, message } = error as FormulaError;
          expect(at).toBeGreaterThanOrEqual(0);
          expect(at + length).toBeLessThanOrEqual(text.length);
          expect(message).not.toMatch(/cannot be read/);
        }
        expect(performance.now() - start).toBeLessThan(200);
      }),
      { ...SEED, numRuns: 6000 },
    );
    expect(read).toBeGreaterThan(100);
  });
});
