import { existsSync, readdirSync } from 'node:fs';
import { installDebian } from './debian.mjs';
import { Obstacle } from './say.mjs';

const home = '/usr/lib/postgresql';
const needed = ['initdb', 'pg_ctl', 'postgres', 'psql'];

/** The folder with the programs of the given version, or of the newest one; null if there is none. */
export function findPostgres(version) {
  if (!existsSync(home)) return null;
  const versions = readdirSync(home)
    .filter((name) => /^\d+$/.test(name) && (version === undefined || name === version))
    .sort((a, b) => Number(b) - Number(a));
  for (const name of versions) {
    if (needed.every((program) => existsSync(`${home}/${name}/bin/${program}`))) return `${home}/${name}/bin`;
  }
  return null;
}

/** As findPostgres, but installs Debian's PostgreSQL if there is none. A cluster of `version` needs that version. */
export async function ensurePostgres(version) {
  const found = findPostgres(version);
  if (found) return found;
  if (version !== undefined && findPostgres()) {
    throw new Obstacle(
      `The database in .data was made with PostgreSQL ${version}, which is not installed here. Install it: apt-get install postgresql-${version}`,
    );
  }
  // The package would make and start a cluster of its own; nobody asked for that one. The note goes after the install.
  const folder = '/etc/postgresql-common/createcluster.d';
  const note = `${folder}/smirr.conf`;
  await installDebian(['postgresql'], {
    why: 'Smirr keeps its data in PostgreSQL.',
    expect: 'up to a minute',
    before: `mkdir -p ${folder}; echo 'create_main_cluster = false' > ${note}`,
    after: `rm -f ${note}; rmdir ${folder} 2>/dev/null || true`,
  });
  const installed = findPostgres(version);
  if (!installed)
    throw new Obstacle(
      `PostgreSQL was installed but its programs are not under ${home}. Set DATABASE_URL to a database of your own.`,
    );
  return installed;
}
