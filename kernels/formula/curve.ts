import { compileFormula } from './compile-formula';
import type { FormulaScope } from './formula-scope';
import type { FormulaTree } from './formula-tree';

/** A function of one variable with its derivative, parameters fixed. */
export interface Curve {
  /** values and derivatives at all x */
  sample(x: Float64Array, out: Float64Array, slope: Float64Array): void;
  /** the value at one place */
  value(x: number): number;
  /** the derivative at one place */
  slope(x: number): number;
}

/**
 * A formula of one variable as a curve.
 * @param tree the formula
 * @param scope its names: one variable
 * @param parameters values in the scope's order
 * @returns the curve; it keeps working arrays, so that a call at one place costs about a microsecond
 * @throws RangeError where the scope has not exactly one variable
 */
export function curveOf(tree: FormulaTree, scope: FormulaScope, parameters: readonly number[]): Curve {
  if (scope.variables.length !== 1) {
    throw new RangeError(`${scope.variables.length} variables given; a curve has exactly 1`);
  }
  const compiled = compileFormula(tree, scope);
  const [x, value, slope] = [new Float64Array(1), new Float64Array(1), new Float64Array(1)];
  return {
    sample: (at, out, slopes) => compiled.evaluateWithSlope([at], parameters, out, slopes),
    value(at) {
      x[0] = at;
      compiled.evaluate([x], parameters, value);
      return value[0];
    },
    slope(at) {
      x[0] = at;
      compiled.evaluateWithSlope([x], parameters, value, slope);
      return slope[0];
    },
  };
}
