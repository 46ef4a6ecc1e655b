import type { KernelHost, WorkerLike } from './kernel-client';
import type { KernelReply, KernelRequest } from './kernel-protocol';

/** What is computed beside the picture, most urgent first. */
export const SIDE_KINDS = ['steps', 'mode', 'trails', 'rail'] as const;
export type SideKind = (typeof SIDE_KINDS)[number];

type Unnumbered<T> = T extends unknown ? Omit<T, 'id'> : never;

export interface SideJob {
  kind: SideKind;
  /** Made when the job starts, so that one that was interrupted asks only for what it has not got yet. */
  request(): Unnumbered<KernelRequest> | null;
  /** Every answer but "stopped"; a job may have several. */
  answer(reply: KernelReply): void;
  /** What is dragged must move: such a job is finished even if a newer one of its kind waits. */
  patient?: boolean;
}

/**
 * A second worker for what stands beside the picture. One job of each kind waits at most, the latest; an urgent kind
 * interrupts the others, which go on where they were.
 */
export class SideClient {
  private worker: WorkerLike | null = null;
  private flag: Int32Array | null = null;
  private lastId = 0;
  private running: { id: number; job: SideJob; wanted: boolean } | null = null;
  private readonly waiting = new Map<SideKind, SideJob>();

  constructor(
    private readonly host: KernelHost,
    private readonly onFailed: (message: string) => void,
  ) {}

  run(job: SideJob): void {
    this.waiting.set(job.kind, job);
    const { running } = this;
    if (running === null) this.next();
    else if (running.job.kind === job.kind) {
      if (!running.job.patient) this.interrupt();
    } else if (urgency(job) < urgency(running.job)) {
      if (running.wanted && !this.waiting.has(running.job.kind)) this.waiting.set(running.job.kind, running.job);
      this.interrupt();
    }
  }

  /** Forgets the jobs of a kind, and ends the one that runs. */
  drop(kind: SideKind): void {
    this.waiting.delete(kind);
    if (this.running?.job.kind === kind) this.interrupt();
  }

  dispose(): void {
    this.waiting.clear();
    this.running = null;
    this.endWorker();
  }

  private next(): void {
    for (const kind of SIDE_KINDS) {
      const job = this.waiting.get(kind);
      if (!job) continue;
      this.waiting.delete(kind);
      const request = job.request();
      if (request === null) continue;
      const id = ++this.lastId;
      this.running = { id, job, wanted: true };
      const worker = this.ready();
      if (this.flag) Atomics.store(this.flag, 0, id);
      worker.postMessage({ ...request, id } as KernelRequest);
      return;
    }
  }

  private interrupt(): void {
    const { running } = this;
    if (running === null || !running.wanted) return;
    running.wanted = false;
    // The worker sees it at its next checkpoint and says "stopped".
    if (this.flag) Atomics.store(this.flag, 0, 0);
    else {
      this.endWorker();
      this.running = null;
      this.next();
    }
  }

  private receive(reply: KernelReply): void {
    const { running } = this;
    if (running === null || reply.id !== running.id) return;
    const last = reply.type !== 'progress' && reply.type !== 'railPoint';
    if (last) {
      this.running = null;
      this.next();
    }
    if (running.wanted && reply.type !== 'stopped' && reply.type !== 'progress') running.job.answer(reply);
  }

  private ready(): WorkerLike {
    if (this.worker) return this.worker;
    const worker = this.host.createWorker();
    worker.onmessage = ({ data }) => this.receive(data);
    worker.onerror = ({ message }) => {
      this.dispose();
      this.onFailed(message ?? 'the computation could not be started');
    };
    this.flag = this.host.createFlag();
    if (this.flag) worker.postMessage({ type: 'share', wanted: this.flag });
    this.worker = worker;
    return worker;
  }

  private endWorker(): void {
    this.worker?.terminate();
    this.worker = null;
  }
}

function urgency(job: SideJob): number {
  return SIDE_KINDS.indexOf(job.kind);
}
