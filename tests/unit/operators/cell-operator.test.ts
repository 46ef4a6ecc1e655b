import { describe, expect, it } from 'vitest';
import { CellOperator } from '@/kernels/operators/cell-operator';
import { boundaryOf } from '@/kernels/operators/ends';
import { plainModel } from '../../support/kernel-maps';

const model = (f: (x: number) => number, df: (x: number) => number, breaks: number[] = [], singular: number[] = []) =>
  plainModel(
    (x, out, slope) => {
      for (let i = 0; i < x.length; i++) {
        out[i] = f(x[i]);
        if (slope) slope[i] = df(x[i]);
      }
    },
    breaks,
    singular,
  );
const shares = (operator: CellOperator, j: number) => {
  const unit = new Float64Array(operator.size);
  unit[j] = 1;
  const out = new Float64Array(operator.size);
  operator.apply(unit, out);
  return [...out];
};

describe('cells', () => {
  it('of the doubling map are exact: each cell goes half and half onto the two it covers', () => {
    const operator = new CellOperator(
      model(
        (x) => 2 * x,
        () => 2,
      ),
      boundaryOf(0, 1, 'periodic'),
      8,
    );
    for (let j = 0; j < 8; j++) {
      const expected = new Array(8).fill(0);
      expected[(2 * j) % 8] = expected[(2 * j + 1) % 8] = 0.5;
      expect(shares(operator, j)).toEqual(expected);
    }
    expect(Math.max(...operator.lost)).toBe(0);
  });

  it('of a tent with an uneven number of cells split where it turns', () => {
    const tent = model(
      (x) => 1 - Math.abs(1 - 2 * x),
      (x) => (x < 0.5 ? 2 : -2),
      [0.5],
    );
    const middle = shares(new CellOperator(tent, boundaryOf(0, 1, 'absorbing'), 5), 2);
    expect(middle[4]).toBeCloseTo(1, 12);
    expect(middle[0] + middle[1] + middle[2] + middle[3]).toBeCloseTo(0, 12);
  });

  it('lose what leaves: the tent of slope three loses a third, all of it from the middle', () => {
    const tent = model(
      (x) => 3 * (0.5 - Math.abs(x - 0.5)),
      (x) => (x < 0.5 ? 3 : -3),
      [0.5],
    );
    const operator = new CellOperator(tent, boundaryOf(0, 1, 'absorbing'), 9);
    expect(operator.lost.reduce((s, v) => s + v / 9, 0)).toBeCloseTo(1 / 3, 12);
    expect(operator.lost[4]).toBeCloseTo(1, 12);
    expect(operator.lost[0]).toBe(0);
  });

  it('of a parabola follow its square root: preimages of the cell edges to the last places', () => {
    const operator = new CellOperator(
      model(
        (x) => x * x,
        (x) => 2 * x,
        [],
        [0],
      ),
      boundaryOf(0, 1, 'reflecting'),
      10,
    );
    // cell 9 = [0.9, 1] is mapped onto [0.81, 1]: up to √0.9 into cell 8
    const out = shares(operator, 9);
    expect(out[8]).toBeCloseTo((Math.sqrt(0.9) - 0.9) / 0.1, 13);
    expect(out[9]).toBeCloseTo((1 - Math.sqrt(0.9)) / 0.1, 13);
  });

  it('mirror at reflecting ends and wrap at periodic ones', () => {
    const shift = model(
      (x) => x + 0.75,
      () => 1,
    );
    expect(shares(new CellOperator(shift, boundaryOf(0, 1, 'reflecting'), 4), 3)).toEqual(
      [0, 1, 0, 0].map((v, i) => (i === 1 ? 1 : v)),
    );
    expect(shares(new CellOperator(shift, boundaryOf(0, 1, 'periodic'), 4), 3)).toEqual([0, 0, 1, 0]);
  });

  it('refuse a slope without bound, naming the place', () => {
    const pole = model(
      (x) => 1 / (x - 0.5 + 1e-9),
      () => Number.NaN,
    );
    expect(() => new CellOperator(pole, boundaryOf(0, 1, 'reflecting'), 4)).toThrow(/more than 64 times/);
  });
});
