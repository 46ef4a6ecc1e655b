import type { SystemDefinition } from './system-definition';

/** The Pomeau–Manneville map, x' = x + eps + x^z modulo 1. */
export const pomeauManneville: SystemDefinition = {
  id: 'pomeau-manneville',
  title: 'Pomeau–Manneville map',
  group: 'textbook',
  type: 'map',
  variables: ['x'],
  formulas: ['mod(x + eps + x^z, 1)'],
  parameters: [
    { name: 'z', title: 'order of the tangency at 0', unit: '', default: 2, range: [1, 5] },
    { name: 'eps', title: 'distance from tangency', unit: 'x', default: 0, range: [0, 0.5] },
  ],
  domain: [{ from: 0, to: 1, ends: 'reflecting' }],
  sigma: { default: 0.01, range: [1e-3, 0.5] },
  map(x, [z, eps], out, slope) {
    for (let i = 0; i < x.length; i++) {
      const y = x[i] + eps + x[i] ** z;
      out[i] = y - Math.floor(y);
      if (slope) slope[i] = 1 + z * x[i] ** (z - 1);
    }
  },
  breaks: ([z, eps]) => (eps > 0 ? [1, 2] : [1]).map((level) => crossing(z, level - eps)),
  citation:
    'Y. Pomeau & P. Manneville, Intermittent transition to turbulence in dissipative dynamical systems, Commun. Math. Phys. 74 (1980) 189 (from memory)',
  known: [
    { quantity: 'fixed point', parameters: { z: 2, eps: 0 }, value: 0, source: 'exact' },
    { quantity: 'slope at the fixed point', parameters: { z: 2, eps: 0 }, value: 1, source: 'marginal, exact' },
    { quantity: 'break', parameters: { z: 2, eps: 0 }, value: (Math.sqrt(5) - 1) / 2, source: 'x + x^2 = 1, exact' },
    {
      quantity: 'invariant density',
      parameters: { z: 2, eps: 0 },
      value: 'not normalisable for z >= 2 without noise',
      source: 'P. Manneville, J. Physique 41 (1980) 1235 (from memory)',
    },
  ],
  summary: 'Intermittency: long quiet stretches close to 0, broken by bursts. Noise shortens the quiet.',
};

/** Where x + x^z = level, by Newton's method from the right, where the function is convex. */
function crossing(z: number, level: number): number {
  let x = 1;
  for (let i = 0; i < 60; i++) {
    const next = x - (x + x ** z - level) / (1 + z * x ** (z - 1));
    if (!(next < x)) break;
    x = next;
  }
  return x;
}
