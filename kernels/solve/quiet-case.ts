import { panelGrid } from '../grid/panels';
import { CellOperator, crossingsOfDomain } from '../operators/cell-operator';
import type { Eigenvalue, Quantity, ResultCase, Warning } from '../result';
import type { StartDensity, Study } from '../spec';
import type { EigenPair } from '../spectrum/arnoldi';
import { startOf } from '../study/start-of';
import type { CaseSetup } from './case-setup';
import { CellSolver } from './cell-solver';
import { bound } from './quantity';
import { gapOf, takeNearest } from './spectrum-entries';

type Warn = (w: Omit<Warning, 'at'>) => void;

/** Number of cells that uncertainties come from: finer ones where that is cheap; no multiple, so that edges fall elsewhere. */
const comparisonCells = (cells: number) => (cells <= 4096 ? 3 * cells + 1 : coarserCells(cells));

/** Coarser cells with other edges: the cheap comparison. */
export const coarserCells = (cells: number) => Math.round(0.79 * cells);

/**
 * What the difference between two numbers of cells is multiplied by. Errors fall like n^-1/2 to 1/n: three times as
 * many cells show 0.4 to 0.7 of the error, 0.79 times as many 0.12 to 0.27.
 */
const safety = (main: CellSolver, other: CellSolver) => (other.operator.size > main.operator.size ? 2.5 : 12);

/** Cells that "auto" takes: errors fall like one over their number or slower, so a small tolerance asks for the most. */
const FEWEST = 1024;
const MOST = 65_536;
/** Entries of a cell matrix that "auto" takes at most. */
const MOST_ENTRIES = 1_500_000;
/** … where a spectrum is asked for: finer cells crowd the circle that cells cannot see through, and bring no eigenvalue nearer. */
const MOST_FOR_SPECTRUM = 4096;
/** Cells for the comparison beside a noisy result: as fine as a figure shows. */
export const COMPARISON_CELLS = 512;
/** What densities the cells' eigenvalues belong to. */
const SPACE = 'densities constant on each cell (bounded variation in the limit of fine cells)';

/**
 * One case of a study without noise, by cells: everything that was asked for, with uncertainties from other cells.
 *
 * Cells converge slowly (one over their number, or its root where the density has singularities), so error bars are that
 * difference times what `safety` says.
 */
export function quietCase(study: Study, setup: CaseSetup, uncertainties: boolean, warn: Warn): Omit<ResultCase, 'at'> {
  const { ask } = study;
  const { model, boundary } = setup;
  const fine =
    setup.points === 'auto'
      ? Math.min(
          ask.spectrum ? MOST_FOR_SPECTRUM : MOST,
          Math.max(FEWEST, Math.round(MOST_ENTRIES / crossingsOfDomain(model, boundary))),
          Math.max(FEWEST, Math.ceil(1 / study.grid.tolerance)),
        )
      : setup.points;
  const main = cellSolver(setup, fine);
  const other = uncertainties ? cellSolver(setup, comparisonCells(fine)) : null;
  const both = (of: (s: CellSolver) => number): Quantity | null => {
    const value = of(main);
    return bound(
      value,
      other ? safety(main, other) * Math.abs(value - of(other)) + 1e-12 * Math.abs(value) + 1e-13 : null,
    );
  };
  const { x, weights } = main.operator;
  const out: Omit<ResultCase, 'at'> = {
    grid: {
      points: [fine],
      x: [[...x]],
      weights: [[...weights]],
      resolved: true,
      compared: other ? [[other.operator.size]] : [],
    },
  };
  if (ask.density) out.density = evolution(study, setup, main, other, warn);
  if (ask.stationary) {
    const mean = (s: CellSolver) => s.integral(s.stationary().map((v, i) => v * s.operator.x[i]));
    // a cell's mass is spread evenly: its own variance is h²/12
    const variance = (s: CellSolver) => {
      const centre = mean(s);
      return s.integral(
        s.stationary().map((v, i) => v * ((s.operator.x[i] - centre) ** 2 + s.operator.weights[i] ** 2 / 12)),
      );
    };
    const values = main.stationary();
    out.stationary = {
      values: [...values],
      mean: [both(mean)],
      covariance: [[both(variance)]],
      entropy: both((s) => -s.integral(s.stationary().map((v) => (v > 0 ? v * Math.log(v) : 0)))),
      quasi: main.loses,
      uncertainty: other ? largestStepDifference(values, other.stationary()) : null,
      lostPerStep: both((s) => (s.loses ? s.integral(s.stationary().map((v, i) => v * s.operator.lost[i])) : 0)),
      secondWay: null,
    };
    if (ask.stationary.deterministic)
      out.stationary.deterministic = { x: [[...x]], values: [...values], method: 'cells' };
  }
  if (ask.spectrum) {
    const entries = quietSpectrum(main, other, ask.spectrum.count);
    // an eigenvalue that moves with the cells says nothing about how long anything lasts
    out.spectrum = { deterministic: entries, ...gapOf(entries.filter((e) => e.resolved !== false)) };
    if (!out.spectrum.gap)
      warn({
        code: 'no-second-eigenvalue',
        message: 'cells resolve no second eigenvalue; gap and relaxation time are not given',
      });
  }
  if (ask.exit) out.exit = exit(ask.exit.start, study, setup, main, other, warn);
  if (ask.lyapunov) {
    const value = both((s) => s.meanStretch(s.stationary()));
    if (!value)
      warn({ code: 'no-exponent', message: "the map is flat on a stretch of the domain: ln|F'| has no finite mean" });
    out.lyapunov = { exponents: [value], value };
  }
  return out;
}

