import { createStore, type StoreApi } from 'zustand/vanilla';
import { noiseLevel } from '@/lib/shared/bench-study';
import type { Bounds } from '@/lib/shared/step-number';
import type { Eigenvalue, ResultCase, StudyFile } from '@/lib/shared/study-types';
import type { ExploreStore, Timers } from './explore-store';
import type { KernelHost } from './kernel-client';
import type { Mode, RailPoint } from './kernel-protocol';
import { coarseCount, railKey, railLevels, trailLevels } from './rail-levels';
import { SIDE_KINDS, SideClient } from './side-client';
import { bare, sideKey, stepsRequest, trailsRequest } from './side-requests';

export interface RailView {
  /** In order of the noise level. */
  points: RailPoint[];
  /** Levels of the window that are computed, and how many it has. */
  done: number;
  of: number;
  /** The points are those of an earlier study. */
  stale: boolean;
}

export interface SideState {
  rail: RailView;
  steps: { study: StudyFile; case: ResultCase; settled: boolean } | null;
  /** Eigenvalues at the noise levels around the study's own. */
  trails: { sigma: number; eigenvalues: Eigenvalue[] }[];
  mode: { index: number; mode: Mode; current: boolean } | null;
  /** Index of the chosen eigenvalue among those with noise. */
  chosen: number | null;
  failure: string | null;
}

export interface SideActions {
  /** Noise levels from end to end of the rail, and all that can be computed. */
  show(window: Bounds, limits: Bounds): void;
  choose(index: number | null): void;
  /** Ends what is being computed; what is drawn stays. */
  stop(): void;
  /** Begins to follow the bench; what it returns ends that. */
  start(): () => void;
}

export type SideStore = StoreApi<SideState & SideActions>;

/** Nothing has to move for so long before rail, trails and eigenfunction are computed again. */
export const SIDE_REST_MS = 160;

const MOST_KEYS = 12;

/** Everything of one study that noise levels share, by noise level. */
interface Known {
  rail: Map<number, RailPoint>;
  trails: Map<number, Eigenvalue[]>;
}

