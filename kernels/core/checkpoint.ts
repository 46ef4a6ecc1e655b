/**
 * Reports progress and gives the host a chance to stop a computation.
 *
 * Called at least every million elementary operations or so. `done` and `total` count the same unit (cases, steps);
 * the host owns the clock, the messages and the decision: it throws `Stopped` to end the run.
 */
export type Checkpoint = (done: number, total: number) => void;

/** Thrown by a host's checkpoint to end a run; nothing of the run is kept. */
export class Stopped extends Error {
  constructor() {
    super('stopped');
    this.name = 'Stopped';
  }
}

/** A checkpoint for hosts that neither watch nor stop. */
export const neverStop: Checkpoint = () => {};
