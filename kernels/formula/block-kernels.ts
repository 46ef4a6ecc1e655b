import { both, either, modulo, power, UNARY } from './scalar-functions';

/**
 * One operation on a block of n points: out[outAt + i] from v[k][at[k] + i] and the scalars s, i = 0 … n-1. Element by
 * element, so `out` may be one of the arrays read.
 */
export type BlockKernel = (
  n: number,
  out: Float64Array,
  outAt: number,
  v: readonly Float64Array[],
  at: readonly number[],
  s: readonly number[],
) => void;

/** The loop around a function of one argument. Cheap operations have loops of their own below, where they are inlined. */
function map(f: (a: number) => number): BlockKernel {
  return (n, out, o, v, at) => {
    const a = v[0];
    const p = at[0];
    for (let i = 0; i < n; i++) out[o + i] = f(a[p + i]);
  };
}

/** The loop around a function of two arguments. */
function map2(f: (a: number, b: number) => number): BlockKernel {
  return (n, out, o, v, at) => {
    const a = v[0];
    const b = v[1];
    const p = at[0];
    const q = at[1];
    for (let i = 0; i < n; i++) out[o + i] = f(a[p + i], b[q + i]);
  };
}

/** Operations of arithmetic and selection. V is an array, S a scalar; capital letters tell the order of the operands. */
export const BLOCK_KERNELS = {
  fillS: (n, out, o, _v, _at, s) => {
    out.fill(s[0], o, o + n);
  },
  copyV: (n, out, o, v, at) => {
    const a = v[0];
    const p = at[0];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i];
  },
  addVV: (n, out, o, v, at) => {
    const a = v[0];
    const b = v[1];
    const p = at[0];
    const q = at[1];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] + b[q + i];
  },
  addVS: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] + c;
  },
  subVV: (n, out, o, v, at) => {
    const a = v[0];
    const b = v[1];
    const p = at[0];
    const q = at[1];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] - b[q + i];
  },
  subSV: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    for (let i = 0; i < n; i++) out[o + i] = c - a[p + i];
  },
  mulVV: (n, out, o, v, at) => {
    const a = v[0];
    const b = v[1];
    const p = at[0];
    const q = at[1];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] * b[q + i];
  },
  mulVS: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] * c;
  },
  divVV: (n, out, o, v, at) => {
    const a = v[0];
    const b = v[1];
    const p = at[0];
    const q = at[1];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] / b[q + i];
  },
  divVS: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] / c;
  },
  divSV: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    for (let i = 0; i < n; i++) out[o + i] = c / a[p + i];
  },
  /** s0*a + s1*b: the derivative of a product of two linear factors in one pass */
  blendVVSS: (n, out, o, v, at, s) => {
    const a = v[0];
    const b = v[1];
    const p = at[0];
    const q = at[1];
    const c = s[0];
    const d = s[1];
    for (let i = 0; i < n; i++) out[o + i] = c * a[p + i] + d * b[q + i];
  },
  /** (s0*a + s1) * (s2*b + s3): a product of two factors of first degree in one pass */
  mulAffine: (n, out, o, v, at, s) => {
    const a = v[0];
    const b = v[1];
    const p = at[0];
    const q = at[1];
    const [e, f, g, h] = s;
    for (let i = 0; i < n; i++) out[o + i] = (e * a[p + i] + f) * (g * b[q + i] + h);
  },
  /** s4*(s0*a + s1) + s5*(s2*b + s3): its derivative */
  blendAffine: (n, out, o, v, at, s) => {
    const a = v[0];
    const b = v[1];
    const p = at[0];
    const q = at[1];
    const [e, f, g, h, c, d] = s;
    for (let i = 0; i < n; i++) out[o + i] = c * (e * a[p + i] + f) + d * (g * b[q + i] + h);
  },
  squareV: (n, out, o, v, at) => {
    const a = v[0];
    const p = at[0];
    for (let i = 0; i < n; i++) {
      const x = a[p + i];
      out[o + i] = x * x;
    }
  },
  powVS: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    if (c === 2) {
      for (let i = 0; i < n; i++) {
        const x = a[p + i];
        out[o + i] = x * x;
      }
    } else if (c === 3) {
      for (let i = 0; i < n; i++) {
        const x = a[p + i];
        out[o + i] = x * x * x;
      }
    } else for (let i = 0; i < n; i++) out[o + i] = power(a[p + i], c);
  },
  powSV: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    for (let i = 0; i < n; i++) out[o + i] = power(c, a[p + i]);
  },
  powVV: map2(power),
  /** p*a^(p-1), the derivative of a^p; 0 for p = 0 even at a = 0 */
  powSlopeVS: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    if (c === 2) for (let i = 0; i < n; i++) out[o + i] = 2 * a[p + i];
    else if (c === 0) out.fill(0, o, o + n);
    else for (let i = 0; i < n; i++) out[o + i] = c * power(a[p + i], c - 1);
  },
  powSlopeVV: map2((a, b) => (b === 0 ? 0 : b * power(a, b - 1))),
  /** value*log(base), the derivative of base^b by b; 0 where the power is 0 */
  timesLogVV: map2((value, base) => (value === 0 ? 0 : value * Math.log(base))),
  modVS: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    if (c === 1) {
      for (let i = 0; i < n; i++) {
        const x = a[p + i];
        out[o + i] = x - Math.floor(x);
      }
    } else for (let i = 0; i < n; i++) out[o + i] = modulo(a[p + i], c);
  },
  modVV: map2(modulo),
  /** floor(a/b) as the whole number of divisors that mod(a, b) took off */
  wholeVV: map2((a, b) => Math.round((a - modulo(a, b)) / b)),
  minVV: map2(Math.min),
  maxVV: map2(Math.max),
  atan2VV: map2(Math.atan2),
  lessVV: map2((a, b) => (a < b ? 1 : a >= b ? 0 : Number.NaN)),
  lessVS: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] < c ? 1 : a[p + i] >= c ? 0 : Number.NaN;
  },
  atMostVV: map2((a, b) => (a <= b ? 1 : a > b ? 0 : Number.NaN)),
  atMostVS: (n, out, o, v, at, s) => {
    const a = v[0];
    const p = at[0];
    const c = s[0];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] <= c ? 1 : a[p + i] > c ? 0 : Number.NaN;
  },
  equalVV: map2((a, b) => (a === b ? 1 : a < b || a > b ? 0 : Number.NaN)),
  bothVV: map2(both),
  eitherVV: map2(either),
  notV: map((a) => (a === 0 ? 1 : Number.isNaN(a) ? a : 0)),
  /** condition ? a : b, point by point; not-a-number where the condition is */
  chooseVVV: (n, out, o, v, at) => {
    const c = v[0];
    const a = v[1];
    const b = v[2];
    const r = at[0];
    const p = at[1];
    const q = at[2];
    for (let i = 0; i < n; i++) {
      const held = c[r + i];
      out[o + i] = held === 0 ? b[q + i] : Number.isNaN(held) ? held : a[p + i];
    }
  },
  sqrt: (n, out, o, v, at) => {
    const a = v[0];
    const p = at[0];
    for (let i = 0; i < n; i++) out[o + i] = Math.sqrt(a[p + i]);
  },
  abs: (n, out, o, v, at) => {
    const a = v[0];
    const p = at[0];
    for (let i = 0; i < n; i++) out[o + i] = Math.abs(a[p + i]);
  },
  floor: (n, out, o, v, at) => {
    const a = v[0];
    const p = at[0];
    for (let i = 0; i < n; i++) out[o + i] = Math.floor(a[p + i]);
  },
  /** the slope of abs: -1 or 1; at 0 that from above, since 0 would be no slope of either side */
  absSlope: (n, out, o, v, at) => {
    const a = v[0];
    const p = at[0];
    for (let i = 0; i < n; i++) out[o + i] = a[p + i] < 0 ? -1 : 1;
  },
  exp: map(UNARY.exp),
  log: map(UNARY.log),
  log10: map(UNARY.log10),
  cbrt: map(UNARY.cbrt),
  sign: map(UNARY.sign),
  ceil: map(UNARY.ceil),
  round: map(UNARY.round),
  sin: map(UNARY.sin),
  cos: map(UNARY.cos),
  tan: map(UNARY.tan),
  asin: map(UNARY.asin),
  acos: map(UNARY.acos),
  atan: map(UNARY.atan),
  sinh: map(UNARY.sinh),
  cosh: map(UNARY.cosh),
  tanh: map(UNARY.tanh),
  erf: map(UNARY.erf),
  /** 1/sqrt(1 - a^2), the derivative of asin */
  asinSlope: map((a) => 1 / Math.sqrt((1 - a) * (1 + a))),
  /** 1/(1 + a^2), the derivative of atan */
  atanSlope: map((a) => 1 / (1 + a * a)),
  /** 1 + tan^2 from the value of tan */
  tanSlope: map((value) => 1 + value * value),
  /** 1/cosh^2, the derivative of tanh: small where 1 - tanh^2 would be round-off */
  tanhSlope: map((a) => {
    const c = Math.cosh(a);
    return 1 / c / c;
  }),
  /** 2/sqrt(pi) exp(-a^2), the derivative of erf */
  erfSlope: map((a) => (2 / Math.sqrt(Math.PI)) * Math.exp(-a * a)),
} as const satisfies Record<string, BlockKernel>;

export type BlockKernelName = keyof typeof BLOCK_KERNELS;
