import { existsSync } from 'node:fs';
import { run, tail } from './run.mjs';
import { Obstacle, step } from './say.mjs';

/** Whether programs can be installed from here: as root, through sudo, or not at all. */
export async function rootAccess() {
  if (process.getuid() === 0) return [];
  if (!process.env.PATH?.split(':').some((folder) => existsSync(`${folder}/sudo`))) return null;
  // Without a terminal sudo must not wait for a password that nobody can type.
  const quiet = ['sudo', '-n'];
  if ((await run('sudo', ['-n', 'true'])).status === 0) return quiet;
  return process.stdin.isTTY ? ['sudo'] : null;
}

/**
 * Installs Debian packages. `before` and `after` are lines of shell run with the same rights around the installation.
 * Without the right to install it says exactly what to do, and stops.
 */
export async function installDebian(packages, { why, expect, before = '', after = '' }) {
  const list = packages.join(' ');
  const byHand = `    sudo apt-get update && sudo apt-get install -y ${list}`;
  const prefix = existsSync('/usr/bin/apt-get') ? await rootAccess() : null;
  if (prefix === null) {
    throw new Obstacle(
      `${why} It is missing here, and this user may not install programs.\nInstall it (Debian, Ubuntu), then start again:\n\n${byHand}`,
    );
  }
  const script = `set -e; export DEBIAN_FRONTEND=noninteractive; cd /
${before}
apt-get update -q || true
status=0; apt-get install -y -q --no-install-recommends ${list} </dev/null || status=$?
${after}
exit $status`;
  const [command, ...rest] = [...prefix, 'sh', '-c', script];
  await step(`Installing ${list} from Debian's packages: ${why}`, expect, async () => {
    const result = await run(command, rest, { terminal: prefix[0] === 'sudo' });
    if (result.status !== 0)
      throw new Obstacle(
        `apt-get could not install ${list}:\n\n${tail(result.stderr || result.stdout)}\n\nTry by hand, then start again:\n\n${byHand}`,
      );
  });
}
