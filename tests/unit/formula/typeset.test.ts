import { describe, expect, it } from 'vitest';
import { parseFormula } from '@/kernels/formula/parse-formula';
import { toTex } from '@/kernels/formula/to-tex';
import { toText } from '@/kernels/formula/to-text';
import { type Typeset, typeset } from '@/kernels/formula/typeset';

const scope = { variables: ['x'], parameters: ['r', 'K', 'Omega', 'a_1', 'rate_in', 'gain'] };
const read = (text: string) => parseFormula(text, scope);

describe('canonical text has no bracket that is not needed', () => {
  it.each([
    ['((r)*x)*(1-(x))', 'r*x*(1 - x)'],
    ['x-(1-x)', 'x - (1 - x)'],
    ['(x-1)-x', 'x - 1 - x'],
    ['x/(2*x)', 'x/(2*x)'],
    ['(-x)^2', '(-x)^2'],
    ['-(x^2)', '-x^2'],
    ['2^(3^2)', '2^3^2'],
    ['(2^3)^2', '(2^3)^2'],
    ['2*-x', '2*(-x)'],
    ['1e-7*x', '1e-7*x'],
    ['((x<1)and(x>0))or(r>1)', 'x < 1 and x > 0 or r > 1'],
    ['x<1and(x>0or r>1)', 'x < 1 and (x > 0 or r > 1)'],
    ['not(x<1)', 'not x < 1'],
    ['(x<1)?2:((x<2)?3:4)', 'x < 1 ? 2 : x < 2 ? 3 : 4'],
    ['min( x ,r)', 'min(x, r)'],
  ])('%s is written %s', (text, canonical) => {
    expect(toText(read(text))).toBe(canonical);
    expect(read(canonical)).toEqual(read(text));
  });
});

describe('TeX', () => {
  it.each([
    ['r*x*(1 - x)', 'r\\,x\\,\\left(1 - x\\right)'],
    ['x/(1 + x^2)', '\\frac{x}{1 + {x}^{2}}'],
    ['sqrt(x)', '\\sqrt{x}'],
    ['cbrt(x)', '\\sqrt[3]{x}'],
    ['abs(x)', '\\left|x\\right|'],
    ['floor(x)', '\\left\\lfloor x\\right\\rfloor '],
    ['log(x)', '\\operatorname{ln}\\left(x\\right)'],
    ['log10(x)', '\\operatorname{log}_{10}\\left(x\\right)'],
    ['a_1', 'a_{1}'],
    ['gain', '\\mathit{gain}'],
    ['2*3', '2 \\cdot  3'],
    ['1.5e-7', '1.5 \\cdot  {10}^{-7}'],
    ['-(-x)', '-\\left(-x\\right)'],
    ['mod(x, 1)', 'x \\mathbin{\\mathrm{mod}} 1'],
    ['x <= 1 ? 0 : x', '\\begin{cases} 0 & \\text{if } x \\le  1 \\\\ x & \\text{otherwise} \\end{cases}'],
  ])('of %s', (text, tex) => {
    expect(toTex(read(text))).toBe(tex);
  });
});

describe('layout', () => {
  const find = (node: Typeset, kind: Typeset['kind']): Typeset[] => {
    const inner = Object.values(node).flatMap((part) => (Array.isArray(part) ? part : [part]));
    const nested = inner.flatMap((part) =>
      part !== null && typeof part === 'object'
        ? 'kind' in part
          ? [part as Typeset]
          : (Object.values(part) as Typeset[])
        : [],
    );
    return [
      ...(node.kind === kind ? [node] : []),
      ...nested.filter((part) => part !== null).flatMap((part) => find(part, kind)),
    ];
  };

  it('marks every parameter as a place of its own, by name and symbol', () => {
    expect(find(typeset(read('x + Omega - K/(2*pi)*sin(2*pi*x)')), 'slot')).toEqual([
      { kind: 'slot', parameter: 'Omega', text: 'Ω', lowered: null },
      { kind: 'slot', parameter: 'K', text: 'K', lowered: null },
    ]);
    expect(find(typeset(read('rate_in*a_1')), 'slot')).toEqual([
      { kind: 'slot', parameter: 'rate_in', text: 'rate', lowered: 'in' },
      { kind: 'slot', parameter: 'a_1', text: 'a', lowered: '1' },
    ]);
  });

  it('puts a chain of choices into lines', () => {
    const [cases] = find(typeset(read('x < 1 ? 2 : x < 2 ? 3 : 4')), 'cases');
    expect(cases.kind === 'cases' && cases.lines.map(({ condition }) => condition === null)).toEqual([
      false,
      false,
      true,
    ]);
  });
});
