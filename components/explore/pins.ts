import type { StudyFile } from '@/lib/shared/study-types';

/** As many as a sweep axis takes. */
export const MOST_PINS = 1000;

/** Pins with one more noise level, in increasing order, each once. */
export function withPin(pins: readonly number[], sigma: number): number[] {
  if (pins.includes(sigma) || pins.length >= MOST_PINS) return [...pins];
  return [...pins, sigma].sort((a, b) => a - b);
}

/** The noise levels that a study's sweep lists one by one. */
export function pinsOf(study: StudyFile): number[] {
  const axis = study.sweep?.find(({ over }) => over === 'noise.sigma');
  return axis && 'values' in axis ? [...axis.values].sort((a, b) => a - b) : [];
}

/** The study with its sweep over the pins in place of any other over the noise level; without pins, with none. */
export function withPinSweep(study: StudyFile, pins: readonly number[]): StudyFile {
  const { sweep, ...rest } = study;
  const others = (sweep ?? []).filter(({ over }) => over !== 'noise.sigma' && over !== 'noise.sigma[0]');
  const axes = [...(pins.length > 0 ? [{ over: 'noise.sigma', values: [...pins] }] : []), ...others].slice(0, 2);
  return axes.length > 0 ? { ...rest, sweep: axes } : rest;
}
