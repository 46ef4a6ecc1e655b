import { chartChecks } from './charts';
import { circleChecks } from './circle';
import { exitChecks } from './exits';
import { lineChecks } from './line';
import { logisticChecks } from './logistic';
import type { PublishedCheck } from './published-check';
import { quietChecks } from './quiet';
import { typedFormulaChecks } from './typed-formulas';
import { walkChecks } from './walks';

/** Every check against a value from outside, in the order a reader meets them. */
export const publishedChecks: readonly PublishedCheck[] = [
  ...circleChecks,
  ...lineChecks,
  ...logisticChecks,
  ...walkChecks,
  ...chartChecks,
  ...exitChecks,
  ...quietChecks,
  ...typedFormulaChecks,
];
