import { root } from './paths.mjs';
import { runGroup } from './run-group.mjs';
import { countPlaywright, countStatus, countVitest } from './tally.mjs';

const bin = (name) => `${root}/node_modules/.bin/${name}`;

/** What can be said about the sources without running them. `run` is given by the caller: it can be interrupted. */
export async function runStaticStages(tally, run) {
  await tally.stage('format', async () => countStatus(await run(bin('biome'), ['format', '.'])));
  await tally.stage('lint and import rules', async () =>
    countStatus(
      await run(bin('biome'), [
        'check',
        '--formatter-enabled=false',
        '--error-on-warnings',
        '--max-diagnostics=100',
        '.',
      ]),
    ),
  );
  await tally.stage('types', async () => {
    // Next writes the types of the routes first.
    const routes = await run(bin('next'), ['typegen']);
    return countStatus(routes.status === 0 ? await run(bin('tsc'), ['--noEmit']) : routes);
  });
}

/** The tests of the named Vitest projects, reported into `folder`. */
export async function runVitestStage(tally, run, folder, projects, env = {}) {
  await tally.stage(projects.join(', '), async () => {
    const file = `${folder}/${projects.join('-')}.json`;
    const chosen = projects.flatMap((name) => ['--project', name]);
    const result = await run(
      bin('vitest'),
      ['run', ...chosen, '--reporter=default', '--reporter=json', `--outputFile.json=${file}`],
      env,
    );
    return countVitest(file, result);
  });
}

/** The end-to-end tests in Chromium against the server at `address`. */
export function runBrowserStage(tally, run, folder, address) {
  return tally.stage('browser (end to end)', async () => {
    const file = `${folder}/browser.json`;
    const result = await run(bin('playwright'), ['test'], { SMIRR_URL: address, SMIRR_E2E_REPORT: file });
    return countPlaywright(file, result);
  });
}

/** A `run` for the stages: from the checkout, with plain output, ended with all it started when `signal` says so. */
export function stageRunner(signal, env = {}) {
  return (command, args, more = {}) =>
    runGroup(command, args, {
      cwd: root,
      signal,
      env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', NO_COLOR: '1', ...env, ...more },
    });
}
