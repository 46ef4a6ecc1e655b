/**
 * A place where a function changes sign, to the last bit: interpolation kept within the reach of halving (the ITP method:
 * I. F. D. Oliveira & R. H. C. Takahashi, ACM Trans. Math. Softw. 47, 2020, art. 5; from memory), then halving.
 * @param f the function; continuous or not
 * @param low lower end
 * @param high upper end; f has another sign there than at `low`, or is 0 at one of them
 * @returns of the last two neighbours with different signs the one where |f| is smaller, or a place where f is 0.
 *   Cost: about 12 calls where f is smooth, never more than 60, or 200 close to 0.
 */
export function bisect(f: (x: number) => number, low: number, high: number): number {
  let atLow = f(low);
  let atHigh = f(high);
  if (atLow === 0) return low;
  if (atHigh === 0) return high;
  const end = Math.max(Math.abs(low), Math.abs(high)) * 1.2e-16;
  const pull = 0.2 / (high - low);
  let reach = end * 2 ** (Math.ceil(Math.log2((high - low) / (2 * end))) + 1);
  for (let i = 0; i < 200; i++) {
    const half = (high - low) / 2;
    let middle = low + half;
    if (low < 0 && high > 0) {
      // 0 is a double like no other: closing in on it by halves would take a thousand steps.
      middle = 0;
    } else if (half > end) {
      const guess = (atHigh * low - atLow * high) / (atHigh - atLow);
      const side = Math.sign(middle - guess);
      const near = pull * (high - low) * (high - low);
      const truncated = near <= Math.abs(middle - guess) ? guess + side * near : middle;
      const allowed = reach - half;
      const projected = Math.abs(truncated - middle) <= allowed ? truncated : middle - side * allowed;
      if (projected > low && projected < high) middle = projected;
    }
    reach /= 2;
    if (middle <= low || middle >= high) break;
    const value = f(middle);
    if (value === 0) return middle;
    if (value < 0 === atLow < 0) {
      low = middle;
      atLow = value;
    } else {
      high = middle;
      atHigh = value;
    }
  }
  return Math.abs(atLow) <= Math.abs(atHigh) ? low : high;
}
