import { CONSTANTS, type ComparisonOperator, type FormulaTree } from './formula-tree';
import { both, either, modulo, power, UNARY } from './scalar-functions';

/**
 * The value of a formula at one point, by recursion: for subtrees of parameters and for single points, where setting up
 * arrays is not worth while. Agrees bit for bit with the compiled formula.
 * @param tree any formula
 * @param lookUp the value of a variable or a parameter
 * @param time the value of t; default 0
 * @returns the value; a condition gives 1, 0 or not-a-number. Cost: the number of nodes.
 */
export function evaluatePoint(tree: FormulaTree, lookUp: (name: string) => number, time = 0): number {
  const value = (part: FormulaTree) => evaluatePoint(part, lookUp, time);
  switch (tree.type) {
    case 'number':
      return tree.value;
    case 'variable':
    case 'parameter':
      return lookUp(tree.name);
    case 'time':
      return time;
    case 'constant':
      return CONSTANTS[tree.name];
    case 'unary':
      return -value(tree.operand);
    case 'binary':
      return arithmetic(tree.operator, value(tree.left), value(tree.right));
    case 'call': {
      const given = tree.arguments.map(value);
      if (tree.name === 'mod') return modulo(given[0], given[1]);
      if (tree.name === 'min') return Math.min(...given);
      if (tree.name === 'max') return Math.max(...given);
      if (tree.name === 'atan2') return Math.atan2(given[0], given[1]);
      return UNARY[tree.name](given[0]);
    }
    case 'comparison': {
      const sides = tree.operands.map(value);
      return tree.operators.reduce((held, operator, i) => both(held, compare(operator, sides[i], sides[i + 1])), 1);
    }
    case 'logic': {
      if (tree.operator === 'not') {
        const operand = value(tree.operand);
        return Number.isNaN(operand) ? operand : operand === 0 ? 1 : 0;
      }
      return (tree.operator === 'and' ? both : either)(value(tree.left), value(tree.right));
    }
    case 'choose': {
      const condition = value(tree.condition);
      return Number.isNaN(condition) ? condition : condition !== 0 ? value(tree.yes) : value(tree.no);
    }
  }
}

function arithmetic(operator: string, a: number, b: number): number {
  if (operator === '+') return a + b;
  if (operator === '-') return a - b;
  if (operator === '*') return a * b;
  return operator === '/' ? a / b : power(a, b);
}

/**
 * One comparison, exact: no tolerance for round-off.
 * @param operator which
 * @param a left side
 * @param b right side
 * @returns 1 where it holds, 0 where not, not-a-number where a side is not a number
 */
export function compare(operator: ComparisonOperator, a: number, b: number): number {
  if (Number.isNaN(a) || Number.isNaN(b)) return Number.NaN;
  switch (operator) {
    case '<':
      return a < b ? 1 : 0;
    case '<=':
      return a <= b ? 1 : 0;
    case '>':
      return a > b ? 1 : 0;
    case '>=':
      return a >= b ? 1 : 0;
    case '==':
      return a === b ? 1 : 0;
    case '!=':
      return a !== b ? 1 : 0;
  }
}
