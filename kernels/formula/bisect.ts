/**
 * A place where a function changes sign, to the last bit.
 * @param f the function; continuous or not
 * @param low lower end
 * @param high upper end; f has another sign there than at `low`, or is 0 at one of them
 * @returns of the last two neighbours with different signs the one where |f| is smaller, or a place where f is 0.
 *   Cost: about 55 calls, one per bit, and no more than 200 close to 0.
 */
export function bisect(f: (x: number) => number, low: number, high: number): number {
  let atLow = f(low);
  let atHigh = f(high);
  if (atLow === 0) return low;
  if (atHigh === 0) return high;
  for (let i = 0; i < 200; i++) {
    // 0 is a double like no other: closing in on it by halves would take a thousand steps.
    const middle = low < 0 && high > 0 ? 0 : low + (high - low) / 2;
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
