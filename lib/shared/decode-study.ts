import { studySchema } from '@/kernels/spec';
import { BENCH_ASK } from './bench-study';
import { parseNumber } from './parse-number';
import type { StudyFile } from './study-types';

export type DecodedStudy = { study: StudyFile } | { fault: string };

type Query = Record<string, string | string[] | undefined>;

/**
 * The study in an address, checked against the schema; a fault in words for anything else. Never throws.
 * `null` where the address holds no study at all.
 */
export function decodeStudy(query: Query): DecodedStudy | null {
  if (Object.keys(query).length === 0) return null;
  const faults: string[] = [];
  const number = (name: string, text: string): number => {
    const parsed = parseNumber(text);
    if ('value' in parsed) return parsed.value;
    faults.push(`${name}: ${parsed.fault}`);
    return 0;
  };
  const all = (name: string) => [query[name] ?? []].flat();
  const one = (name: string) => all(name).at(0);

  const parameters: [string, number][] = [];
  for (const key of Object.keys(query)) {
    if (key.startsWith('p.')) parameters.push([key.slice(2), number(key, one(key) ?? '')]);
    else if (!known.has(key)) faults.push(`${key.slice(0, 40)}: no such key`);
  }
  const more = readMore(one('more'), faults);
  const sigma = one('sigma');
  const draft = {
    ...more,
    format: 'smirr-study',
    version: 1,
    title: one('title'),
    system: {
      ...more.system,
      type: one('type') ?? 'map',
      id: one('system'),
      variables: optional(all('var')),
      formulas: optional(all('f')),
      parameters: Object.fromEntries(parameters),
    },
    noise: {
      ...more.noise,
      kind: one('noise') ?? 'gaussian',
      ...(sigma !== undefined && { sigma: number('sigma', sigma) }),
    },
    domain: all('on').map((text) => {
      const [from = '', to = '', ...ends] = text.split(',');
      return { from: number('on', from), to: number('on', to), ends: ends.length > 1 ? ends : ends[0] };
    }),
    ask: more.ask ?? BENCH_ASK,
  };
  const checked = studySchema.safeParse(withoutUndefined(draft));
  for (const issue of checked.success ? [] : checked.error.issues)
    faults.push(`${issue.path.join('.')}: ${issue.message}`);
  if (!checked.success || faults.length > 0) return { fault: faults[0] };
  // The short study, not the one with every default written out: its next address is then as short as this one.
  return { study: withoutUndefined(draft) as StudyFile };
}

const known = new Set(['type', 'system', 'var', 'f', 'noise', 'sigma', 'on', 'title', 'more']);

interface More {
  system?: object;
  noise?: object;
  ask?: object;
}

function readMore(text: string | undefined, faults: string[]): More {
  if (text === undefined) return {};
  try {
    const more: unknown = JSON.parse(text);
    if (typeof more === 'object' && more !== null && !Array.isArray(more)) return more;
  } catch {}
  faults.push('more: not readable as JSON');
  return {};
}

function optional<T>(list: T[]): T[] | undefined {
  return list.length === 0 ? undefined : list;
}

function withoutUndefined<T>(value: T): T {
  return JSON.parse(JSON.stringify(value)) as T;
}
