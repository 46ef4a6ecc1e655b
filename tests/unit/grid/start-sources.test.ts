import { describe, expect, it } from 'vitest';
import { panelGrid } from '@/kernels/grid/panels';
import { gaussianCuts, pointSource, sampleSources, smoothSources } from '@/kernels/grid/start-sources';

const base = panelGrid([0, 0.5, 1], 16);
const moment = (s: { x: Float64Array; mass: Float64Array }, k: number) =>
  s.x.reduce((t, x, i) => t + s.mass[i] * x ** k, 0);

describe('start densities', () => {
  it('resolve a Gaussian a thousand times narrower than the panels, to the last digits', () => {
    const [mean, sd] = [0.3217, 1e-4];
    const start = smoothSources(base, gaussianCuts(mean, sd, 0, 1), (x) =>
      x.map((v) => Math.exp(-0.5 * ((v - mean) / sd) ** 2)),
    );
    expect(moment(start, 0)).toBeCloseTo(1, 13);
    expect(moment(start, 1)).toBeCloseTo(mean, 13);
    expect((moment(start, 2) - mean ** 2) / sd ** 2).toBeCloseTo(1, 6);
    expect(start.density?.(Float64Array.of(mean))[0]).toBeCloseTo(1 / (sd * Math.sqrt(2 * Math.PI)), 6);
  });

  it('are normalised whatever their integral, and break where they are told to', () => {
    const start = smoothSources(base, [1 / 3], (x) => x.map((v) => (v < 1 / 3 ? 7 : 0)));
    expect(moment(start, 0)).toBeCloseTo(1, 14);
    expect(moment(start, 1)).toBeCloseTo(1 / 6, 14);
  });

  it('must not be negative, empty or infinite: the place and the value are named', () => {
    expect(() => smoothSources(base, [], (x) => x.map((v) => v - 0.2))).toThrow(
      /-0\.\d+ at 0\.\d+; allowed: 0 and above/,
    );
    expect(() => smoothSources(base, [], (x) => x.map(() => 0))).toThrow(/positive somewhere/);
    expect(() => smoothSources(base, [], (x) => x.map(() => Number.POSITIVE_INFINITY))).toThrow(/Infinity/);
  });

  it('of points and samples are masses without a density', () => {
    expect(pointSource(0.4)).toEqual({ x: Float64Array.of(0.4), mass: Float64Array.of(1), density: null });
    const samples = sampleSources([0.1, 0.2, 0.9]);
    expect(moment(samples, 1)).toBeCloseTo(0.4, 15);
    expect(samples.density).toBeNull();
  });
});
