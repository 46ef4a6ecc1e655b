import type { Result, StudyFile } from '@/lib/shared/study-types';
import type { TypesetFormula } from '@/lib/shared/typeset-types';
import type { KernelReply, KernelRequest, Pass, StudyFault } from './kernel-protocol';

export interface WorkerLike {
  postMessage(message: KernelRequest): void;
  terminate(): void;
  onmessage: ((event: { data: KernelReply }) => void) | null;
  onerror: ((event: { message?: string }) => void) | null;
}

export interface KernelHost {
  createWorker(): WorkerLike;
  /** Null where the browser gives no shared memory: a stale computation is then ended with its worker. */
  createFlag(): Int32Array | null;
  now(): number;
}

export interface KernelListener {
  onProgress(progress: { done: number; total: number; seconds: number }): void;
  onResult(result: Result, study: StudyFile, pass: Pass, seconds: number): void;
  onRefused(faults: StudyFault[], study: StudyFile): void;
  onStopped(): void;
  onFailed(message: string): void;
}

export type TypesetReply = { formula: TypesetFormula } | { faults: StudyFault[] };
export type CheckReply = { study: StudyFile } | { faults: StudyFault[] };

/** A live pass may finish if it is younger than this, or if the one before it was not allowed to: what is dragged must move. */
const PATIENCE_MS = 1000;

interface Job {
  id: number;
  study: StudyFile;
  pass: Pass;
  since: number;
}

/**
 * Talks to the worker. The latest request wins: one computation runs, at most one waits, anything older is dropped.
 * The shared flag holds the id that is wanted; the worker compares it at every checkpoint.
 */
export class KernelClient {
  private worker: WorkerLike | null = null;
  private flag: Int32Array | null = null;
  private lastId = 0;
  private running: Job | null = null;
  private waiting: Job | null = null;
  private abandonedLive = false;
  private readonly questions = new Map<number, (reply: KernelReply) => void>();

  constructor(
    private readonly host: KernelHost,
    private readonly listener: KernelListener,
  ) {}

  compute(study: StudyFile, pass: Pass): void {
    const now = this.host.now();
    this.waiting = { id: ++this.lastId, study, pass, since: now };
    const running = this.running;
    if (running === null) this.startWaiting();
    else if (running.pass === 'full') this.abandonRunning();
    else if (now - running.since > PATIENCE_MS && !this.abandonedLive) {
      this.abandonedLive = true;
      this.abandonRunning();
    }
  }

  /** Ends what runs and what waits; the picture stays as it is. */
  stop(): void {
    this.waiting = null;
    if (this.running) this.abandonRunning();
  }

  async typeset(formula: string, variables: string[], parameters: string[]): Promise<TypesetReply> {
    const reply = await this.ask((id) => ({ type: 'typeset', id, formula, variables, parameters }));
    if (reply.type === 'typeset') return { formula: reply.formula };
    return { faults: faultsOf(reply) };
  }

  async check(study: unknown): Promise<CheckReply> {
    const reply = await this.ask((id) => ({ type: 'check', id, study }));
    if (reply.type === 'checked') return { study: reply.study };
    return { faults: faultsOf(reply) };
  }

  dispose(): void {
    this.endWorker();
    this.running = null;
    this.waiting = null;
  }

  private ask(request: (id: number) => KernelRequest): Promise<KernelReply> {
    const id = ++this.lastId;
    // A question is answered at once: a long computation gives way and starts again behind it.
    if (this.running) {
      this.waiting ??= { ...this.running, id: ++this.lastId };
      this.abandonRunning();
    }
    return new Promise((resolve) => {
      this.questions.set(id, resolve);
      this.ready().postMessage(request(id));
    });
  }

  private startWaiting(): void {
    const job = this.waiting;
    if (job === null) return;
    this.waiting = null;
    this.running = { ...job, since: this.host.now() };
    const worker = this.ready();
    if (this.flag) Atomics.store(this.flag, 0, job.id);
    worker.postMessage({ type: 'compute', id: job.id, study: job.study, pass: job.pass });
  }

  private abandonRunning(): void {
    if (this.flag) {
      Atomics.store(this.flag, 0, 0);
      return;
    }
    const unanswered = this.questions.size > 0;
    if (unanswered) return;
    this.endWorker();
    this.running = null;
    if (this.waiting) this.startWaiting();
    else this.listener.onStopped();
  }

  private ready(): WorkerLike {
    if (this.worker) return this.worker;
    const worker = this.host.createWorker();
    worker.onmessage = ({ data }) => this.receive(data);
    worker.onerror = ({ message }) => this.fail(message ?? 'the computation could not be started');
    this.flag = this.host.createFlag();
    if (this.flag) worker.postMessage({ type: 'share', wanted: this.flag });
    this.worker = worker;
    return worker;
  }

  private endWorker(): void {
    this.worker?.terminate();
    this.worker = null;
  }

  private receive(reply: KernelReply): void {
    const question = this.questions.get(reply.id);
    if (question) {
      this.questions.delete(reply.id);
      question(reply);
      return;
    }
    const running = this.running;
    if (running === null || reply.id !== running.id) return;
    if (reply.type === 'progress') {
      const seconds = (this.host.now() - running.since) / 1000;
      this.listener.onProgress({ done: reply.done, total: reply.total, seconds });
      return;
    }
    this.running = null;
    const next = this.waiting;
    // The next one starts before this one is drawn: drawing and computing then overlap.
    this.startWaiting();
    if (reply.type !== 'stopped') this.abandonedLive = false;
    if (reply.type === 'result') this.listener.onResult(reply.result, running.study, running.pass, reply.seconds);
    else if (reply.type === 'refused') this.listener.onRefused(reply.faults, running.study);
    else if (reply.type === 'failed') this.listener.onFailed(reply.message);
    else if (next === null) this.listener.onStopped();
  }

  private fail(message: string): void {
    this.endWorker();
    this.running = null;
    this.waiting = null;
    for (const [id, question] of this.questions) question({ type: 'failed', id, message });
    this.questions.clear();
    this.listener.onFailed(message);
  }
}

function faultsOf(reply: KernelReply): StudyFault[] {
  if (reply.type === 'refused') return reply.faults;
  return [{ path: '', message: reply.type === 'failed' ? reply.message : 'the answer did not come' }];
}
