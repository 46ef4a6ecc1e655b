import { spawn } from 'node:child_process';
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { ensureBundle } from '@/lib/ops/bundle.mjs';
import { createTestFolder } from '../support/test-folder';

const folder = createTestFolder();
afterAll(() => folder.remove());
beforeAll(async () => {
  await ensureBundle('cli');
});

/** Runs the headless command as npm does, without any of the environment that a server would have. */
function compute(
  ...args: string[]
): Promise<{ status: number | null; stdout: string; stderr: string; seconds: number }> {
  const since = performance.now();
  const child = spawn(process.execPath, ['lib/ops/compute.mjs', ...args], {
    env: { PATH: process.env.PATH ?? '', NODE_ENV: 'production' },
  });
  let stdout = '';
  let stderr = '';
  child.stdout.on('data', (part) => {
    stdout += part;
  });
  child.stderr.on('data', (part) => {
    stderr += part;
  });
  return new Promise((resolve) =>
    child.once('close', (status) => resolve({ status, stdout, stderr, seconds: (performance.now() - since) / 1000 })),
  );
}

const study = {
  format: 'smirr-study',
  version: 1,
  system: { type: 'map', id: 'logistic', parameters: { r: 3.8 } },
  noise: { kind: 'gaussian', sigma: 0.05 },
  domain: [{ from: 0, to: 1, ends: 'absorbing' }],
  ask: { exit: {} } as Record<string, unknown>,
};

function write(name: string, content: unknown): string {
  const file = `${folder.path}/${name}`;
  writeFileSync(file, typeof content === 'string' ? content : JSON.stringify(content));
  return file;
}

describe('the compute command', () => {
  test('prints a result and nothing else, and ends with 0', async () => {
    const { status, stdout, stderr } = await compute(write('good.json', study));
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
    const result = JSON.parse(stdout);
    expect(result).toMatchObject({
      format: 'smirr-result',
      version: 1,
      runtime: `node ${process.versions.node}`,
      warnings: [],
    });
    expect(result.cases[0].exit.meanTime.value).toBeGreaterThan(1);
  });

  test('ends with 3 and says what could not be had, in the result as on standard error', async () => {
    const { status, stdout, stderr } = await compute(write('coarse.json', { ...study, grid: { points: 16 } }));
    expect(status).toBe(3);
    const { warnings } = JSON.parse(stdout) as { warnings: { code: string; message: string }[] };
    expect(warnings.map((warning) => warning.code)).toContain('grid-too-coarse');
    for (const { message } of warnings) expect(stderr).toContain(message);
  });

  test('gives the same bytes each time, on standard output as in a file', async () => {
    const out = `${folder.path}/result.json`;
    const file = write('same.json', study);
    const { status, stdout, stderr } = await compute(file, '--out', out);
    expect({ status, stdout, stderr }).toEqual({ status: 0, stdout: '', stderr: '' });
    expect((await compute(file)).stdout).toBe(readFileSync(out, 'utf8'));
  });

  test('prints a JSON Schema of the study file', async () => {
    const { status, stdout, stderr } = await compute('--schema');
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
    const schema = JSON.parse(stdout);
    expect(schema.$schema).toMatch(/^https:\/\/json-schema\.org\//);
    expect(Object.keys(schema.properties)).toEqual(
      expect.arrayContaining(['format', 'version', 'system', 'noise', 'domain', 'ask']),
    );
  });

  test.each([
    ['a wrong value', { ...study, noise: { kind: 'gaussian', sigma: -1 } }, /^noise\.sigma: /],
    ['an unknown key', { ...study, nosie: {} }, /nosie.*noise/],
    ['no JSON', '{ "format": ', /JSON/],
    ['nothing asked in a known format', [], /./],
  ])('refuses %s with 2, in a line with path and reason', async (name, content, words) => {
    const { status, stdout, stderr } = await compute(write(`${name.replaceAll(' ', '-')}.json`, content));
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(stderr).toMatch(words);
    expect(stderr).not.toMatch(/^\s+at /m);
    expect(
      stderr
        .trim()
        .split('\n')
        .every((line) => /^\S.*: .+/.test(line)),
      stderr,
    ).toBe(true);
  });

  test('refuses a file that is not there, a folder, no file at all, and a place it may not write to, with 2', async () => {
    const good = write('again.json', study);
    for (const args of [
      [`${folder.path}/none.json`],
      [folder.path],
      [],
      ['--out'],
      [good, '--out', `${folder.path}/no/such/folder.json`],
    ]) {
      const { status, stdout, stderr } = await compute(...args);
      expect({ args, status, stdout }).toEqual({ args, status: 2, stdout: '' });
      expect(stderr).not.toMatch(/^\s+at /m);
      expect(stderr).not.toBe('');
    }
  });

  test('starts in under half a second when nothing changed', async () => {
    const times = [];
    for (let tries = 0; tries < 3; tries++) times.push((await compute('--schema')).seconds);
    // Half a second is what a person accepts; the best of three leaves out what else the machine was doing.
    expect(Math.min(...times)).toBeLessThan(0.5);
  });
});

describe('bundles', () => {
  test('made by several processes at once are whole, and leave no drafts', async () => {
    const place = `${folder.path}/bundles`;
    const script = `const { ensureBundle } = await import('./lib/ops/bundle.mjs'); await import(await ensureBundle('cli', { folder: ${JSON.stringify(place)} }));`;
    const runs = [1, 2, 3].map(
      () =>
        new Promise((resolve) => spawn(process.execPath, ['--input-type=module', '-e', script]).once('close', resolve)),
    );
    expect(await Promise.all(runs)).toEqual([0, 0, 0]);
    expect(readdirSync(place).sort()).toEqual(['cli.json', 'cli.mjs']);
    expect(existsSync(`${place}/cli.mjs`)).toBe(true);
  });
});
