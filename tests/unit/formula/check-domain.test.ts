import { expect, it } from 'vitest';
import { checkDomain } from '@/kernels/formula/check-domain';
import { parseFormula } from '@/kernels/formula/parse-formula';

const scope = { variables: ['x'], parameters: ['r'] };
const check = (text: string, from: number, to: number) => checkDomain(parseFormula(text, scope), scope, [2], from, to);

it.each([
  ['r*x*(1 - x)', 0, 1],
  ['1/x', -1, 1],
  ['mod(1/x, 1)', 0, 1],
  ['1/(x - 0.3)', 0, 1],
  ['sin(x)/x', -1, 1],
  ['log(abs(x))', -1, 1],
  ['sqrt(x)', 0, 1],
  ['x > 0 ? log(x) : 0', -1, 1],
  ['tan(x)', -10, 10],
  ['asin(x)', -1, 1],
])('%s is a number on %d to %d, single places aside', (text, from, to) => {
  expect(check(text, from, to)).toBeNull();
});

it.each([
  ['log(x)', -1, 1, -1, 0, 'the formula is not a number'],
  ['sqrt(x - 0.5)', 0, 1, 0, 0.5, 'the formula is not a number'],
  ['asin(2*x)', 0, 1, 0.5, 1, 'the formula is not a number'],
  ['x^0.5', -1, 1, -1, 0, 'the formula is not a number'],
  ['sqrt((x - 0.5)^2 - 1e-10)', 0, 1, 0.49999, 0.50001, 'the formula is not a number'],
  ['1/0', 0, 1, 0, 1, 'the formula is infinite'],
  ['0/0 + x', 0, 1, 0, 1, 'the formula is not a number'],
  ['exp(1000*x)', 0, 1, 0.7097827128933841, 1, 'the formula is infinite'],
  ['9^9^9^9*x', 0, 1, 0, 1, 'the formula is infinite'],
])('%s on %d to %d: not on %d to %d', (text, from, to, low, high, reason) => {
  const fault = check(text, from, to);
  expect(fault?.reason).toBe(reason);
  expect(fault?.from).toBeCloseTo(low, 9);
  expect(fault?.to).toBeCloseTo(high, 9);
});
