import type { Curve } from './density-path';

export const STRIP_MARGIN = { top: 4, right: 40, bottom: 26, left: 44 };

/** One row of the strip: a step's density, and how dark its columns are. */
export interface StripRow {
  step: number;
  curve: Curve;
}

/**
 * Shades of a row, 0 to 1, one per column of equal width over the domain: the density at the column's middle, read
 * straight between grid points. A wide density is flat and would vanish beside a narrow one, so each row has the full
 * range of shades up to its own peak, and the square root lifts what is small.
 */
export function rowShades({ x, values }: Curve, from: number, to: number, columns: number): Float32Array {
  const shades = new Float32Array(columns);
  let peak = 0;
  for (const value of values) if (value > peak) peak = value;
  if (peak <= 0 || x.length === 0) return shades;
  let right = 0;
  for (let column = 0; column < columns; column++) {
    const at = from + ((column + 0.5) / columns) * (to - from);
    while (right < x.length - 1 && x[right] < at) right++;
    const left = Math.max(right - 1, 0);
    const gap = x[right] - x[left];
    const share = gap > 0 ? Math.min(Math.max((at - x[left]) / gap, 0), 1) : 1;
    const value = values[left] + share * (values[right] - values[left]);
    shades[column] = Math.sqrt(Math.min(Math.max(value, 0) / peak, 1));
  }
  return shades;
}

export type Colour = readonly [red: number, green: number, blue: number];

/** A shade between paper, rain and ink: half way it is rain. */
export function shadeColour(shade: number, paper: Colour, rain: Colour, ink: Colour): Colour {
  const [from, to, share] = shade < 0.72 ? [paper, rain, shade / 0.72] : [rain, ink, (shade - 0.72) / 0.28];
  return [0, 1, 2].map((i) => Math.round(from[i] + share * (to[i] - from[i]))) as unknown as Colour;
}

/** "#256a8c" or "rgb(37, 106, 140)" as three numbers; null for anything else, such as a system colour's name. */
export function readColour(text: string): Colour | null {
  const hex = /^#([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})$/i.exec(text.trim());
  if (hex) return hex.slice(1).map((part) => Number.parseInt(part, 16)) as unknown as Colour;
  const rgb = /^rgba?\((\d+)[, ]+(\d+)[, ]+(\d+)/.exec(text.trim());
  return rgb ? (rgb.slice(1, 4).map(Number) as unknown as Colour) : null;
}

export interface StepNumbers {
  mass: number;
  mean: number | null;
  sd: number | null;
}

/** Mass that is left, and mean and standard deviation of what is left. */
export function stepNumbers(values: readonly number[], x: readonly number[], weights: readonly number[]): StepNumbers {
  let mass = 0;
  let first = 0;
  for (let i = 0; i < x.length; i++) {
    mass += weights[i] * values[i];
    first += weights[i] * values[i] * x[i];
  }
  if (!(mass > 0)) return { mass, mean: null, sd: null };
  const mean = first / mass;
  let second = 0;
  for (let i = 0; i < x.length; i++) second += weights[i] * values[i] * (x[i] - mean) ** 2;
  return { mass, mean, sd: Math.sqrt(Math.max(second / mass, 0)) };
}
