import type { Ends } from '../spec';

export type SystemGroup =
  | 'populations'
  | 'clocks and loops'
  | 'switches and bistable devices'
  | 'chemical'
  | 'control charts and random walks'
  | 'textbook';

export interface SystemParameter {
  /** as in the formula */
  name: string;
  /** what it is, in words */
  title: string;
  /** unit, empty for a pure number; x stands for the unit of the variable */
  unit: string;
  default: number;
  /** smallest and largest value for which the definition holds */
  range: [number, number];
}

/** Something known of a system from the literature or by an exact argument. */
export interface KnownValue {
  /** what it is, in words */
  quantity: string;
  /** parameters it holds for; `sigma` among them where it holds with noise (gaussian, the domain of the definition) */
  parameters: Readonly<Record<string, number>>;
  value: number | string;
  source: string;
}

/** A map of the catalogue. Everything on screen, in checks and in tests about it comes from here. */
export interface SystemDefinition {
  id: string;
  title: string;
  group: SystemGroup;
  type: 'map';
  variables: ['x'];
  /** next state; positions on periodic domains are not reduced here, the ends do that */
  formulas: [string];
  parameters: SystemParameter[];
  /** the usual domain, one entry per variable */
  domain: { from: number; to: number; ends: Ends }[];
  /** standard deviation of the noise per step, in the unit of x */
  sigma: { default: number; range: [number, number] };
  /**
   * The formula by hand: out[i] = F(x[i]) and, where asked for, slope[i] = F'(x[i]).
   * `p` holds the parameters in the order of `parameters`.
   */
  map(x: Float64Array, p: readonly number[], out: Float64Array, slope?: Float64Array): void;
  /** places inside the usual domain where F or F' is not smooth, increasing */
  breaks(p: readonly number[]): number[];
  citation: string;
  known: KnownValue[];
  /** one or two sentences: what it models, what noise does to it */
  summary: string;
}
