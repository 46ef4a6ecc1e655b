import { readFileSync } from 'node:fs';
import { withLock } from './lock.mjs';
import { root } from './paths.mjs';
import { run, tail } from './run.mjs';
import { Obstacle, say, step } from './say.mjs';

/**
 * Why the installed packages do not match package-lock.json, or null if they do. npm leaves a list of what it
 * installed in node_modules as its last act, so an install that was interrupted shows here too.
 */
export function stalePackages(folder = root) {
  const wanted = readPackages(`${folder}/package-lock.json`);
  if (!wanted)
    throw new Obstacle('package-lock.json is missing or damaged. Restore it: git checkout package-lock.json');
  const installed = readPackages(`${folder}/node_modules/.package-lock.json`);
  if (!installed) return 'no packages are installed';
  for (const [path, entry] of Object.entries(wanted)) {
    if (path === '') continue;
    const got = installed[path];
    // Packages for other processors and systems are listed as optional and stay away.
    if (!got && (entry.optional || entry.devOptional || entry.peer)) continue;
    if (!got || got.version !== entry.version || got.integrity !== entry.integrity)
      return `${path} is not at ${entry.version}`;
  }
  return null;
}

/** Installs the packages of package-lock.json where they are missing or stale. */
export async function ensurePackages() {
  if (!stalePackages()) return;
  // Not in node_modules: npm empties it.
  await withLock(
    `${root}/.build/install.lock`,
    async () => {
      const reason = stalePackages();
      if (!reason) return;
      await step(`Installing packages from the npm registry: ${reason}`, 'one to two minutes', installPackages);
    },
    () => say('- Waiting for another command that is installing packages …'),
  );
}

async function installPackages() {
  const npm = process.env.npm_execpath;
  const args = ['ci', '--include=dev', '--include=optional', '--no-audit', '--no-fund', '--loglevel=error'];
  const result = npm
    ? await run(process.execPath, [npm, ...args], { cwd: root })
    : await run('npm', args, { cwd: root });
  if (result.status !== 0) {
    throw new Obstacle(
      `npm could not install the packages:\n\n${tail(result.stderr || result.stdout)}\n\nThe npm registry must be reachable. Then start again.`,
    );
  }
}

function readPackages(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8')).packages ?? null;
  } catch {
    return null;
  }
}
