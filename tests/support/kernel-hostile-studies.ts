import fc from 'fast-check';

/** A text that is no computable study, and what is wrong with it. */
export interface HostileFile {
  readonly why: string;
  readonly text: string;
}

type Json = null | boolean | number | string | Json[] | { [key: string]: Json };

/** A study that can be computed; every hostile file differs from it in one respect. */
export const goodStudy = (): { [key: string]: Json } => ({
  format: 'smirr-study',
  version: 1,
  title: 'Gate amplifier',
  system: { type: 'map', variables: ['x'], formulas: ['r*x*(1 - x)'], parameters: { r: 3.8 } },
  noise: { kind: 'gaussian', sigma: 0.05 },
  domain: [{ from: 0, to: 1, ends: 'absorbing' }],
  grid: { points: 'auto', tolerance: 1e-8 },
  ask: {
    spectrum: { count: 4 },
    density: { start: { kind: 'point', at: [0.3] }, at: [1, 2] },
    exit: { start: { kind: 'uniform' } },
  },
  sweep: [{ over: 'noise.sigma', from: 0.05, to: 0.1, count: 2, scale: 'log' }],
});

/** The good study with the value at a path replaced (undefined: taken away). Text pieces, so that NaN or twins can stand there. */
function withText(path: (string | number)[], piece: string | undefined): string {
  const MARK = '@@here@@';
  const root = goodStudy();
  let at = root as Record<string | number, unknown>;
  for (const key of path.slice(0, -1)) at = at[key] as Record<string | number, unknown>;
  const last = path[path.length - 1];
  if (piece === undefined) delete at[last];
  else at[last] = MARK;
  return JSON.stringify(root).replace(JSON.stringify(MARK), () => piece ?? '');
}

const set = (why: string, path: (string | number)[], value: unknown): HostileFile => ({
  why,
  text: withText(path, JSON.stringify(value)),
});

const REQUIRED: (string | number)[][] = [
  ['format'],
  ['version'],
  ['system'],
  ['system', 'type'],
  ['system', 'formulas'],
  ['noise'],
  ['noise', 'kind'],
  ['noise', 'sigma'],
  ['domain'],
  ['domain', 0, 'from'],
  ['domain', 0, 'to'],
  ['domain', 0, 'ends'],
  ['ask'],
  ['ask', 'density', 'at'],
  ['ask', 'density', 'start', 'kind'],
  ['ask', 'density', 'start', 'at'],
  ['sweep', 0, 'over'],
  ['sweep', 0, 'count'],
];

/** Values that none of these places takes. */
const ODD: [string, string][] = [
  ['null', 'null'],
  ['a list', '[[]]'],
  ['an object', '{"a": {}}'],
  ['a boolean', 'true'],
];

const PLACES: (string | number)[][] = [
  ['format'],
  ['version'],
  ['title'],
  ['system'],
  ['system', 'type'],
  ['system', 'variables'],
  ['system', 'formulas'],
  ['system', 'formulas', 0],
  ['system', 'parameters', 'r'],
  ['noise', 'kind'],
  ['noise', 'sigma'],
  ['domain', 0],
  ['domain', 0, 'from'],
  ['domain', 0, 'ends'],
  ['grid', 'points'],
  ['grid', 'tolerance'],
  ['ask', 'spectrum', 'count'],
  ['ask', 'density', 'at'],
  ['ask', 'density', 'start'],
  ['ask', 'exit', 'start'],
  ['sweep', 0],
  ['sweep', 0, 'count'],
  ['sweep', 0, 'scale'],
];

const NEAR_KEYS: [(string | number)[], string][] = [
  [['sytem'], 'system'],
  [['Noise'], 'noise'],
  [['system', 'formula'], 'formulas'],
  [['system', 'parameter'], 'parameters'],
  [['noise', 'sigmas'], 'sigma'],
  [['noise', 'sgima'], 'sigma'],
  [['domain', 0, 'form'], 'from'],
  [['domain', 0, 'end'], 'ends'],
  [['grid', 'tolerence'], 'tolerance'],
  [['grid', 'point'], 'points'],
  [['ask', 'spectra'], 'spectrum'],
  [['ask', 'stationery'], 'stationary'],
  [['ask', 'lyapunow'], 'lyapunov'],
  [['ask', 'spectrum', 'counts'], 'count'],
  [['ask', 'density', 'start', 'mean'], ''],
  [['sweep', 0, 'form'], 'from'],
  [['constructor'], ''],
  [['toString'], ''],
  [['system', 'hasOwnProperty'], ''],
];

