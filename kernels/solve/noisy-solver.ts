import seedrandom from 'seedrandom';
import { type Checkpoint, neverStop } from '../core/checkpoint';
import { type ExitSolution, rateBySweeps, solveExit } from '../exits/exit-solution';
import { prepareSpread, type Spread } from '../fft/spread-kernel';
import type { StartSources } from '../grid/start-sources';
import { exitProbability, foldImage, loses } from '../operators/ends';
import type { NoisyPlan } from '../operators/noisy-plan';
import { type ArnoldiResult, arnoldi } from '../spectrum/arnoldi';

/** Residual at which eigenpairs count as found: a few units of round-off of an operator of norm one. */
const RESIDUAL = 2e-14;

/** One noisy map on one grid at one noise level; each number is computed when first asked for. */
export class NoisySolver {
  readonly plan: NoisyPlan;
  readonly sigma: number;
  readonly operator;
  private readonly checkpoint: Checkpoint;
  private pairs: ArnoldiResult | null = null;
  private left: Float64Array | null = null;
  private solved: ExitSolution | null = null;

  constructor(plan: NoisyPlan, sigma: number, checkpoint: Checkpoint = neverStop) {
    this.plan = plan;
    this.sigma = sigma;
    this.checkpoint = checkpoint;
    this.operator = plan.spreadOperator(sigma);
  }

  get weights(): Float64Array {
    return this.plan.grid.weights;
  }

  /** Leading eigenpairs, at least `count` of them (a nilpotent operator may have fewer). */
  spectrum(count: number): ArnoldiResult {
    const wanted = Math.max(2, count);
    if (!this.pairs || this.pairs.pairs.length < wanted) {
      this.pairs = arnoldi((v, out) => this.operator.apply(v, out), this.weights, {
        count: wanted,
        tolerance: RESIDUAL,
        start: seededStart(this.weights.length),
        checkpoint: this.checkpoint,
      });
    }
    return this.pairs;
  }

  /** First eigenfunction, integral 1: stationary, or quasi-stationary where mass is lost. */
  stationary(): Float64Array {
    const { vector } = this.spectrum(2).pairs[0];
    const total = this.integral(vector);
    return vector.map((v) => v / total);
  }

  /** First eigenvalue: what one step leaves of the (quasi-)stationary density. */
  kept(): number {
    return this.spectrum(2).pairs[0].re;
  }

  /** First eigenfunction of the adjoint, scaled to ⟨h, ρ⟩ = 1: relative chance of staying for long, from each node. */
  survivors(): Float64Array {
    if (!this.left) {
      const found = arnoldi((v, out) => this.operator.applyAdjoint(v, out), this.weights, {
        count: 1,
        tolerance: RESIDUAL,
        start: new Float64Array(this.weights.length).fill(1),
        checkpoint: this.checkpoint,
      });
      const h = found.pairs[0].vector;
      const scale = this.product(h, this.stationary());
      this.left = h.map((v) => v / scale);
    }
    return this.left;
  }

  /** Probability of leaving in one step from each node. */
  leaveProbability(): Float64Array {
    const { plan, sigma } = this;
    return plan.images.map((y) =>
      Number.isNaN(y) ? 1 : exitProbability(plan.boundary, y, (d) => plan.noise.tail(d, sigma)),
    );
  }

  get loses(): boolean {
    return loses(this.plan.boundary);
  }

  /** Exits by positive sums; throws RangeError where nothing can leave. */
  exit(): ExitSolution {
    if (!this.solved) {
      const { pairs } = this.spectrum(2);
      const modulus = (k: number) => (pairs[k] ? Math.hypot(pairs[k].re, pairs[k].im) : 0);
      this.solved = solveExit(
        this.positiveOperator(),
        this.leaveProbability(),
        this.stationary(),
        Math.min(1, modulus(1) / modulus(0)),
        this.checkpoint,
      );
    }
    return this.solved;
  }

  /** Probability of leaving per step to a relative tolerance, without the field of times: what a noise rail needs. */
  leavingPerStep(tolerance: number): number {
    const leave = this.leaveProbability();
    if (!leave.some((p) => p > 0)) return 0; // rarer than numbers reach
    return rateBySweeps(this.positiveOperator(), leave, this.stationary(), tolerance, this.checkpoint).perStep;
  }

