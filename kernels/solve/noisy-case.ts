import type { StartSources } from '../grid/start-sources';
import type { Quantity, ResultCase, Warning } from '../result';
import type { Study } from '../spec';
import type { EigenPair } from '../spectrum/arnoldi';
import { startOf } from '../study/start-of';
import type { CaseSetup } from './case-setup';
import { NoisySolver } from './noisy-solver';
import { planOf } from './plan-of';
import { bound, errorBar } from './quantity';
import { denseWay } from './second-way';
import { gapOf, spectrumEntries } from './spectrum-entries';

/** Refinement of the grid that uncertainties come from. */
const FINER = 1.2;
const EPS = 2.220446049250313e-16;

/**
 * One case of a study with noise: everything that was asked for, on the chosen grid and, for the uncertainties, on one
 * 1.2 times as fine.
 *
 * @param setup system, ends, noise level and parameters of the case
 * @param uncertainties false: one grid only; error bars are null or 0 (for moving pictures)
 * @param warn receives what could not be had
 */
export function noisyCase(
  study: Study,
  setup: CaseSetup,
  uncertainties: boolean,
  warn: (w: Omit<Warning, 'at'>) => void,
): Omit<ResultCase, 'at'> {
  const { model, sigma, checkpoint } = setup;
  const main = new NoisySolver(planOf(setup, study.grid.tolerance, 1), sigma, checkpoint);
  const finer = uncertainties ? new NoisySolver(planOf(setup, study.grid.tolerance, FINER), sigma, checkpoint) : null;
  const { ask } = study;
  const { grid, resolved, enough } = main.plan;
  const x = grid.x;
  const out: Omit<ResultCase, 'at'> = {
    grid: {
      points: [x.length],
      x: [[...x]],
      weights: [[...grid.weights]],
      resolved,
      compared: finer ? [[finer.plan.grid.x.length]] : [],
    },
  };
  if (!resolved)
    warn({
      code: 'grid-too-coarse',
      message:
        setup.points === 'auto'
          ? `the slope of the map grows without bound and the ends fold every image back: ${x.length} points carry most of it, no number carries all`
          : `${x.length} points are too few for sigma ${sigma}: about ${enough} are needed`,
    });
  if (!model.complete)
    warn({
      code: 'breaks-incomplete',
      message: 'the map has more breaks than can be listed; numbers may be less certain than stated',
    });
  if ((ask.stationary || ask.spectrum || ask.lyapunov || ask.exit) && !stays(main, finer)) {
    warn({
      code: 'nothing-stays',
      message:
        'everything leaves the domain at once, or is forgotten to the last digit: no eigenvalue stands above its uncertainty, so there is no long-run density, exponent or rate',
    });
    if (ask.density) out.density = evolution(study, setup, main, finer, warn);
    if (ask.spectrum) out.spectrum = { noisy: [], gap: null, relaxationTime: null };
    if (ask.lyapunov) out.lyapunov = { exponents: [null], value: null };
    if (ask.exit)
      out.exit = { ...exit(study, setup, main, finer, warn), rate: null, meanTime: null } as ResultCase['exit'];
    return out;
  }

  /** A number from both grids with its error bar. */
  const both = (
    of: (s: NoisySolver) => number,
    floor: (value: number) => number = (v) => 8 * EPS * Math.abs(v),
  ): Quantity | null => {
    const value = of(main);
    return bound(value, errorBar(value, finer ? of(finer) : null, floor(value)));
  };

  if (ask.stationary && finer) warnIfNotUnique(main, finer, warn);
  if (ask.density) out.density = evolution(study, setup, main, finer, warn);
  if (ask.stationary) out.stationary = stationary(setup, main, finer, both);
  if (ask.spectrum) out.spectrum = spectrum(ask.spectrum.count, main, finer, warn);
  if (ask.exit) out.exit = exit(study, setup, main, finer, warn);
  if (ask.lyapunov) out.lyapunov = lyapunov(main, both, warn);
  return out;
}

/** Warns where two leading eigenvalues cannot be told apart: any mixture of their densities is as stationary. */
function warnIfNotUnique(main: NoisySolver, finer: NoisySolver, warn: Warn): void {
  const [first, second] = spectrumEntries(main.spectrum(2).pairs, finer.spectrum(2).pairs, 1);
  if (!first || !second || first.uncertainty === null || second.uncertainty === null) return;
  if (first.modulus - second.modulus > 4 * (first.uncertainty + second.uncertainty)) return;
  warn({
    code: 'not-unique',
    message:
      'the two leading eigenvalues cannot be told apart: the long-run density depends on the start, and what is given is one mixture',
  });
}