const FORMULAS: [string, string][] = [
  ['ten thousand characters', `x${'+x'.repeat(5000)}`],
  ['just above the length allowed', `x${'+1'.repeat(1000)}`],
  ['five hundred parentheses', `${'('.repeat(500)}x${')'.repeat(500)}`],
  ['five hundred calls', `${'sin('.repeat(300)}x${')'.repeat(300)}`],
  ['a tower of powers', 'x^9^9^9^9^9^9'],
  ['a hundred signs', `${'-'.repeat(400)}x`],
  ['constructor', 'constructor'],
  ['constructor of constructor', 'x.constructor.constructor("return 1")()'],
  ['__proto__', '__proto__'],
  ['import', 'import("fs")'],
  ['eval', 'eval(1)'],
  ['a call of a text', 'sin("x")'],
  ['an assignment', 'x = 3'],
  ['a statement', 'x; x'],
  ['a function', 'f(x) = x'],
  ['a unit', '3 cm'],
  ['a complex number', 'x + 2i'],
  ['a matrix', '[x, 1]'],
  ['an index', 'x[1]'],
  ['a range', '1:3'],
  ['a factorial', 'x!'],
  ['a derivative', "x'"],
  ['nothing after a plus', 'x +'],
  ['an empty parenthesis', 'sin()'],
  ['too many arguments', 'sin(x, 2)'],
  ['an unknown function', 'sine(x)'],
  ['an unknown name', 'y*x'],
  ['time in a map', 't*x'],
  ['unicode letters', 'х*(1-х)'],
  ['a wide multiplication sign', '3×x'],
  ['an emoji', '😀*x'],
  ['a zero byte', 'x\u0000'],
  ['a line break in a name', 'si\nn(x)'],
  ['right to left', '\u202Ex'],
  ['two dots', '1..2*x'],
  ['hexadecimal', '0x10*x'],
  ['a lone question mark', 'x ? '],
  ['the logarithm of a negative stretch', 'log(x - 0.5)'],
  ['the root of a negative stretch', 'sqrt(x - 0.7)'],
  ['a division by zero everywhere', 'x/(r - r)'],
  ['an overflow', 'exp(1000*(1 + x))'],
  ['infinity minus infinity', 'exp(999 + x) - exp(999 + x)'],
  ['an inverse sine outside its range', 'asin(2 + x)'],
  ['zero over zero', '(x - x)/(x - x)'],
  ['an empty text', ''],
  ['blanks', '   '],
];

