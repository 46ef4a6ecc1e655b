import type { Ends, StudyFile } from './study-types';

/** What the bench asks for; a study that asks for just this does not repeat it in its address. */
export const BENCH_ASK = {
  stationary: { deterministic: true },
  spectrum: { count: 8, deterministic: true },
  exit: {},
  lyapunov: {},
} satisfies StudyFile['ask'];

/** The bench's first study: the logistic map in its chaotic range, watched between two absorbing ends. */
export const FIRST_STUDY: StudyFile = {
  format: 'smirr-study',
  version: 1,
  title: 'Logistic map under noise',
  system: { type: 'map', id: 'logistic', parameters: { r: 3.8 } },
  noise: { kind: 'gaussian', sigma: 0.012 },
  domain: [{ from: 0, to: 1, ends: 'absorbing' }],
  ask: BENCH_ASK,
};

export function losesMass(ends: Ends): boolean {
  return Array.isArray(ends) ? ends.includes('absorbing') : ends === 'absorbing';
}

/**
 * The study that the bench has computed. While something moves, what does not depend on the moving noise level (the
 * system without noise) is left out, and so are exit times, whose last digits cost more than all the rest.
 */
export function benchRequest(study: StudyFile, pass: 'live' | 'full'): StudyFile {
  const { sweep: _sweep, ask: _ask, ...kept } = study;
  const deterministic = pass === 'full';
  // Without noise everything comes from cells, of which a fine picture takes very many.
  const coarse = pass === 'live' && study.noise.kind === 'none' && { grid: { ...study.grid, points: 1024 } };
  return {
    ...kept,
    ...coarse,
    ask: {
      stationary: { deterministic },
      spectrum: { count: 8, deterministic },
      lyapunov: {},
      ...(pass === 'full' && study.domain.some(({ ends }) => losesMass(ends)) && { exit: {} }),
    },
  };
}

/** Two studies with the same key have the same picture without noise. */
export function withoutNoiseKey(study: StudyFile): string {
  return JSON.stringify([study.system, study.domain, study.grid ?? null]);
}

/** The noise level of a study of one variable; null where it has none. */
export function noiseLevel(study: StudyFile): number | null {
  const { sigma } = study.noise;
  return (Array.isArray(sigma) ? sigma[0] : sigma) ?? null;
}

/** Whether two studies ask for the same work: title and notes are words about it. Compares by reference, for edits. */
export function sameWork(one: StudyFile, other: StudyFile): boolean {
  const names = new Set([...Object.keys(one), ...Object.keys(other)] as (keyof StudyFile)[]);
  return [...names].every((name) => name === 'title' || name === 'notes' || one[name] === other[name]);
}
