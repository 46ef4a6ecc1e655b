import { withoutNoiseKey } from '@/lib/shared/bench-study';
import type { Quantity, Result, ResultCase, StudyFile, Warning } from '@/lib/shared/study-types';
import type { TypesetFormula } from '@/lib/shared/typeset-types';
import type { Pass, StudyFault } from './kernel-protocol';

/** What is drawn: the last result that could be had, with the system without noise from the last full pass. */
export interface Picture {
  study: StudyFile;
  case: ResultCase;
  warnings: Warning[];
  /** False while something moves: uncertainties are then those of the last full pass, shown muted. */
  settled: boolean;
  seconds: number;
}

export interface Progress {
  done: number;
  total: number;
  seconds: number;
}

export interface ExploreState {
  study: StudyFile;
  faults: StudyFault[];
  picture: Picture | null;
  computing: boolean;
  progress: Progress | null;
  failure: string | null;
  past: StudyFile[];
  future: StudyFile[];
  /** Typed formulas laid out, by their text. */
  typesets: Record<string, TypesetFormula>;
  /** Between the first and the last edit of one gesture, which undo takes back as one. */
  moving: boolean;
}

const MOST_STEPS = 200;

export function firstState(study: StudyFile): ExploreState {
  return {
    study,
    faults: [],
    picture: null,
    // The first pass starts with the page.
    computing: true,
    progress: null,
    failure: null,
    past: [],
    future: [],
    typesets: {},
    moving: false,
  };
}

/** Edits of one gesture are one step of undo: only its first one is kept. */
export function edited(state: ExploreState, study: StudyFile, moving: boolean): Partial<ExploreState> {
  const past = state.moving ? state.past : [...state.past, state.study].slice(-MOST_STEPS);
  return { study, past, future: [], moving, faults: [] };
}

export function undone(state: ExploreState): Partial<ExploreState> {
  const study = state.past.at(-1);
  if (study === undefined) return {};
  return { study, past: state.past.slice(0, -1), future: [state.study, ...state.future], moving: false, faults: [] };
}

export function redone(state: ExploreState): Partial<ExploreState> {
  const [study, ...future] = state.future;
  if (study === undefined) return {};
  return { study, past: [...state.past, state.study], future, moving: false, faults: [] };
}

export function pictured(
  state: ExploreState,
  result: Result,
  study: StudyFile,
  pass: Pass,
  seconds: number,
): Partial<ExploreState> {
  const fresh = result.cases[0];
  const shown = pass === 'full' ? fresh : withKept(fresh, study, state.picture);
  const picture = { study, case: shown, warnings: result.warnings, settled: pass === 'full', seconds };
  return { picture, faults: [], failure: null, progress: null, computing: pass === 'live' };
}

/**
 * A live pass has no uncertainties and nothing without noise: both stay as the last full pass left them, and limit the
 * digits shown meanwhile. An eigenvalue that the full pass did not have counts as unresolved until the next one.
 */
function withKept(fresh: ResultCase, study: StudyFile, last: Picture | null): ResultCase {
  if (last === null) return fresh;
  const before = last.case;
  const same = withoutNoiseKey(last.study) === withoutNoiseKey(study);
  const { stationary, spectrum, exit, lyapunov } = fresh;
  const noisy = spectrum?.noisy?.map((eigenvalue, place) => {
    const uncertainty = before.spectrum?.noisy?.[place]?.uncertainty ?? null;
    return { ...eigenvalue, uncertainty, resolved: uncertainty !== null && uncertainty < eigenvalue.modulus };
  });
  return {
    ...fresh,
    ...(stationary && {
      stationary: {
        ...stationary,
        lostPerStep: withError(stationary.lostPerStep, before.stationary?.lostPerStep),
        deterministic: stationary.deterministic ?? (same ? before.stationary?.deterministic : undefined),
      },
    }),
    ...(spectrum && {
      spectrum: {
        ...spectrum,
        noisy,
        relaxationTime: withError(spectrum.relaxationTime, before.spectrum?.relaxationTime) ?? null,
        deterministic: spectrum.deterministic ?? (same ? before.spectrum?.deterministic : undefined),
      },
    }),
    exit: exit ?? passingExit(stationary?.lostPerStep, before.exit?.meanTime),
    ...(lyapunov && {
      lyapunov: {
        ...lyapunov,
        value: withError(lyapunov.value, before.lyapunov?.value) ?? null,
        survivors: withError(lyapunov.survivors, before.lyapunov?.survivors),
      },
    }),
  };
}

/** Below this the mass lost per step has too few true digits for a mean exit time; the full pass sums it without loss. */
const LEAST_LOSS = 1e-9;

/** While something moves the mean exit time is that of the mass lost per step, 1/(1 - first eigenvalue). */
function passingExit(lost: Quantity | null | undefined, last: Quantity | null | undefined): ResultCase['exit'] {
  if (!lost || lost.value < LEAST_LOSS) return undefined;
  const meanTime: Quantity = { value: 1 / lost.value, uncertainty: 0, kind: 'bound' };
  return { rate: null, meanTime: withError(meanTime, last), meanTimeFrom: null, field: null };
}

/** The relative uncertainty is kept: an exit time may change by powers of ten between two passes. */
function withError<T extends Quantity | null | undefined>(fresh: T, last: Quantity | null | undefined): T {
  if (!fresh || !last || last.value === 0) return fresh;
  return { ...fresh, uncertainty: Math.abs(last.uncertainty / last.value) * Math.abs(fresh.value) };
}

/** A refused study leaves the picture as it is; the faults stand at their fields. */
export function refused(faults: StudyFault[]): Partial<ExploreState> {
  return { faults, progress: null, computing: false };
}

export function faultAt(state: ExploreState, path: string): StudyFault | undefined {
  return state.faults.find(
    (fault) => fault.path === path || fault.path.startsWith(`${path}.`) || fault.path.startsWith(`${path}[`),
  );
}
