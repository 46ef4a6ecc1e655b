import {
  copyHead,
  prepareSpread,
  readFrom,
  SPREAD_WIDTH,
  type Spread,
  spreadOnto,
  spreadTransform,
  wrapTail,
} from '../fft/spread-kernel';
import { SymmetricConvolution } from '../fft/symmetric-convolution';
import type { Boundary } from './ends';
import type { OperatorPair } from './operator-pair';

/** Grid spacings per sigma that the compact spread needs: 6e-15 of the peak (measured; 4e-12 at 2.4, 3e-9 at 2). */
export const LINE_POINTS_PER_SIGMA = 2.8;

/**
 * What the noisy step of one system shares for all noise levels of a range: the push (stencils of the images), the
 * reading stencils of the nodes, the line they meet on.
 *
 * - `x`, `weights` nodes of the domain and quadrature weights (n)
 * - `images` folded images of the nodes (n)
 * - `extent` lowest and highest image of any position of the domain, folded
 * - `smallest`, `largest` the range of sigma served, 0 < smallest ≤ largest
 * - `reach` multiples of sigma beyond which noise counts as zero
 *
 * Periodic ends meet on a circle of the domain's length, two reflecting ends on one of twice the length, others on a
 * line padded by the noise's reach. Cost to build: one exponential per stencil weight, 30·n.
 */
export class Push {
  readonly x: Float64Array;
  readonly weights: Float64Array;
  readonly convolution: SymmetricConvolution;
  readonly transform: Float64Array;
  readonly spacing: number;
  /** distance beyond an absorbing end from which noise brings nothing back */
  readonly farthest: number;
  /** position of point 0 of the line */
  readonly anchor: number;
  readonly mirrored: boolean;
  readonly sources: Spread;
  readonly targets: Spread;
  readonly smallest: number;
  readonly largest: number;

  constructor(
    x: Float64Array,
    weights: Float64Array,
    images: Float64Array,
    extent: readonly [number, number],
    boundary: Boundary,
    smallest: number,
    largest: number,
    reach: number,
  ) {
    this.x = x;
    this.weights = weights;
    this.smallest = smallest;
    this.largest = largest;
    const { from, to, periodic, low, high } = boundary;
    const length = to - from;
    const far = reach * largest;
    this.farthest = periodic || (low === 'reflecting' && high === 'reflecting') ? Number.POSITIVE_INFINITY : far;
    const finest = smallest / LINE_POINTS_PER_SIGMA;
    let circle = periodic ? length : 2 * length;
    let anchor = from;
    const placed = Float64Array.from(images);
    this.mirrored = !periodic && (low === 'reflecting' || high === 'reflecting');
    if (!periodic && (low === 'absorbing' || high === 'absorbing')) {
      for (let i = 0; i < placed.length; i++)
        if (placed[i] < from - far || placed[i] > to + far) placed[i] = Number.NaN;
      const lowest = Math.min(from, Math.max(from - far, extent[0]));
      const highest = Math.max(to, Math.min(to + far, extent[1]));
      if (this.mirrored) circle = 2 * length + 2 * far;
      else circle = Math.max(highest - from, to - lowest) + far;
      if (high === 'reflecting') anchor = to;
    }
    this.anchor = anchor;
    const least = Math.max(32, circle / finest);
    const points = 2 ** Math.ceil(Math.log2(least));
    // a circle of given length is cut into `points`; a padded line may as well be as fine as the points allow
    this.spacing = circle / points;
    this.convolution = new SymmetricConvolution(points);
    this.transform = spreadTransform(points);
    this.sources = prepareSpread(
      placed.map((y) => (y - anchor) / this.spacing),
      points,
    );
    this.targets = prepareSpread(
      x.map((y) => (y - anchor) / this.spacing),
      points,
    );
  }
}

/**
 * The noisy step by a compact spread and one FFT: masses are spread from their images onto an even line, convolved with
 * the noise, folded back by the ends and read at the nodes.
 *
 * Same sums as `DirectOperator` to about 1e-14 of the largest value; relative accuracy of small values is not kept.
 * Cost: 2·15·n multiplications and two complex transforms of half the line's points.
 *
 * @see A. H. Barnett et al., SIAM J. Sci. Comput. 41, 2019, C479 (type 1 and type 2 transforms, here back to back)
 */
export class SpreadOperator implements OperatorPair {
  readonly size: number;
  readonly weights: Float64Array;
  private readonly push: Push;
  private readonly multiplier: Float64Array;
  private readonly line: Float64Array;
  private readonly circle: Float64Array;
  private readonly mass: Float64Array;

  /**
   * @param push shared part
   * @param transform the noise's characteristic function at wave number q (radians per unit)
   */
  constructor(push: Push, transform: (q: number) => number) {
    this.push = push;
    this.size = push.x.length;
    this.weights = push.weights;
    const points = push.convolution.length;
    const step = (2 * Math.PI) / (points * push.spacing);
    this.multiplier = push.transform.map((t, k) => {
      const g = transform(k * step);
      return g < 1e-30 ? 0 : g / (t * t * push.spacing);
    });
    this.line = new Float64Array(points + SPREAD_WIDTH);
    this.circle = this.line.subarray(0, points);
    this.mass = new Float64Array(this.size);
  }

  apply(rho: Float64Array, out: Float64Array): void {
    this.carry(this.push.sources, rho, this.push.targets, out);
  }

  applyAdjoint(observable: Float64Array, out: Float64Array): void {
    this.carry(this.push.targets, observable, this.push.sources, out);
  }

  /** out_i ← the density one step later at any prepared positions (`NoisyPlan.targetsAt`): interpolation without error of its own. */
  read(rho: Float64Array, targets: Spread, out: Float64Array): void {
    this.carry(this.push.sources, rho, targets, out);
  }

  /** out ← the density at prepared positions after point masses at any prepared images were blurred. */
  launch(images: Spread, mass: Float64Array, targets: Spread, out: Float64Array): void {
    this.blur(images, mass);
    readFrom(targets, this.line, out);
  }

  /** out_i ← the observable's expectation after the noise, from any prepared images. */
  expect(observable: Float64Array, images: Spread, out: Float64Array): void {
    this.carry(this.push.targets, observable, images, out);
  }

  private carry(from: Spread, values: Float64Array, to: Spread, out: Float64Array): void {
    const { mass, weights } = this;
    for (let i = 0; i < mass.length; i++) mass[i] = values[i] * weights[i];
    this.blur(from, mass);
    readFrom(to, this.line, out);
  }

  /** Spreads masses onto the line, convolves with the noise and folds by the ends. */
  private blur(from: Spread, mass: Float64Array): void {
    const { line, circle, push } = this;
    const points = push.convolution.length;
    line.fill(0);
    spreadOnto(from, mass, line);
    wrapTail(line, points);
    push.convolution.apply(circle, this.multiplier);
    if (push.mirrored) mirror(circle);
    copyHead(line, points);
  }
}

/** c[j] ← c[j] + c[−j] on a circle: adds what a reflecting end at point 0 folds back. Symmetric, so its own adjoint. */
function mirror(circle: Float64Array): void {
  const n = circle.length;
  circle[0] *= 2;
  circle[n / 2] *= 2;
  for (let j = 1; j < n / 2; j++) {
    const both = circle[j] + circle[n - j];
    circle[j] = both;
    circle[n - j] = both;
  }
}
