import { describe, expect, it } from 'vitest';
import { bound, errorBar } from '@/kernels/solve/quantity';

describe('quantities', () => {
  it('are null where the number or its error bar is not finite: a result file has no NaN', () => {
    expect(bound(Number.NaN, 1)).toBeNull();
    expect(bound(Number.POSITIVE_INFINITY, 1)).toBeNull();
    expect(bound(1, Number.NaN)).toBeNull();
    expect(bound(2, 0.5)).toEqual({ value: 2, uncertainty: 0.5, kind: 'bound' });
    expect(bound(2, null)).toEqual({ value: 2, uncertainty: 0, kind: 'bound' });
  });

  it('have error bars of twice a small difference, five times a large one, and never below the floor', () => {
    expect(errorBar(1, 1 + 4e-12, 0)).toBeCloseTo(8e-12, 15);
    expect(errorBar(1, 1.001, 0)).toBeCloseTo(0.005, 12);
    expect(errorBar(1, 1, 3e-16)).toBe(3e-16);
    expect(errorBar(1, null, 1)).toBeNull();
  });
});
