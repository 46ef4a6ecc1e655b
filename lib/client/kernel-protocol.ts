import type { Mode } from '@/kernels/mode';
import type { RailPoint } from '@/kernels/solve/rail-point';
import type { Result, StudyFile } from '@/lib/shared/study-types';
import type { TypesetFormula } from '@/lib/shared/typeset-types';

/** One thing that is wrong with a study, at the field that has it. */
export interface StudyFault {
  path: string;
  message: string;
  /** For a formula: the first character at fault and how many are. */
  at?: number;
  length?: number;
}

export type { Mode, RailPoint };

export type Pass = 'live' | 'full';

export type KernelRequest =
  | { type: 'share'; wanted: Int32Array }
  | { type: 'compute'; id: number; study: unknown; pass: Pass }
  | { type: 'typeset'; id: number; formula: string; variables: string[]; parameters: string[] }
  | { type: 'check'; id: number; study: unknown }
  | { type: 'rail'; id: number; study: unknown; sigmas: number[] }
  | { type: 'mode'; id: number; study: unknown; index: number };

export type KernelReply =
  | { type: 'progress'; id: number; done: number; total: number }
  | { type: 'result'; id: number; result: Result; seconds: number }
  | { type: 'refused'; id: number; faults: StudyFault[] }
  | { type: 'stopped'; id: number }
  | { type: 'failed'; id: number; message: string }
  | { type: 'typeset'; id: number; formula: TypesetFormula }
  | { type: 'checked'; id: number; study: StudyFile }
  | { type: 'railPoint'; id: number; point: RailPoint }
  | { type: 'railDone'; id: number }
  | { type: 'mode'; id: number; mode: Mode };
