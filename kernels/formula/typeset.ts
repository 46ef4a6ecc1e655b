import type { FormulaTree } from './formula-tree';
import { BINDING, bindingOf } from './to-text';

/** A formula laid out for mathematical typesetting: plain data that a renderer walks. */
export type Typeset =
  | { kind: 'row'; items: Typeset[] }
  | { kind: 'number'; text: string }
  /** a variable, the time or a constant: slanted letters, Greek ones as symbols, what follows the first _ lowered */
  | { kind: 'name'; text: string; lowered: string | null }
  /** a parameter: a place where its value or its symbol stands and can be changed */
  | { kind: 'slot'; parameter: string; text: string; lowered: string | null }
  /** a sign with space around it: + − · < ≤ = ≠ … */
  | { kind: 'operator'; text: string }
  /** a minus sign that belongs to what follows */
  | { kind: 'sign'; text: string }
  /** upright: the name of a function */
  | { kind: 'function'; text: string; lowered: string | null }
  /** upright with space around it: mod, and, or, not */
  | { kind: 'word'; text: string }
  /** a thin space between factors */
  | { kind: 'gap' }
  | { kind: 'fraction'; top: Typeset; bottom: Typeset }
  | { kind: 'power'; base: Typeset; exponent: Typeset }
  | { kind: 'root'; degree: string | null; inside: Typeset }
  | { kind: 'brackets'; shape: 'round' | 'bars' | 'floor' | 'ceil'; inside: Typeset }
  /** values with their conditions, one per line; the last has none: otherwise */
  | { kind: 'cases'; lines: { value: Typeset; condition: Typeset | null }[] };

const GREEK = new Map(
  Object.entries({
    alpha: 'α',
    beta: 'β',
    gamma: 'γ',
    delta: 'δ',
    epsilon: 'ε',
    eps: 'ε',
    zeta: 'ζ',
    eta: 'η',
    theta: 'θ',
    kappa: 'κ',
    lambda: 'λ',
    mu: 'μ',
    nu: 'ν',
    xi: 'ξ',
    pi: 'π',
    rho: 'ρ',
    sigma: 'σ',
    tau: 'τ',
    phi: 'φ',
    chi: 'χ',
    psi: 'ψ',
    omega: 'ω',
    Gamma: 'Γ',
    Delta: 'Δ',
    Theta: 'Θ',
    Lambda: 'Λ',
    Sigma: 'Σ',
    Phi: 'Φ',
    Psi: 'Ψ',
    Omega: 'Ω',
  }),
);

const RELATIONS = { '<': '<', '<=': '≤', '>': '>', '>=': '≥', '==': '=', '!=': '≠' } as const;

const row = (...items: Typeset[]): Typeset => ({ kind: 'row', items });
const operator = (text: string): Typeset => ({ kind: 'operator', text });
const word = (text: string): Typeset => ({ kind: 'word', text });
const brackets = (inside: Typeset, shape: 'round' | 'bars' | 'floor' | 'ceil' = 'round'): Typeset => ({
  kind: 'brackets',
  shape,
  inside,
});

/**
 * Lays a formula out: fractions, superscripts, roots, bars, cases; multiplication by standing side by side.
 * @param tree a formula
 * @returns a tree of `Typeset` nodes, JSON-serialisable; `log` appears as ln, `mod(a, b)` as "a mod b". Cost: linear.
 */
export function typeset(tree: FormulaTree): Typeset {
  switch (tree.type) {
    case 'number':
      return number(tree.value);
    case 'variable':
    case 'constant':
      return { kind: 'name', ...symbol(tree.name) };
    case 'parameter':
      return { kind: 'slot', parameter: tree.name, ...symbol(tree.name) };
    case 'time':
      return { kind: 'name', text: 't', lowered: null };
    case 'unary':
      return row(
        { kind: 'sign', text: '−' },
        bindingOf(tree.operand) === BINDING.sign
          ? brackets(typeset(tree.operand))
          : within(tree.operand, BINDING.product),
      );
    case 'binary':
      return binary(tree);
    case 'call':
      return call(tree);
    case 'comparison':
      return row(
        ...tree.operands.flatMap((side, k) => [
          ...(k === 0 ? [] : [operator(RELATIONS[tree.operators[k - 1]])]),
          within(side, BINDING.sum),
        ]),
      );
    case 'logic':
      if (tree.operator === 'not') return row(word('not'), within(tree.operand, BINDING.not));
      return row(
        within(tree.left, BINDING[tree.operator]),
        word(tree.operator),
        within(tree.right, BINDING[tree.operator] + 1),
      );
    case 'choose':
      return cases(tree);
  }
}