/** What stands beside the picture: the noise rail, the strip of steps, trails and eigenfunctions. */
export function createSideStore(explore: ExploreStore, host: KernelHost, timers: Timers): SideStore {
  const known = new Map<string, Known>();
  let client: SideClient | null = null;
  let cancelRest = () => {};
  let drawnKey = '';
  let window: Bounds | null = null;
  let limits: Bounds | null = null;

  return createStore<SideState & SideActions>()((set, get) => {
    const study = () => explore.getState().study;
    const knownOf = (key: string): Known => {
      const found = known.get(key) ?? { rail: new Map(), trails: new Map() };
      known.delete(key);
      known.set(key, found);
      for (const old of known.keys()) if (known.size > MOST_KEYS) known.delete(old);
      return found;
    };

    /** Draws what is known of the study; until that is a first coarse curve, what stood before stays, as stale. */
    const drawRail = () => {
      if (window === null) return;
      drawnKey = railKey(study());
      const { rail } = knownOf(drawnKey);
      const levels = railLevels(window);
      const done = levels.filter((level) => rail.has(level)).length;
      const coarse = levels.slice(0, coarseCount(levels)).every((level) => rail.has(level));
      if (coarse || get().rail.points.length === 0) {
        const points = [...rail.values()].sort((a, b) => a.sigma - b.sigma);
        set({ rail: { points, done, of: levels.length, stale: false } });
      } else set({ rail: { ...get().rail, done, of: levels.length, stale: true } });
    };

    const computeRail = () => {
      const current = study();
      if (window === null || current.noise.kind === 'none') return client?.drop('rail');
      const { rail } = knownOf(railKey(current));
      const levels = railLevels(window);
      drawRail();
      client?.run({
        kind: 'rail',
        request() {
          const sigmas = levels.filter((level) => !rail.has(level));
          return sigmas.length === 0 ? null : { type: 'rail', study: bare(current), sigmas };
        },
        answer(reply) {
          if (reply.type === 'failed') set({ failure: reply.message });
          if (reply.type !== 'railPoint') return;
          rail.set(reply.point.sigma, reply.point);
          drawRail();
        },
      });
    };

    const computeSteps = (pass: 'live' | 'full') => {
      const current = study();
      client?.run({
        kind: 'steps',
        patient: pass === 'live',
        request: () => ({ type: 'compute', study: stepsRequest(current, pass), pass }),
        answer(reply) {
          if (reply.type === 'result')
            set({ steps: { study: current, case: reply.result.cases[0], settled: pass === 'full' } });
        },
      });
    };

    const drawTrails = () => {
      const current = study();
      const sigma = noiseLevel(current);
      if (sigma === null || limits === null || current.noise.kind === 'none') return set({ trails: [] });
      const { trails } = knownOf(railKey(current));
      const drawn = trailLevels(sigma, limits).flatMap((level) => {
        const eigenvalues = trails.get(level);
        return eigenvalues ? [{ sigma: level, eigenvalues }] : [];
      });
      set({ trails: drawn });
    };

    const computeTrails = () => {
      const current = study();
      const sigma = noiseLevel(current);
      if (sigma === null || limits === null || current.noise.kind === 'none') return;
      const { trails } = knownOf(railKey(current));
      const missing = trailLevels(sigma, limits).filter((level) => !trails.has(level));
      if (missing.length === 0) return;
      client?.run({
        kind: 'trails',
        request: () => ({ type: 'compute', study: trailsRequest(current, missing), pass: 'live' }),
        answer(reply) {
          if (reply.type !== 'result') return;
          for (const shown of reply.result.cases) trails.set(shown.at['noise.sigma'], shown.spectrum?.noisy ?? []);
          drawTrails();
        },
      });
    };

    const computeMode = () => {
      const index = get().chosen;
      const current = study();
      if (index === null || current.noise.kind === 'none') return set({ mode: null });
      client?.run({
        kind: 'mode',
        request: () => ({ type: 'mode', study: bare(current), index }),
        answer(reply) {
          set({ mode: reply.type === 'mode' ? { index, mode: reply.mode, current: true } : null });
        },
      });
    };

    const rest = () => {
      if (explore.getState().faults.length > 0) return;
      set({ failure: null });
      computeSteps('full');
      computeMode();
      computeTrails();
      computeRail();
    };

    const changed = () => {
      const { mode } = get();
      if (mode) set({ mode: { ...mode, current: false } });
      // A moving bench has the second core for its steps; what is known of rail and trails is drawn meanwhile.
      for (const kind of ['mode', 'trails', 'rail'] as const) client?.drop(kind);
      computeSteps('live');
      drawTrails();
      // The noise level itself moves along the rail and leaves it as it is.
      if (railKey(study()) !== drawnKey) drawRail();
      cancelRest();
      cancelRest = timers.after(SIDE_REST_MS, rest);
    };

    return {
      rail: { points: [], done: 0, of: 0, stale: false },
      steps: null,
      trails: [],
      mode: null,
      chosen: null,
      failure: null,
      show(next, all) {
        const same = window?.min === next.min && window.max === next.max && limits?.min === all.min;
        window = next;
        limits = all;
        if (same || client === null) return;
        drawRail();
        cancelRest();
        cancelRest = timers.after(SIDE_REST_MS, rest);
      },
      choose(index) {
        set({ chosen: index });
        computeMode();
      },
      stop() {
        cancelRest();
        for (const kind of SIDE_KINDS) client?.drop(kind);
      },
      start() {
        client = new SideClient(host, (failure) => set({ failure }));
        let last = sideKey(study());
        const unsubscribe = explore.subscribe((state) => {
          const key = sideKey(state.study);
          if (key === last) return;
          last = key;
          changed();
        });
        // The page's own first picture comes before what stands beside it.
        cancelRest = timers.after(2 * SIDE_REST_MS, rest);
        return () => {
          unsubscribe();
          cancelRest();
          client?.dispose();
          client = null;
        };
      },
    };
  });
}
