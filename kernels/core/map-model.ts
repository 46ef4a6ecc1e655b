/** A one-variable map as the operators see it: parameters are fixed, positions come in blocks. */
export interface MapModel {
  /**
   * out ← F(x) and, where asked for, slope ← dF/dx, entry by entry.
   *
   * At a break the value is that of one side; callers evaluate inside pieces only.
   */
  evaluate(x: Float64Array, out: Float64Array, slope?: Float64Array): void;
  /** positions inside the domain where F or its first derivatives jump or blow up, increasing */
  readonly breaks: readonly number[];
  /** positions in the domain, ends included, where F' is zero or unbounded: ln|F'| is singular there; increasing */
  readonly singular: readonly number[];
  /** false: more breaks than could be listed; numbers are less certain than they look */
  readonly complete: boolean;
  /** out ← ln|F'(x)|: where a branch stands in for infinitely many, that of the map itself */
  stretch(x: Float64Array, out: Float64Array): void;
  /** positions where ln|F'| is singular, those where branches pile up included; increasing */
  readonly stretchSingular: readonly number[];
}
