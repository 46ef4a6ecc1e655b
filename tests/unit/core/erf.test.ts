import { describe, expect, it } from 'vitest';
import { erf, erfc, erfcx } from '@/kernels/core/erf';

/** x, erf(x), erfc(x): 40-digit arithmetic (mpmath 1.3 or later), rounded to the nearest double. */
const VALUES = [
  [1e-300, 1.1283791670955126e-300, 1],
  [1e-20, 1.1283791670955125e-20, 1],
  [1e-8, 1.1283791670955126e-8, 0.9999999887162083],
  [0.001, 0.0011283787909692365, 0.9988716212090307],
  [0.1, 0.1124629160182849, 0.887537083981715],
  [0.25, 0.27632639016823696, 0.7236736098317631],
  [0.4999999, 0.5204997899347843, 0.47950021006521576],
  [0.5, 0.5204998778130465, 0.4795001221869535],
  [0.6, 0.6038560908479259, 0.3961439091520741],
  [0.7, 0.6778011938374184, 0.32219880616258156],
  [0.9, 0.7969082124228322, 0.20309178757716786],
  [1, 0.8427007929497149, 0.15729920705028513],
  [1.1, 0.8802050695740817, 0.11979493042591827],
  [1.3, 0.9340079449406524, 0.06599205505934755],
  [1.7, 0.9837904585907745, 0.01620954140922544],
  [2, 0.9953222650189527, 0.004677734981047266],
  [2.3, 0.9988568234026434, 0.0011431765973566525],
  [2.7, 0.9998656672600594, 0.0001343327399405242],
  [3, 0.9999779095030014, 2.209049699858544e-5],
  [3.7, 0.9999998328489421, 1.6715105790914599e-7],
  [4, 0.9999999845827421, 1.541725790028002e-8],
  [5, 0.9999999999984626, 1.537459794428035e-12],
  [5.9, 0.9999999999999999, 7.190409783550478e-17],
  [6.1, 1, 6.3146021501937184e-18],
  [7, 1, 4.183825607779414e-23],
  [8, 1, 1.1224297172982926e-29],
  [8.9, 1, 2.5053574980338356e-36],
  [9, 1, 4.13703174651381e-37],
  [9.1, 1, 6.696900427988608e-38],
  [10, 1, 2.088487583762545e-45],
  [13, 1, 1.7395573154667246e-75],
  [17, 1, 1.0212280150942608e-127],
  [20, 1, 5.395865611607901e-176],
  [24, 1, 1.6489825831519335e-252],
  [26, 1, 5.663192408856143e-296],
  [26.2, 1, 1.643250792438946e-300],
  [-0.3, -0.3286267594591274, 1.3286267594591274],
  [-0.5, -0.5204998778130465, 1.5204998778130465],
  [-1, -0.8427007929497149, 1.8427007929497148],
  [-3, -0.9999779095030014, 1.9999779095030015],
  [-7, -1, 2],
] as const;

const relative = (value: number, expected: number) => Math.abs(value / expected - 1);

describe('the error function', () => {
  it.each(VALUES)('at %d keeps its digits, and so does its complement', (x, value, complement) => {
    expect(relative(erf(x), value)).toBeLessThan(4.5e-16);
    expect(relative(erfc(x), complement)).toBeLessThan(1e-15);
  });

  // Abramowitz & Stegun 1964, table 7.1 (from memory)
  it.each([
    [0.5, 0.5204998778],
    [1, 0.8427007929],
    [1.5, 0.9661051465],
    [2, 0.995322265],
  ])('at %d is that of the handbook', (x, value) => {
    expect(erf(x)).toBeCloseTo(value, 9);
  });

  it('is odd, and its complement the difference from 1', () => {
    for (let x = 0; x < 6; x += 0.0137) {
      expect(erf(-x)).toBe(-erf(x));
      expect(Math.abs(erf(x) + erfc(x) - 1)).toBeLessThan(3e-16);
      expect(Math.abs(erfc(-x) - 2 + erfc(x))).toBeLessThan(5e-16);
    }
  });

  it('has no seam where its expansions meet', () => {
    for (const seam of [0.5, 0.625, 0.875, 1.125, 8.875, 9, 6]) {
      for (const f of [erf, erfc, erfcx]) {
        const [below, above] = [f(seam * (1 - 2e-16)), f(seam * (1 + 2e-16))];
        // A change of x by some 5e-16 changes erfc by 2 x^2 times that.
        expect(relative(below, above)).toBeLessThan(1e-15 + 7e-16 * 2 * seam * seam);
      }
    }
  });

  it('scaled: erfcx(x) = exp(x^2) erfc(x), 1/(x sqrt(pi)) far out', () => {
    for (const x of [0, 0.2, 1, 3, 5]) expect(relative(erfcx(x), Math.exp(x * x) * erfc(x))).toBeLessThan(5e-15);
    expect(relative(erfcx(1e10), 1 / (1e10 * Math.sqrt(Math.PI)))).toBeLessThan(4e-16);
    expect(erfcx(-1)).toBeNaN();
  });

  it('at the far ends', () => {
    expect([erf(0), erf(Infinity), erf(-Infinity), erfc(Infinity), erfc(-Infinity)]).toEqual([0, 1, -1, 0, 2]);
    expect([erf(Number.NaN), erfc(Number.NaN)]).toEqual([Number.NaN, Number.NaN]);
    expect(Object.is(erf(-0), -0)).toBe(true);
  });
});
