import type { Fault } from './fault';

/** A study that satisfies the schema but cannot be computed as it stands; says where and what is allowed. */
export class StudyRefused extends RangeError {
  readonly faults: readonly Fault[];

  constructor(path: string, message: string) {
    super(`${path}: ${message}`);
    this.name = 'StudyRefused';
    this.faults = [{ path, message }];
  }
}
