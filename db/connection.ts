import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import { Pool } from 'pg';

export type Database = NodePgDatabase;

/**
 * Opens a pool of connections; none is made before the first query. A connection that breaks while idle (the
 * database restarts) is reported to `onIdleError` and replaced; without a listener it would end the process.
 */
export function openDatabase(url: string, onIdleError: (error: Error) => void): { pool: Pool; database: Database } {
  const pool = new Pool({ connectionString: url, max: 10, connectionTimeoutMillis: 3000, application_name: 'smirr' });
  pool.on('error', onIdleError);
  return { pool, database: drizzle(pool) };
}