/** How tightly a part binds once it is laid out: a fraction or a "mod" differs from its text. */
function laidOutBinding(tree: FormulaTree): number {
  if (tree.type === 'call' && tree.name === 'mod') return BINDING.comparison;
  if (tree.type === 'binary' && tree.operator === '/') return BINDING.product;
  return bindingOf(tree);
}

function within(part: FormulaTree, least: number): Typeset {
  return laidOutBinding(part) < least ? brackets(typeset(part)) : typeset(part);
}

function number(value: number): Typeset {
  const [digits, exponent] = String(value).replace('-', '−').split('e');
  const mantissa: Typeset = { kind: 'number', text: digits };
  if (exponent === undefined) return mantissa;
  const power: Typeset = {
    kind: 'power',
    base: { kind: 'number', text: '10' },
    exponent: { kind: 'number', text: exponent.replace('+', '').replace('-', '−') },
  };
  return digits === '1' ? power : row(mantissa, operator('·'), power);
}

function symbol(name: string): { text: string; lowered: string | null } {
  const [, head, tail] = /^([A-Za-z]+?)_?([0-9]*|(?<=_).*)$/.exec(name) ?? [name, name, ''];
  return { text: GREEK.get(head) ?? head, lowered: tail === '' ? null : (GREEK.get(tail) ?? tail) };
}

function binary(tree: FormulaTree & { type: 'binary' }): Typeset {
  const { left, right } = tree;
  switch (tree.operator) {
    case '/':
      return { kind: 'fraction', top: typeset(left), bottom: typeset(right) };
    case '^':
      return {
        kind: 'power',
        base: left.type === 'binary' && left.operator === '/' ? brackets(typeset(left)) : within(left, BINDING.atom),
        exponent: typeset(right),
      };
    case '*': {
      const [first, second] = [
        within(left, BINDING.product),
        within(right, right.type === 'unary' ? BINDING.power : BINDING.product),
      ];
      return row(
        first,
        startsWithDigit(second) || endsWithName(first, second) ? operator('·') : { kind: 'gap' },
        second,
      );
    }
    default: {
      const second = right.type === 'unary' ? brackets(typeset(right)) : within(right, BINDING.product);
      return row(within(left, BINDING.sum), operator(tree.operator === '-' ? '−' : '+'), second);
    }
  }
}

function startsWithDigit(node: Typeset): boolean {
  if (node.kind === 'row') return node.items.length > 0 && startsWithDigit(node.items[0]);
  if (node.kind === 'power') return startsWithDigit(node.base);
  return node.kind === 'number' || node.kind === 'fraction';
}

/** Whether a name of several letters meets another name: side by side they would read as one. */
function endsWithName(first: Typeset, second: Typeset): boolean {
  const last = first.kind === 'row' ? first.items[first.items.length - 1] : first;
  const isWord = (node: Typeset) => (node.kind === 'name' || node.kind === 'slot') && node.text.length > 1;
  return isWord(last) || isWord(second);
}

function call(tree: FormulaTree & { type: 'call' }): Typeset {
  const given = tree.arguments;
  const [first, second] = given;
  switch (tree.name) {
    case 'sqrt':
      return { kind: 'root', degree: null, inside: typeset(first) };
    case 'cbrt':
      return { kind: 'root', degree: '3', inside: typeset(first) };
    case 'abs':
      return brackets(typeset(first), 'bars');
    case 'floor':
    case 'ceil':
      return brackets(typeset(first), tree.name);
    case 'mod':
      return row(within(first, BINDING.sum), word('mod'), within(second, BINDING.sum));
    default: {
      const inside = given.flatMap((part, k) => (k === 0 ? [typeset(part)] : [operator(','), typeset(part)]));
      const name = tree.name === 'log' ? 'ln' : tree.name === 'log10' ? 'log' : tree.name;
      const lowered = tree.name === 'log10' ? '10' : null;
      return row({ kind: 'function', text: name, lowered }, brackets(inside.length === 1 ? inside[0] : row(...inside)));
    }
  }
}

function cases(tree: FormulaTree & { type: 'choose' }): Typeset {
  const lines: { value: Typeset; condition: Typeset | null }[] = [];
  let rest: FormulaTree = tree;
  while (rest.type === 'choose') {
    lines.push({ value: typeset(rest.yes), condition: typeset(rest.condition) });
    rest = rest.no;
  }
  lines.push({ value: typeset(rest), condition: null });
  return { kind: 'cases', lines };
}
