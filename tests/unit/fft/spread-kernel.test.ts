import { describe, expect, it } from 'vitest';
import {
  copyHead,
  prepareSpread,
  readFrom,
  SPREAD_WIDTH,
  spreadKernel,
  spreadOnto,
  spreadTransform,
  wrapTail,
} from '@/kernels/fft/spread-kernel';
import { SymmetricConvolution } from '@/kernels/fft/symmetric-convolution';
import { randomValues } from '../../support/kernel-maps';

describe('the compact kernel', () => {
  it('is even, one at its middle, zero from half its width on', () => {
    expect(spreadKernel(0)).toBe(1);
    expect(spreadKernel(2.3)).toBe(spreadKernel(-2.3));
    expect(spreadKernel(SPREAD_WIDTH / 2)).toBe(0);
    expect(spreadKernel(100)).toBe(0);
    expect(spreadKernel(7)).toBeGreaterThan(0);
  });

  it('has the transform that a fine sum of it gives', () => {
    const n = 64;
    const transform = spreadTransform(n);
    const FINE = 2000;
    for (const k of [0, 1, 5, 16, 23]) {
      let sum = 0;
      for (let i = -FINE; i <= FINE; i++) {
        const u = ((SPREAD_WIDTH / 2) * i) / FINE;
        sum += spreadKernel(u) * Math.cos((2 * Math.PI * k * u) / n);
      }
      sum *= SPREAD_WIDTH / 2 / FINE;
      expect(Math.abs(transform[k] - sum) / transform[0]).toBeLessThan(1e-13);
    }
  });

  it('puts masses anywhere on a circle and, convolved, gives the direct sum of wrapped Gaussians', () => {
    const n = 64;
    const sigma = 3 / n; // of a circle of length 1
    const at = randomValues(20, 4);
    const mass = randomValues(20, 9);
    const read = randomValues(30, 11);
    const line = new Float64Array(n + SPREAD_WIDTH);
    spreadOnto(
      prepareSpread(
        at.map((v) => v * n),
        n,
      ),
      mass,
      line,
    );
    wrapTail(line, n);
    const transform = spreadTransform(n);
    const multiplier = transform.map((t, k) => (Math.exp(-2 * (Math.PI * k * sigma) ** 2) * n) / (t * t));
    new SymmetricConvolution(n).apply(line.subarray(0, n), multiplier);
    copyHead(line, n);
    const out = new Float64Array(30);
    readFrom(
      prepareSpread(
        read.map((v) => v * n),
        n,
      ),
      line,
      out,
    );
    out.forEach((v, i) => {
      let sum = 0;
      for (let j = 0; j < 20; j++)
        for (const turn of [-1, 0, 1]) sum += mass[j] * Math.exp(-0.5 * ((read[i] - at[j] + turn) / sigma) ** 2);
      sum /= sigma * Math.sqrt(2 * Math.PI);
      expect(Math.abs(v - sum)).toBeLessThan(2e-13 * 80);
    });
  });

  it('leaves out positions that are not a number', () => {
    const spread = prepareSpread(Float64Array.of(Number.NaN, 3), 32);
    const line = new Float64Array(32 + SPREAD_WIDTH);
    spreadOnto(spread, Float64Array.of(5, 0), line);
    expect(line.every((v) => v === 0)).toBe(true);
    const out = Float64Array.of(7, 7);
    readFrom(spread, line.fill(1), out);
    expect(out[0]).toBe(0);
  });
});
