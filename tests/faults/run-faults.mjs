import { spawnSync } from 'node:child_process';
import { cpSync, existsSync, mkdtempSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { fileURLToPath } from 'node:url';
import { faults } from './faults.mjs';

/**
 * Applies each fault to a copy of the sources and runs the test that must notice it. Exit status 1 when a fault survives,
 * when its line is no longer there, or when the test is red without it.
 */
const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');
const COPIED = [
  ...['app', 'components', 'db', 'kernels', 'lib', 'tests', 'public', 'proxy.ts', 'package.json', 'tsconfig.json'],
  ...['vitest.config.ts', 'next.config.ts', 'next-env.d.ts', 'biome.json'],
];
const LIMIT = 120_000;

const folder = mkdtempSync(`${tmpdir()}/smirr-faults-`);
for (const signal of ['SIGINT', 'SIGTERM'])
  process.once(signal, () => {
    rmSync(folder, { recursive: true, force: true });
    process.exit(1);
  });
const say = (text) => process.stdout.write(`${text}\n`);
const escaped = (text) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

/** Runs the named test in the copy: how many passed, and how many failed. A file that does not even load counts as failed. */
function runTest({ project, testFile, test }) {
  const report = `${folder}/report.json`;
  rmSync(report, { force: true });
  const chosen = test === '' ? [] : ['-t', escaped(test)];
  const command = ['run', '--project', project, testFile, ...chosen, '--reporter=json', `--outputFile=${report}`];
  const { status, stderr } = spawnSync(`${root}/node_modules/.bin/vitest`, command, {
    cwd: folder,
    encoding: 'utf8',
    timeout: LIMIT,
    killSignal: 'SIGKILL',
  });
  if (!existsSync(report)) return { passed: 0, failed: status === 0 ? 0 : 1, detail: stderr.slice(-400) };
  const { numPassedTests, numFailedTests, success, testResults } = JSON.parse(readFileSync(report, 'utf8'));
  const broken = !success && numFailedTests === 0 ? 1 : 0;
  const detail = testResults
    .flatMap((file) => file.assertionResults.filter((a) => a.status === 'failed').map((a) => a.fullName))
    .slice(0, 3)
    .join('; ');
  return { passed: numPassedTests, failed: numFailedTests + broken, detail };
}

let survived = 0;
let noticed = 0;
try {
  for (const name of COPIED)
    if (existsSync(`${root}/${name}`)) cpSync(`${root}/${name}`, `${folder}/${name}`, { recursive: true });
  symlinkSync(`${root}/node_modules`, `${folder}/node_modules`);

  const wanted = process.argv.slice(2);
  for (const fault of faults) {
    if (wanted.length > 0 && !wanted.some((word) => fault.what.includes(word) || fault.file.includes(word))) continue;
    const path = `${folder}/${fault.file}`;
    const before = readFileSync(path, 'utf8');
    const complain = (why) => {
      survived++;
      say(`✗ ${fault.what} (${fault.file}): ${why}`);
    };
    if (before.split(fault.find).length !== 2) {
      complain(`the line to break stands ${before.split(fault.find).length - 1} times in the file`);
      continue;
    }
    const sound = runTest(fault);
    if (sound.failed > 0 || sound.passed === 0) {
      complain(`without the fault ${sound.passed} passed, ${sound.failed} failed: ${sound.detail}`);
      continue;
    }
    writeFileSync(
      path,
      before.replace(fault.find, () => fault.replace),
    );
    const broken = runTest(fault);
    writeFileSync(path, before);
    if (broken.failed === 0) complain(`survives: ${fault.testFile} stays green`);
    else {
      noticed++;
      say(`✓ ${fault.what}: noticed by ${fault.testFile}, ${fault.test || broken.detail}`);
    }
  }
  say(`faults: ${noticed} noticed, ${survived} survived`);
} finally {
  rmSync(folder, { recursive: true, force: true });
}
process.exitCode = survived > 0 ? 1 : 0;
