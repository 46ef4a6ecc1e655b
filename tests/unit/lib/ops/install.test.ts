import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { stalePackages } from '@/lib/ops/install.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(`${tmpdir()}/smirr-unit-`);
  mkdirSync(`${folder}/node_modules`);
});
afterEach(() => rmSync(folder, { recursive: true }));

const packages = {
  '': { version: '0.1.0' },
  'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' },
  'node_modules/only-elsewhere': { version: '2.0.0', integrity: 'sha512-b', optional: true },
};
const write = (name: string, list: object) => writeFileSync(`${folder}/${name}`, JSON.stringify({ packages: list }));

describe('installed packages', () => {
  beforeEach(() => write('package-lock.json', packages));

  test('are up to date when each one is at the locked version, those of other systems aside', () => {
    write('node_modules/.package-lock.json', { 'node_modules/a': packages['node_modules/a'] });
    expect(stalePackages(folder)).toBeNull();
  });

  test('are stale when none are installed, or an install was interrupted', () => {
    expect(stalePackages(folder)).toBe('no packages are installed');
  });

  test('are stale when a version or its content differs, or one is missing', () => {
    write('node_modules/.package-lock.json', { 'node_modules/a': { version: '0.9.0', integrity: 'sha512-a' } });
    expect(stalePackages(folder)).toBe('node_modules/a is not at 1.0.0');
    write('node_modules/.package-lock.json', { 'node_modules/a': { version: '1.0.0', integrity: 'sha512-x' } });
    expect(stalePackages(folder)).toBe('node_modules/a is not at 1.0.0');
    write('node_modules/.package-lock.json', {});
    expect(stalePackages(folder)).toBe('node_modules/a is not at 1.0.0');
  });
});

test('a missing lock file is said in words', () => {
  expect(() => stalePackages(folder)).toThrow('package-lock.json is missing or damaged');
});
