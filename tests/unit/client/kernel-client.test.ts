import { beforeEach, describe, expect, it, vi } from 'vitest';
import { KernelClient, type KernelListener, type WorkerLike } from '@/lib/client/kernel-client';
import type { KernelReply, KernelRequest } from '@/lib/client/kernel-protocol';
import { FIRST_STUDY, withoutNoiseKey } from '@/lib/shared/bench-study';
import type { Result, StudyFile } from '@/lib/shared/study-types';

class FakeWorker implements WorkerLike {
  onmessage: WorkerLike['onmessage'] = null;
  onerror: WorkerLike['onerror'] = null;
  sent: KernelRequest[] = [];
  ended = false;
  postMessage(message: KernelRequest) {
    this.sent.push(message);
  }
  terminate() {
    this.ended = true;
  }
  reply(data: KernelReply) {
    this.onmessage?.({ data });
  }
  computed() {
    return this.sent.filter((message) => message.type === 'compute');
  }
}

const at = (sigma: number): StudyFile => ({ ...FIRST_STUDY, noise: { kind: 'gaussian', sigma } });
const result = { cases: [] } as unknown as Result;

let workers: FakeWorker[];
let time: number;
let flag: Int32Array | null;
let shared: boolean;
let listener: { [K in keyof KernelListener]: ReturnType<typeof vi.fn<KernelListener[K]>> };
let client: KernelClient;

beforeEach(() => {
  workers = [];
  time = 0;
  flag = null;
  shared = true;
  listener = { onProgress: vi.fn(), onResult: vi.fn(), onRefused: vi.fn(), onStopped: vi.fn(), onFailed: vi.fn() };
  client = new KernelClient(
    {
      createWorker() {
        const worker = new FakeWorker();
        workers.push(worker);
        return worker;
      },
      createFlag() {
        flag = shared ? new Int32Array(1) : null;
        return flag;
      },
      now: () => time,
    },
    listener,
  );
});

const lastId = () => workers.at(-1)?.computed().at(-1)?.id ?? -1;

describe('with shared memory', () => {
  it('the flag holds the id of the computation that is wanted', () => {
    client.compute(at(0.1), 'live');
    expect(flag?.[0]).toBe(lastId());
  });

  it('a full pass gives way at once to whatever comes after it', () => {
    client.compute(at(0.1), 'full');
    client.compute(at(0.2), 'live');
    expect(flag?.[0]).toBe(0);
    expect(workers[0].computed()).toHaveLength(1);
    workers[0].reply({ type: 'stopped', id: lastId() });
    expect(workers[0].computed().map(({ study }) => (study as StudyFile).noise.sigma)).toEqual([0.1, 0.2]);
    expect(flag?.[0]).toBe(lastId());
    expect(listener.onStopped).not.toHaveBeenCalled();
  });

  it('while dragging, one pass runs and only the newest waits', () => {
    for (const sigma of [0.1, 0.2, 0.3, 0.4]) client.compute(at(sigma), 'live');
    workers[0].reply({ type: 'result', id: lastId(), result, seconds: 0 });
    workers[0].reply({ type: 'result', id: lastId(), result, seconds: 0 });
    expect(listener.onResult.mock.calls.map(([, study]) => study.noise.sigma)).toEqual([0.1, 0.4]);
  });

  it('a live pass that takes too long is abandoned', () => {
    client.compute(at(0.1), 'live');
    time = 1001;
    client.compute(at(0.2), 'live');
    expect(flag?.[0]).toBe(0);
  });

  it('but the one after it is not: what is dragged must move, however slow the computation', () => {
    client.compute(at(0.1), 'live');
    time = 1001;
    client.compute(at(0.2), 'live');
    workers[0].reply({ type: 'stopped', id: lastId() });
    time = 9999;
    client.compute(at(0.3), 'live');
    expect(flag?.[0]).toBe(lastId());
  });

  it('an answer to an older request is dropped', () => {
    client.compute(at(0.1), 'live');
    workers[0].reply({ type: 'result', id: lastId() - 1, result, seconds: 0 });
    expect(listener.onResult).not.toHaveBeenCalled();
  });

  it('stop raises the flag, drops what waits and says when it has stopped', () => {
    client.compute(at(0.1), 'full');
    client.compute(at(0.2), 'full');
    client.stop();
    expect(flag?.[0]).toBe(0);
    workers[0].reply({ type: 'stopped', id: lastId() });
    expect(listener.onStopped).toHaveBeenCalledOnce();
    expect(workers[0].computed()).toHaveLength(1);
  });

  it('a formula is read at once: the computation gives way and starts again', async () => {
    client.compute(at(0.1), 'full');
    const first = lastId();
    const asked = client.typeset('x', ['x'], []);
    expect(flag?.[0]).toBe(0);
    workers[0].reply({ type: 'stopped', id: first });
    expect(lastId()).not.toBe(first);
    const question = workers[0].sent.find((message) => message.type === 'typeset');
    workers[0].reply({ type: 'refused', id: question?.id ?? -1, faults: [{ path: '', message: 'no', at: 0 }] });
    expect(await asked).toEqual({ faults: [{ path: '', message: 'no', at: 0 }] });
  });
});

describe('without shared memory', () => {
  beforeEach(() => {
    shared = false;
  });

  it('a stale computation is ended with its worker', () => {
    client.compute(at(0.1), 'full');
    client.compute(at(0.2), 'live');
    expect(workers[0].ended).toBe(true);
    expect(workers).toHaveLength(2);
    expect(workers[1].computed().map(({ study }) => (study as StudyFile).noise.sigma)).toEqual([0.2]);
  });

  it('stop ends the worker too', () => {
    client.compute(at(0.1), 'full');
    client.stop();
    expect(workers[0].ended).toBe(true);
    expect(listener.onStopped).toHaveBeenCalledOnce();
  });
});

it('a worker that breaks down is replaced for the next request', () => {
  client.compute(at(0.1), 'full');
  workers[0].onerror?.({ message: 'out of memory' });
  expect(listener.onFailed).toHaveBeenCalledWith('out of memory');
  client.compute(at(0.2), 'full');
  expect(workers).toHaveLength(2);
});

it('the picture without noise belongs to a system and a domain, not to a noise level', () => {
  expect(withoutNoiseKey(at(0.1))).toBe(withoutNoiseKey(at(0.2)));
  const moved = { ...FIRST_STUDY, system: { ...FIRST_STUDY.system, parameters: { r: 3.7 } } };
  expect(withoutNoiseKey(moved)).not.toBe(withoutNoiseKey(FIRST_STUDY));
});
