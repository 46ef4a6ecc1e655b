import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { pathToFileURL } from 'node:url';
import { ensureBundle } from './bundle.mjs';
import { ensurePackages } from './install.mjs';
import { withLock } from './lock.mjs';
import { buildFolder, root } from './paths.mjs';
import { run, tail } from './run.mjs';
import { fail, Obstacle, say, step } from './say.mjs';
import { hashSources } from './sources.mjs';

const stamp = `${root}/.next/sources`;

/** Builds the pages and the bundles where their sources changed since the last build. */
export async function ensureBuild({ signal } = {}) {
  for (const name of ['cli', 'migrate']) await ensureBundle(name);
  if (isBuilt()) return;
  await withLock(
    `${buildFolder}/build.lock`,
    async () => {
      if (isBuilt()) return;
      await step('Building the pages', 'about a minute', () => buildPages(signal));
    },
    () => say('- Waiting for another command that is building …'),
  );
}

function isBuilt() {
  return existsSync(stamp) && existsSync(`${root}/.next/BUILD_ID`) && readFileSync(stamp, 'utf8') === hashSources();
}

async function buildPages(signal) {
  // Taken before: what changes while it builds is built the next time.
  const hash = hashSources();
  rmSync(stamp, { force: true });
  const result = await run(process.execPath, ['node_modules/next/dist/bin/next', 'build'], {
    cwd: root,
    signal,
    env: { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1', NO_COLOR: '1' },
  });
  const output = result.stdout + result.stderr;
  if (result.status !== 0) throw new Obstacle(`The pages could not be built:\n\n${tail(output, 60)}`);
  const warnings = output.split('\n').filter((line) => /\bwarn(ing)?\b|⚠/i.test(line));
  for (const line of warnings) say(`  ${line.trim()}`);
  writeFileSync(stamp, hash);
}

if (import.meta.url === pathToFileURL(process.argv[1]).href) {
  ensurePackages()
    .then(() => ensureBuild())
    .then(() => say('Built.'), fail);
}
