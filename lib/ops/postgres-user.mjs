import { run } from './run.mjs';
import { Obstacle } from './say.mjs';

/**
 * PostgreSQL refuses to run as root, so root hands it to the user `postgres` of Debian's package. Where that user
 * cannot reach the data folder (a checkout under a folder of mode 0700), it gets the right to pass folders, no more.
 * Returns what to put before a command: nothing for an ordinary user.
 */
export async function postgresPrefix(folder) {
  if (process.getuid() !== 0) return [];
  const as = ['setpriv', '--reuid=postgres', '--regid=postgres', '--init-groups'];
  const withRights = (rights) => [...as, `--inh-caps=${rights}`, `--ambient-caps=${rights}`, '--'];
  const ways = [
    [...as, '--'],
    withRights('+dac_read_search'),
    withRights('+dac_override,+dac_read_search'),
    withRights('+dac_override'),
  ];
  for (const way of ways) {
    const [command, ...args] = [...way, 'sh', '-c', 'cd "$1" && test -w . && ls >/dev/null', 'sh', folder];
    if ((await run(command, args, { cwd: '/' })).status === 0) return way;
  }
  throw new Obstacle(
    `The user "postgres" cannot reach ${folder}, and this system does not let root lend it the right to (setpriv failed).\nMove the checkout to a folder that others may enter, or set DATABASE_URL to a database of your own.`,
  );
}
