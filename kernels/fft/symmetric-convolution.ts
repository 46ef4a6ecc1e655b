import FFT from 'fft.js';

/**
 * Circular convolution of real sequences with an even kernel, by one real transform there and one back.
 *
 * A real sequence of length n is packed into n/2 complex numbers, transformed with fft.js, multiplied mode by mode with
 * the kernel's (real) transform and transformed back. The operation is symmetric: it is its own adjoint.
 *
 * Cost: two complex transforms of length n/2. Accuracy: a few units in the last place of the largest entry.
 *
 * @see Press et al., Numerical Recipes, 3rd ed. 2007, §12.3.2 (transform of a single real function)
 */
export class SymmetricConvolution {
  readonly length: number;
  private readonly half: number;
  private readonly fft: FFT;
  private readonly cos: Float64Array;
  private readonly sin: Float64Array;
  private readonly packed: Float64Array;
  private readonly modes: Float64Array;

  /** @param length number of points of the circle, a power of two from 8 up; throws RangeError otherwise */
  constructor(length: number) {
    if (!Number.isInteger(Math.log2(length)) || length < 8)
      throw new RangeError(`length ${length}: allowed are powers of two from 8 up`);
    this.length = length;
    this.half = length / 2;
    this.fft = new FFT(this.half);
    this.cos = new Float64Array(this.half / 2 + 1);
    this.sin = new Float64Array(this.half / 2 + 1);
    for (let k = 0; k <= this.half / 2; k++) {
      this.cos[k] = Math.cos((2 * Math.PI * k) / length);
      this.sin[k] = Math.sin((2 * Math.PI * k) / length);
    }
    this.packed = new Float64Array(length);
    this.modes = new Float64Array(length);
  }

  /**
   * data ← kernel ∗ data, in place.
   *
   * @param data length entries
   * @param multiplier the kernel's transform at modes 0 … length/2 (length/2 + 1 entries)
   */
  apply(data: Float64Array, multiplier: Float64Array): void {
    const { half, cos, sin, packed, modes } = this;
    // fft.js takes and gives interleaved re, im: the real sequence is already packed that way
    this.fft.transform(modes, data);
    const z0 = modes[0];
    const z1 = modes[1];
    const first = (z0 + z1) * multiplier[0];
    const last = (z0 - z1) * multiplier[half];
    packed[0] = 0.5 * (first + last);
    packed[1] = 0.5 * (first - last);
    for (let k = 1; k <= half >> 1; k++) {
      const j = half - k;
      const ar = modes[2 * k];
      const ai = modes[2 * k + 1];
      const br = modes[2 * j];
      const bi = modes[2 * j + 1];
      // even and odd samples' transforms: E = (A + conj B)/2, O = (A − conj B)/(2i)
      const er = 0.5 * (ar + br);
      const ei = 0.5 * (ai - bi);
      const or = 0.5 * (ai + bi);
      const oi = 0.5 * (br - ar);
      const c = cos[k];
      const s = sin[k];
      const tr = c * or + s * oi;
      const ti = c * oi - s * or;
      const m = multiplier[k];
      const w = multiplier[j];
      // X_k = E + T and conj X_{half−k} = E − T, each multiplied by its mode's factor
      const xr = m * (er + tr);
      const xi = m * (ei + ti);
      const yr = w * (er - tr);
      const yi = w * (ei - ti);
      const e2r = 0.5 * (xr + yr);
      const e2i = 0.5 * (xi + yi);
      const t2r = 0.5 * (xr - yr);
      const t2i = 0.5 * (xi - yi);
      const o2r = c * t2r - s * t2i;
      const o2i = c * t2i + s * t2r;
      packed[2 * k] = e2r - o2i;
      packed[2 * k + 1] = e2i + o2r;
      packed[2 * j] = e2r + o2i;
      packed[2 * j + 1] = o2r - e2i;
    }
    this.fft.inverseTransform(data, packed);
  }
}
