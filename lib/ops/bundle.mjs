import { mkdirSync, readFileSync, renameSync, statSync, writeFileSync } from 'node:fs';
import { ensurePackages } from './install.mjs';
import { buildFolder, root } from './paths.mjs';
import { Obstacle } from './say.mjs';

/** What is bundled, and whether packages go into the bundle (faster to load) or stay where they are. */
const bundles = {
  cli: { entry: 'kernels/cli.ts', packages: 'bundle' },
  bench: { entry: 'tests/bench/bench.ts', packages: 'bundle' },
  migrate: { entry: 'db/migrate.ts', packages: 'external' },
};

/**
 * The path of an up-to-date bundle. Where nothing changed this costs a look at each source file and no more, so that
 * `npm run compute` starts fast; esbuild is loaded only when there is something to do.
 */
export async function ensureBundle(name, { folder = buildFolder } = {}) {
  const file = `${folder}/${name}.mjs`;
  const stamp = `${folder}/${name}.json`;
  if (!isFresh(stamp)) {
    await ensurePackages();
    await makeBundle(bundles[name], file, stamp);
  }
  return file;
}

function isFresh(stamp) {
  try {
    const inputs = JSON.parse(readFileSync(stamp, 'utf8'));
    return inputs.every(([path, size, time]) => {
      const now = statSync(`${root}/${path}`);
      return now.size === size && now.mtimeMs === time;
    });
  } catch {
    return false;
  }
}

async function makeBundle({ entry, packages }, file, stamp) {
  // biome-ignore lint/style/noRestrictedImports: the packages are there by now.
  const { build } = await import('esbuild');
  mkdirSync(file.slice(0, file.lastIndexOf('/')), { recursive: true });
  // Two commands may bundle at once: each writes files of its own and renames them into place.
  const draft = `${file}.${process.pid}`;
  const result = await build({
    absWorkingDir: root,
    entryPoints: [entry],
    outfile: draft,
    bundle: true,
    packages,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    sourcemap: 'inline',
    sourcesContent: false,
    metafile: true,
    logLevel: 'silent',
    // Packages in CommonJS form may ask for Node's modules.
    banner: {
      js: "import { createRequire as makeRequire } from 'node:module'; const require = makeRequire(import.meta.url);",
    },
  }).catch((error) => {
    throw new Obstacle(`${entry} could not be bundled:\n\n${error.message}`);
  });
  const own = Object.keys(result.metafile.inputs).filter((path) => !path.startsWith('node_modules/'));
  // The lock file stands for all packages, this file for the options.
  const inputs = [...own, 'package-lock.json', 'lib/ops/bundle.mjs'].map((path) => {
    const { size, mtimeMs } = statSync(`${root}/${path}`);
    return [path, size, mtimeMs];
  });
  writeFileSync(`${stamp}.${process.pid}`, JSON.stringify(inputs));
  renameSync(draft, file);
  renameSync(`${stamp}.${process.pid}`, stamp);
}
