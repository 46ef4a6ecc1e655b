const reserved = new Set(['pi', 'e', 't', 'and', 'or', 'not']);

/** Names in a formula that are neither its variable, a function nor a constant: its parameters, each once, in order. */
export function formulaNames(formula: string, variable: string): string[] {
  const names = new Set<string>();
  for (const { 0: name, index } of formula.matchAll(/(?<![\w.])[A-Za-z][A-Za-z0-9_]*/g)) {
    const call = /^\s*\(/.test(formula.slice(index + name.length));
    if (!call && name !== variable && !reserved.has(name)) names.add(name);
  }
  return [...names];
}
