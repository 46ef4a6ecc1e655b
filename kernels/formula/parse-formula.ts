import { create, type MathNode, parseDependencies } from 'mathjs/number';
import { checkGrammar } from './check-grammar';
import { FormulaError } from './formula-error';
import { checkScope, type FormulaScope } from './formula-scope';
import type { BinaryOperator, CONSTANTS, ComparisonOperator, FormulaTree, FunctionName } from './formula-tree';
import { type FormulaToken, lexFormula } from './lex-formula';

export { FormulaError } from './formula-error';
export type { FormulaScope } from './formula-scope';

/** The parser alone: none of the functions that evaluate, compile or simplify. */
const { parse } = create(parseDependencies);

const COMPARISONS: Record<string, ComparisonOperator> = {
  smaller: '<',
  smallerEq: '<=',
  larger: '>',
  largerEq: '>=',
  equal: '==',
  unequal: '!=',
};

/** The few fields of the parser's nodes that are read. */
interface ParsedNode {
  type: string;
  name?: string;
  op?: string;
  fn?: string | ParsedNode;
  args?: ParsedNode[];
  content?: ParsedNode;
  condition?: ParsedNode;
  trueExpr?: ParsedNode;
  falseExpr?: ParsedNode;
  conditionals?: string[];
  params?: ParsedNode[];
}

/**
 * Reads a formula: numbers, variables, parameters, t, pi, e, `+ - * / ^`, comparisons, `and or not`, `c ? a : b` and the
 * functions of the language. Powers bind from the right and more tightly than a sign in front: -x^2 = -(x^2). `not` is
 * weaker than a comparison and stronger than `and`; a < b < c means a < b and b < c.
 * @param text the formula; at most 2000 characters, 600 tokens, 60 levels, towers of at most 4 powers
 * @param scope the names it may use
 * @returns its tree, plain data
 * @throws FormulaError for everything that is not a formula in this scope, with the character and the way out.
 *   Cost: linear in the length; a millisecond at the limits.
 */
export function parseFormula(text: string, scope: FormulaScope): FormulaTree {
  try {
    checkScope(scope);
  } catch (error) {
    throw new FormulaError((error as RangeError).message, 0, 0, text);
  }
  const tokens = lexFormula(text);
  const written = checkGrammar(tokens, text, scope);
  let parsed: MathNode;
  try {
    parsed = parse(written);
  } catch {
    // The grammar has been checked: whatever still fails here is reported rather than passed on.
    throw new FormulaError('This cannot be read as a formula', 0, text.length, text);
  }
  return convert(parsed as unknown as ParsedNode, { tokens, text, scope });
}

interface Source {
  tokens: readonly FormulaToken[];
  text: string;
  scope: FormulaScope;
}

/** From the parser's node to ours: a node that is not on the list is refused. */
function convert(node: ParsedNode, source: Source): FormulaTree {
  const part = (child: ParsedNode) => convert(child, source);
  switch (node.type) {
    case 'ParenthesisNode':
      return part(node.content!);
    case 'SymbolNode':
      return leaf(tokenOf(node, source), source.scope);
    case 'OperatorNode':
      return operation(node, source);
    case 'FunctionNode': {
      const name = tokenOf(node.fn as ParsedNode, source).text as FunctionName;
      return { type: 'call', name, arguments: node.args!.map(part) };
    }
    case 'ConditionalNode':
      return { type: 'choose', condition: part(node.condition!), yes: part(node.trueExpr!), no: part(node.falseExpr!) };
    case 'RelationalNode':
      return {
        type: 'comparison',
        operators: node.conditionals!.map((name) => COMPARISONS[name]),
        operands: node.params!.map(part),
      };
    default:
      throw refused(source);
  }
}

function operation(node: ParsedNode, source: Source): FormulaTree {
  const [first, second] = node.args!.map((child) => convert(child, source));
  const operator = node.op!;
  if (second === undefined) {
    if (operator === '+') return first;
    if (operator === '-') return { type: 'unary', operator, operand: first };
    if (operator === 'not') return { type: 'logic', operator, operand: first };
    throw refused(source);
  }
  if (operator === 'and' || operator === 'or') return { type: 'logic', operator, left: first, right: second };
  const comparison = COMPARISONS[node.fn as string];
  if (comparison !== undefined) return { type: 'comparison', operators: [comparison], operands: [first, second] };
  if (!['+', '-', '*', '/', '^'].includes(operator)) throw refused(source);
  return { type: 'binary', operator: operator as BinaryOperator, left: first, right: second };
}

function leaf(token: FormulaToken, scope: FormulaScope): FormulaTree {
  const name = token.text;
  if (token.kind === 'number') return { type: 'number', value: Number(name) };
  if (scope.variables.includes(name)) return { type: 'variable', name };
  if (scope.parameters.includes(name)) return { type: 'parameter', name };
  return name === 't' ? { type: 'time' } : { type: 'constant', name: name as keyof typeof CONSTANTS };
}

function tokenOf(node: ParsedNode, source: Source): FormulaToken {
  const token = source.tokens[Number(node.name?.slice(1))];
  if (token === undefined) throw refused(source);
  return token;
}

function refused(source: Source): FormulaError {
  return new FormulaError('This cannot be read as a formula', 0, source.text.length, source.text);
}
