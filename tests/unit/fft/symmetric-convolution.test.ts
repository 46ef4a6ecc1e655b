import { describe, expect, it } from 'vitest';
import { SymmetricConvolution } from '@/kernels/fft/symmetric-convolution';
import { randomValues } from '../../support/kernel-maps';

/** The definition, term by term: multiply every mode of the sequence by its factor. */
function byDefinition(data: Float64Array, multiplier: Float64Array): Float64Array {
  const n = data.length;
  const kernel = Float64Array.from({ length: n }, (_, d) => {
    let sum = 0;
    for (let k = 0; k < n; k++) sum += multiplier[Math.min(k, n - k)] * Math.cos((2 * Math.PI * k * d) / n);
    return sum / n;
  });
  return data.map((_, i) => data.reduce((s, v, j) => s + kernel[(i - j + n) % n] * v, 0));
}

describe('circular convolution with an even kernel', () => {
  it.each([8, 16, 64, 256])('of %d points is the sum of its definition', (n) => {
    const data = randomValues(n, n, -1, 1);
    const multiplier = randomValues(n / 2 + 1, n + 1, -1, 1);
    const expected = byDefinition(data, multiplier);
    new SymmetricConvolution(n).apply(data, multiplier);
    data.forEach((v, i) => {
      expect(Math.abs(v - expected[i])).toBeLessThan(1e-13);
    });
  });

  it('with every factor one changes nothing, with only the zeroth leaves the mean', () => {
    const data = randomValues(32, 3);
    const copy = data.slice();
    const convolution = new SymmetricConvolution(32);
    convolution.apply(copy, new Float64Array(17).fill(1));
    copy.forEach((v, i) => {
      expect(v).toBeCloseTo(data[i], 14);
    });
    const mean = data.reduce((s, v) => s + v, 0) / 32;
    const first = new Float64Array(17);
    first[0] = 1;
    convolution.apply(copy, first);
    for (const v of copy) expect(v).toBeCloseTo(mean, 14);
  });

  it.each([0, 4, 12, 100, 8.5])('refuses a length of %d', (n) => {
    expect(() => new SymmetricConvolution(n)).toThrow(/powers of two from 8/);
  });
});
