import { expect, it } from 'vitest';
import { eigenvalueRows } from '@/lib/shared/eigenvalue-rows';
import type { Eigenvalue } from '@/lib/shared/study-types';

function eigenvalue(re: number, im: number, more: Partial<Eigenvalue> = {}): Eigenvalue {
  return { re, im, modulus: Math.hypot(re, im), residual: 1e-15, uncertainty: 1e-12, multiplicity: 1, ...more };
}

it('a conjugate pair stands in one row, with both places', () => {
  const rows = eigenvalueRows([eigenvalue(1, 0), eigenvalue(0.3, 0.4), eigenvalue(0.3, -0.4), eigenvalue(-0.2, 0)]);
  expect(rows.map(({ place, index }) => [place, index])).toEqual([
    ['1', 0],
    ['2, 3', 1],
    ['4', 3],
  ]);
  expect(rows[1].modulus).toBe(0.5);
  expect(rows[1].phase).toBeCloseTo(Math.atan2(0.4, 0.3) / Math.PI, 15);
  expect(rows[2].phase).toBe(1);
});

it('an unresolved eigenvalue never enters the table', () => {
  expect(eigenvalueRows([eigenvalue(1, 0), eigenvalue(0.5, 0, { resolved: false })])).toHaveLength(1);
});

it('modulus 1 lasts for ever, one half lasts 1/ln 2 steps', () => {
  const [first, second] = eigenvalueRows([eigenvalue(1, 0), eigenvalue(0.5, 0)]);
  expect(first.lasts).toBeNull();
  expect(second.lasts).toBeCloseTo(1 / Math.LN2, 14);
  // d(-1/ln m) = dm / (m ln² m)
  expect(second.lastsUncertainty).toBeCloseTo(1e-12 / 0.5 / Math.LN2 ** 2, 20);
});

it('a multiple eigenvalue counts as often as it is there', () => {
  const rows = eigenvalueRows([eigenvalue(1, 0, { multiplicity: 2 }), eigenvalue(0.5, 0)]);
  expect(rows.map(({ place }) => place)).toEqual(['1 to 2', '3']);
});