/** The solver on so many cells; the cell matrix is kept in the case's cache. */
export function cellSolver(setup: CaseSetup, cells: number): CellSolver {
  const { checkpoint } = setup;
  const operator = setup.cache(
    `cells ${cells}`,
    () => new CellOperator(setup.model, setup.boundary, cells, checkpoint),
  );
  return new CellSolver(operator, setup.model, setup.boundary, checkpoint);
}

/**
 * Eigenvalues of cells with what moving to other cells does to each; one that moves by more than a twentieth is
 * marked unresolved.
 */
export function quietSpectrum(main: CellSolver, other: CellSolver | null, count: number): Eigenvalue[] {
  const { pairs } = main.spectrum(Math.max(2, count));
  const partners: EigenPair[] | null = other ? [...other.spectrum(Math.max(2, count + 4)).pairs] : null;
  const entries: Eigenvalue[] = [];
  for (const p of pairs) {
    const modulus = Math.hypot(p.re, p.im);
    const distance = partners ? takeNearest(partners, p) : null;
    const roundOff = (p.residual + 1e-15) * Math.max(1, p.condition);
    const uncertainty = distance === null || !other ? null : safety(main, other) * distance + roundOff;
    if (modulus < Math.max(1e-9, roundOff)) continue;
    entries.push({
      re: p.re,
      im: p.im,
      modulus,
      residual: p.residual,
      uncertainty,
      multiplicity: 1,
      resolved: uncertainty === null || uncertainty <= 0.05,
      method: 'cells',
      space: SPACE,
    });
  }
  const cut = entries.length > count && entries[count - 1].im > 0 && entries[count].im < 0 ? count + 1 : count;
  return entries.slice(0, cut);
}

function startBins(start: StartDensity, path: string, study: Study, setup: CaseSetup, s: CellSolver) {
  const { from, to } = setup.boundary;
  const cells = s.operator.size;
  const edges = Array.from({ length: cells + 1 }, (_, i) => (i === cells ? to : from + ((to - from) * i) / cells));
  return s.binned(startOf(start, path, study, setup.parameters, setup.boundary, panelGrid(edges, 4)));
}

function evolution(
  study: Study,
  setup: CaseSetup,
  main: CellSolver,
  other: CellSolver | null,
  warn: Warn,
): ResultCase['density'] {
  const ask = study.ask.density;
  if (!ask) return undefined;
  const path = (s: CellSolver) => {
    const last = Math.max(...ask.at);
    const wanted = new Set(ask.at);
    const kept = new Map<number, Float64Array>();
    let now = startBins(ask.start, 'ask.density.start', study, setup, s);
    if (wanted.has(0)) kept.set(0, now);
    for (let n = 1; n <= last; n++) {
      const next = new Float64Array(now.length);
      s.operator.apply(now, next);
      now = next;
      if (wanted.has(n)) kept.set(n, now);
      setup.checkpoint(n, last);
    }
    return kept;
  };
  const a = path(main);
  const b = other ? path(other) : null;
  if (ask.start.kind === 'point' || ask.start.kind === 'samples')
    warn({ code: 'start-in-cells', message: 'without noise a point or a sample is spread over its cell' });
  return ask.at.map((at) => {
    const values = a.get(at) ?? new Float64Array(0);
    const there = b?.get(at) ?? null;
    const mass = main.integral(values);
    return {
      at,
      mass: bound(mass, there && other ? safety(main, other) * Math.abs(mass - other.integral(there)) + 1e-13 : null),
      values: [...values],
      uncertainty: there ? largestStepDifference(values, there) : null,
    };
  });
}

/** Largest difference of two step functions on the same domain, seen at the middles of the first one's cells. */
function largestStepDifference(a: Float64Array, b: Float64Array): number {
  let most = 0;
  for (let i = 0; i < a.length; i++)
    most = Math.max(most, Math.abs(a[i] - b[Math.min(b.length - 1, Math.floor(((i + 0.5) * b.length) / a.length))]));
  return most;
}

function exit(
  start: StartDensity,
  study: Study,
  setup: CaseSetup,
  main: CellSolver,
  other: CellSolver | null,
  warn: Warn,
): ResultCase['exit'] {
  const none = { rate: null, meanTime: null, meanTimeFrom: null, field: null };
  if (!main.loses) {
    warn({ code: 'nothing-leaves', message: 'without noise nothing leaves the domain: exit times are infinite' });
    return none;
  }
  const numbers = (s: CellSolver) => {
    const solved = s.exit();
    const bins = startBins(start, 'ask.exit.start', study, setup, s);
    return {
      solved,
      rate: -Math.log1p(-solved.perStep),
      mean: 1 / solved.perStep,
      from: s.integral(bins.map((v, i) => v * solved.field[i])),
    };
  };
  try {
    const a = numbers(main);
    const b = other ? numbers(other) : null;
    const quantity = (of: (n: ReturnType<typeof numbers>) => number) =>
      bound(of(a), b && other ? safety(main, other) * Math.abs(of(a) - of(b)) + 1e-12 * Math.abs(of(a)) : null);
    return {
      rate: quantity((n) => n.rate),
      meanTime: quantity((n) => n.mean),
      meanTimeFrom: quantity((n) => n.from),
      field: [...a.solved.field],
    };
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    warn({ code: 'exit-not-computed', message: `${error.message}; without noise some cells may never lose anything` });
    return none;
  }
}
