import { Assembler, type Operand, type Program } from './assembler';
import { evaluatePoint } from './evaluate-point';
import type { FormulaScope } from './formula-scope';
import { type FormulaTree, varies } from './formula-tree';

/** A value along the points and its derivative; null where the derivative is 0 everywhere. */
interface Dual {
  value: Operand;
  slope: Operand | null;
}

/** A formula as a program of block operations, with the operands that hold the value and the derivative at the end. */
export interface AssembledFormula {
  program: Program;
  value: Operand;
  slope: Operand | null;
}

/**
 * Translates a formula into block operations; with a variable named, its derivative by forward differentiation as well
 * (Wengert, A simple automatic derivative evaluation program, Comm. ACM 7, 1964, 463; from memory).
 * @param tree the formula
 * @param scope its names; input k holds variable k
 * @param by number of the variable to differentiate by, or null for values alone
 * @returns the program; a formula without variables has a scalar value
 * @throws RangeError naming a variable or a parameter that the scope does not have. Cost: the number of nodes.
 */
export function assembleFormula(tree: FormulaTree, scope: FormulaScope, by: number | null): AssembledFormula {
  const out = new Assembler(scope.variables.length);
  const positions = new Map(scope.parameters.map((name, index) => [name, index]));
  const build = (part: FormulaTree): Dual => assemble(part, { out, scope, positions, by, build });
  const { value, slope } = build(tree);
  return { program: out.program, value, slope };
}

interface Context {
  out: Assembler;
  scope: FormulaScope;
  positions: ReadonlyMap<string, number>;
  by: number | null;
  build(part: FormulaTree): Dual;
}

function assemble(tree: FormulaTree, context: Context): Dual {
  const { out, scope, positions, build } = context;
  if (!varies(tree)) return { value: uniform(tree, out, positions), slope: null };
  switch (tree.type) {
    case 'variable': {
      const vector = scope.variables.indexOf(tree.name);
      if (vector < 0) throw new RangeError(`"${tree.name}" is no variable; variables: ${scope.variables.join(', ')}`);
      return { value: { vector }, slope: vector === context.by ? out.constant(1) : null };
    }
    case 'unary': {
      const { value, slope } = build(tree.operand);
      return { value: out.negate(value), slope: slope && out.negate(slope) };
    }
    case 'binary': {
      const [a, b] = [build(tree.left), build(tree.right)];
      if (tree.operator === '+') return { value: out.add(a.value, b.value), slope: sum(out, a.slope, b.slope) };
      if (tree.operator === '-')
        return { value: out.subtract(a.value, b.value), slope: difference(out, a.slope, b.slope) };
      if (tree.operator === '*') return product(out, a, b);
      return tree.operator === '/' ? quotient(out, a, b) : toThePower(out, a, b);
    }
    case 'call':
      return call(tree, out, build);
    case 'comparison': {
      const sides = tree.operands.map((side) => build(side).value);
      const each = tree.operators.map((operator, i) => comparison(out, operator, sides[i], sides[i + 1]));
      return { value: each.reduce((held, next) => out.step('bothVV', [held, next])), slope: null };
    }
    case 'logic': {
      if (tree.operator === 'not') return { value: out.step('notV', [build(tree.operand).value]), slope: null };
      const sides = [build(tree.left).value, build(tree.right).value];
      return { value: out.step(tree.operator === 'and' ? 'bothVV' : 'eitherVV', sides), slope: null };
    }
    case 'choose': {
      const condition = build(tree.condition).value;
      return choice(out, condition, build(tree.yes), build(tree.no));
    }
    default:
      throw new RangeError(`A formula has no part of type "${(tree as { type: string }).type}"`);
  }
}

/** A part without variables: one number per call, computed before the loop over the points. */
function uniform(tree: FormulaTree, out: Assembler, positions: ReadonlyMap<string, number>): Operand {
  if (tree.type === 'number') return out.constant(tree.value);
  const check = (part: FormulaTree): void => {
    if (part.type === 'parameter' && !positions.has(part.name)) {
      throw new RangeError(`"${part.name}" is no parameter; parameters: ${[...positions.keys()].join(', ')}`);
    }
    for (const value of Object.values(part)) {
      for (const child of Array.isArray(value) ? value : [value]) if (typeof child === 'object') check(child);
    }
  };
  check(tree);
  return out.scalar(JSON.stringify(tree), (_values, parameters, time) =>
    evaluatePoint(tree, (name) => parameters[positions.get(name) ?? -1], time),
  );
}

function sum(out: Assembler, a: Operand | null, b: Operand | null): Operand | null {
  return a && b ? out.add(a, b) : (a ?? b);
}

function difference(out: Assembler, a: Operand | null, b: Operand | null): Operand | null {
  return b === null ? a : a === null ? out.negate(b) : out.subtract(a, b);
}

/** (ab)' = a'b + b'a */
function product(out: Assembler, a: Dual, b: Dual): Dual {
  const value = out.multiply(a.value, b.value);
  if (a.slope && b.slope && 'scalar' in a.slope && 'scalar' in b.slope && 'vector' in a.value && 'vector' in b.value) {
    return { value, slope: out.step('blendVVSS', [b.value, a.value], [a.slope, b.slope]) };
  }
  return {
    value,
    slope: sum(out, a.slope && out.multiply(a.slope, b.value), b.slope && out.multiply(b.slope, a.value)),
  };
}

