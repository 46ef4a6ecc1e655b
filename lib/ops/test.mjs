import { chmodSync, mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { ensureChromium } from './browser.mjs';
import { ensureBuild } from './build.mjs';
import { ensureRsvg } from './drawing.mjs';
import { ensurePackages } from './install.mjs';
import { migrateDatabase } from './migrate.mjs';
import { root } from './paths.mjs';
import { freePort } from './ports.mjs';
import { startCluster } from './postgres.mjs';
import { Obstacle, say, seconds } from './say.mjs';
import { stopWish } from './signals.mjs';
import { runBrowserStage, runStaticStages, runVitestStage, stageRunner } from './stages.mjs';
import { createTally } from './tally.mjs';
import { startWeb } from './web.mjs';

/**
 * `npm test`: everything. It has a database cluster, ports and a temporary folder of its own, all gone at the end,
 * also when a stage fails or somebody presses Ctrl-C. The data of a running `npm start` is never touched.
 */
async function test() {
  const since = performance.now();
  const { signal } = stopWish();
  const tally = createTally();
  const folder = mkdtempSync(`${tmpdir()}/smirr-test-`);
  const undo = [() => rmSync(folder, { recursive: true, force: true })];
  try {
    await runEverything(tally, folder, undo, signal);
  } catch (error) {
    say(`\n${error instanceof Obstacle ? error.message : error.stack}`);
    tally.total.failed += 1;
  }
  for (const action of undo.reverse()) {
    try {
      await action();
    } catch (error) {
      say(`Could not clean up: ${error.message}`);
      tally.total.failed += 1;
    }
  }
  if (signal.aborted) {
    say('Stopped before the end.');
    tally.total.failed += 1;
  }
  say(`\nTook ${seconds(since)}.`);
  tally.close();
}

async function runEverything(tally, folder, undo, signal) {
  // What cannot be had is better heard of now than after minutes of tests.
  await ensurePackages();
  const chromium = await ensureChromium();
  await ensureRsvg();
  // The user postgres must be able to pass through; what is secret inside has a mode of its own.
  chmodSync(folder, 0o755);
  const cluster = await startCluster(folder, { durable: false, wantedPort: await freePort() });
  undo.push(cluster.stop);

  // All that the stages put into the temporary folder goes with ours.
  const scratch = `${folder}/tmp`;
  mkdirSync(scratch);
  // Chromium would else leave its crash records in the home folder.
  const places = { TMPDIR: scratch, XDG_CONFIG_HOME: scratch, XDG_CACHE_HOME: scratch };
  const run = stageRunner(signal, { ...places, CHROMIUM: chromium, SMIRR_TEST_ADMIN_URL: cluster.adminUrl });

  await runStaticStages(tally, run);
  await runVitestStage(tally, run, scratch, ['unit', 'property', 'published']);
  if (signal.aborted) return;
  const built = await tally.stage('build', async () => {
    await ensureBuild({ signal });
    return { passed: 1, failed: 0 };
  });
  if (!built || signal.aborted) return;
  await runVitestStage(tally, run, scratch, ['integration']);
  if (signal.aborted) return;
  await migrateDatabase(cluster.url);
  const web = await startWeb({ port: await freePort(), databaseUrl: cluster.url, logFile: `${folder}/web.log` });
  undo.push(web.stop);
  const output = `${root}/test-results`;
  rmSync(output, { recursive: true, force: true });
  const passed = await runBrowserStage(tally, run, scratch, web.address);
  // Traces of failures stay for a look.
  if (passed) rmSync(output, { recursive: true, force: true });
}

await test();
