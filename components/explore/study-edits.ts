import { START_STEPS, type Start } from '@/lib/shared/start-density';
import type { Bounds } from '@/lib/shared/step-number';
import type { StudyFile } from '@/lib/shared/study-types';
import type { SystemEntry } from '@/lib/shared/system-entry';

type Interval = StudyFile['domain'][number];

export function withSigma(study: StudyFile, sigma: number): StudyFile {
  return { ...study, noise: { ...study.noise, sigma } };
}

export function withParameter(study: StudyFile, name: string, value: number): StudyFile {
  return { ...study, system: { ...study.system, parameters: { ...study.system.parameters, [name]: value } } };
}

export function withInterval(study: StudyFile, change: Partial<Interval>): StudyFile {
  return { ...study, domain: [{ ...study.domain[0], ...change }] };
}

export function withKind(study: StudyFile, kind: StudyFile['noise']['kind']): StudyFile {
  const { sigma, ...rest } = study.noise;
  if (kind === 'none') return { ...study, noise: { ...rest, kind } };
  return { ...study, noise: { ...rest, kind, sigma: sigma ?? 0.01 * (study.domain[0].to - study.domain[0].from) } };
}

export function withPoints(study: StudyFile, points: number | 'auto'): StudyFile {
  const { points: _points, ...rest } = study.grid ?? {};
  const grid = points === 'auto' ? rest : { ...rest, points };
  const { grid: _grid, ...others } = study;
  return Object.keys(grid).length > 0 ? { ...others, grid } : others;
}

/** Another start density; none stands for the usual one. */
export function withStart(study: StudyFile, start: Start | null): StudyFile {
  const { density, ...ask } = study.ask;
  if (start === null) return { ...study, ask };
  return { ...study, ask: { ...ask, density: { at: density?.at ?? START_STEPS, start } } };
}

/** A system of the catalogue with its usual parameters, domain and noise level. */
export function withSystem(study: StudyFile, entry: SystemEntry): StudyFile {
  return {
    // A start belongs to the domain that it was chosen on.
    ...withStart(study, null),
    title: `${entry.title} under noise`,
    system: {
      type: 'map',
      id: entry.id,
      parameters: Object.fromEntries(entry.parameters.map((parameter) => [parameter.name, parameter.default])),
    },
    noise: study.noise.kind === 'none' ? study.noise : { ...study.noise, sigma: entry.sigma },
    domain: [entry.domain],
  };
}

/** A typed formula keeps the parameters that it still names; new ones begin at 1. */
export function withFormula(study: StudyFile, formula: string, variable: string, names: string[]): StudyFile {
  const before = study.system.parameters ?? {};
  const { id: _id, parameters: _parameters, ...rest } = study.system;
  return {
    ...study,
    system: {
      ...rest,
      variables: [variable],
      formulas: [formula],
      parameters: Object.fromEntries(names.map((name) => [name, before[name] ?? 1])),
    },
  };
}

/** Levels that can be typed: a hundred-thousandth to a thousand times the domain's length, as the engine takes them. */
export function sigmaLimits(study: StudyFile): Bounds {
  const { from, to } = study.domain[0];
  const length = Math.abs(to - from) || 1;
  return { min: Number((length * 1e-5).toPrecision(3)), max: Number((length * 1e3).toPrecision(3)) };
}

/** The slider's reach: from a thousandth to half of the domain's length. */
export function sigmaBounds(study: StudyFile): Bounds {
  const { from, to } = study.domain[0];
  const length = Math.abs(to - from) || 1;
  return { min: Number((length * 1e-3).toPrecision(3)), max: Number((length * 0.5).toPrecision(3)) };
}
