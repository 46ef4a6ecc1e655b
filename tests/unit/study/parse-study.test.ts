import { describe, expect, it } from 'vitest';
import { parseStudy } from '@/kernels/study/parse-study';

type Loose = Record<string, unknown>;

const base = (): Loose & { system: Loose; noise: Loose; ask: Loose } => ({
  format: 'smirr-study',
  version: 1,
  system: { type: 'map', formulas: ['r*x*(1 - x)'], parameters: { r: 3.8 } },
  noise: { kind: 'gaussian', sigma: 0.05 },
  domain: [{ from: 0, to: 1, ends: 'absorbing' }],
  ask: { stationary: {} },
});
const faultsOf = (change: (s: ReturnType<typeof base>) => void) => {
  const study = base();
  change(study);
  return parseStudy(study).faults ?? [];
};

describe('a study that is read', () => {
  it('has every default written out', () => {
    const { study, faults } = parseStudy({ ...base(), ask: { spectrum: {}, exit: {} } });
    expect(faults).toBeUndefined();
    expect(study).toMatchObject({
      title: '',
      notes: '',
      grid: { points: 'auto', tolerance: 1e-8 },
      system: { variables: ['x'] },
      ask: { spectrum: { count: 8, deterministic: false, method: 'auto' }, exit: { start: { kind: 'uniform' } } },
      sweep: [],
    });
  });

  it('read again is the same study', () => {
    const once = parseStudy(base()).study;
    expect(parseStudy(JSON.parse(JSON.stringify(once))).study).toEqual(once);
  });

  it('from the catalogue has its formula and its other parameters written out', () => {
    const { study } = parseStudy({ ...base(), system: { type: 'map', id: 'sine-circle', parameters: {} } });
    expect(study?.system.formulas).toHaveLength(1);
    expect(Object.keys(study?.system.parameters ?? {}).length).toBeGreaterThan(1);
  });
});

