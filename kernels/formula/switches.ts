import type { Levels } from './find-crossings';
import { children, type FormulaTree, varies } from './formula-tree';

/** kink: the slope jumps; jump: the value does; pole: the value runs away; root: the slope runs away. */
export type BreakKind = 'kink' | 'jump' | 'pole' | 'root';

/** A part of a formula whose crossings of the levels are breaks of the whole; where `keep` is given, only where that holds. */
export interface Switch {
  part: FormulaTree;
  levels: Levels;
  kind: BreakKind;
  keep?: FormulaTree;
}

const ZERO: Levels = { kind: 'zero' };
const WHOLE: Levels = { kind: 'whole', offset: 0 };
const HALVES: Levels = { kind: 'whole', offset: 0.5 };

const number = (value: number): FormulaTree => ({ type: 'number', value });
const binary = (operator: '+' | '-' | '/', left: FormulaTree, right: FormulaTree): FormulaTree => ({
  type: 'binary',
  operator,
  left,
  right,
});

/**
 * What the topmost operation of a formula decides by.
 * @param tree a formula
 * @param valueAt the value of a part without variables, for exponents that are whole numbers by chance
 * @returns its switches, none for a smooth operation; not those of its parts
 */
export function switchesOf(tree: FormulaTree, valueAt: (part: FormulaTree) => number): Switch[] {
  const all = ((): Switch[] => {
    switch (tree.type) {
      case 'binary':
        if (tree.operator === '/') return [{ part: tree.right, levels: ZERO, kind: 'pole' }];
        return tree.operator === '^' ? powerSwitches(tree.left, tree.right, valueAt) : [];
      case 'choose':
        return tree.condition.type === 'comparison' || tree.condition.type === 'logic'
          ? []
          : [{ part: tree.condition, levels: ZERO, kind: 'jump' }];
      case 'logic':
        return children(tree)
          .filter(({ type }) => type !== 'comparison' && type !== 'logic')
          .map((part) => ({ part, levels: ZERO, kind: 'jump' }));
      case 'comparison':
        return tree.operands
          .slice(1)
          .map((side, k) => ({ part: binary('-', tree.operands[k], side), levels: ZERO, kind: 'jump' }));
      case 'call':
        return callSwitches(tree);
      default:
        return [];
    }
  })();
  return all.filter(({ part }) => varies(part));
}

function powerSwitches(base: FormulaTree, exponent: FormulaTree, valueAt: (part: FormulaTree) => number): Switch[] {
  if (varies(exponent)) return [{ part: base, levels: ZERO, kind: 'root' }];
  const p = valueAt(exponent);
  if (Number.isInteger(p) && p >= 0) return [];
  return [{ part: base, levels: ZERO, kind: p < 0 ? 'pole' : 'root' }];
}

function callSwitches(tree: FormulaTree & { type: 'call' }): Switch[] {
  const { name, arguments: given } = tree;
  const [a, b] = given;
  switch (name) {
    case 'abs':
      return [{ part: a, levels: ZERO, kind: 'kink' }];
    case 'sign':
      return [{ part: a, levels: ZERO, kind: 'jump' }];
    case 'floor':
    case 'ceil':
      return [{ part: a, levels: WHOLE, kind: 'jump' }];
    case 'round':
      return [{ part: a, levels: HALVES, kind: 'jump' }];
    case 'mod':
      return [{ part: b.type === 'number' && b.value === 1 ? a : binary('/', a, b), levels: WHOLE, kind: 'jump' }];
    case 'min':
    case 'max':
      return given.flatMap((left, k) =>
        given.slice(k + 1).map((right): Switch => {
          const chosen = (side: FormulaTree): FormulaTree => ({
            type: 'comparison',
            operators: ['=='],
            operands: [side, tree],
          });
          const keep: FormulaTree = { type: 'logic', operator: 'or', left: chosen(left), right: chosen(right) };
          return { part: binary('-', left, right), levels: ZERO, kind: 'kink', keep };
        }),
      );
    case 'sqrt':
    case 'cbrt':
      return [{ part: a, levels: ZERO, kind: 'root' }];
    case 'log':
    case 'log10':
      return [{ part: a, levels: ZERO, kind: 'pole' }];
    case 'asin':
    case 'acos':
      return [
        { part: binary('-', a, number(1)), levels: ZERO, kind: 'root' },
        { part: binary('+', a, number(1)), levels: ZERO, kind: 'root' },
      ];
    case 'tan':
      return [{ part: binary('/', a, { type: 'constant', name: 'pi' }), levels: HALVES, kind: 'pole' }];
    case 'atan2':
      // The angle jumps across the negative half-axis only.
      return [
        {
          part: a,
          levels: ZERO,
          kind: 'jump',
          keep: { type: 'comparison', operators: ['<='], operands: [b, number(0)] },
        },
      ];
    default:
      return [];
  }
}

/**
 * Whether a formula has no break for any value of its variables and parameters, as far as its operations tell.
 * @param tree a formula
 * @returns true where none of its operations decides, divides by, or takes a root of something that varies. Cost: its nodes.
 */
export function isSmooth(tree: FormulaTree): boolean {
  // A parameter as exponent may be anything: 1/2 stands for it.
  const valueAt = (part: FormulaTree) => (part.type === 'number' ? part.value : 0.5);
  return switchesOf(tree, valueAt).length === 0 && children(tree).every(isSmooth);
}
