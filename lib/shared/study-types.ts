// Types only: whoever shows a study or a result needs their shapes, not the schema that checks them.
export type { Eigenvalue, Quantity, Result, ResultCase, Warning } from '@/kernels/result';
export type { Ask, End, Ends, Study, StudyFile } from '@/kernels/spec';
