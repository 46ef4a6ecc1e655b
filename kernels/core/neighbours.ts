const bits = new DataView(new ArrayBuffer(8));

function shift(x: number, steps: bigint): number {
  bits.setFloat64(0, x);
  bits.setBigInt64(0, bits.getBigInt64(0) + steps);
  return bits.getFloat64(0);
}

/**
 * The next double above x.
 * @param x a finite number
 * @returns the smallest double greater than x; x itself where it is not finite
 */
export function nextUp(x: number): number {
  if (!Number.isFinite(x)) return x;
  if (x === 0) return Number.MIN_VALUE;
  return shift(x, x > 0 ? 1n : -1n);
}

/**
 * The next double below x.
 * @param x a finite number
 * @returns the largest double smaller than x; x itself where it is not finite
 */
export function nextDown(x: number): number {
  return -nextUp(-x);
}
