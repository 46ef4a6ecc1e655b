import { bernoulliShift } from './bernoulli-shift';
import { cubic } from './cubic';
import { doubling } from './doubling';
import { gauss } from './gauss';
import { linear } from './linear';
import { logistic } from './logistic';
import { pomeauManneville } from './pomeau-manneville';
import { ricker } from './ricker';
import { rotation } from './rotation';
import { saturating } from './saturating';
import { sineCircle } from './sine-circle';
import type { SystemDefinition } from './system-definition';
import { tent } from './tent';

/** The catalogue, in the order in which it is shown. */
export const SYSTEMS: readonly SystemDefinition[] = [
  logistic,
  ricker,
  saturating,
  cubic,
  sineCircle,
  rotation,
  linear,
  tent,
  doubling,
  bernoulliShift,
  gauss,
  pomeauManneville,
];

/**
 * An entry of the catalogue.
 * @param id its id
 * @returns the entry, or undefined where there is none of that id
 */
export function findSystem(id: string): SystemDefinition | undefined {
  return SYSTEMS.find((system) => system.id === id);
}
