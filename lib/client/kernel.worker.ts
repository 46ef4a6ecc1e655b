import { mode, parseStudy, type RunCache, rail, run, Stopped, type Study, StudyRefused } from '@/kernels';
import { FormulaError } from '@/kernels/formula/formula-error';
import { typesetFormula } from '@/lib/shared/typeset-study';
import type { KernelReply, KernelRequest, RailPoint, StudyFault } from './kernel-protocol';
import { DRAWN_MOST } from './rail-lanes';
import { runtimeName } from './runtime-name';

const scope = self as unknown as {
  postMessage(reply: KernelReply): void;
  onmessage: (event: { data: KernelRequest }) => void;
};
const cache: RunCache = new Map();
const runtime = runtimeName(navigator.userAgent);
const BETWEEN_REPORTS_MS = 100;

/** Holds the id of the computation that is wanted; null where the page cannot share memory. */
let wanted: Int32Array | null = null;

scope.onmessage = ({ data }) => {
  if (data.type === 'share') wanted = data.wanted;
  else scope.postMessage(answer(data));
};

function answer(request: Exclude<KernelRequest, { type: 'share' }>): KernelReply {
  const { id } = request;
  try {
    if (request.type === 'compute') return compute(id, request.study, request.pass === 'full');
    if (request.type === 'rail') {
      const onPoint = (_index: number, point: RailPoint) => scope.postMessage({ type: 'railPoint', id, point });
      rail(parsed(request.study), request.sigmas, { checkpoint: watch(id), cache, roughAbove: DRAWN_MOST, onPoint });
      return { type: 'railDone', id };
    }
    if (request.type === 'mode') {
      return { type: 'mode', id, mode: mode(parsed(request.study), request.index, { checkpoint: watch(id), cache }) };
    }
    if (request.type === 'check') {
      const { faults } = parseStudy(request.study);
      // The file as it was written, not the study with every default written out: it is saved again as it came.
      return faults
        ? { type: 'refused', id, faults: [...faults] }
        : { type: 'checked', id, study: request.study as never };
    }
    const { formula, variables, parameters } = request;
    return { type: 'typeset', id, formula: typesetFormula(formula, variables, parameters) };
  } catch (error) {
    if (error instanceof Stopped) return { type: 'stopped', id };
    const faults = faultsOf(error);
    return faults ? { type: 'refused', id, faults } : { type: 'failed', id, message: messageOf(error) };
  }
}

function compute(id: number, input: unknown, uncertainties: boolean): KernelReply {
  const { study, faults } = parseStudy(input);
  if (faults) return { type: 'refused', id, faults: [...faults] };
  const began = performance.now();
  let reported = began;
  const stopIfStale = watch(id);
  const checkpoint = (done: number, total: number) => {
    stopIfStale();
    const now = performance.now();
    if (now - reported < BETWEEN_REPORTS_MS) return;
    reported = now;
    scope.postMessage({ type: 'progress', id, done, total });
  };
  const result = run(study, { runtime, checkpoint, uncertainties, cache });
  return { type: 'result', id, result, seconds: (performance.now() - began) / 1000 };
}

/** Ends a computation that nobody wants any more. */
function watch(id: number) {
  return () => {
    if (wanted !== null && Atomics.load(wanted, 0) !== id) throw new Stopped();
  };
}

function parsed(input: unknown): Study {
  const { study, faults } = parseStudy(input);
  if (faults) throw new StudyRefused(faults[0].path, faults[0].message);
  return study;
}

function faultsOf(error: unknown): StudyFault[] | null {
  if (error instanceof FormulaError) {
    return [{ path: 'system.formulas[0]', message: error.message, at: error.at, length: error.length }];
  }
  return error instanceof StudyRefused ? [...error.faults] : null;
}

function messageOf(error: unknown): string {
  return error instanceof Error ? error.message : String(error);
}
