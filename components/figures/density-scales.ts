import { type ScaleLinear, scaleLinear } from 'd3-scale';
import type { Curve } from './density-path';

export const DENSITY_MARGIN = { top: 22, right: 40, bottom: 30, left: 44 };

export interface DensityScales {
  x: ScaleLinear<number, number>;
  y: ScaleLinear<number, number>;
}

/**
 * Heights up to half above the density with noise; peaks of the one without are cut there, for they are infinite in
 * truth and would flatten all else. Without noise alone, the highest fiftieth is cut.
 */
export function densityTop(noisy: Curve | null, without: Curve | null): number {
  const peak = noisy ? maximum(noisy.values) : 0;
  if (peak > 0) {
    const sharper = without ? maximum(without.values) : 0;
    return Math.max(peak * 1.08, Math.min(sharper * 1.05, peak * 1.5));
  }
  if (!without || without.values.length === 0) return 1;
  const sorted = [...without.values].sort((a, b) => a - b);
  return (sorted[Math.floor(sorted.length * 0.98)] || sorted[sorted.length - 1] || 1) * 1.3;
}

export function densityScales(width: number, height: number, from: number, to: number, top: number): DensityScales {
  const { left, right, bottom, top: above } = DENSITY_MARGIN;
  return {
    x: scaleLinear([from, to], [left, width - right]),
    y: scaleLinear([0, top], [height - bottom, above]),
  };
}

function maximum(values: number[]): number {
  let largest = 0;
  for (const value of values) if (value > largest) largest = value;
  return largest;
}
