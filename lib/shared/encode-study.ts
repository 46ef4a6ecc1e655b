import { BENCH_ASK } from './bench-study';
import type { StudyFile } from './study-types';

/** Longer addresses are cut by some mail programs and proxies; such a study travels as a file. */
export const LONGEST_ADDRESS = 6000;

/**
 * A study as the query of an address, readable where it can be: `system=logistic&p.r=3.8&sigma=0.012&on=0,1,absorbing`.
 * What has no short form of its own follows as JSON under `more`. `decodeStudy` gives the same study back.
 */
export function encodeStudy(study: StudyFile): string {
  const { title, system, noise, domain, ask, format: _format, version: _version, ...others } = study;
  const { type, id, formulas, variables, parameters, ...systemRest } = system;
  const { kind, sigma, ...noiseRest } = noise;
  const pairs: [string, string | number][] = [];
  if (type !== 'map') pairs.push(['type', type]);
  if (id !== undefined) pairs.push(['system', id]);
  for (const name of variables ?? []) pairs.push(['var', name]);
  for (const formula of formulas ?? []) pairs.push(['f', formula]);
  for (const [name, value] of Object.entries(parameters ?? {})) pairs.push([`p.${name}`, value]);
  if (kind !== 'gaussian') pairs.push(['noise', kind]);
  if (typeof sigma === 'number') pairs.push(['sigma', sigma]);
  for (const { from, to, ends } of domain) pairs.push(['on', [from, to, ...[ends].flat()].join(',')]);
  if (title) pairs.push(['title', title]);
  const more = {
    ...(Object.keys(systemRest).length > 0 && { system: systemRest }),
    ...((Object.keys(noiseRest).length > 0 || Array.isArray(sigma)) && {
      noise: { ...noiseRest, ...(Array.isArray(sigma) && { sigma }) },
    }),
    ...(JSON.stringify(ask) !== JSON.stringify(BENCH_ASK) && { ask }),
    ...others,
  };
  if (Object.keys(more).length > 0) pairs.push(['more', JSON.stringify(more)]);
  return pairs.map(([key, value]) => `${key}=${escapeValue(String(value))}`).join('&');
}

/** Percent signs only where an address needs them: a formula stays readable. */
function escapeValue(text: string): string {
  return encodeURIComponent(text).replace(/%(2C|2F|3A|5E|5B|5D|3C|3E|40|3B|3F)/g, (escaped) =>
    escaped === '%3C' || escaped === '%3E' || escaped === '%5E' ? escaped : decodeURIComponent(escaped),
  );
}
