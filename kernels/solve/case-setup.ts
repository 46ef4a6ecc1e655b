import type { Checkpoint } from '../core/checkpoint';
import type { MapModel } from '../core/map-model';
import type { NoiseKind } from '../noise/noise-kind';
import type { Boundary } from '../operators/ends';

/** One point of a sweep, ready to be computed. */
export interface CaseSetup {
  readonly model: MapModel;
  readonly boundary: Boundary;
  readonly noise: NoiseKind;
  /** 0 where there is no noise */
  readonly sigma: number;
  readonly parameters: Readonly<Record<string, number>>;
  readonly points: number | 'auto';
  /** what was made for this system under the same key before, else made now */
  readonly cache: <T>(key: string, make: () => T) => T;
  readonly checkpoint: Checkpoint;
}
