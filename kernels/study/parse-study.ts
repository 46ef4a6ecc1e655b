import { FormulaError } from '../formula/formula-error';
import { nameFault } from '../formula/formula-scope';
import type { FormulaTree } from '../formula/formula-tree';
import { nearestName } from '../formula/nearest-name';
import { parseFormula } from '../formula/parse-formula';
import { LIMITS, type StartDensity, type Study, type SweepAxis, studySchema } from '../spec';
import { findSystem, SYSTEMS } from '../systems/index';
import { type Fault, pathText, quoted } from './fault';
import { notYet } from './not-yet';
import { schemaFaults } from './schema-faults';

export type ParsedStudy =
  | { readonly study: Study; readonly faults?: undefined }
  | { readonly study?: undefined; readonly faults: readonly Fault[] };

/**
 * Reads a study file: schema, then what the schema cannot say (names, formulas, ranges, what is not computed yet).
 *
 * @param input parsed JSON of any kind
 * @returns the study with every default written out (a catalogue entry's formulas and parameters too), or all faults
 *   found, each with its path and what is allowed. Never throws for bad input.
 */
export function parseStudy(input: unknown): ParsedStudy {
  const foreign = reservedKey(input, []);
  if (foreign) return { faults: [foreign] };
  const read = studySchema.safeParse(input);
  if (!read.success) return { faults: schemaFaults(read.error.issues, input) };
  const early = notYet(read.data);
  if (early.length > 0) return { faults: early };
  const faults: Fault[] = [];
  const study = complete(read.data, faults);
  if (faults.length > 0) return { faults };
  checkRanges(study, faults);
  checkFormulas(study, faults);
  checkSweep(study, faults);
  return faults.length > 0 ? { faults } : { study };
}

/** Levels of nesting that a study file can have; samples in a start are the deepest. */
const DEEPEST = 12;

/** A key that JavaScript reads as something else than a key, or nesting beyond any study's; null where there is none. */
function reservedKey(value: unknown, path: readonly (string | number)[]): Fault | null {
  if (value === null || typeof value !== 'object') return null;
  if (path.length > DEEPEST)
    return { path: pathText(path), message: `is nested deeper than ${DEEPEST} levels; no study is` };
  const entries = Array.isArray(value) ? value.entries() : Object.entries(value);
  for (const [key, inner] of entries) {
    if (key === '__proto__')
      return { path: pathText([...path, key]), message: 'cannot be used as a name; choose another' };
    if (typeof inner !== 'object') continue;
    const fault = reservedKey(inner, [...path, key]);
    if (fault) return fault;
  }
  return null;
}

/** Fills in what a catalogue entry knows, and the defaults that depend on other fields. */
function complete(study: Study, faults: Fault[]): Study {
  const { system, noise } = study;
  let { variables, formulas } = system;
  let parameters = system.parameters;
  if (system.id !== undefined) {
    const entry = findSystem(system.id);
    if (!entry) {
      const near = nearestName(
        system.id,
        SYSTEMS.map((s) => s.id),
      );
      faults.push({
        path: 'system.id',
        message: `unknown system ${quoted(system.id)}; ${near ? `did you mean ${near}?` : `known: ${SYSTEMS.map((s) => s.id).join(', ')}`}`,
      });
      return study;
    }
    if (formulas && formulas.join() !== entry.formulas.join()) {
      faults.push({
        path: 'system.formulas',
        message: `differ from those of ${entry.id} (${entry.formulas.join(', ')}); leave out the formulas or the id`,
      });
    }
    if (variables && variables.join() !== entry.variables.join()) {
      faults.push({
        path: 'system.variables',
        message: `differ from those of ${entry.id} (${entry.variables.join(', ')}); leave them or the id out`,
      });
    }
    variables = [...entry.variables];
    formulas = [...entry.formulas];
    parameters = { ...Object.fromEntries(entry.parameters.map((p) => [p.name, p.default])), ...parameters };
    for (const key of Object.keys(parameters)) {
      if (!entry.parameters.some((p) => p.name === key))
        faults.push({
          path: `system.parameters.${key}`,
          message: `no parameter of ${entry.id}; allowed: ${entry.parameters.map((p) => p.name).join(', ') || 'none'}`,
        });
    }
  } else if (!formulas) {
    faults.push({
      path: 'system.formulas',
      message: 'is missing; a system needs an id of the catalogue or a formula per variable',
    });
    return study;
  }
  variables ??= formulas?.length === 2 ? ['x', 'y'] : ['x'];
  const count = variables.length;
  const fits = (path: string, list: readonly unknown[] | undefined) => {
    if (list && list.length !== count)
      faults.push({
        path,
        message: `has ${list.length} entries for ${count} variable${count > 1 ? 's' : ''}; allowed: one per variable`,
      });
  };
  fits('system.formulas', formulas);
  fits('system.units', system.units);
  fits('system.breaks', system.breaks);
  fits('domain', study.domain);
  if (Array.isArray(noise.sigma)) fits('noise.sigma', noise.sigma);
  if (Array.isArray(study.grid.points)) fits('grid.points', study.grid.points);
  if (Object.keys(parameters).length > LIMITS.parameters)
    faults.push({ path: 'system.parameters', message: `must have at most ${LIMITS.parameters} entries` });
  for (const name of [...variables, ...Object.keys(parameters)]) {
    const wrong = nameFault(name);
    if (wrong)
      faults.push({
        path: variables.includes(name) ? 'system.variables' : `system.parameters.${name}`,
        message: wrong,
      });
    else if (variables.includes(name) && Object.hasOwn(parameters, name))
      faults.push({ path: `system.parameters.${name}`, message: 'is the name of a variable as well; choose another' });
  }
  if (noise.kind !== 'none' && noise.sigma === undefined)
    faults.push({ path: 'noise.sigma', message: `is missing; noise of kind "${noise.kind}" needs a sigma above 0` });
  if (noise.kind === 'none' && noise.sigma !== undefined)
    faults.push({ path: 'noise.sigma', message: 'must be left out where the kind is "none"' });
  if (noise.correlation !== undefined && count === 1)
    faults.push({ path: 'noise.correlation', message: 'needs two variables' });
  if (system.period !== undefined && system.type === 'map')
    faults.push({ path: 'system.period', message: 'is for systems of type "sde"' });
  if (study.step && system.type === 'map') faults.push({ path: 'step', message: 'is for systems of type "sde"' });
  return { ...study, system: { ...system, variables, formulas, parameters } };
}

