import { beforeEach, describe, expect, it } from 'vitest';
import type { WorkerLike } from '@/lib/client/kernel-client';
import type { KernelReply, KernelRequest } from '@/lib/client/kernel-protocol';
import { SideClient, type SideJob, type SideKind } from '@/lib/client/side-client';

let sent: { id: number; study: unknown }[];
let answers: string[];
let worker: WorkerLike;
let ended: number;
let flag: Int32Array | null;
let client: SideClient;

const job = (kind: SideKind, name: string, patient = false): SideJob => ({
  kind,
  patient,
  request: () => ({ type: 'mode', study: name, index: 0 }),
  answer: ({ type }) => answers.push(`${name} ${type}`),
});
const reply = (type: 'stopped' | 'railDone' | 'railPoint') =>
  worker.onmessage?.({ data: { type, id: sent.at(-1)?.id } as unknown as KernelReply });
const names = () => sent.map(({ study }) => study);

function begin(shared: boolean) {
  sent = [];
  answers = [];
  ended = 0;
  flag = shared ? new Int32Array(1) : null;
  client = new SideClient(
    {
      createWorker() {
        worker = {
          onmessage: null,
          onerror: null,
          terminate: () => ended++,
          postMessage: (message: KernelRequest) => message.type !== 'share' && sent.push(message as never),
        } as WorkerLike;
        return worker;
      },
      createFlag: () => flag,
      now: () => 0,
    },
    (message) => answers.push(`failed ${message}`),
  );
}

beforeEach(() => begin(true));

describe('beside the picture', () => {
  it('a stale rail is interrupted, never queued: the latest one alone follows', () => {
    client.run(job('rail', 'a'));
    client.run(job('rail', 'b'));
    client.run(job('rail', 'c'));
    expect(flag?.[0]).toBe(0);
    reply('railPoint');
    reply('stopped');
    expect(names()).toEqual(['a', 'c']);
    expect(answers).toEqual([]);
  });

  it('steps go before a rail, which goes on behind them', () => {
    client.run(job('rail', 'rail'));
    client.run(job('steps', 'steps'));
    reply('stopped');
    reply('railDone');
    expect(names()).toEqual(['rail', 'steps', 'rail']);
    reply('railPoint');
    reply('railDone');
    expect(answers).toEqual(['steps railDone', 'rail railPoint', 'rail railDone']);
  });

  it('what is dragged moves: a patient job is finished before the newest one', () => {
    client.run(job('steps', '1', true));
    client.run(job('steps', '2', true));
    client.run(job('steps', '3', true));
    expect(flag?.[0]).toBe(sent[0].id);
    reply('railDone');
    expect(names()).toEqual(['1', '3']);
    expect(answers).toEqual(['1 railDone']);
  });

  it('dropped work is not answered and not begun', () => {
    client.run(job('rail', 'a'));
    client.run(job('trails', 'b'));
    client.drop('rail');
    client.drop('trails');
    reply('stopped');
    expect(names()).toEqual(['a']);
  });

  it('without shared memory stale work ends with its worker', () => {
    begin(false);
    client.run(job('rail', 'a'));
    client.run(job('rail', 'b'));
    expect(ended).toBe(1);
    expect(names()).toEqual(['a', 'b']);
  });

  it('says so when its worker fails', () => {
    client.run(job('rail', 'a'));
    worker.onerror?.({ message: 'no memory' });
    expect(answers).toEqual(['failed no memory']);
    client.run(job('rail', 'b'));
    expect(names()).toEqual(['a', 'b']);
  });
});
