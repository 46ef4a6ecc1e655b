import type { Ends } from './study-types';
import type { TypesetFormula } from './typeset-types';

export interface ParameterEntry {
  name: string;
  /** What it is, in words. */
  title: string;
  unit: string;
  min: number;
  max: number;
  default: number;
}

/** Something known of a system from the literature or by an exact argument. */
export interface KnownEntry {
  quantity: string;
  /** What it holds for: "r = 4, sigma = 0.05"; empty where it holds throughout. */
  holdsFor: string;
  value: string;
  source: string;
}

/** What pages know of a system of the catalogue: plain data, no functions. */
export interface SystemEntry {
  id: string;
  title: string;
  group: string;
  summary: string;
  variable: string;
  formula: string;
  typeset: TypesetFormula;
  parameters: ParameterEntry[];
  domain: { from: number; to: number; ends: Ends };
  /** The usual noise level, in the unit of the variable. */
  sigma: number;
  citation: string;
  known: KnownEntry[];
}