/** What is wrong, the path that must be named, and a word of what is allowed. */
const REFUSED: [string, (s: ReturnType<typeof base>) => void, string, RegExp][] = [
  [
    'a misspelt key',
    (s) => {
      s.nosie = s.noise;
    },
    'nosie',
    /did you mean noise\?/,
  ],
  [
    'a misspelt key inside',
    (s) => {
      s.system.formula = 'x';
    },
    'system.formula',
    /did you mean formulas\?/,
  ],
  [
    'an unknown format',
    (s) => {
      s.format = 'other';
    },
    'format',
    /"smirr-study"/,
  ],
  [
    'a later version',
    (s) => {
      s.version = 2;
    },
    'version',
    /1/,
  ],
  [
    'a missing domain',
    (s) => {
      delete s.domain;
    },
    'domain',
    /missing/,
  ],
  [
    'an unknown end',
    (s) => {
      s.domain = [{ from: 0, to: 1, ends: 'open' }];
    },
    'domain[0].ends',
    /"periodic"/,
  ],
  [
    'from above to',
    (s) => {
      s.domain = [{ from: 2, to: 1, ends: 'absorbing' }];
    },
    'domain[0]',
    /from 2 must be below to 1/,
  ],
  [
    'a sigma of zero',
    (s) => {
      s.noise.sigma = 0;
    },
    'noise.sigma',
    /above 0/,
  ],
  [
    'a sigma below what any grid carries',
    (s) => {
      s.noise.sigma = 1e-9;
    },
    'noise.sigma',
    /allowed: 0\.00001 to 1000/,
  ],
  [
    'a sigma beyond use',
    (s) => {
      s.noise.sigma = 1e6;
    },
    'noise.sigma',
    /allowed/,
  ],
  [
    'a sigma that is a text',
    (s) => {
      s.noise.sigma = '0.1';
    },
    'noise.sigma',
    /got "0\.1"/,
  ],
  [
    'noise without sigma',
    (s) => {
      s.noise = { kind: 'gaussian' };
    },
    'noise.sigma',
    /missing/,
  ],
  [
    'sigma without noise',
    (s) => {
      s.noise = { kind: 'none', sigma: 0.1 };
    },
    'noise.sigma',
    /left out/,
  ],
  [
    'too few points',
    (s) => {
      s.grid = { points: 4 };
    },
    'grid.points',
    /at least 8/,
  ],
  [
    'too many points',
    (s) => {
      s.grid = { points: 1e6 };
    },
    'grid.points',
    /at most 65536/,
  ],
  [
    'a tolerance beyond doubles',
    (s) => {
      s.grid = { tolerance: 1e-14 };
    },
    'grid.tolerance',
    /at least 1e-11/,
  ],
  [
    'no eigenvalue',
    (s) => {
      s.ask = { spectrum: { count: 0 } };
    },
    'ask.spectrum.count',
    /at least 1/,
  ],
  [
    'half a step',
    (s) => {
      s.ask = { density: { at: [1, 2.5] } };
    },
    'ask.density.at[1]',
    /whole numbers/,
  ],
  [
    'a start outside',
    (s) => {
      s.ask = { exit: { start: { kind: 'point', at: [3] } } };
    },
    'ask.exit.start.at[0]',
    /allowed: 0 to 1/,
  ],
  [
    'a start of no width',
    (s) => {
      s.ask = { density: { at: [1], start: { kind: 'gaussian', mean: [0.5], sd: [0] } } };
    },
    'ask.density.start.sd[0]',
    /above 0/,
  ],
  [
    'a sample outside',
    (s) => {
      s.ask = { density: { at: [1], start: { kind: 'samples', samples: [0.5, 2] } } };
    },
    'ask.density.start.samples[1]',
    /0 to 1/,
  ],
  [
    'a formula that ends early',
    (s) => {
      s.system.formulas = ['r*x*(1 - x'];
    },
    'system.formulas[0]',
    /character \d+/,
  ],
  [
    'a formula with an unknown name',
    (s) => {
      s.system.formulas = ['q*x'];
    },
    'system.formulas[0]',
    /q.*character 1\b/,
  ],
  [
    'a start formula that is none',
    (s) => {
      s.ask = { exit: { start: { kind: 'formula', formula: 'x +' } } };
    },
    'ask.exit.start.formula',
    /character/,
  ],
  [
    'no formula and no id',
    (s) => {
      s.system = { type: 'map' };
    },
    'system.formulas',
    /missing/,
  ],
  [
    'an unknown system',
    (s) => {
      s.system = { type: 'map', id: 'logistik' };
    },
    'system.id',
    /did you mean logistic\?/,
  ],
  [
    'a parameter the system has not',
    (s) => {
      s.system = { type: 'map', id: 'logistic', parameters: { q: 1 } };
    },
    'system.parameters.q',
    /allowed: r/,
  ],
  [
    'another formula than the system has',
    (s) => {
      s.system = { type: 'map', id: 'logistic', formulas: ['x'] };
    },
    'system.formulas',
    /leave out/,
  ],
  [
    'a parameter named like a function',
    (s) => {
      s.system.parameters = { r: 1, exp: 1 };
    },
    'system.parameters.exp',
    /./,
  ],
  [
    'a parameter named like the variable',
    (s) => {
      s.system.parameters = { r: 1, x: 1 };
    },
    'system.parameters.x',
    /variable/,
  ],
  [
    'two formulas on one domain',
    (s) => {
      s.system.variables = ['x'];
      s.system.formulas = ['x', 'x'];
    },
    'system.formulas',
    /one per variable/,
  ],
  [
    'a break outside',
    (s) => {
      s.system.breaks = [[2]];
    },
    'system.breaks[0][0]',
    /0 to 1/,
  ],
  [
    'a sweep over an unknown parameter',
    (s) => {
      s.sweep = [{ over: 'parameters.rr', values: [1] }];
    },
    'sweep[0].over',
    /did you mean parameters\.r\?/,
  ],
  [
    'a sweep over something else',
    (s) => {
      s.sweep = [{ over: 'title', values: [1] }];
    },
    'sweep[0].over',
    /noise\.sigma/,
  ],
  [
    'a log sweep from zero',
    (s) => {
      s.sweep = [{ over: 'noise.sigma', from: 0, to: 1, count: 5, scale: 'log' }];
    },
    'sweep[0]',
    /above 0/,
  ],
  [
    'a sweep of sigma out of range',
    (s) => {
      s.sweep = [{ over: 'noise.sigma', values: [0.1, 1e9] }];
    },
    'sweep[0]',
    /1000000000/,
  ],
  [
    'a sweep of no noise',
    (s) => {
      s.noise = { kind: 'none' };
      s.sweep = [{ over: 'noise.sigma', values: [0.1] }];
    },
    'sweep[0].over',
    /no noise/,
  ],
  [
    'the same sweep twice',
    (s) => {
      s.sweep = [
        { over: 'noise.sigma', values: [0.1] },
        { over: 'noise.sigma[0]', values: [0.1] },
      ];
    },
    'sweep[1].over',
    /twice/,
  ],
  [
    'ten thousand cases',
    (s) => {
      s.sweep = [
        { over: 'noise.sigma', from: 0.1, to: 0.2, count: 100 },
        { over: 'parameters.r', from: 3, to: 4, count: 100 },
      ];
    },
    'sweep',
    /at most 4000/,
  ],
];

describe('a study that is refused', () => {
  it.each(REFUSED)('for %s names the place and what is allowed', (_, change, path, words) => {
    const faults = faultsOf(change);
    const fault = faults.find((f) => f.path === path);
    expect(fault, JSON.stringify(faults)).toBeDefined();
    expect(fault?.message).toMatch(words);
  });

  it('names all faults at once, twenty at most', () => {
    const two = faultsOf((s) => {
      s.grid = { points: 4 };
      s.ask = { spectrum: { count: 0 } };
    });
    expect(two.map((f) => f.path)).toEqual(expect.arrayContaining(['grid.points', 'ask.spectrum.count']));
    const many = faultsOf((s) => {
      s.ask = { density: { at: Array(400).fill(-1) } };
    });
    expect(many.length).toBe(20);
  });

  it.each([null, 1, 'x', [], undefined])('is what %j gives', (input) => {
    expect(parseStudy(input).faults?.length).toBeGreaterThan(0);
  });
});
