import { sql } from 'drizzle-orm';
import type { Database } from './connection';
import journal from './migrations/meta/_journal.json';

/** `ahead`: the database was migrated by a newer version than this one. */
export type MigrationState = 'current' | 'behind' | 'ahead';

/** Compares the migrations the database has seen with those this version knows. Throws if the database is away. */
export async function readMigrationState(database: Database): Promise<MigrationState> {
  const known = journal.entries.length === 0 ? 0 : Math.max(...journal.entries.map((entry) => entry.when));
  const table = await database.execute<{ present: boolean }>(
    sql`select to_regclass('drizzle.__drizzle_migrations') is not null as present`,
  );
  if (!table.rows[0]?.present) return 'behind';
  const seen = await database.execute<{ newest: string | null }>(
    sql`select max(created_at) as newest from drizzle.__drizzle_migrations`,
  );
  const newest = Number(seen.rows[0]?.newest ?? 0);
  if (newest === known) return 'current';
  return newest < known ? 'behind' : 'ahead';
}
