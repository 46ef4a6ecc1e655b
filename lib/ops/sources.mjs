import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { root } from './paths.mjs';

/** What a build of the pages is made of. Tests and the commands themselves are not part of it. */
const parts = [
  'app',
  'components',
  'db',
  'kernels',
  'lib/client',
  'lib/node',
  'lib/server',
  'lib/shared',
  'lib/jobs',
  'public',
  'proxy.ts',
  'next.config.ts',
  'postcss.config.mjs',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
];

/** A fingerprint of the sources' names and contents: equal prints, equal pages. Some hundredths of a second. */
export function hashSources(folder = root) {
  const hash = createHash('sha256');
  hash.update(process.version);
  for (const path of parts.flatMap((part) => list(folder, part))) {
    hash.update(`\0${path}\0`);
    hash.update(readFileSync(`${folder}/${path}`));
  }
  return hash.digest('hex');
}

function list(folder, path) {
  const full = `${folder}/${path}`;
  if (!existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [path];
  return readdirSync(full)
    .sort()
    .flatMap((name) => list(folder, `${path}/${name}`));
}
