import type { KernelHost, WorkerLike } from './kernel-client';

/** The worker and the clock of a real browser. */
export const browserKernelHost: KernelHost = {
  createWorker: () => new Worker(new URL('./kernel.worker.ts', import.meta.url), { type: 'module' }) as WorkerLike,
  createFlag: () => (crossOriginIsolated ? new Int32Array(new SharedArrayBuffer(4)) : null),
  now: () => performance.now(),
};
