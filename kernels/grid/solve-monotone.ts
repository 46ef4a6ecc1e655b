import { type Checkpoint, neverStop } from '../core/checkpoint';

/**
 * Solves F(x) = target for many brackets at once, F monotone inside each.
 *
 * Newton's method kept inside the bracket, with bisection where a step would leave it or gains too little; all brackets
 * advance together, so that F is evaluated in blocks. Accurate to a few units in the last place of x.
 *
 * @param evaluate out ← F(x), slope ← F'(x), entry by entry
 * @param low lower ends of the brackets; high upper ends (count entries each, low ≤ high)
 * @param atLow F at the lower ends, so that the direction is known
 * @param target wanted values, between F(low) and F(high)
 * @returns solutions, one a bracket
 * @see Press et al., Numerical Recipes, 3rd ed. 2007, §9.4 (safe Newton)
 */
export function solveMonotone(
  evaluate: (x: Float64Array, out: Float64Array, slope: Float64Array) => void,
  low: Float64Array,
  high: Float64Array,
  atLow: Float64Array,
  target: Float64Array,
  checkpoint: Checkpoint = neverStop,
): Float64Array {
  const solution = new Float64Array(low.length);
  let active = Int32Array.from(low, (_, i) => i);
  const lo = Float64Array.from(low);
  const hi = Float64Array.from(high);
  const x = low.map((v, i) => v + (high[i] - v) / 2);
  for (let pass = 0; pass < 70 && active.length > 0; pass++) {
    const at = new Float64Array(active.length);
    const value = new Float64Array(active.length);
    const slope = new Float64Array(active.length);
    for (let k = 0; k < active.length; k++) at[k] = x[active[k]];
    evaluate(at, value, slope);
    let left = 0;
    for (let k = 0; k < active.length; k++) {
      const i = active[k];
      const miss = value[k] - target[i];
      const rising = atLow[i] < target[i];
      if (miss === 0) {
        solution[i] = at[k];
        continue;
      }
      if (miss < 0 === rising) lo[i] = at[k];
      else hi[i] = at[k];
      let next = at[k] - miss / slope[k];
      if (!(next > lo[i] && next < hi[i])) next = lo[i] + (hi[i] - lo[i]) / 2;
      const scale = Math.max(Math.abs(lo[i]), Math.abs(hi[i]), 1e-300);
      if (hi[i] - lo[i] <= 4e-16 * scale || Math.abs(next - at[k]) <= 1e-16 * scale) {
        solution[i] = next;
        continue;
      }
      x[i] = next;
      active[left++] = i;
    }
    active = active.subarray(0, left);
    checkpoint(low.length - left, low.length);
  }
  for (const i of active) solution[i] = x[i];
  return solution;
}
