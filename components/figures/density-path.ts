import { area, curveLinear, curveMonotoneX, curveStep, line } from 'd3-shape';

export interface Curve {
  x: number[];
  values: number[];
}

const round = (value: number) => Math.round(value * 10) / 10;

/** Points closer than a few pixels need no rounding between them, and a third of the text. */
function curveFor(places: number[], x: (value: number) => number) {
  const width = places.length > 1 ? x(places[places.length - 1]) - x(places[0]) : 0;
  return width / places.length > 3 ? curveMonotoneX : curveLinear;
}

/** A smooth density through its grid points. */
export function curvePath(curve: Curve, x: (value: number) => number, y: (value: number) => number): string {
  return (
    line<number>()
      .x((_, i) => round(x(curve.x[i])))
      .y((_, i) => round(y(curve.values[i])))
      .curve(curveFor(curve.x, x))(curve.values) ?? ''
  );
}

export function areaPath(curve: Curve, x: (value: number) => number, y: (value: number) => number): string {
  return (
    area<number>()
      .x((_, i) => round(x(curve.x[i])))
      .y0(round(y(0)))
      .y1((_, i) => round(y(curve.values[i])))
      .curve(curveFor(curve.x, x))(curve.values) ?? ''
  );
}

/** A density of cells as steps; cells narrower than a pixel are averaged, which is again a density of cells. */
export function stepPath(
  curve: Curve,
  x: (value: number) => number,
  y: (value: number) => number,
  most: number,
): string {
  const { x: centres, values } = mergedCells(curve, most);
  const half = centres.length > 1 ? (centres[1] - centres[0]) / 2 : 0;
  const points = [
    [centres[0] - half, 0],
    ...centres.map((centre, i) => [centre, values[i]]),
    [(centres.at(-1) ?? 0) + half, 0],
  ];
  return (
    line<number[]>()
      .x(([at]) => round(x(at)))
      .y(([, value]) => round(y(value)))
      .curve(curveStep)(points) ?? ''
  );
}

export function mergedCells(curve: Curve, most: number): Curve {
  const factor = Math.ceil(curve.values.length / most);
  if (factor <= 1) return curve;
  const merged: Curve = { x: [], values: [] };
  for (let first = 0; first < curve.values.length; first += factor) {
    const last = Math.min(first + factor, curve.values.length);
    let x = 0;
    let sum = 0;
    for (let i = first; i < last; i++) {
      x += curve.x[i];
      sum += curve.values[i];
    }
    merged.x.push(x / (last - first));
    merged.values.push(sum / (last - first));
  }
  return merged;
}

/** Index of the point nearest to a place; the points increase. */
export function nearestIndex(x: number[], at: number): number {
  let low = 0;
  let high = x.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (x[middle] <= at) low = middle;
    else high = middle;
  }
  return Math.abs(at - x[low]) <= Math.abs(x[high] - at) ? low : high;
}

/** The density of the cell that holds a place; null outside all cells. */
export function cellValue({ x, values }: Curve, at: number): number | null {
  if (x.length === 0) return null;
  const half = x.length > 1 ? (x[1] - x[0]) / 2 : Number.POSITIVE_INFINITY;
  const nearest = nearestIndex(x, at);
  return Math.abs(at - x[nearest]) <= half * (1 + 1e-9) ? values[nearest] : null;
}
