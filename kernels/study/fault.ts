/** One thing that is wrong with a study file: where, and what is allowed there. */
export interface Fault {
  /** as written in the file: `domain[0].from`; empty for the file as a whole */
  readonly path: string;
  readonly message: string;
}

/**
 * Path pieces as zod gives them → `ask.density.at[2]`. A key that is no plain name stands quoted in brackets, without a
 * bare colon, so that the first colon of a fault line ends its path.
 *
 * @param path keys and places in lists, outermost first
 */
export function pathText(path: readonly PropertyKey[]): string {
  let text = '';
  for (const piece of path) {
    if (typeof piece === 'number') text += `[${piece}]`;
    else if (/^[A-Za-z_]\w*$/.test(String(piece))) text += text === '' ? String(piece) : `.${String(piece)}`;
    else text += `[${JSON.stringify(String(piece)).replaceAll(':', '\\u003a')}]`;
  }
  return text;
}

/**
 * A value as it is quoted in a fault: JSON, at most 40 characters.
 *
 * @param value anything that JSON.parse may give, nested as deep as it likes
 */
export function quoted(value: unknown): string {
  if (typeof value === 'number' && !Number.isFinite(value)) return String(value);
  if (Array.isArray(value) && value.length > 0) return `a list of ${value.length}`;
  if (value !== null && typeof value === 'object') {
    const keys = Object.keys(value);
    return `an object with ${keys.length === 1 ? 'key' : 'keys'} ${keys.slice(0, 3).join(', ').slice(0, 40) || '(none)'}`;
  }
  const text = JSON.stringify(value) ?? String(value);
  return text.length > 40 ? `${text.slice(0, 37)}…` : text;
}
