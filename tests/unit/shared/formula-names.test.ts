import { expect, it } from 'vitest';
import { formulaNames } from '@/lib/shared/formula-names';

it.each([
  ['r*x*(1-x)', ['r']],
  ['a*sin(2*pi*x) + b', ['a', 'b']],
  ['x < c ? a*x : a*(1-x)', ['c', 'a']],
  ['exp (x) + e + 1e5*x + 2e-3', []],
  ['mod(x + omega, 1) and not x', ['omega']],
  ['', []],
])('the parameters of %s are %j', (formula, names) => {
  expect(formulaNames(formula, 'x')).toEqual(names);
});
