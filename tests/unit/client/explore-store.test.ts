import { beforeEach, describe, expect, it } from 'vitest';
import { createExploreStore, type ExploreStore } from '@/lib/client/explore-store';
import type { WorkerLike } from '@/lib/client/kernel-client';
import type { KernelReply, KernelRequest } from '@/lib/client/kernel-protocol';
import { FIRST_STUDY } from '@/lib/shared/bench-study';
import type { Result, StudyFile } from '@/lib/shared/study-types';

type Compute = Extract<KernelRequest, { type: 'compute' }>;

let sent: Compute[];
let worker: WorkerLike;
let waiting: (() => void) | null;
let store: ExploreStore;

const withSigma = (sigma: number) => (study: StudyFile) => ({ ...study, noise: { ...study.noise, sigma } });
const reply = (data: KernelReply) => worker.onmessage?.({ data });
const grid = { points: [8], x: [[]], weights: [[]], resolved: true, compared: [] };
const result = { cases: [{ at: {}, grid }], warnings: [] } as unknown as Result;
const answer = () => reply({ type: 'result', id: sent.at(-1)?.id ?? -1, result, seconds: 0.01 });

beforeEach(() => {
  sent = [];
  waiting = null;
  store = createExploreStore(
    { study: FIRST_STUDY },
    {
      createWorker() {
        worker = {
          onmessage: null,
          onerror: null,
          terminate() {},
          postMessage: (message) => message.type === 'compute' && sent.push(message),
        };
        return worker;
      },
      createFlag: () => new Int32Array(1),
      now: () => 0,
    },
    {
      after(_ms, run) {
        waiting = run;
        return () => {
          waiting = null;
        };
      },
    },
  );
});

describe('the bench', () => {
  it('computes nothing for another title, which undo takes back all the same', () => {
    store.getState().edit(withSigma(-1));
    reply({ type: 'refused', id: sent.at(-1)?.id ?? -1, faults: [{ path: 'noise.sigma', message: 'no' }] });
    const before = sent.length;
    store.getState().edit((study) => ({ ...study, title: 'Another', notes: 'Words' }));
    expect(store.getState().study.title).toBe('Another');
    // What was wrong with the study still is.
    expect(store.getState().faults).toHaveLength(1);
    store.getState().undo();
    expect(store.getState().study.title).toBe(FIRST_STUDY.title);
    expect(sent).toHaveLength(before);
    store.getState().undo();
    expect(sent.length).toBeGreaterThan(before);
  });

  it('computes fast while something moves and in full at rest', () => {
    store.getState().edit(withSigma(0.02), true);
    answer();
    expect(store.getState().picture?.settled).toBe(false);
    expect(store.getState().computing).toBe(true);
    waiting?.();
    answer();
    expect(sent.map(({ pass }) => pass)).toEqual(['live', 'full']);
    expect(sent.map(({ study }) => (study as StudyFile).ask.exit)).toEqual([undefined, {}]);
    expect(store.getState().picture?.settled).toBe(true);
    expect(store.getState().computing).toBe(false);
  });

  it('asks for exit times only where something can leave, and for nothing without noise while it moves', () => {
    store.getState().edit((study) => ({ ...study, domain: [{ from: 0, to: 1, ends: 'reflecting' }] }), true);
    const { ask } = sent[0].study as StudyFile;
    expect(ask.exit).toBeUndefined();
    expect(ask.stationary).toEqual({ deterministic: false });
  });

  it('does not start the full pass of a study that was refused', () => {
    store.getState().edit(withSigma(0.02), false);
    reply({ type: 'refused', id: sent[0].id, faults: [{ path: 'noise.sigma', message: 'too small' }] });
    waiting?.();
    expect(sent).toHaveLength(1);
    expect(store.getState().computing).toBe(false);
    expect(store.getState().faults[0].message).toBe('too small');
  });

  it('stop before the full pass leaves nothing running', () => {
    store.getState().edit(withSigma(0.02), false);
    answer();
    store.getState().stop();
    expect(waiting).toBeNull();
    expect(store.getState().computing).toBe(false);
  });

  it('undo computes what stood before', () => {
    store.getState().edit(withSigma(0.02), false);
    answer();
    store.getState().undo();
    expect(sent.at(-1)?.study).toMatchObject({ noise: { sigma: 0.012 } });
  });
});
