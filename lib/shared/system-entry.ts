import type { Ends } from './study-types';
import type { TypesetFormula } from './typeset-types';

export interface ParameterEntry {
  name: string;
  unit: string;
  min: number;
  max: number;
  default: number;
}

/** What pages know of a system of the catalogue: plain data, no functions. */
export interface SystemEntry {
  id: string;
  title: string;
  variable: string;
  formula: string;
  typeset: TypesetFormula;
  parameters: ParameterEntry[];
  domain: { from: number; to: number; ends: Ends };
  citation: string;
}
