import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate as applyMigrations } from 'drizzle-orm/node-postgres/migrator';
import { Client } from 'pg';
import { serverStart } from './schema/server-start';

// Any number will do, as long as every version of Smirr uses the same.
const lock = 7_369_728;

/**
 * Brings the database at `url` to this version's schema. Safe to run twice and from several processes at once: the
 * others wait for the first, then find nothing to do.
 */
export async function migrate(url: string, migrationsFolder: string): Promise<void> {
  const client = new Client({
    connectionString: url,
    connectionTimeoutMillis: 10_000,
    application_name: 'smirr migrate',
  });
  await client.connect();
  try {
    // Held by the session: it goes with the connection, also when this process is killed.
    await client.query('select pg_advisory_lock($1)', [lock]);
    await client.query('set client_min_messages = warning');
    await applyMigrations(drizzle(client), { migrationsFolder });
  } finally {
    await client.end();
  }
}

/** Notes that this version begins to serve. */
export async function recordStart(url: string, version: string, runtime: string): Promise<void> {
  const client = new Client({
    connectionString: url,
    connectionTimeoutMillis: 10_000,
    application_name: 'smirr migrate',
  });
  await client.connect();
  try {
    await drizzle(client).insert(serverStart).values({ version, runtime });
  } finally {
    await client.end();
  }
}
