import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { migrate } from '@/db/migrate';
import { ensureBuild } from '@/lib/ops/build.mjs';
import { freePort } from '@/lib/ops/ports.mjs';
import { startCluster } from '@/lib/ops/postgres.mjs';
import { isAlive } from '@/lib/ops/processes.mjs';
import { startWeb } from '@/lib/ops/web.mjs';
import { query } from '../support/test-database';
import { createTestFolder } from '../support/test-folder';

const folder = createTestFolder();
let cluster: Awaited<ReturnType<typeof startCluster>>;
let web: Awaited<ReturnType<typeof startWeb>>;
const start = () => startCluster(folder.path, { durable: false });

beforeAll(async () => {
  await ensureBuild();
  cluster = await start();
  await migrate(cluster.url, 'db/migrations');
  web = await startWeb({ port: await freePort(), databaseUrl: cluster.url, logFile: `${folder.path}/web.log` });
});
afterAll(async () => {
  await web?.stop();
  await cluster?.stop();
  folder.remove();
});

const health = async (query = '') => {
  const answer = await fetch(`${web.address}/api/health${query}`);
  return { status: answer.status, cache: answer.headers.get('cache-control'), body: await answer.json() };
};

describe('/api/health', () => {
  test('is 200 and ready while database and migrations are as they should be', async () => {
    expect(await health()).toEqual({
      status: 200,
      cache: 'no-store',
      body: { live: true, ready: true, checks: { database: 'ok', migrations: 'current' }, message: 'Ready.' },
    });
  });

  test('tells a database that waits for migrations from one that is ready', async () => {
    const newest = 'update drizzle.__drizzle_migrations set created_at = created_at + $1';
    await query(cluster.url, newest, [-1]);
    expect(await health()).toMatchObject({
      status: 503,
      body: { ready: false, checks: { database: 'ok', migrations: 'behind' } },
    });
    await query(cluster.url, newest, [1]);
    expect((await health()).status).toBe(200);
  });

  test('is 503 in words without the database, live all the same, and 200 again once it is back', async () => {
    const port = cluster.port;
    await cluster.stop();
    for (let tries = 0; tries < 3; tries++) {
      const { status, body } = await health();
      expect(status).toBe(503);
      expect(body).toMatchObject({
        live: true,
        ready: false,
        checks: { database: 'unreachable', migrations: 'unknown' },
      });
      expect(body.message).toMatch(/database does not answer/);
      expect(JSON.stringify(body)).not.toMatch(/127\.0\.0\.1|smirr:/);
    }
    expect(await health('?live')).toEqual({ status: 200, cache: 'no-store', body: { live: true } });
    expect((await fetch(`${web.address}/`)).status).toBe(200);
    cluster = await start();
    expect(cluster.port).toBe(port);
    expect((await health()).status).toBe(200);
    expect(isAlive(web.process)).toBe(true);
  });
});
