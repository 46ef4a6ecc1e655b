import type { StudyFile } from '@/kernels/index';

/** How far a number may lie from the expected one. */
export type Tolerance = { absolute: number } | { relative: number };

interface Common {
  /** into the result file; [at=5] picks the entry of a list by its key */
  readonly path: string;
  readonly tolerance: Tolerance;
  /** how well the expected number itself is known, in the tolerance's measure; null: not to 1e-9 */
  readonly known: number | null;
}

/** One number, or one list of numbers, of a result with what it should be. Plain data: a page runs the same list. */
export type Wanted = Common &
  (
    | { readonly kind: 'number'; readonly expected: number }
    /** [re, im] each; compared as a set, and nothing larger than the smallest of them may be reported beside them */
    | { readonly kind: 'eigenvalues'; readonly expected: readonly (readonly [number, number])[] }
    /** the density at positions: smooth with noise, per cell without */
    | { readonly kind: 'density'; readonly at: readonly number[]; readonly expected: readonly number[] }
    /** ∫ of × density over the window (default: the domain); `of` is a formula of the study's variable */
    | {
        readonly kind: 'mean';
        readonly of: string;
        readonly window?: readonly [number, number];
        readonly expected: number;
      }
    /** ∫ |density − to| over the domain, for densities per cell; `to` is a formula */
    | { readonly kind: 'distance'; readonly to: string; readonly expected: number }
  );

/** A study with the numbers it must give, and where they come from. */
export interface PublishedCheck {
  readonly id: string;
  readonly title: string;
  readonly group: string;
  readonly study: StudyFile;
  readonly compare: readonly Wanted[];
  readonly source: string;
  /** exact: closed form or theorem; computed: by another program, convergence shown; published: a printed table */
  readonly basis: 'exact' | 'computed' | 'published';
  /** whether the source was read: on a page, from memory, or the number is an identity or was computed anew */
  readonly seen: 'page' | 'from memory' | 'identity' | 'recomputed';
}
