/** Nodes and weights of a quadrature rule on [-1, 1], nodes increasing. */
export interface Rule {
  readonly nodes: Float64Array;
  readonly weights: Float64Array;
}

const cache = new Map<number, Rule>();

/**
 * Gauss–Legendre rule of `order` points on [-1, 1]: exact for polynomials of degree 2·order − 1.
 *
 * Newton's method on P_n from Tricomi's starting values; rules are kept, so a repeated call costs nothing.
 *
 * @param order 1 to 512
 * @returns nodes increasing and positive weights that sum to 2; both accurate to a few units in the last place
 * @throws RangeError where `order` is not a whole number from 1 to 512
 * @see Abramowitz & Stegun, Handbook of Mathematical Functions, 1964, eq. 25.4.29 (weights 2/((1−x²) P'_n(x)²))
 */
export function gaussLegendre(order: number): Rule {
  if (!Number.isInteger(order) || order < 1 || order > 512)
    throw new RangeError(`order ${order}: allowed are whole numbers from 1 to 512`);
  const known = cache.get(order);
  if (known) return known;
  const nodes = new Float64Array(order);
  const weights = new Float64Array(order);
  for (let i = 0; i < (order + 1) >> 1; i++) {
    let x = order % 2 === 1 && i === (order - 1) / 2 ? 0 : Math.cos((Math.PI * (i + 0.75)) / (order + 0.5));
    let slope = 0;
    for (let pass = 0; pass < 20; pass++) {
      let below = 1;
      let here = x;
      for (let k = 2; k <= order; k++) [below, here] = [here, ((2 * k - 1) * x * here - (k - 1) * below) / k];
      slope = (order * (below - x * here)) / (1 - x * x);
      const change = here / slope;
      x -= change;
      if (Math.abs(change) <= 1e-16) break;
    }
    nodes[order - 1 - i] = x;
    nodes[i] = -x;
    weights[i] = weights[order - 1 - i] = 2 / ((1 - x * x) * slope * slope);
  }
  const rule = { nodes, weights };
  cache.set(order, rule);
  return rule;
}
