import { CONSTANTS, FUNCTIONS } from './formula-tree';
import { FORMULA_LIMITS } from './lex-formula';

/** The names a formula may use beside functions and constants. */
export interface FormulaScope {
  /** names of the state's variables, in the order of the arrays given to `evaluate` */
  variables: readonly string[];
  /** names of the parameters, in the order of the values given to `evaluate` */
  parameters: readonly string[];
  /** whether `t`, the time, may be used; default false */
  time?: boolean;
}

/**
 * What is wrong with a name for a variable or a parameter.
 * @param name the name; a letter, then letters, digits or _, at most 32 characters
 * @returns null where nothing is; else the fault and what is allowed, in words: not of that form, a function's, constant's
 *   or operator's name, `t` (the time), or one that every JavaScript object carries (`constructor`, `toString`, …)
 */
export function nameFault(name: string): string | null {
  const shown = `"${name.slice(0, 40)}"`;
  if (!/^[A-Za-z][A-Za-z0-9_]*$/.test(name)) return `${shown} is no name: a letter, then letters, digits or _`;
  if (name.length > FORMULA_LIMITS.name)
    return `${shown} is too long: a name has at most ${FORMULA_LIMITS.name} characters`;
  if (Object.hasOwn(FUNCTIONS, name)) return `${shown} is the name of a function; choose another`;
  if (Object.hasOwn(CONSTANTS, name)) return `${shown} is the name of a constant; choose another`;
  if (name === 't') return '"t" is the time; choose another name';
  if (['and', 'or', 'not'].includes(name)) return `${shown} joins conditions; choose another name`;
  if (name in Object.prototype) return `${shown} cannot be used as a name; choose another`;
  return null;
}

/**
 * Checks the names of variables and parameters.
 * @param scope the names
 * @throws RangeError naming the first name that is malformed, taken by the language or given twice
 */
export function checkScope(scope: FormulaScope): void {
  const seen = new Set<string>();
  for (const name of [...scope.variables, ...scope.parameters]) {
    const fault = nameFault(name);
    if (fault !== null) throw new RangeError(fault);
    if (seen.has(name))
      throw new RangeError(`"${name}" is given twice; every variable and parameter needs a name of its own`);
    seen.add(name);
  }
}
