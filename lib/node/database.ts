import type { Pool } from 'pg';
import { type Database, openDatabase } from '@/db/connection';
import { readEnvironment } from './environment';
import { log } from './log';

// The development server loads modules anew on each change; the pool must outlive that.
const kept = globalThis as { smirrDatabase?: { pool: Pool; database: Database } };

/** This process's database, opened at first use. */
export function database(): Database {
  kept.smirrDatabase ??= openDatabase(readEnvironment().DATABASE_URL, (error) =>
    log.warn({ err: error }, 'an idle database connection broke'),
  );
  return kept.smirrDatabase.database;
}
