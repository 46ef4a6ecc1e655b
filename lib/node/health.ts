import type { Database } from '@/db/connection';
import { readMigrationState } from '@/db/migration-state';

export type Health = {
  /** The process answers. */
  live: true;
  /** It can do its work now. */
  ready: boolean;
  checks: { database: 'ok' | 'unreachable'; migrations: 'current' | 'behind' | 'ahead' | 'unknown' };
  /** In words, for people: what is the matter. */
  message: string;
};

/** What an operator's probe asks. A database that is away is an answer here, not an error. */
export async function readHealth(open: () => Database, onFailure: (error: unknown) => void): Promise<Health> {
  try {
    const migrations = await readMigrationState(open());
    const ready = migrations === 'current';
    return { live: true, ready, checks: { database: 'ok', migrations }, message: words[migrations] };
  } catch (error) {
    onFailure(error);
    return {
      live: true,
      ready: false,
      checks: { database: 'unreachable', migrations: 'unknown' },
      message: 'The database does not answer. The pages that need it come back as soon as it does.',
    };
  }
}

const words = {
  current: 'Ready.',
  behind: 'The database waits for this version’s migrations: start the server with npm start, which applies them.',
  ahead: 'The database was migrated by a newer version of Smirr: start that version.',
};
