import { describe, expect, it } from 'vitest';
import { compileFormula } from '@/kernels/formula/compile-formula';
import { findBreaks } from '@/kernels/formula/find-breaks';
import { parseFormula } from '@/kernels/formula/parse-formula';
import { findSystem, SYSTEMS } from '@/kernels/systems/index';
import type { SystemDefinition } from '@/kernels/systems/system-definition';
import { seededRandom } from './seeded-random';

/** Values of all parameters: those given, else the defaults. */
function parametersOf(system: SystemDefinition, given: Readonly<Record<string, number>> = {}): number[] {
  return system.parameters.map(({ name, default: usual }) => given[name] ?? usual);
}

function randomParameters(system: SystemDefinition, random: () => number): number[] {
  return system.parameters.map(({ range: [low, high] }) => low + (high - low) * random());
}

function at(system: SystemDefinition, x: number, p: readonly number[]): { value: number; slope: number } {
  const [out, slope] = [new Float64Array(1), new Float64Array(1)];
  system.map(Float64Array.of(x), p, out, slope);
  return { value: out[0], slope: slope[0] };
}

const scopeOf = (system: SystemDefinition) => ({
  variables: system.variables,
  parameters: system.parameters.map(({ name }) => name),
});

/** Mean of ln|F'| along an orbit. A speck of noise keeps dyadic orbits from dying in binary arithmetic. */
function orbitExponent(system: SystemDefinition, p: readonly number[], steps: number): number {
  const random = seededRandom(7);
  const [{ from, to, ends }] = system.domain;
  const n = 2000;
  const x = Float64Array.from({ length: n }, () => from + (to - from) * random());
  const [y, slope] = [new Float64Array(n), new Float64Array(n)];
  let sum = 0;
  for (let k = 0; k < steps; k++) {
    system.map(x, p, y, slope);
    for (let i = 0; i < n; i++) {
      if (k >= 20) sum += Math.log(Math.abs(slope[i]));
      let next = y[i] + 1e-12 * (random() - 0.5);
      if (ends === 'periodic') next = from + ((((next - from) % (to - from)) + (to - from)) % (to - from));
      x[i] = Math.min(to, Math.max(from, next));
    }
  }
  return sum / (n * (steps - 20));
}

/** The density that the map gives back, pushed once at x: the sum over preimages of density/|slope|. */
function pushedDensity(
  system: SystemDefinition,
  p: readonly number[],
  density: (x: number) => number,
  y: number,
): number {
  const [{ from, to, ends }] = system.domain;
  const n = 2_000_000;
  let sum = 0;
  const width = 1e-3;
  const x = Float64Array.from({ length: n }, (_, i) => from + ((to - from) * (i + 0.5)) / n);
  const image = new Float64Array(n);
  system.map(x, p, image);
  for (let i = 0; i < n; i++) {
    let v = image[i];
    if (ends === 'periodic') v = from + ((((v - from) % (to - from)) + (to - from)) % (to - from));
    if (Math.abs(v - y) < width) sum += density(x[i]);
  }
  return (sum * (to - from)) / n / (2 * width);
}

const DENSITIES: Record<string, (x: number) => number> = {
  doubling: () => 1,
  rotation: () => 1,
  tent: () => 1,
  gauss: (x) => 1 / ((1 + x) * Math.LN2),
  'bernoulli-shift': (x) => (x < 2 / (1 + Math.sqrt(5)) ? (5 + 3 * Math.sqrt(5)) / 10 : (5 + Math.sqrt(5)) / 10),
  cubic: (x) => 1 / (Math.PI * Math.sqrt(1 - x * x)),
};

it('the catalogue has the twelve maps, each once', () => {
  expect(SYSTEMS.map(({ id }) => id).sort()).toEqual([
    'bernoulli-shift',
    'cubic',
    'doubling',
    'gauss',
    'linear',
    'logistic',
    'pomeau-manneville',
    'ricker',
    'rotation',
    'saturating',
    'sine-circle',
    'tent',
  ]);
  expect(findSystem('tent')?.title).toBe('Tent map');
  expect(findSystem('constructor')).toBeUndefined();
});

