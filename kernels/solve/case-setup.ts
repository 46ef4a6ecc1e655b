import type { Checkpoint } from '../core/checkpoint';
import type { MapModel } from '../core/map-model';
import { gaussian } from '../noise/gaussian';
import type { NoiseKind } from '../noise/noise-kind';
import { type Boundary, boundaryOf } from '../operators/ends';
import type { Study } from '../spec';
import { modelOf } from '../study/model-of';

/** Things made for a system that later runs may use again; a host keeps one as long as it likes. */
export type RunCache = Map<string, Map<string, unknown>>;

const SYSTEMS_KEPT = 8;

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

/**
 * Sets up one point of a sweep.
 *
 * @param at values of the swept quantities at this point: noise.sigma, parameters.NAME
 * @param cache kept by the host; at most eight systems stay in it
 * @throws StudyRefused where the formula is not a finite number on the domain
 */
export function caseSetup(
  study: Study,
  at: Readonly<Record<string, number>>,
  cache: RunCache,
  checkpoint: Checkpoint,
): CaseSetup {
  const { noise, domain, grid } = study;
  const parameters = { ...study.system.parameters };
  let sigma = noise.sigma === undefined ? 0 : [noise.sigma].flat()[0];
  for (const [over, value] of Object.entries(at)) {
    if (over.startsWith('parameters.')) parameters[over.slice('parameters.'.length)] = value;
    else sigma = value;
  }
  const own = systemCache(cache, JSON.stringify([study.system, parameters, domain]));
  const keep = <T>(key: string, make: () => T): T => {
    if (!own.has(key)) own.set(key, make());
    return own.get(key) as T;
  };
  const [{ from, to, ends }] = domain;
  return {
    model: keep('model', () => modelOf(study, parameters)),
    boundary: boundaryOf(from, to, ends),
    noise: gaussian,
    sigma,
    parameters,
    points: [grid.points].flat()[0],
    cache: keep,
    checkpoint,
  };
}

function systemCache(cache: RunCache, key: string): Map<string, unknown> {
  let own = cache.get(key);
  if (own) cache.delete(key);
  else own = new Map();
  cache.set(key, own); // most recent last
  for (const oldest of cache.keys()) {
    if (cache.size <= SYSTEMS_KEPT) break;
    cache.delete(oldest);
  }
  return own;
}