/** (a/b)' = (a' - (a/b) b') / b */
function quotient(out: Assembler, a: Dual, b: Dual): Dual {
  const value = out.divide(a.value, b.value);
  const top = difference(out, a.slope, b.slope && out.multiply(value, b.slope));
  return { value, slope: top && out.divide(top, b.value) };
}

/** (a^b)' = b a^(b-1) a' + a^b log(a) b' */
function toThePower(out: Assembler, a: Dual, b: Dual): Dual {
  if ('scalar' in b.value) {
    const value = out.step('powVS', [a.value], [b.value]);
    return { value, slope: a.slope && out.multiply(out.step('powSlopeVS', [a.value], [b.value]), a.slope) };
  }
  const value = 'scalar' in a.value ? out.step('powSV', [b.value], [a.value]) : out.step('powVV', [a.value, b.value]);
  const first = a.slope && out.multiply(out.step('powSlopeVV', [a.value, b.value]), a.slope);
  const second = b.slope && out.multiply(out.step('timesLogVV', [value, a.value]), b.slope);
  return { value, slope: sum(out, first, second) };
}

function comparison(out: Assembler, operator: string, a: Operand, b: Operand): Operand {
  switch (operator) {
    case '<':
      return 'scalar' in b && 'vector' in a ? out.step('lessVS', [a], [b]) : out.step('lessVV', [a, b]);
    case '<=':
      return 'scalar' in b && 'vector' in a ? out.step('atMostVS', [a], [b]) : out.step('atMostVV', [a, b]);
    case '>':
      return out.step('lessVV', [b, a]);
    case '>=':
      return out.step('atMostVV', [b, a]);
    case '==':
      return out.step('equalVV', [a, b]);
    default:
      return out.step('notV', [out.step('equalVV', [a, b])]);
  }
}

function choice(out: Assembler, condition: Operand, yes: Dual, no: Dual): Dual {
  const value = out.step('chooseVVV', [condition, yes.value, no.value]);
  if (yes.slope === null && no.slope === null) return { value, slope: null };
  const zero = out.constant(0);
  return { value, slope: out.step('chooseVVV', [condition, yes.slope ?? zero, no.slope ?? zero]) };
}

function call(tree: FormulaTree & { type: 'call' }, out: Assembler, build: (part: FormulaTree) => Dual): Dual {
  const given = tree.arguments.map(build);
  const [a, b] = given;
  const { name } = tree;
  switch (name) {
    case 'min':
    case 'max':
      return given.reduce((best, next) => {
        const value = out.step(name === 'min' ? 'minVV' : 'maxVV', [best.value, next.value]);
        if (best.slope === null && next.slope === null) return { value, slope: null };
        const sides = name === 'min' ? [best.value, next.value] : [next.value, best.value];
        return { value, slope: choice(out, out.step('atMostVV', sides), slopeOf(best, out), slopeOf(next, out)).value };
      });
    case 'mod': {
      const value =
        'scalar' in b.value ? out.step('modVS', [a.value], [b.value]) : out.step('modVV', [a.value, b.value]);
      const whole = b.slope && out.step('wholeVV', [a.value, b.value]);
      return { value, slope: difference(out, a.slope, b.slope && whole && out.multiply(whole, b.slope)) };
    }
    case 'atan2': {
      const value = out.step('atan2VV', [a.value, b.value]);
      const top = difference(out, a.slope && out.multiply(b.value, a.slope), b.slope && out.multiply(a.value, b.slope));
      const square = () => out.add(out.multiply(a.value, a.value), out.multiply(b.value, b.value));
      return { value, slope: top && out.divide(top, square()) };
    }
    default: {
      const value = out.step(name, [a.value]);
      return { value, slope: a.slope && chain(name, a.value, value, a.slope, out) };
    }
  }
}

/** The derivative as a value of its own, so that it can be chosen from. */
function slopeOf(dual: Dual, out: Assembler): Dual {
  return { value: dual.slope ?? out.constant(0), slope: null };
}

/** f(a)' = f'(a) a' for the functions of one argument. */
function chain(name: string, a: Operand, value: Operand, slope: Operand, out: Assembler): Operand | null {
  const times = (factor: Operand) => out.multiply(factor, slope);
  switch (name) {
    case 'exp':
      return times(value);
    case 'log':
      return out.divide(slope, a);
    case 'log10':
      return out.divide(slope, out.multiply(a, out.constant(Math.LN10)));
    case 'sqrt':
      return out.divide(slope, out.multiply(value, out.constant(2)));
    case 'cbrt':
      return out.divide(slope, out.multiply(out.multiply(value, value), out.constant(3)));
    case 'abs':
      return times(out.step('absSlope', [a]));
    case 'sin':
      return times(out.step('cos', [a]));
    case 'cos':
      return times(out.negate(out.step('sin', [a])));
    case 'tan':
      return times(out.step('tanSlope', [value]));
    case 'asin':
      return times(out.step('asinSlope', [a]));
    case 'acos':
      return times(out.negate(out.step('asinSlope', [a])));
    case 'atan':
      return times(out.step('atanSlope', [a]));
    case 'sinh':
      return times(out.step('cosh', [a]));
    case 'cosh':
      return times(out.step('sinh', [a]));
    case 'tanh':
      return times(out.step('tanhSlope', [a]));
    case 'erf':
      return times(out.step('erfSlope', [a]));
    default:
      // sign, floor, ceil and round are flat between their jumps.
      return null;
  }
}
