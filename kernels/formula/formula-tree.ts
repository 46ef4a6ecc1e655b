/** The functions of the formula language, with the number of arguments each takes. */
export const FUNCTIONS = {
  exp: [1, 1],
  log: [1, 1],
  log10: [1, 1],
  sqrt: [1, 1],
  cbrt: [1, 1],
  abs: [1, 1],
  sign: [1, 1],
  floor: [1, 1],
  ceil: [1, 1],
  round: [1, 1],
  mod: [2, 2],
  min: [2, 8],
  max: [2, 8],
  sin: [1, 1],
  cos: [1, 1],
  tan: [1, 1],
  asin: [1, 1],
  acos: [1, 1],
  atan: [1, 1],
  atan2: [2, 2],
  sinh: [1, 1],
  cosh: [1, 1],
  tanh: [1, 1],
  erf: [1, 1],
} as const satisfies Record<string, readonly [number, number]>;

export type FunctionName = keyof typeof FUNCTIONS;
export type BinaryOperator = '+' | '-' | '*' | '/' | '^';
export type ComparisonOperator = '<' | '<=' | '>' | '>=' | '==' | '!=';

/** The constants of the formula language. */
export const CONSTANTS = { pi: Math.PI, e: Math.E } as const;

/**
 * A formula as data. Nothing outside this union is ever evaluated. A condition is a number: 1 where it holds, 0 where it
 * does not, not-a-number where a side of it is not a number. `a < b < c` is one comparison with three operands.
 */
export type FormulaTree =
  | { type: 'number'; value: number }
  | { type: 'variable'; name: string }
  | { type: 'parameter'; name: string }
  | { type: 'time' }
  | { type: 'constant'; name: keyof typeof CONSTANTS }
  | { type: 'unary'; operator: '-'; operand: FormulaTree }
  | { type: 'binary'; operator: BinaryOperator; left: FormulaTree; right: FormulaTree }
  | { type: 'call'; name: FunctionName; arguments: FormulaTree[] }
  | { type: 'comparison'; operators: ComparisonOperator[]; operands: FormulaTree[] }
  | { type: 'logic'; operator: 'and' | 'or'; left: FormulaTree; right: FormulaTree }
  | { type: 'logic'; operator: 'not'; operand: FormulaTree }
  | { type: 'choose'; condition: FormulaTree; yes: FormulaTree; no: FormulaTree };

/**
 * The parts of a node, in the order in which they are written.
 * @param tree any formula
 * @returns a new array of the direct subtrees; empty for a number, a name, the time or a constant. Cost: their number.
 */
export function children(tree: FormulaTree): FormulaTree[] {
  switch (tree.type) {
    case 'unary':
      return [tree.operand];
    case 'binary':
      return [tree.left, tree.right];
    case 'call':
      return tree.arguments;
    case 'comparison':
      return tree.operands;
    case 'logic':
      return tree.operator === 'not' ? [tree.operand] : [tree.left, tree.right];
    case 'choose':
      return [tree.condition, tree.yes, tree.no];
    default:
      return [];
  }
}

/**
 * Whether a formula changes along a run: it does if it contains one of the variables named.
 * @param tree any formula
 * @param variables the names that vary; every variable where left out
 * @returns true where at least one of them occurs. Cost: the number of nodes.
 */
export function varies(tree: FormulaTree, variables?: readonly string[]): boolean {
  if (tree.type === 'variable') return variables === undefined || variables.includes(tree.name);
  return children(tree).some((child) => varies(child, variables));
}