describe.each(SYSTEMS.map((system) => [system.id, system] as const))('%s', (_, system) => {
  const scope = scopeOf(system);
  const tree = parseFormula(system.formulas[0], scope);
  const formula = compileFormula(tree, scope);
  const [{ from, to }] = system.domain;

  it('states what a form needs', () => {
    expect(system.title.length).toBeGreaterThan(3);
    expect(system.summary).toMatch(/\.$/);
    expect(system.citation).toMatch(/\(?(1[89]|20)\d\d\)?/);
    expect(system.known.length).toBeGreaterThan(0);
    for (const known of system.known) {
      expect(known.source.length).toBeGreaterThan(4);
      for (const name of Object.keys(known.parameters)) expect([...scope.parameters, 'sigma']).toContain(name);
    }
    for (const { name, title, default: usual, range } of system.parameters) {
      expect(title.length, name).toBeGreaterThan(3);
      expect(range[0]).toBeLessThan(range[1]);
      expect(usual).toBeGreaterThanOrEqual(range[0]);
      expect(usual).toBeLessThanOrEqual(range[1]);
    }
    expect(system.sigma.range[0]).toBeGreaterThan(0);
    expect(system.sigma.default).toBeGreaterThanOrEqual(system.sigma.range[0]);
    expect(system.sigma.default).toBeLessThanOrEqual(system.sigma.range[1]);
    expect(from).toBeLessThan(to);
  });

  it('formula and hand-written map agree to a few units in the last place, slopes too', () => {
    const random = seededRandom(1);
    const n = 4000;
    const x = Float64Array.from({ length: n }, () => from + (to - from) * random());
    const [byHand, slopeByHand, byFormula, slopeByFormula] = [0, 1, 2, 3].map(() => new Float64Array(n));
    for (let round = 0; round < 25; round++) {
      const p = round === 0 ? parametersOf(system) : randomParameters(system, random);
      system.map(x, p, byHand, slopeByHand);
      formula.evaluateWithSlope([x], p, byFormula, slopeByFormula);
      for (let i = 0; i < n; i++) {
        // The size of what is added up, not of the sum, sets the round-off of a sum.
        const size = Math.max(1, Math.abs(byHand[i]), Math.abs(slopeByHand[i]), ...p.map(Math.abs));
        const close = (a: number, b: number) => Math.abs(a - b) <= 16 * Number.EPSILON * size;
        if (!close(byHand[i], byFormula[i]) || !close(slopeByHand[i], slopeByFormula[i])) {
          expect.fail(
            `x = ${x[i]}, p = ${p}: ${byHand[i]} ${byFormula[i]}, slopes ${slopeByHand[i]} ${slopeByFormula[i]}`,
          );
        }
      }
    }
  });

  it('leaves the slopes alone where they are not asked for', () => {
    const out = new Float64Array(1);
    system.map(Float64Array.of(0.3), parametersOf(system), out);
    expect(out[0]).toBe(at(system, 0.3, parametersOf(system)).value);
  });

  it('has its breaks where the formula has them', () => {
    const random = seededRandom(2);
    for (let round = 0; round < 12; round++) {
      const p = round === 0 ? parametersOf(system) : randomParameters(system, random);
      const found = findBreaks(tree, scope, p, from, to);
      const stated = system.breaks(p);
      expect(found.at.length, `p = ${p}`).toBe(stated.length);
      stated.forEach((place, k) => {
        expect(Math.abs(place - found.at[k])).toBeLessThan(1e-13 * (to - from));
      });
    }
  });

  it('gives finite images on its domain', () => {
    const random = seededRandom(3);
    const n = 10_001;
    const x = Float64Array.from({ length: n }, (_, i) => from + ((to - from) * (i + 0.5)) / n);
    const [out, slope] = [new Float64Array(n), new Float64Array(n)];
    for (let round = 0; round < 10; round++) {
      system.map(x, randomParameters(system, random), out, slope);
      expect(out.every(Number.isFinite)).toBe(true);
      expect(slope.every(Number.isFinite)).toBe(true);
    }
  });

  it.each(system.known.filter(({ quantity }) => quantity === 'fixed point'))(
    'stays at its fixed point $value',
    (known) => {
      const x = known.value as number;
      expect(at(system, x, parametersOf(system, known.parameters)).value).toBeCloseTo(x, 14);
    },
  );

  it.each(system.known.filter(({ quantity }) => quantity === 'slope at the fixed point'))(
    'has slope $value there',
    (known) => {
      const fixed = system.known.find(
        ({ quantity, parameters }) =>
          quantity === 'fixed point' && JSON.stringify(parameters) === JSON.stringify(known.parameters),
      );
      const x = fixed?.value as number;
      expect(at(system, x, parametersOf(system, known.parameters)).slope).toBeCloseTo(known.value as number, 13);
    },
  );

  it.each(system.known.filter(({ quantity }) => quantity === 'Lyapunov exponent'))(
    'has Lyapunov exponent $value along orbits',
    (known) => {
      const exponent = orbitExponent(system, parametersOf(system, known.parameters), 320);
      // 600 000 samples: statistical error below 2e-3 even with the logarithm's tail.
      expect(Math.abs(exponent - (known.value as number))).toBeLessThan(5e-3);
    },
  );

  it.each(system.known.filter(({ quantity }) => quantity.startsWith('invariant density at')))(
    '$quantity: what the push gives back is $value',
    (known) => {
      const y = Number(known.quantity.split('= ')[1]);
      const density = DENSITIES[system.id];
      expect(density(y)).toBeCloseTo(known.value as number, 12);
      expect(pushedDensity(system, parametersOf(system, known.parameters), density, y) / density(y)).toBeCloseTo(1, 2);
    },
  );
});

describe('what is known beyond that', () => {
  const known = (id: string, quantity: string) => {
    const entry = findSystem(id)?.known.find((value) => value.quantity === quantity);
    return entry?.value as number;
  };

  it('the largest image of the Ricker map lies at 1/r', () => {
    const ricker = findSystem('ricker') as SystemDefinition;
    const { value, slope } = at(ricker, 1 / 2.6, [2.6]);
    expect(value).toBeCloseTo(known('ricker', 'largest image'), 14);
    expect(slope).toBeCloseTo(0, 14);
  });

  it('the bands of the cubic map meet where its local maximum falls onto 0', () => {
    const cubic = findSystem('cubic') as SystemDefinition;
    const a = known('cubic', 'the two bands meet at a');
    const top = at(cubic, -Math.sqrt((a - 1) / (3 * a)), [a]).value;
    expect(at(cubic, top, [a]).value).toBeCloseTo(0, 13);
  });

  it('the Pomeau-Manneville map breaks at the golden section', () => {
    expect(findSystem('pomeau-manneville')?.breaks([2, 0])[0]).toBeCloseTo(known('pomeau-manneville', 'break'), 15);
  });

  it('the doubling of periods of the logistic map ends at 3.5699…: stable before, chaotic after', () => {
    const logistic = findSystem('logistic') as SystemDefinition;
    const end = known('logistic', 'end of the first period-doubling cascade, r');
    expect(orbitExponent(logistic, [end - 0.01], 3000)).toBeLessThan(-0.02);
    expect(orbitExponent(logistic, [end + 0.01], 3000)).toBeGreaterThan(0.02);
  });
});
