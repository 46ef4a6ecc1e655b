import { parseFormula } from '@/kernels/formula/parse-formula';
import { typeset } from '@/kernels/formula/typeset';
import type { StudyFile } from './study-types';
import type { TypesetFormula } from './typeset-types';

/** A formula laid out; throws FormulaError, with the character, where it cannot be read. */
export function typesetFormula(formula: string, variables: string[], parameters: string[]): TypesetFormula {
  return typeset(parseFormula(formula, { variables, parameters }));
}

/** The typed formula of a study laid out; null for a system of the catalogue or where the formula has a fault. */
export function typesetStudy(study: StudyFile): TypesetFormula | null {
  const { formulas, variables, parameters } = study.system;
  if (formulas === undefined) return null;
  try {
    return typesetFormula(formulas[0], variables ?? ['x'], Object.keys(parameters ?? {}));
  } catch {
    return null;
  }
}