function checkRanges(study: Study, faults: Fault[]): void {
  const { domain, noise, ask, system } = study;
  domain.forEach((d, i) => {
    if (!(d.from < d.to)) faults.push({ path: `domain[${i}]`, message: `from ${d.from} must be below to ${d.to}` });
    else if (!((d.to - d.from) / Math.max(Math.abs(d.from), Math.abs(d.to)) > 1e-9))
      faults.push({
        path: `domain[${i}]`,
        message: `${d.from} to ${d.to} is too narrow for its distance from zero; shift the variable`,
      });
  });
  if (faults.length > 0) return;
  const [{ from, to }] = domain;
  const sigmas = noise.sigma === undefined ? [] : [noise.sigma].flat();
  sigmas.forEach((s, i) => {
    const path = Array.isArray(noise.sigma) ? `noise.sigma[${i}]` : 'noise.sigma';
    const [low, high] = sigmaRange(from, to);
    if (!(s >= low && s <= high))
      faults.push({ path, message: `${s} on a domain of length ${to - from}; allowed: ${low} to ${high}` });
  });
  for (const [name, value] of Object.entries(system.parameters)) {
    const range = catalogueRange(study, name);
    if (outside(range, value)) {
      const path = pathText(['system', 'parameters', name]);
      faults.push({
        path,
        message: `${value} for ${system.id}; allowed: ${range?.join(' to ')} (type the formula for other values)`,
      });
    }
  }
  system.breaks?.forEach((list, v) => {
    list.forEach((b, i) => {
      if (!(b >= domain[v].from && b <= domain[v].to))
        faults.push({
          path: `system.breaks[${v}][${i}]`,
          message: `${b} lies outside the domain; allowed: ${domain[v].from} to ${domain[v].to}`,
        });
    });
  });
  ask.density?.at.forEach((n, i) => {
    if (!Number.isInteger(n))
      faults.push({
        path: `ask.density.at[${i}]`,
        message: `${n} is no number of steps; allowed: whole numbers from 0 up`,
      });
  });
  if (ask.density) checkStart(ask.density.start, 'ask.density.start', study, faults);
  if (ask.exit) checkStart(ask.exit.start, 'ask.exit.start', study, faults);
}

/**
 * Noise levels that a domain admits: below, no affordable grid; above, one step forgets everything.
 *
 * @param from lower end of the domain
 * @param to upper end
 * @returns smallest and largest sigma, units of the variable
 */
export function sigmaRange(from: number, to: number): [number, number] {
  const tidy = (v: number) => Number(v.toPrecision(3));
  return [tidy(1e-5 * (to - from)), tidy(1e3 * (to - from))];
}

