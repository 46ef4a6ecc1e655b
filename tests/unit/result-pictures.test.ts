import { describe, expect, it } from 'vitest';
import { resultSchema } from '@/kernels/result';
import explore from '../fixtures/results/explore.json' with { type: 'json' };
import explore2d from '../fixtures/results/explore-2d.json' with { type: 'json' };
import published from '../fixtures/results/published.json' with { type: 'json' };
import { valueAt } from '../published/judge';

/** Every mark, number and label of a page, and where it stands in the result file that the page is drawn from. */
type Marks = [string, string][];

const BENCH: Marks = [
  ['title', 'study.title'],
  ['equation', 'study.system.formulas[0]'],
  ['number in the equation', 'study.system.parameters.r'],
  ['kind of noise', 'study.noise.kind'],
  ['sigma', 'study.noise.sigma'],
  ['lower end of the domain', 'study.domain[0].from'],
  ['upper end of the domain', 'study.domain[0].to'],
  ['ends', 'study.domain[0].ends'],
  ['grid auto', 'study.grid.points'],
  ['number of points', 'cases[1].grid.points[0]'],
  ['positions of the density', 'cases[1].grid.x[0]'],
  ['density with noise', 'cases[1].stationary.values'],
  ['steps of the density without', 'cases[1].stationary.deterministic.x[0]'],
  ['density without noise', 'cases[1].stationary.deterministic.values'],
  ['mass lost per step', 'cases[1].stationary.lostPerStep.value'],
  ['error of the density', 'cases[1].stationary.uncertainty'],
  ['points compared against', 'cases[1].grid.compared[0][0]'],
  ['two ways agree', 'cases[1].stationary.secondWay.difference'],
  ['start of the strip, in words', 'study.ask.density.start.kind'],
  ['its mean', 'study.ask.density.start.mean[0]'],
  ['row of the strip', 'cases[1].density[at=7].values'],
  ['its step number', 'cases[1].density[1].at'],
  ['mass at that step', 'cases[1].density[at=7].mass.value'],
  ['dot of the spectrum, across', 'cases[1].spectrum.noisy[1].re'],
  ['dot of the spectrum, up', 'cases[1].spectrum.noisy[1].im'],
  ['modulus in the table', 'cases[1].spectrum.noisy[1].modulus'],
  ['error in the table', 'cases[1].spectrum.noisy[1].uncertainty'],
  ['diamond, across', 'cases[1].spectrum.deterministic[1].re'],
  ['diamond, up', 'cases[1].spectrum.deterministic[1].im'],
  ['diamond drawn faint', 'cases[1].spectrum.deterministic[1].resolved'],
  ['method of the diamonds', 'cases[1].spectrum.deterministic[1].method'],
  ['what densities they hold for', 'cases[1].spectrum.deterministic[1].space'],
  ['trail of an eigenvalue along sigma', 'cases[2].spectrum.noisy[1].re'],
  ['noise level on the rail', 'cases[0].at'],
  ['mean exit time on the rail', 'cases[0].exit.meanTime.value'],
  ['relaxation time on the rail', 'cases[0].spectrum.relaxationTime.value'],
  ['Lyapunov exponent on the rail', 'cases[0].lyapunov.value.value'],
  ['limit', 'study.ask.target.atLeast'],
  ['what the limit is about', 'study.ask.target.quantity'],
  ['noise level at the limit', 'cases[1].target.value.value'],
  ['caution', 'warnings[0].message'],
];

const SURFACE: Marks = [
  ['title', 'study.title'],
  ['first equation', 'study.system.formulas[0]'],
  ['second equation', 'study.system.formulas[1]'],
  ['names of the axes', 'study.system.variables[1]'],
  ['number in an equation', 'study.system.parameters.a'],
  ['sigma of the second variable', 'study.noise.sigma[1]'],
  ['correlation', 'study.noise.correlation'],
  ['ends', 'study.domain[1].ends'],
  ['number of points, second variable', 'cases[0].grid.points[1]'],
  ['positions along x', 'cases[0].grid.x[0]'],
  ['positions along y', 'cases[0].grid.x[1]'],
  ['heights with noise', 'cases[0].stationary.values'],
  ['positions without noise', 'cases[0].stationary.deterministic.x[1]'],
  ['heights without noise', 'cases[0].stationary.deterministic.values'],
  ['how they were made', 'cases[0].stationary.deterministic.method'],
  ['mass lost per step', 'cases[0].stationary.lostPerStep.value'],
  ['error of the density', 'cases[0].stationary.uncertainty'],
  ['grid compared against', 'cases[0].grid.compared[0][1]'],
];

const RECORD: Marks = [
  ['title', 'study.title'],
  ['summary', 'study.notes'],
  ['largest sigma that meets the limit', 'cases[1].target.value.value'],
  ['its error', 'cases[1].target.value.uncertainty'],
  ['its unit', 'study.system.units[0]'],
  ['mean exit time', 'cases[1].exit.meanTime.value'],
  ['its error', 'cases[1].exit.meanTime.uncertainty'],
  ['relaxation time', 'cases[1].spectrum.relaxationTime.value'],
  ['its error', 'cases[1].spectrum.relaxationTime.uncertainty'],
  ['Lyapunov exponent', 'cases[1].lyapunov.value.value'],
  ['its error', 'cases[1].lyapunov.value.uncertainty'],
  ['density with noise', 'cases[1].stationary.values'],
  ['density without noise', 'cases[1].stationary.deterministic.values'],
  ['mass lost per step', 'cases[1].stationary.lostPerStep.value'],
  ['error of the density', 'cases[1].stationary.uncertainty'],
  ['curve of exit times, across', 'cases[2].at'],
  ['curve of exit times, up', 'cases[2].exit.meanTime.value'],
  ['largest error along the curve', 'cases[2].exit.meanTime.uncertainty'],
  ['limit', 'study.ask.target.atLeast'],
  ['equation', 'study.system.formulas[0]'],
  ['length of a step', 'study.system.stepTime.value'],
  ['its unit', 'study.system.stepTime.unit'],
  ['domain and ends', 'study.domain[0].ends'],
  ['noise', 'study.noise.kind'],
  ['points of the density', 'cases[1].grid.points[0]'],
  ['second eigenvalue, modulus', 'cases[1].spectrum.noisy[1].modulus'],
  ['its error', 'cases[1].spectrum.noisy[1].uncertainty'],
  ['program that computed it', 'engine'],
  ['where it ran', 'runtime'],
];

const PAGES = [
  ['the bench', explore, BENCH],
  ['the bench in two variables', explore2d, SURFACE],
  ['a published study', published, RECORD],
] as const;

describe.each(PAGES)('the result file behind %s', (_, file, marks) => {
  it('is accepted by every reader of version 1', () => {
    expect(resultSchema.safeParse(file).error?.issues ?? []).toEqual([]);
  });

  it.each(marks)('holds %s at %s', (_mark, path) => {
    // read through the schema: what it would drop is not in the file
    expect(valueAt(resultSchema.parse(file), path)).toBeDefined();
    expect(valueAt(file, path)).not.toBeNull();
  });

  it('is refused with a key that no reader knows', () => {
    expect(resultSchema.safeParse({ ...file, colour: 'blue' }).success).toBe(false);
  });
});
