import { z } from 'zod';
import { nearestName } from '../formula/nearest-name';
import { studySchema } from '../spec';
import { type Fault, pathText, quoted } from './fault';

type Issue = z.core.$ZodIssue;
interface Shape {
  properties?: Record<string, Shape>;
  items?: Shape | Shape[];
  prefixItems?: Shape[];
  anyOf?: Shape[];
  oneOf?: Shape[];
  additionalProperties?: Shape | boolean;
}

let shape: Shape | null = null;
const MOST = 20;

/**
 * Turns zod's issues into faults in words: where, what is there, what is allowed. Of a union the branch that fits best
 * speaks; for an unknown key the nearest known one is named.
 *
 * @param issues what the schema found
 * @param input the value that was checked, for quoting
 * @returns at most 20 faults
 */
export function schemaFaults(issues: readonly Issue[], input: unknown): Fault[] {
  return issues.flatMap((issue) => faultsOf(issue, [], input)).slice(0, MOST);
}

function faultsOf(issue: Issue, before: readonly PropertyKey[], input: unknown): Fault[] {
  const path = [...before, ...issue.path];
  const at = pathText(path);
  const found = valueAt(input, path);
  const fault = (message: string): Fault[] => [{ path: at, message }];
  switch (issue.code) {
    case 'unrecognized_keys':
      return issue.keys.slice(0, 5).map((key) => {
        const known = keysAt(path);
        const near = nearestName(key, known);
        const hint = near ? `did you mean ${near}?` : `known here: ${known.join(', ') || 'none'}`;
        return { path: pathText([...path, key.slice(0, 40)]), message: `unknown key; ${hint}` };
      });
    case 'invalid_type':
      return fault(
        found === undefined
          ? `is missing; expected ${issue.expected}`
          : `expected ${issue.expected}, got ${quoted(found)}`,
      );
    case 'invalid_value':
      return fault(
        `${found === undefined ? 'is missing' : `got ${quoted(found)}`}; allowed: ${issue.values.map((v) => JSON.stringify(v)).join(', ')}`,
      );
    case 'too_small':
      return fault(
        `${sizeWord(issue.origin)} ${issue.inclusive ? 'at least' : 'above'} ${issue.minimum}${sizeUnit(issue.origin)}, got ${quoted(found)}`,
      );
    case 'too_big':
      return fault(
        `${sizeWord(issue.origin)} ${issue.inclusive ? 'at most' : 'below'} ${issue.maximum}${sizeUnit(issue.origin)}, got ${quoted(found)}`,
      );
    case 'invalid_union': {
      // the branch that got furthest: fewest issues, and rather a value out of range than one of another type
      const score = (branch: readonly Issue[]) =>
        branch.reduce(
          (s, i) =>
            s +
            (i.code === 'invalid_type' || i.code === 'invalid_value' ? 10 : i.code === 'unrecognized_keys' ? 3 : 1) -
            i.path.length,
          0,
        );
      const best = [...issue.errors].filter((b) => b.length > 0).sort((a, b) => score(a) - score(b))[0];
      if (!best) {
        const kinds = discriminators(path);
        return fault(
          `${found === undefined ? 'is missing' : `got ${quoted(found)}`}; allowed: ${kinds || 'see the schema'}`,
        );
      }
      return best.flatMap((inner) => faultsOf(inner, path, input));
    }
    case 'invalid_key':
      return fault(issue.issues[0] ? `key ${issue.issues[0].message}` : 'is no allowed key');
    case 'invalid_format':
      return fault(`got ${quoted(found)}; ${issue.message}`);
    default:
      return fault(`${issue.message}, got ${quoted(found)}`);
  }
}

const sizeWord = (origin: string) => (origin === 'string' ? 'must have' : origin === 'array' ? 'must have' : 'must be');
const sizeUnit = (origin: string) => (origin === 'string' ? ' characters' : origin === 'array' ? ' entries' : '');

function valueAt(input: unknown, path: readonly PropertyKey[]): unknown {
  let value = input;
  for (const piece of path) {
    if (value === null || typeof value !== 'object' || !Object.hasOwn(value, piece)) return undefined;
    value = (value as Record<PropertyKey, unknown>)[piece];
  }
  return value;
}

function shapesAt(path: readonly PropertyKey[]): Shape[] {
  shape ??= z.toJSONSchema(studySchema, { io: 'input', unrepresentable: 'any' }) as Shape;
  let here = spread([shape]);
  for (const piece of path) {
    here = spread(
      here.flatMap((s) => {
        if (typeof piece === 'number')
          return [...(Array.isArray(s.items) ? s.items : s.items ? [s.items] : []), ...(s.prefixItems ?? [])];
        const own = s.properties && Object.hasOwn(s.properties, piece) ? [s.properties[piece as string]] : [];
        return own.length > 0 ? own : typeof s.additionalProperties === 'object' ? [s.additionalProperties] : [];
      }),
    );
  }
  return here;
}

const spread = (list: Shape[]): Shape[] =>
  list.flatMap((s) => (s.anyOf || s.oneOf ? spread([...(s.anyOf ?? []), ...(s.oneOf ?? [])]) : [s]));

function keysAt(path: readonly PropertyKey[]): string[] {
  return [...new Set(shapesAt(path).flatMap((s) => Object.keys(s.properties ?? {})))];
}

function discriminators(path: readonly PropertyKey[]): string {
  const kinds = shapesAt(path).flatMap((s) => {
    const kind = s.properties?.kind as { const?: unknown } | undefined;
    return kind?.const === undefined ? [] : [`kind ${JSON.stringify(kind.const)}`];
  });
  return [...new Set(kinds)].join(', ');
}