function checkStart(start: StartDensity, path: string, study: Study, faults: Fault[]): void {
  const [{ from, to }] = study.domain;
  const inside = (value: number, at: string) => {
    if (!(value >= from && value <= to))
      faults.push({ path: at, message: `${value} lies outside the domain; allowed: ${from} to ${to}` });
  };
  const single = (list: readonly number[], at: string) => {
    if (list.length !== 1) faults.push({ path: at, message: `has ${list.length} entries; allowed: one per variable` });
  };
  if (start.kind === 'point') {
    single(start.at, `${path}.at`);
    start.at.forEach((v, i) => {
      inside(v, `${path}.at[${i}]`);
    });
  } else if (start.kind === 'gaussian') {
    single(start.mean, `${path}.mean`);
    single(start.sd, `${path}.sd`);
    start.mean.forEach((v, i) => {
      inside(v, `${path}.mean[${i}]`);
    });
    start.sd.forEach((v, i) => {
      if (!(v >= 1e-9 * (to - from) && v <= 1e3 * (to - from)))
        faults.push({
          path: `${path}.sd[${i}]`,
          message: `${v} on a domain of length ${to - from}; allowed: ${1e-9 * (to - from)} to ${1e3 * (to - from)}`,
        });
    });
  } else if (start.kind === 'samples') {
    const outside = start.samples.findIndex((s) => typeof s !== 'number' || !(s >= from && s <= to));
    if (outside >= 0) {
      const message = `${quoted(start.samples[outside])}; allowed: one number per sample, ${from} to ${to}`;
      faults.push({ path: `${path}.samples[${outside}]`, message });
    }
  }
}

function checkFormulas(study: Study, faults: Fault[]): void {
  const { system, ask } = study;
  const scope = { variables: system.variables ?? ['x'], parameters: Object.keys(system.parameters) };
  const read = (text: string, path: string): FormulaTree | null => {
    try {
      return parseFormula(text, scope);
    } catch (error) {
      if (!(error instanceof FormulaError)) throw error;
      faults.push({ path, message: `${error.message} (character ${error.at + 1})` });
      return null;
    }
  };
  system.formulas?.forEach((text, i) => {
    read(text, `system.formulas[${i}]`);
  });
  for (const key of ['density', 'exit'] as const) {
    const start = ask[key]?.start;
    if (start?.kind === 'formula') read(start.formula, `ask.${key}.start.formula`);
  }
}

/** Values of one sweep axis, in order. */
export function axisValues(axis: SweepAxis): number[] {
  if ('values' in axis) return axis.values;
  const { from, to, count, scale } = axis;
  const part = (i: number) => i / (count - 1);
  if (scale === 'log')
    return Array.from({ length: count }, (_, i) =>
      i === 0 ? from : i === count - 1 ? to : Math.exp(Math.log(from) + part(i) * Math.log(to / from)),
    );
  return Array.from({ length: count }, (_, i) => (i === count - 1 ? to : from + part(i) * (to - from)));
}

/** Range of a catalogue system's parameter; null where the system is typed. */
function catalogueRange(study: Study, parameter: string): readonly [number, number] | null {
  const entry = study.system.id === undefined ? undefined : findSystem(study.system.id);
  return entry?.parameters.find((p) => p.name === parameter)?.range ?? null;
}

const outside = (range: readonly [number, number] | null, value: number) =>
  range !== null && !(value >= range[0] && value <= range[1]);

function checkSweep(study: Study, faults: Fault[]): void {
  const { system, noise, domain } = study;
  let cases = 1;
  const seen = new Set<string>();
  study.sweep.forEach((axis, i) => {
    const path = `sweep[${i}]`;
    const name = axis.over === 'noise.sigma[0]' ? 'noise.sigma' : axis.over;
    if (seen.has(name)) faults.push({ path: `${path}.over`, message: `${axis.over} is swept twice` });
    seen.add(name);
    if ('scale' in axis && axis.scale === 'log' && !(axis.from > 0 && axis.to > 0)) {
      faults.push({ path, message: `a log scale needs from and to above 0, got ${axis.from} and ${axis.to}` });
      return;
    }
    const values = axisValues(axis);
    cases *= values.length;
    if (name.startsWith('parameters.')) {
      const parameter = name.slice('parameters.'.length);
      if (!Object.hasOwn(system.parameters, parameter)) {
        const near = nearestName(parameter, Object.keys(system.parameters));
        faults.push({
          path: `${path}.over`,
          message: `no parameter ${parameter}; ${near ? `did you mean parameters.${near}?` : `known: ${Object.keys(system.parameters).join(', ') || 'none'}`}`,
        });
      }
      const range = catalogueRange(study, parameter);
      const bad = values.find((v) => outside(range, v));
      if (bad !== undefined)
        faults.push({ path, message: `${parameter} ${bad} for ${system.id}; allowed: ${range?.join(' to ')}` });
    } else if (name === 'noise.sigma') {
      if (noise.kind === 'none')
        faults.push({ path: `${path}.over`, message: 'there is no noise to sweep; choose a kind other than "none"' });
      const [low, high] = sigmaRange(domain[0].from, domain[0].to);
      const bad = values.find((v) => !(v >= low && v <= high));
      if (bad !== undefined) faults.push({ path, message: `sigma ${bad} on this domain; allowed: ${low} to ${high}` });
    } else faults.push({ path: `${path}.over`, message: `${axis.over} needs two variables` });
  });
  if (cases > LIMITS.sweepCases)
    faults.push({ path: 'sweep', message: `${cases} cases; allowed: at most ${LIMITS.sweepCases}` });
}
