import { readdirSync, readFileSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, inject, test } from 'vitest';
import { ensureBuild } from '@/lib/ops/build.mjs';
import { freePort } from '@/lib/ops/ports.mjs';
import { startWeb } from '@/lib/ops/web.mjs';
import { createTestDatabase } from '../support/test-database';
import { createTestFolder } from '../support/test-folder';

const folder = createTestFolder();
let database: Awaited<ReturnType<typeof createTestDatabase>>;
let web: Awaited<ReturnType<typeof startWeb>>;

beforeAll(async () => {
  await ensureBuild();
  database = await createTestDatabase(inject('adminUrl'), inject('template'));
  web = await startWeb({ port: await freePort(), databaseUrl: database.url, logFile: `${folder.path}/web.log` });
});
afterAll(async () => {
  await web?.stop();
  await database?.drop();
  folder.remove();
});

/** The directives of a policy by name. */
function policyOf(answer: Response): Map<string, string> {
  const text = answer.headers.get('content-security-policy') ?? '';
  return new Map(
    text.split(';').map(
      (part) =>
        part
          .trim()
          .split(/\s+(.*)/s)
          .slice(0, 2) as [string, string],
    ),
  );
}

/** Every script the build made that starts or is a worker: these must carry the headers themselves. */
function builtScripts(): string[] {
  const files = readdirSync('.next/static', { recursive: true, encoding: 'utf8' }).filter((file) =>
    file.endsWith('.js'),
  );
  const workers = files.filter((file) =>
    /importScripts|WorkerGlobalScope|turbopack-worker/.test(`${file}${readFileSync(`.next/static/${file}`, 'utf8')}`),
  );
  return (workers.length > 0 ? workers : files.slice(0, 1)).map((file) => `/_next/static/${file}`);
}

describe('every response', () => {
  test.each(['/', '/explore', '/no-such-page', '/api/health', '/api/no-such-route', '/icon.svg', ...builtScripts()])(
    '%s is isolated from other origins and never sniffed',
    async (path) => {
      const { headers } = await fetch(web.address + path);
      expect(Object.fromEntries(headers)).toMatchObject({
        'cross-origin-opener-policy': 'same-origin',
        'cross-origin-embedder-policy': 'require-corp',
        'cross-origin-resource-policy': 'same-origin',
        'x-content-type-options': 'nosniff',
        'x-frame-options': 'DENY',
        'referrer-policy': 'same-origin',
      });
      expect(headers.has('x-powered-by')).toBe(false);
      expect(headers.get('content-security-policy')).toBeTruthy();
    },
  );
});

describe('the policy of pages', () => {
  test.each(['/', '/explore', '/licences', '/no-such-page'])(
    '%s allows scripts by a nonce alone, and each script has it',
    async (path) => {
      const answer = await fetch(web.address + path);
      const policy = policyOf(answer);
      const scripts = policy.get('script-src') ?? '';
      const nonce = /'nonce-([0-9a-f]{32})'/.exec(scripts)?.[1];
      expect(nonce).toBeTruthy();
      expect(scripts).toBe(`'self' 'nonce-${nonce}'`);
      expect(policy.get('style-src')).toBe(`'self' 'nonce-${nonce}'`);
      expect(policy.get('default-src')).toBe("'self'");
      for (const none of ['object-src', 'base-uri', 'frame-src', 'frame-ancestors'])
        expect(policy.get(none)).toBe("'none'");
      const tags = (await answer.text()).match(/<script\b[^>]*>/g) ?? [];
      expect(tags.length).toBeGreaterThan(0);
      for (const tag of tags) expect(tag).toContain(`nonce="${nonce}"`);
    },
  );

  test('has another nonce for each request, whatever the request brings', async () => {
    const headers = { 'x-nonce': 'mine', 'content-security-policy': "script-src 'nonce-mine'" };
    const policies = await Promise.all(
      [1, 2, 3].map(async () => (await fetch(web.address, { headers })).headers.get('content-security-policy')),
    );
    expect(new Set(policies).size).toBe(3);
    expect(policies.join()).not.toContain('mine');
  });
});

test('scripts and data carry policies that allow no more than they need', async () => {
  const script = policyOf(await fetch(web.address + builtScripts()[0]));
  expect(script.get('default-src')).toBe("'none'");
  expect(script.get('script-src')).toBe("'self'");
  const data = policyOf(await fetch(`${web.address}/api/health`));
  expect([...data]).toEqual([
    ['default-src', "'none'"],
    ['frame-ancestors', "'none'"],
  ]);
});

test('the server listens on the loopback address alone', () => {
  const port = Number(new URL(web.address).port).toString(16).toUpperCase().padStart(4, '0');
  const listening = ['/proc/net/tcp', '/proc/net/tcp6'].flatMap((file) =>
    readFileSync(file, 'utf8')
      .split('\n')
      .map((line) => line.trim().split(/\s+/))
      .filter((fields) => fields[1]?.endsWith(`:${port}`) && fields[3] === '0A')
      .map((fields) => fields[1]),
  );
  expect(listening).toEqual([`0100007F:${port}`]);
});
