import type { FormulaTree } from './formula-tree';
import { type Typeset, typeset } from './typeset';

const TEX = new Map(
  Object.entries({
    α: '\\alpha ',
    β: '\\beta ',
    γ: '\\gamma ',
    δ: '\\delta ',
    ε: '\\varepsilon ',
    ζ: '\\zeta ',
    η: '\\eta ',
    θ: '\\theta ',
    κ: '\\kappa ',
    λ: '\\lambda ',
    μ: '\\mu ',
    ν: '\\nu ',
    ξ: '\\xi ',
    π: '\\pi ',
    ρ: '\\rho ',
    σ: '\\sigma ',
    τ: '\\tau ',
    φ: '\\varphi ',
    χ: '\\chi ',
    ψ: '\\psi ',
    ω: '\\omega ',
    Γ: '\\Gamma ',
    Δ: '\\Delta ',
    Θ: '\\Theta ',
    Λ: '\\Lambda ',
    Σ: '\\Sigma ',
    Φ: '\\Phi ',
    Ψ: '\\Psi ',
    Ω: '\\Omega ',
    '≤': '\\le ',
    '≥': '\\ge ',
    '≠': '\\ne ',
    '·': '\\cdot ',
    '−': '-',
  }),
);

const FENCES = {
  round: ['\\left(', '\\right)'],
  bars: ['\\left|', '\\right|'],
  floor: ['\\left\\lfloor ', '\\right\\rfloor '],
  ceil: ['\\left\\lceil ', '\\right\\rceil '],
} as const;

/**
 * A formula in TeX's mathematical notation, for papers and reports.
 * @param tree a formula
 * @returns TeX for mathematical mode, with `cases` (amsmath) where the formula has a choice. Cost: linear.
 */
export function toTex(tree: FormulaTree): string {
  return write(typeset(tree));
}

function write(node: Typeset): string {
  switch (node.kind) {
    case 'row':
      return node.items.map(write).join('');
    case 'number':
      return node.text.replace('−', '-');
    case 'name':
    case 'slot':
      return `${letters(node.text)}${node.lowered === null ? '' : `_{${letters(node.lowered)}}`}`;
    case 'operator':
      return node.text === ',' ? ',' : ` ${TEX.get(node.text) ?? node.text} `;
    case 'sign':
      return '-';
    case 'function':
      return `\\operatorname{${node.text}}${node.lowered === null ? '' : `_{${node.lowered}}`}`;
    case 'word':
      return ` \\mathbin{\\mathrm{${node.text}}} `;
    case 'gap':
      return '\\,';
    case 'fraction':
      return `\\frac{${write(node.top)}}{${write(node.bottom)}}`;
    case 'power':
      return `{${write(node.base)}}^{${write(node.exponent)}}`;
    case 'root':
      return `\\sqrt${node.degree === null ? '' : `[${node.degree}]`}{${write(node.inside)}}`;
    case 'brackets': {
      const [open, close] = FENCES[node.shape];
      return `${open}${write(node.inside)}${close}`;
    }
    case 'cases': {
      const lines = node.lines.map(
        ({ value, condition }) =>
          `${write(value)} & ${condition === null ? '\\text{otherwise}' : `\\text{if } ${write(condition)}`}`,
      );
      return `\\begin{cases} ${lines.join(' \\\\ ')} \\end{cases}`;
    }
  }
}

function letters(text: string): string {
  const symbol = TEX.get(text);
  if (symbol !== undefined) return symbol;
  return text.length === 1 ? text : `\\mathit{${text.replaceAll('_', '\\_')}}`;
}
