export type TypesetFormula = unknown;
