import type { Study } from '../spec';
import type { Fault } from './fault';

/**
 * What the schema knows and this engine does not compute yet. Such a study is refused, never computed in part.
 *
 * @param study a study that satisfies the schema
 * @returns one fault for each thing that is not computed yet
 */
export function notYet(study: Study): Fault[] {
  const faults: Fault[] = [];
  const add = (path: string, what: string, allowed: string) =>
    faults.push({ path, message: `${what}: not computed yet; allowed now: ${allowed}` });
  const { system, noise, domain, ask } = study;
  if (system.type === 'sde') add('system.type', '"sde"', '"map"');
  const variables = system.variables?.length ?? system.formulas?.length ?? domain.length;
  if (variables === 2) add('system.variables', 'two variables', 'one variable');
  if (noise.kind !== 'gaussian' && noise.kind !== 'none') add('noise.kind', `"${noise.kind}"`, '"gaussian", "none"');
  if (noise.factor) add('noise.factor', 'state-dependent noise', 'leave it out');
  if (noise.calculus) add('noise.calculus', 'a calculus', 'leave it out');
  domain.forEach((d, i) => {
    if ([d.ends].flat().includes('holding'))
      add(`domain[${i}].ends`, '"holding"', '"periodic", "reflecting", "absorbing" or a pair of the last two');
  });
  if (ask.spectrum?.method === 'collocation') add('ask.spectrum.method', '"collocation"', '"auto", "cells"');
  if (ask.exit?.inside !== undefined)
    add('ask.exit.inside', 'a working range inside the domain', 'leave it out: the whole domain');
  if (ask.exit?.survival) add('ask.exit.survival', 'survival', 'leave it out');
  for (const key of ['correlation', 'powerSpectrum', 'ensemble', 'sensitivity', 'target'] as const) {
    if (ask[key]) add(`ask.${key}`, key, 'density, stationary, spectrum, exit, lyapunov');
  }
  return faults;
}