const NUMBERS: [string, (string | number)[], unknown][] = [
  ['r of a billion on an absorbing interval, far beyond any grid', ['grid', 'points'], 1e9],
  ['negative sigma', ['noise', 'sigma'], -1],
  ['zero sigma', ['noise', 'sigma'], 0],
  ['tiny sigma', ['noise', 'sigma'], 1e-12],
  ['huge sigma', ['noise', 'sigma'], 1e200],
  ['text for sigma', ['noise', 'sigma'], 'NaN'],
  ['Infinity as text', ['noise', 'sigma'], 'Infinity'],
  ['two sigmas for one variable', ['noise', 'sigma'], [0.1, 0.2]],
  ['no sigma in a list', ['noise', 'sigma'], []],
  ['from above to', ['domain', 0], { from: 1, to: 0, ends: 'absorbing' }],
  ['from at to', ['domain', 0], { from: 1, to: 1, ends: 'absorbing' }],
  ['a domain too narrow for doubles', ['domain', 0], { from: 1, to: 1 + 1e-12, ends: 'absorbing' }],
  ['a domain beyond all numbers', ['domain', 0, 'to'], 1.7e308],
  ['an unknown end', ['domain', 0, 'ends'], 'open'],
  ['a pair with a periodic end', ['domain', 0, 'ends'], ['periodic', 'absorbing']],
  ['three ends', ['domain', 0, 'ends'], ['absorbing', 'absorbing', 'absorbing']],
  ['no variable', ['domain'], []],
  ['three variables', ['domain'], Array(3).fill({ from: 0, to: 1, ends: 'absorbing' })],
  ['a start outside', ['ask', 'density', 'start', 'at'], [1.5]],
  ['a start in two variables', ['ask', 'density', 'start', 'at'], [0.1, 0.2]],
  ['a start of an unknown kind', ['ask', 'density', 'start'], { kind: 'delta', at: [0.5] }],
  ['a start of negative width', ['ask', 'density', 'start'], { kind: 'gaussian', mean: [0.5], sd: [-1] }],
  ['a start with no mean', ['ask', 'density', 'start'], { kind: 'gaussian', sd: [0.1] }],
  ['a start formula below zero', ['ask', 'density', 'start'], { kind: 'formula', formula: 'x - 0.5' }],
  ['a start formula of nothing', ['ask', 'density', 'start'], { kind: 'formula', formula: '0*x' }],
  ['a start formula that is no number', ['ask', 'density', 'start'], { kind: 'formula', formula: 'log(-1 - x)' }],
  ['a start formula that does not parse', ['ask', 'density', 'start'], { kind: 'formula', formula: 'exp(' }],
  ['no samples', ['ask', 'density', 'start'], { kind: 'samples', samples: [] }],
  ['samples outside', ['ask', 'density', 'start'], { kind: 'samples', samples: [0.2, 7] }],
  ['samples that are texts', ['ask', 'density', 'start'], { kind: 'samples', samples: ['0.2'] }],
  ['half a step', ['ask', 'density', 'at'], [0.5]],
  ['a step before the start', ['ask', 'density', 'at'], [-1]],
  ['no step', ['ask', 'density', 'at'], []],
  ['too many steps', ['ask', 'density', 'at'], Array.from({ length: 501 }, (_, i) => i)],
  ['ten times ten million steps', ['ask', 'density', 'at'], [1e8]],
  ['no eigenvalue', ['ask', 'spectrum', 'count'], 0],
  ['half an eigenvalue', ['ask', 'spectrum', 'count'], 2.5],
  ['a thousand eigenvalues', ['ask', 'spectrum', 'count'], 1000],
  ['three points', ['grid', 'points'], 3],
  ['more points than allowed', ['grid', 'points'], 65_537],
  ['a tolerance of zero', ['grid', 'tolerance'], 0],
  ['a tolerance beyond doubles', ['grid', 'tolerance'], 1e-15],
  ['a long sweep', ['sweep', 0, 'count'], 1e6],
  [
    'two sweeps of a hundred each, ten thousand cases',
    ['sweep'],
    [
      { over: 'noise.sigma', from: 0.05, to: 0.1, count: 100 },
      { over: 'parameters.r', from: 3, to: 4, count: 100 },
    ],
  ],
  ['three sweeps', ['sweep'], Array(3).fill({ over: 'noise.sigma', values: [0.1] })],
  ['the same sweep twice', ['sweep'], Array(2).fill({ over: 'noise.sigma', values: [0.1] })],
  ['a sweep of nothing', ['sweep'], [{ over: 'noise.sigma', values: [] }]],
  ['a sweep over what is not there', ['sweep', 0, 'over'], 'parameters.q'],
  ['a sweep over the prototype', ['sweep', 0, 'over'], 'parameters.constructor'],
  ['a sweep over the title', ['sweep', 0, 'over'], 'title'],
  ['a log sweep through zero', ['sweep', 0, 'from'], 0],
  ['a log sweep to below zero', ['sweep', 0, 'to'], -3],
  ['a parameter of a wrong name', ['system', 'parameters'], { 'r r': 1 }],
  ['a parameter with the name of a function', ['system', 'parameters'], { r: 3.8, sin: 2 }],
  ['a parameter with the name of the variable', ['system', 'parameters'], { r: 3.8, x: 2 }],
  [
    'forty parameters',
    ['system', 'parameters'],
    Object.fromEntries(Array.from({ length: 40 }, (_, i) => [i ? `p${i}` : 'r', 1])),
  ],
  ['a parameter beyond all numbers', ['system', 'parameters', 'r'], 1.5e308],
  ['a missing parameter', ['system', 'parameters'], {}],
  ['an unknown system', ['system'], { type: 'map', id: 'logistics' }],
  ['the system of the prototype', ['system'], { type: 'map', id: 'constructor' }],
  ['a parameter the system has not', ['system'], { type: 'map', id: 'logistic', parameters: { rr: 1 } }],
  ['a type of no kind', ['system', 'type'], 'flow'],
  ['a break outside', ['system', 'breaks'], [[4]]],
  ['a later version', ['version'], 2],
  ['another format', ['format'], 'smirr-result'],
  ['a title of a novel', ['title'], 'a'.repeat(10_000)],
  ['a noise of no kind', ['noise', 'kind'], 'white'],
  ['a noise without level', ['noise'], { kind: 'gaussian' }],
  ['a level without noise', ['noise'], { kind: 'none', sigma: 0.1 }],
  ['a correlation of one variable', ['noise', 'correlation'], 0.3],
  ['a survival that is not computed', ['ask', 'exit', 'survival'], { horizon: 10 }],
  ['an sde', ['system', 'type'], 'sde'],
  ['an ensemble', ['ask', 'ensemble'], { paths: 10, steps: 10, seed: 's' }],
];

