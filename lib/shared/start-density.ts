import type { StudyFile } from './study-types';

export type Start = NonNullable<NonNullable<StudyFile['ask']['density']>['start']>;
type Interval = Pick<StudyFile['domain'][number], 'from' | 'to'>;

/** Steps that a start is followed through, where the study does not say. */
export const START_STEPS = Array.from({ length: 17 }, (_, step) => step);

/** Where a picture begins if the study does not say: a narrow Gaussian in the lower part of the domain. */
export function usualStart({ from, to }: Interval): Extract<Start, { kind: 'gaussian' }> {
  const digits = (value: number) => Number(value.toPrecision(6));
  return { kind: 'gaussian', mean: [digits(from + 0.22 * (to - from))], sd: [digits(0.02 * (to - from))] };
}

export function insideFault(value: number, { from, to }: Interval): string | null {
  return value >= from && value <= to ? null : `${value} lies outside the domain; allowed: ${from} to ${to}`;
}

/** Widths that the engine takes, as it states them. */
export function widthFault(value: number, { from, to }: Interval): string | null {
  const length = to - from;
  return value >= 1e-9 * length && value <= 1e3 * length
    ? null
    : `${value} on a domain of length ${length}; allowed: ${1e-9 * length} to ${1e3 * length}`;
}
