import { describe, expect, it } from 'vitest';
import { gapOf, spectrumEntries } from '@/kernels/solve/spectrum-entries';
import type { EigenPair } from '@/kernels/spectrum/arnoldi';

const pair = (re: number, im = 0, condition = 1, residual = 1e-15): EigenPair => ({
  re,
  im,
  condition,
  residual,
  vector: new Float64Array(1),
  imaginary: null,
});

describe('eigenvalues as stated in a result', () => {
  it('carry the distance to their partner on the other grid, each partner used once', () => {
    const entries = spectrumEntries([pair(1), pair(0.5), pair(0.5)], [pair(1), pair(0.5), pair(0.47)], 1);
    expect(entries[1].uncertainty).toBeLessThan(1e-14);
    expect(entries[2].uncertainty).toBeGreaterThanOrEqual(0.03);
    expect(entries[2].uncertainty).toBeLessThan(0.2);
  });

  it('are left out where they do not stand above their uncertainty', () => {
    const entries = spectrumEntries([pair(1), pair(0.003)], [pair(1), pair(0.001)], 1);
    expect(entries.map((e) => e.re)).toEqual([1]);
  });

  it('count round-off as often as they are sensitive to it', () => {
    const [calm, touchy] = spectrumEntries([pair(1), pair(0.5, 0, 1e6)], [pair(1), pair(0.5, 0, 1e6)], 1);
    expect(touchy.uncertainty ?? 0).toBeGreaterThan(1e5 * (calm.uncertainty ?? 1));
  });

  it('without a second grid have no uncertainty rather than an invented one', () => {
    expect(spectrumEntries([pair(1), pair(0.5)], null, 1).map((e) => e.uncertainty)).toEqual([null, null]);
  });

  it('give gap and relaxation time with errors that follow theirs', () => {
    const entries = spectrumEntries([pair(1), pair(0.6, 0.3)], [pair(1), pair(0.6, 0.3001)], 1);
    const { gap, relaxationTime } = gapOf(entries);
    const ratio = Math.hypot(0.6, 0.3);
    expect(gap?.value).toBeCloseTo(1 - ratio, 14);
    expect(relaxationTime?.value).toBeCloseTo(-1 / Math.log(ratio), 13);
    const u = entries[1].uncertainty ?? 0;
    expect(gap?.uncertainty).toBeGreaterThanOrEqual(u);
    expect(relaxationTime?.uncertainty).toBeGreaterThanOrEqual(u / (ratio * Math.log(ratio) ** 2));
    expect(gapOf(entries.slice(0, 1))).toEqual({ gap: null, relaxationTime: null });
  });
});
