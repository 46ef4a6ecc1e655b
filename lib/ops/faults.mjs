import { existsSync } from 'node:fs';
import { ensurePackages } from './install.mjs';
import { root } from './paths.mjs';
import { fail, Obstacle } from './say.mjs';

// The runner lies with the faults it applies; this command only sees to it that its packages are there.
try {
  await ensurePackages();
  const runner = `${root}/tests/faults/run-faults.mjs`;
  if (!existsSync(runner)) throw new Obstacle('tests/faults/run-faults.mjs is missing.');
  await import(runner);
} catch (error) {
  fail(error);
}