const whole = JSON.stringify(goodStudy());
const TEXTS: [string, string][] = [
  ['nothing', ''],
  ['a blank', ' '],
  ['null', 'null'],
  ['a number', '12'],
  ['a text', '"study"'],
  ['an empty list', '[]'],
  ['an empty object', '{}'],
  ['a list of a study', `[${whole}]`],
  ['two studies', `${whole}\n${whole}`],
  ['single quotes', whole.replaceAll('"', "'")],
  ['a trailing comma', `${whole.slice(0, -1)},}`],
  ['a comment', `// a study\n${whole}`],
  ['a byte order mark within', `{\uFEFF${whole.slice(1)}`],
  ['NaN as a number', withText(['noise', 'sigma'], 'NaN')],
  ['Infinity as a number', withText(['noise', 'sigma'], 'Infinity')],
  ['a number with too many zeros', withText(['noise', 'sigma'], '1e999')],
  ['a prototype of its own', withText(['title'], '"", "__proto__": {"polluted": true}')],
  ['a prototype in the parameters', withText(['system', 'parameters'], '{"r": 3.8, "__proto__": 1}')],
  ['deep lists', `${'['.repeat(5000)}${']'.repeat(5000)}`],
  ['deep objects', `${'{"a":'.repeat(2000)}1${'}'.repeat(2000)}`],
  ['a deep title', withText(['title'], `${'['.repeat(3000)}${']'.repeat(3000)}`)],
  ['random bytes', '\u0000\u0001\u0002ÿþ'],
];

/** Every listed fault, one file each. */
export const hostileFiles: readonly HostileFile[] = [
  ...REQUIRED.map((path) => ({ why: `no ${path.join('.')}`, text: withText(path, undefined) })),
  ...PLACES.flatMap((path) =>
    ODD.map(([what, piece]) => ({ why: `${what} for ${path.join('.')}`, text: withText(path, piece) })),
  ),
  ...NEAR_KEYS.map(([path]) => set(`an extra key ${path.join('.')}`, path, 1)),
  ...FORMULAS.map(([what, formula]) => set(`formula: ${what}`, ['system', 'formulas'], [formula])),
  ...NUMBERS.map(([why, path, value]) => set(why, path, value)),
  ...TEXTS.map(([why, text]) => ({ why: `file: ${why}`, text })),
];

/** Misspelt keys with the known key that a message must name. */
export const nearKeys = NEAR_KEYS.filter(([, near]) => near !== '').map(([path, near]) => ({
  path,
  near,
  text: withText(path, '1'),
}));

/** The good study cut short anywhere, or with one character of its frame changed. */
export const brokenTexts: fc.Arbitrary<HostileFile> = fc.oneof(
  fc.integer({ min: 0, max: whole.length - 1 }).map((n) => ({ why: `cut after ${n}`, text: whole.slice(0, n) })),
  fc.tuple(fc.constantFrom('{', '}', '[', ']', ':'), fc.nat(10_000)).map(([character, nth]) => {
    const places = [...whole].flatMap((c, i) => (c === character ? [i] : []));
    const at = places[nth % places.length];
    return { why: `${character} at ${at} taken away`, text: whole.slice(0, at) + whole.slice(at + 1) };
  }),
);

/** Any JSON in any place of the good study. */
export const strangeValues: fc.Arbitrary<HostileFile> = fc
  .tuple(fc.constantFrom(...PLACES), fc.jsonValue({ maxDepth: 3 }))
  .map(([path, value]) => set(`${JSON.stringify(value)?.slice(0, 60)} for ${path.join('.')}`, path, value));
