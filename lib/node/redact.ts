const secretName = /pass|secret|token|cookie|authorization|api-?key|session|phrase/i;
const email = /[\w.+-]+@[\w-]+(?:\.[\w-]+)+/g;
const credentials = /\b([a-z][a-z0-9+.-]*:\/\/)[^/\s@]*@/gi;
const bearer = /\b(bearer|basic)\s+[\w.~+/=-]+/gi;
const deepest = 6;

/** A text as it may stand in a log: without addresses of persons and without passwords in addresses. */
export function redactText(text: string): string {
  return text.replace(credentials, '$1[hidden]@').replace(bearer, '$1 [hidden]').replace(email, '[email]');
}

/** A copy of `value` as it may stand in a log: what has a secret's name is hidden, every text is cleaned. */
export function redact(value: unknown, depth = 0): unknown {
  if (typeof value === 'string') return redactText(value);
  if (typeof value !== 'object' || value === null) return value;
  if (depth > deepest) return '[deeper]';
  if (value instanceof Error) {
    const cause = value.cause === undefined ? {} : { cause: redact(value.cause, depth + 1) };
    return { name: value.name, message: redactText(value.message), stack: redactText(value.stack ?? ''), ...cause };
  }
  if (value instanceof Date) return value;
  if (ArrayBuffer.isView(value)) return '[binary]';
  if (Array.isArray(value)) return value.map((item) => redact(item, depth + 1));
  return Object.fromEntries(
    Object.entries(value).map(([name, item]) => [name, secretName.test(name) ? '[hidden]' : redact(item, depth + 1)]),
  );
}