/** false where not even the first eigenvalue is known to differ from zero. */
function stays(main: NoisySolver, finer: NoisySolver | null): boolean {
  const other = finer ? finer.spectrum(2).pairs : null;
  return spectrumEntries(main.spectrum(2).pairs.slice(0, 1), other, 1).length > 0;
}

type Both = (of: (s: NoisySolver) => number, floor?: (value: number) => number) => Quantity | null;
type Warn = (w: Omit<Warning, 'at'>) => void;

/** Values of a density known on the finer grid, at the nodes of the main one, by one step of the finer operator. */
function carriedOver(finer: NoisySolver, before: Float64Array, main: NoisySolver): Float64Array {
  const values = new Float64Array(main.weights.length);
  finer.operator.read(before, finer.plan.targetsAt(main.plan.grid.x), values);
  return values;
}

const largestDifference = (a: Float64Array, b: Float64Array) =>
  a.reduce((m, v, i) => Math.max(m, Math.abs(v - b[i])), 0);

function evolution(
  study: Study,
  setup: CaseSetup,
  main: NoisySolver,
  finer: NoisySolver | null,
  warn: Warn,
): ResultCase['density'] {
  const ask = study.ask.density;
  if (!ask) return undefined;
  const path = (s: NoisySolver) => {
    const start: StartSources = startOf(
      ask.start,
      'ask.density.start',
      study,
      setup.parameters,
      setup.boundary,
      s.plan.grid,
    );
    const last = Math.max(...ask.at);
    const wanted = new Set(ask.at);
    const kept = new Map<number, { now: Float64Array; before: Float64Array | null; mass: number }>();
    let before: Float64Array | null = null;
    let now: Float64Array | null = start.density ? start.density(s.plan.grid.x) : null;
    if (wanted.has(0)) kept.set(0, { now: now ?? new Float64Array(0), before: null, mass: 1 });
    for (let n = 1; n <= last; n++) {
      const next: Float64Array = n === 1 ? s.launch(start) : new Float64Array(s.weights.length);
      if (n > 1 && now) s.operator.apply(now, next);
      before = n === 1 ? null : now;
      now = next;
      if (wanted.has(n)) kept.set(n, { now: next, before, mass: s.integral(next) });
      setup.checkpoint(n, last);
    }
    return { kept, start };
  };
  const a = path(main);
  const b = finer ? path(finer) : null;
  return ask.at.map((at) => {
    const mine = a.kept.get(at);
    const other = b?.kept.get(at);
    if (!mine) throw new RangeError(`step ${at}: was not kept`);
    if (mine.now.length === 0) {
      warn({
        code: 'no-density-at-start',
        message: 'points and samples have no density at step 0; it is given from step 1 on',
      });
      return { at, mass: bound(1, 0), values: null, uncertainty: null };
    }
    let uncertainty: number | null = null;
    if (finer && other) {
      if (at === 0) uncertainty = 0;
      else {
        const there = other.before ? carriedOver(finer, other.before, main) : launchedAt(finer, b?.start, main);
        const top = mine.now.reduce((m, v) => Math.max(m, Math.abs(v)), 0);
        uncertainty = 2 * largestDifference(mine.now, there) + 64 * EPS * top;
      }
    }
    return {
      at,
      mass: bound(mine.mass, at === 0 ? 0 : errorBar(mine.mass, other?.mass ?? null, 8 * EPS * Math.sqrt(at))),
      values: [...mine.now],
      uncertainty,
    };
  });
}

/** First step of the finer solver's start at the main solver's nodes. */
function launchedAt(finer: NoisySolver, start: StartSources | undefined, main: NoisySolver): Float64Array {
  if (!start) return new Float64Array(main.weights.length);
  return finer.launch(start, finer.plan.targetsAt(main.plan.grid.x));
}