  /** What surely leaves per step: from where the density stands well above round-off. A lower bound of the rate; 0 to 1. */
  sureRate(): number {
    const rho = this.stationary();
    const leave = this.leaveProbability();
    const sure = 1e-10 * rho.reduce((m, v) => Math.max(m, v), 0);
    let rate = 0;
    for (let i = 0; i < rho.length; i++) if (rho[i] > sure) rate += this.weights[i] * rho[i] * leave[i];
    return Math.min(1, rate);
  }

  /**
   * The direct operator with a band wide enough for its exits: entries below 1e-16 of the rate add nothing to it. Where
   * nothing surely leaves, the band is as wide as the noise's density reaches.
   */
  private positiveOperator() {
    const { noise } = this.plan;
    const rate = this.sureRate();
    const multiples = rate > 1e-280 ? Math.min(noise.fullReach, noise.reachOf(1e-16 * rate)) : noise.fullReach;
    return this.plan.directOperator(this.sigma, multiples, this.checkpoint);
  }

  /** Density one step after point masses, on the nodes or at other prepared positions. */
  launch(start: StartSources, targets: Spread = this.plan.push.targets): Float64Array {
    const { plan } = this;
    const out = new Float64Array(targets.count);
    const part = new Float64Array(out.length);
    const BLOCK = 65_536; // bounds the memory of the stencils for large samples
    for (let from = 0; from < start.x.length; from += BLOCK) {
      const x = start.x.subarray(from, from + BLOCK);
      const images = new Float64Array(x.length);
      plan.model.evaluate(x, images);
      const { anchor, spacing, convolution, farthest } = plan.push;
      const places = images.map((y) => {
        const folded = foldImage(plan.boundary, y);
        return Math.max(plan.boundary.from - folded, folded - plan.boundary.to) > farthest
          ? Number.NaN
          : (folded - anchor) / spacing;
      });
      this.operator.launch(
        prepareSpread(places, convolution.length),
        start.mass.subarray(from, from + BLOCK),
        targets,
        part,
      );
      for (let i = 0; i < out.length; i++) out[i] += part[i];
    }
    return out;
  }

  /** ∫ ln|F'| f dx for the density one step after `rho`, divided by `norm`. */
  meanStretch(rho: Float64Array, norm: number): number {
    const { targets, weights } = this.plan.stretch();
    const values = new Float64Array(weights.length);
    this.operator.read(rho, targets, values);
    let sum = 0;
    for (let i = 0; i < weights.length; i++) sum += weights[i] * values[i];
    return sum / norm;
  }

  /** ∫ ln|F'| ρ h dx with ρ and h continued between the nodes by the operator itself; 1 where ⟨ρ, h⟩ = 1. */
  survivorStretch(): number {
    const { targets, weights } = this.plan.stretch();
    const rho = new Float64Array(weights.length);
    this.operator.read(this.stationary(), targets, rho);
    const h = this.observableAt(this.survivors());
    const kept = this.kept();
    let sum = 0;
    for (let i = 0; i < weights.length; i++) sum += weights[i] * rho[i] * h[i];
    return sum / (kept * kept);
  }

  /** The observable one step later at the nodes of the stretch quadrature. */
  private observableAt(h: Float64Array): Float64Array {
    const { plan } = this;
    const { x } = plan.stretch();
    const images = new Float64Array(x.length);
    plan.model.evaluate(x, images);
    const { anchor, spacing, convolution } = plan.push;
    const out = new Float64Array(x.length);
    this.operator.expect(
      h,
      prepareSpread(
        images.map((y) => (foldImage(plan.boundary, y) - anchor) / spacing),
        convolution.length,
      ),
      out,
    );
    return out;
  }

  integral(f: Float64Array): number {
    let sum = 0;
    for (let i = 0; i < f.length; i++) sum += f[i] * this.weights[i];
    return sum;
  }

  product(f: Float64Array, g: Float64Array): number {
    let sum = 0;
    for (let i = 0; i < f.length; i++) sum += f[i] * g[i] * this.weights[i];
    return sum;
  }
}

/** A start vector with a part along every eigenfunction: one plus seeded noise, the same on every run. */
export function seededStart(n: number): Float64Array {
  const random = seedrandom('krylov');
  return Float64Array.from({ length: n }, () => 0.5 + random());
}
