import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { ensurePackages } from './install.mjs';
import { fail } from './say.mjs';
import { stopWish } from './signals.mjs';
import { runStaticStages, runVitestStage, stageRunner } from './stages.mjs';
import { createTally } from './tally.mjs';

/** `npm run check`: everything that needs neither a database nor a server nor a browser. */
const { signal } = stopWish();
const folder = mkdtempSync(`${tmpdir()}/smirr-check-`);
try {
  await ensurePackages();
  const tally = createTally();
  const run = stageRunner(signal);
  await runStaticStages(tally, run);
  await runVitestStage(tally, run, folder, ['unit', 'property', 'published']);
  tally.close();
} catch (error) {
  fail(error);
} finally {
  rmSync(folder, { recursive: true, force: true });
}
