/** What the operators need to know of a noise with zero mean, symmetric about it. */
export interface NoiseKind {
  readonly id: 'gaussian';
  readonly title: string;
  /** probability density of sigma·ξ at distance d (units of the variable), per unit */
  density(d: number, sigma: number): number;
  /** probability that sigma·ξ exceeds d, with full relative accuracy for d > 0 however small it is */
  tail(d: number, sigma: number): number;
  /** characteristic function E cos(q·sigma·ξ) at wave number q (radians per unit) */
  transform(q: number, sigma: number): number;
  /** multiples of sigma beyond which the density is below 1e-17 of its peak: round-off of a sum of order one */
  readonly reach: number;
  /** multiples of sigma beyond which the density is below `part` of its peak, 0 < part < 1 */
  reachOf(part: number): number;
  /** multiples of sigma beyond which the density underflows: what direct sums keep for rare events */
  readonly fullReach: number;
}
