import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { afterEach, beforeEach, describe, expect, inject, test } from 'vitest';
import { openDatabase } from '@/db/connection';
import { migrate, recordStart } from '@/db/migrate';
import { readMigrationState } from '@/db/migration-state';
import { ensureBundle } from '@/lib/ops/bundle.mjs';
import { createTestDatabase, query } from '../support/test-database';

const run = promisify(execFile);
const migrations = 'db/migrations';
const count = 'select count(*)::int as n from drizzle.__drizzle_migrations';

let database: Awaited<ReturnType<typeof createTestDatabase>>;
beforeEach(async () => {
  database = await createTestDatabase(inject('adminUrl'));
});
afterEach(() => database.drop());

async function stateOf(url: string) {
  const { pool, database } = openDatabase(url, () => {});
  try {
    return await readMigrationState(database);
  } finally {
    await pool.end();
  }
}

describe('migrations', () => {
  test('bring an empty database to the current schema, and a second run changes nothing', async () => {
    expect(await stateOf(database.url)).toBe('behind');
    await migrate(database.url, migrations);
    expect(await stateOf(database.url)).toBe('current');
    const before = await query<{ n: number }>(database.url, count);
    await migrate(database.url, migrations);
    expect(await query(database.url, count)).toEqual(before);
    expect(before[0].n).toBeGreaterThan(0);
  });

  test('run by three processes at once are applied once', async () => {
    const bundle = await ensureBundle('migrate');
    const script = `const { migrate } = await import(${JSON.stringify(bundle)}); await migrate(${JSON.stringify(database.url)}, ${JSON.stringify(migrations)});`;
    await Promise.all([1, 2, 3].map(() => run(process.execPath, ['--input-type=module', '-e', script])));
    expect(await stateOf(database.url)).toBe('current');
    const rows = await query<{ hash: string }>(database.url, 'select hash from drizzle.__drizzle_migrations');
    expect(new Set(rows.map((row) => row.hash)).size).toBe(rows.length);
  });

  test('of a newer version are noticed', async () => {
    await migrate(database.url, migrations);
    await query(
      database.url,
      "insert into drizzle.__drizzle_migrations (hash, created_at) values ('x', 9999999999999)",
    );
    expect(await stateOf(database.url)).toBe('ahead');
  });

  test('leave a table in which each start is noted', async () => {
    await migrate(database.url, migrations);
    await recordStart(database.url, '0.1.0', 'node 20.20.2');
    const rows = await query(
      database.url,
      "select version, runtime, now() - started_at < interval '1 minute' as recent from server_start",
    );
    expect(rows).toEqual([{ version: '0.1.0', runtime: 'node 20.20.2', recent: true }]);
  });
});