function stationary(
  setup: CaseSetup,
  main: NoisySolver,
  finer: NoisySolver | null,
  both: Both,
): ResultCase['stationary'] {
  const rho = main.stationary();
  const power = (s: NoisySolver, k: number, about: number) =>
    s.integral(s.stationary().map((v, i) => v * (s.plan.grid.x[i] - about) ** k));
  const mean = power(main, 1, 0);
  const top = rho.reduce((m, v) => Math.max(m, Math.abs(v)), 0);
  let uncertainty: number | null = null;
  if (finer) {
    const there = carriedOver(finer, finer.stationary(), main).map((v) => v / finer.kept());
    uncertainty = 2 * largestDifference(rho, there) + 64 * EPS * top;
  }
  const second = finer
    ? denseWay(setup.model, setup.boundary, setup.noise, setup.sigma, Math.round(1.3 * rho.length), 2, setup.checkpoint)
    : null;
  const span = setup.boundary.to - setup.boundary.from;
  return {
    values: [...rho],
    mean: [
      both(
        (s) => power(s, 1, 0),
        () => 16 * EPS * span,
      ),
    ],
    covariance: [
      [
        both(
          (s) => power(s, 2, s === main ? mean : power(s, 1, 0)),
          () => 16 * EPS * span * span,
        ),
      ],
    ],
    entropy: both(
      (s) => -s.integral(s.stationary().map((v) => (v > 0 ? v * Math.log(v) : 0))),
      () => 64 * EPS,
    ),
    quasi: main.loses,
    uncertainty,
    lostPerStep: main.loses
      ? both(
          (s) => s.product(s.stationary(), s.leaveProbability()),
          () => 4 * EPS,
        )
      : bound(0, 0),
    secondWay: second
      ? { points: second.points, difference: largestDifference(rho, second.density(main.plan.grid.x)) / top }
      : null,
  };
}

function spectrum(count: number, main: NoisySolver, finer: NoisySolver | null, warn: Warn): ResultCase['spectrum'] {
  const mine = main.spectrum(count);
  const other: readonly EigenPair[] | null = finer ? finer.spectrum(count + 2).pairs : null;
  if (!mine.converged)
    warn({
      code: 'not-converged',
      message: `the spectrum was not settled after ${mine.steps} steps; residuals say how far each eigenvalue got`,
    });
  const entries = spectrumEntries(mine.pairs, other, Math.max(1, main.kept()));
  const cut = entries.length > count && entries[count - 1].im > 0 && entries[count].im < 0 ? count + 1 : count;
  const known = gapOf(entries);
  if (!known.gap)
    warn({
      code: 'no-second-eigenvalue',
      message: 'no second eigenvalue stands above its uncertainty; gap and relaxation time are not given',
    });
  return { noisy: entries.slice(0, cut), ...known };
}

function exit(
  study: Study,
  setup: CaseSetup,
  main: NoisySolver,
  finer: NoisySolver | null,
  warn: Warn,
): ResultCase['exit'] {
  const ask = study.ask.exit;
  if (!ask) return undefined;
  const none = { rate: null, meanTime: null, meanTimeFrom: null, field: null };
  if (!main.loses) {
    warn({
      code: 'nothing-leaves',
      message: 'neither end is absorbing: nothing leaves the domain, exit times are infinite',
    });
    return none;
  }
  const numbers = (s: NoisySolver) => {
    const solved = s.exit();
    const start = startOf(ask.start, 'ask.exit.start', study, setup.parameters, setup.boundary, s.plan.grid);
    return {
      solved,
      rate: -Math.log1p(-solved.perStep),
      mean: 1 / solved.perStep,
      from: 1 + s.product(s.launch(start), solved.field),
    };
  };
  try {
    const a = numbers(main);
    const b = finer ? numbers(finer) : null;
    const floor = (v: number) => 32 * EPS * Math.abs(v);
    const settled = a.solved.converged && b?.solved.converged !== false;
    const fieldSettled = a.solved.fieldConverged && b?.solved.fieldConverged !== false;
    if (!settled || !fieldSettled)
      warn({
        code: 'exit-not-settled',
        message:
          'the quasi-stationary density did not settle: a second mode is as slow as the first, or round-off hides both; what depends on it is not given',
      });
    const quantity = (stands: boolean, of: (n: ReturnType<typeof numbers>) => number) =>
      stands ? bound(of(a), errorBar(of(a), b ? of(b) : null, floor(of(a)))) : null;
    return {
      rate: quantity(settled, (n) => n.rate),
      meanTime: quantity(settled, (n) => n.mean),
      meanTimeFrom: quantity(fieldSettled, (n) => n.from),
      field: fieldSettled ? [...a.solved.field] : null,
    };
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    warn({ code: 'exit-not-computed', message: error.message });
    return none;
  }
}

function lyapunov(main: NoisySolver, both: Both, warn: Warn): ResultCase['lyapunov'] {
  const value = both(
    (s) => s.meanStretch(s.stationary(), s.kept()),
    () => 64 * EPS,
  );
  if (!value)
    warn({ code: 'no-exponent', message: "the map is flat on a stretch of the domain: ln|F'| has no finite mean" });
  if (!main.loses) return { exponents: [value], value };
  return {
    exponents: [value],
    value,
    survivors: both(
      (s) => s.survivorStretch(),
      () => 256 * EPS,
    ),
  };
}
