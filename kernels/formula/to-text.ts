import type { FormulaTree } from './formula-tree';

/** How tightly a part binds; a part inside one that binds more tightly needs brackets. */
export const BINDING = {
  choose: 0,
  or: 1,
  and: 2,
  not: 3,
  comparison: 4,
  sum: 5,
  product: 6,
  sign: 7,
  power: 8,
  atom: 9,
} as const;

/**
 * How tightly the topmost operation of a formula binds.
 * @param tree a formula
 * @returns 0 (a choice) to 9 (a number, a name, a function with its brackets), as in `BINDING`
 */
export function bindingOf(tree: FormulaTree): number {
  switch (tree.type) {
    case 'choose':
      return BINDING.choose;
    case 'logic':
      return BINDING[tree.operator];
    case 'comparison':
      return BINDING.comparison;
    case 'unary':
      return BINDING.sign;
    case 'number':
      return tree.value < 0 || Object.is(tree.value, -0) ? BINDING.sign : BINDING.atom;
    case 'binary':
      if (tree.operator === '^') return BINDING.power;
      return tree.operator === '+' || tree.operator === '-' ? BINDING.sum : BINDING.product;
    default:
      return BINDING.atom;
  }
}

/**
 * A formula as text that `parseFormula` reads back as the same tree, in one canonical form: no bracket that is not needed
 * (but around a sign after an operator), spaces around + and -, conditions and commas only.
 * @param tree a formula; numbers finite
 * @returns the text; numbers in the shortest form that keeps every bit. Cost: linear in the length of the text.
 */
export function toText(tree: FormulaTree): string {
  const within = (part: FormulaTree, least: number) => (bindingOf(part) < least ? `(${toText(part)})` : toText(part));
  switch (tree.type) {
    case 'number':
      return String(tree.value);
    case 'variable':
    case 'parameter':
    case 'constant':
      return tree.name;
    case 'time':
      return 't';
    case 'unary':
      return `-${within(tree.operand, BINDING.power)}`;
    case 'binary': {
      const { operator, left, right } = tree;
      // A sign is written without brackets only where it comes first.
      if (operator === '^') return `${within(left, BINDING.atom)}^${within(right, BINDING.power)}`;
      if (operator === '+' || operator === '-') {
        const second = bindingOf(right) === BINDING.sign ? `(${toText(right)})` : within(right, BINDING.product);
        return `${within(left, BINDING.sum)} ${operator} ${second}`;
      }
      return `${within(left, BINDING.product)}${operator}${within(right, BINDING.power)}`;
    }
    case 'call':
      return `${tree.name}(${tree.arguments.map(toText).join(', ')})`;
    case 'comparison':
      return tree.operands
        .map((side, k) => `${k === 0 ? '' : ` ${tree.operators[k - 1]} `}${within(side, BINDING.sum)}`)
        .join('');
    case 'logic':
      if (tree.operator === 'not') return `not ${within(tree.operand, BINDING.not)}`;
      return `${within(tree.left, BINDING[tree.operator])} ${tree.operator} ${within(tree.right, BINDING[tree.operator] + 1)}`;
    case 'choose':
      return `${within(tree.condition, BINDING.or)} ? ${within(tree.yes, BINDING.or)} : ${toText(tree.no)}`;
  }
}
