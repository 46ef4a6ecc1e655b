import { spawnSync } from 'node:child_process';
import { cpSync, mkdirSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { createTestFolder } from '../support/test-folder';

const folder = createTestFolder();
afterAll(() => folder.remove());

/** Each case is a file of its own in a copy of the rules; one run of Biome over all of them. */
const cases: { file: string; source: string }[] = [];
function place(file: string, source: string): string {
  const unique = file.replace(/(\.\w+)$/, `-${cases.length}$1`);
  cases.push({ file: unique, source });
  return unique;
}

let refused: Set<string>;
beforeAll(() => {
  for (const path of ['biome.json', 'package.json', '.gitignore', 'lib/ops/lint'])
    cpSync(path, `${folder.path}/${path}`, { recursive: true });
  for (const { file, source } of cases) {
    mkdirSync(dirname(`${folder.path}/${file}`), { recursive: true });
    writeFileSync(`${folder.path}/${file}`, `${source}\n`);
  }
  const biome = `${process.cwd()}/node_modules/.bin/biome`;
  const args = ['lint', '--reporter=github', '--max-diagnostics=1000', '.'];
  const { stdout } = spawnSync(biome, args, { cwd: folder.path, encoding: 'utf8' });
  const lines = stdout
    .split('\n')
    .filter((line) => /title=(lint\/style\/noRestricted(Imports|Globals)|plugin)/.test(line));
  refused = new Set(lines.map((line) => /file=(?:.*?\/smirr-case-[^/]*\/)?([^,]+)/.exec(line)?.[1] ?? line));
});

const importing = (source: string) => `import { a } from '${source}';\nexport const b = a;`;

const forbidden: [string, string][] = [
  ['kernels/fft/a.ts', 'node:fs'],
  ['kernels/fft/a.ts', 'react'],
  ['kernels/fft/a.ts', '@/kernels/core/check'],
  ['kernels/fft/a.ts', '../../lib/shared/format-number'],
  ['db/a.ts', '@/lib/node/log'],
  ['lib/shared/a.ts', '@/lib/client/theme'],
  ['lib/shared/a.ts', '../node/log'],
  ['lib/shared/a.ts', 'node:fs'],
  ['lib/client/a.ts', '@/lib/node/log'],
  ['lib/node/a.ts', '@/lib/server/session'],
  ['lib/node/a.ts', 'next/headers'],
  ['lib/server/a.ts', '@/components/site/site-nav'],
  ['lib/ops/a.mjs', 'pg'],
  ['lib/ops/a.mjs', '../shared/permissions'],
  ['components/site/a.tsx', '@/lib/node/database'],
  ['components/site/a.tsx', '@/db/connection'],
  ['components/site/a.tsx', '@/app/fonts'],
  ['app/explore/page.tsx', '@/db/connection'],
  ['app/explore/page.tsx', '../../tests/support/test-folder'],
];

const allowed: [string, string][] = [
  ['kernels/fft/a.ts', 'fft.js'],
  ['kernels/fft/a.ts', '../core/check'],
  ['db/a.ts', '@/kernels/spec'],
  ['lib/node/a.ts', '@/db/connection'],
  ['lib/ops/a.mjs', 'node:fs/promises'],
  ['lib/server/a.ts', '@/lib/node/log'],
  ['components/site/a.tsx', '@/lib/client/theme'],
  ['app/explore/page.tsx', '@/components/site/site-nav'],
];

const expressions = ['Math.random()', 'Date.now()', 'performance.now()', 'process.pid', 'document.title'];

// Placed now, while the tests are collected: Biome runs before the first of them.
const placed = (list: [string, string][]) =>
  list.map(([file, source]) => ({ file, source, at: place(file, importing(source)) }));
const forbiddenCases = placed(forbidden);
const allowedCases = placed(allowed);
const expressionCases = expressions.map((expression) => {
  const source = `export const a = ${expression};`;
  return { expression, inKernels: place('kernels/core/a.ts', source), elsewhere: place('lib/node/a.ts', source) };
});

describe('lint', () => {
  test.each(forbiddenCases)('$file may not import $source', ({ at }) => {
    expect(refused).toContain(at);
  });

  test.each(allowedCases)('$file may import $source', ({ at }) => {
    expect(refused).not.toContain(at);
  });

  test.each(expressionCases)('kernels may not use $expression, others may', ({ inKernels, elsewhere }) => {
    expect(refused).toContain(inKernels);
    expect(refused).not.toContain(elsewhere);
  });
});
