import { createStore, type StoreApi } from 'zustand/vanilla';
import { benchRequest, sameWork } from '@/lib/shared/bench-study';
import type { StudyFile } from '@/lib/shared/study-types';
import type { TypesetFormula } from '@/lib/shared/typeset-types';
import { type ExploreState, edited, firstState, type Picture, pictured, redone, refused, undone } from './explore-core';
import { KernelClient, type KernelHost } from './kernel-client';

export interface ExploreActions {
  /** Changes the study. `moving`: one of many edits of a gesture that `rest` will end. */
  edit(change: (study: StudyFile) => StudyFile, moving?: boolean): void;
  rest(): void;
  undo(): void;
  redo(): void;
  stop(): void;
  start(): void;
  dispose(): void;
  keepTypeset(text: string, formula: TypesetFormula): void;
  kernel: KernelClient;
}

export type ExploreStore = StoreApi<ExploreState & ExploreActions>;

export interface Timers {
  after(ms: number, run: () => void): () => void;
}

/** How long nothing has to move before the full pass, which alone has uncertainties, begins. */
export const REST_MS = 120;

export interface ExploreBeginning {
  study: StudyFile;
  /** Typed formulas that the server has laid out already. */
  typesets?: Record<string, TypesetFormula>;
  /** A picture computed ahead, shown until the first pass is done. */
  picture?: Picture | null;
}

/** One store per page: nothing of it outlives the page or is shared between requests. */
export function createExploreStore(from: ExploreBeginning, host: KernelHost, timers: Timers): ExploreStore {
  let cancelRest = () => {};
  const store = createStore<ExploreState & ExploreActions>()((set, get) => {
    const kernel = new KernelClient(host, {
      onProgress: (progress) => set({ progress }),
      onResult: (result, computed, pass, seconds) => set(pictured(get(), result, computed, pass, seconds)),
      onRefused: (faults) => set(refused(faults)),
      onStopped: () => set({ computing: false, progress: null }),
      onFailed: (failure) => set({ failure, computing: false, progress: null }),
    });
    const compute = (pass: 'live' | 'full') => {
      const { study: current } = get();
      set({ computing: true });
      kernel.compute(benchRequest(current, pass), pass);
    };
    const computeAndRest = () => {
      compute('live');
      cancelRest();
      cancelRest = timers.after(REST_MS, () => {
        if (get().faults.length === 0) compute('full');
      });
    };
    /** Another title is no other work: picture and faults stay as they are. */
    const take = (change: Partial<ExploreState>) => {
      const before = get();
      if (change.study === undefined || sameWork(before.study, change.study)) {
        set({ ...change, faults: before.faults });
        return;
      }
      set(change);
      computeAndRest();
    };
    return {
      ...firstState(from.study),
      typesets: from.typesets ?? {},
      picture: from.picture ?? null,
      kernel,
      edit(change, moving = false) {
        take(edited(get(), change(get().study), moving));
      },
      rest: () => set({ moving: false }),
      undo() {
        take(undone(get()));
      },
      redo() {
        take(redone(get()));
      },
      stop() {
        cancelRest();
        kernel.stop();
        set({ computing: false, progress: null });
      },
      start: () => (get().picture ? compute('full') : computeAndRest()),
      keepTypeset: (text, formula) => set({ typesets: { ...get().typesets, [text]: formula } }),
      dispose() {
        cancelRest();
        kernel.dispose();
      },
    };
  });
  return store;
}
