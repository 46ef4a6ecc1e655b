import { readFileSync } from 'node:fs';
import { ensureBundle } from './bundle.mjs';
import { root } from './paths.mjs';
import { Obstacle } from './say.mjs';

/** Brings the database to this version's schema and notes the start in it. */
export async function migrateDatabase(url) {
  const { migrate, recordStart } = await import(await ensureBundle('migrate'));
  const { version } = JSON.parse(readFileSync(`${root}/package.json`, 'utf8'));
  try {
    await migrate(url, `${root}/db/migrations`);
    await recordStart(url, version, `node ${process.versions.node}`);
  } catch (error) {
    throw new Obstacle(`The database ${withoutPassword(url)} could not be brought up to date: ${reason(error)}`);
  }
}

/** The address as it may be shown. */
export function withoutPassword(url) {
  try {
    const { hostname, port, pathname } = new URL(url);
    return `${hostname}${port ? `:${port}` : ''}${pathname}`;
  } catch {
    return 'in DATABASE_URL';
  }
}

function reason(error) {
  // A refused connection to a name with several addresses has its words one level down.
  const parts = error?.errors?.length ? error.errors : [error?.cause ?? error];
  return parts.map((part) => part?.message || part?.code || String(part)).join('; ');
}
