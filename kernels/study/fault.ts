/** One thing that is wrong with a study file: where, and what is allowed there. */
export interface Fault {
  /** as written in the file: `domain[0].from`; empty for the file as a whole */
  readonly path: string;
  readonly message: string;
}

/** Path pieces as zod gives them → `ask.density.at[2]`. */
export function pathText(path: readonly PropertyKey[]): string {
  let text = '';
  for (const piece of path)
    text += typeof piece === 'number' ? `[${piece}]` : text === '' ? String(piece) : `.${String(piece)}`;
  return text;
}

/** A value as it is quoted in a fault: JSON, at most 40 characters. */
export function quoted(value: unknown): string {
  if (typeof value === 'number' && !Number.isFinite(value)) return String(value);
  const text = JSON.stringify(value) ?? String(value);
  return text.length > 40 ? `${text.slice(0, 37)}…` : text;
}
