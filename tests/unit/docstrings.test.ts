import { readdirSync, readFileSync } from 'node:fs';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';

const files = (readdirSync('kernels', { recursive: true }) as string[]).filter((f) => f.endsWith('.ts')).sort();

interface Exported {
  name: string;
  doc: string;
  parameters: string[];
}

/** Exported functions, and exported constants that hold one, with the comment before them. */
function exportedFunctions(text: string): Exported[] {
  const source = ts.createSourceFile('a.ts', text, ts.ScriptTarget.ES2022, true);
  const docOf = (node: ts.Node) =>
    (ts.getLeadingCommentRanges(text, node.getFullStart()) ?? [])
      .map((r) => text.slice(r.pos, r.end))
      .filter((c) => c.startsWith('/**'))
      .at(-1) ?? '';
  const isExported = (node: ts.HasModifiers) => node.modifiers?.some((m) => m.kind === ts.SyntaxKind.ExportKeyword);
  const found: Exported[] = [];
  const add = (node: ts.Node, name: string, parameters: readonly ts.ParameterDeclaration[]) =>
    found.push({ name, doc: docOf(node), parameters: parameters.map((p) => p.name.getText()) });
  for (const node of source.statements) {
    if (ts.isFunctionDeclaration(node) && isExported(node)) add(node, node.name?.text ?? '', node.parameters);
    if (ts.isVariableStatement(node) && isExported(node))
      for (const d of node.declarationList.declarations)
        if (d.initializer && ts.isArrowFunction(d.initializer)) add(node, d.name.getText(), d.initializer.parameters);
    if (ts.isClassDeclaration(node) && isExported(node)) add(node, node.name?.text ?? '', []);
  }
  return found;
}

describe('the numerical core', () => {
  const all = files.flatMap((file) =>
    exportedFunctions(readFileSync(`kernels/${file}`, 'utf8')).map((f) => ({ file, ...f })),
  );

  it('has functions to look at', () => {
    expect(all.length).toBeGreaterThan(80);
  });

  it('says of every exported function and class what it does', () => {
    expect(all.filter((f) => f.doc.length < 20).map((f) => `${f.file}: ${f.name}`)).toEqual([]);
  });

  it('speaks of the parameters wherever there are two or more: by @param, by a list, or by name', () => {
    const silent = all.filter(
      ({ doc, parameters }) =>
        parameters.length >= 2 &&
        !doc.includes('@param') &&
        !/^ \* - `/m.test(doc) &&
        !parameters.some((p) => new RegExp(`\\b${p}\\b`).test(doc)),
    );
    expect(silent.map((f) => `${f.file}: ${f.name}`)).toEqual([]);
  });

  it('finds a function without a comment, so that the test can fail', () => {
    expect(exportedFunctions('export function a(b: number, c: number) {}')).toEqual([
      { name: 'a', doc: '', parameters: ['b', 'c'] },
    ]);
  });
});
