/**
 * A number as ARIA wants its values: a plain decimal, no exponent. Undefined where that would take more than twenty
 * places, which says no more to a listener than silence does.
 */
export function plainDecimal(value: number): number | string | undefined {
  const text = String(value);
  if (!text.includes('e')) return value;
  return Math.abs(value) < 1 && Math.abs(value) >= 1e-18 ? value.toFixed(20).replace(/0+$/, '') : undefined;
}
