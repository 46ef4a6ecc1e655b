import { existsSync, readFileSync } from 'node:fs';
import { say, seconds } from './say.mjs';

/** Counts what passed and failed over all stages, and says each stage's outcome and time. */
export function createTally() {
  const total = { passed: 0, failed: 0, skipped: 0 };
  return {
    total,
    /** Runs one stage. `work` returns `{ passed, failed, skipped, words }`; `words` are shown if anything failed. */
    async stage(name, work) {
      const since = performance.now();
      let outcome;
      try {
        outcome = await work();
      } catch (error) {
        outcome = { passed: 0, failed: 1, words: error?.message ?? String(error) };
      }
      const { passed, failed, skipped = 0, words } = outcome;
      total.passed += passed;
      total.failed += failed;
      total.skipped += skipped;
      if (failed > 0 && words) say(`\n${words.trim()}\n`);
      const more = skipped > 0 ? `, ${skipped} left out` : '';
      say(
        `${failed > 0 ? 'FAILED' : 'passed'}  ${name.padEnd(34)} ${`${passed} passed, ${failed} failed${more}`.padEnd(28)} ${seconds(since)}`,
      );
      return failed === 0;
    },
    /** The line that machines read; nothing may follow it. */
    close() {
      say(`\n${total.passed} passed, ${total.failed} failed`);
      if (total.failed > 0 || total.passed === 0) process.exitCode = 1;
    },
  };
}

/** One pass or one failure for a command that has no tests of its own to count. */
export function countStatus({ status, stdout, stderr }) {
  return { passed: status === 0 ? 1 : 0, failed: status === 0 ? 0 : 1, words: `${stdout}\n${stderr}` };
}

/** Counts Vitest's report. A run that ended without a report, or with a file that could not be loaded, failed. */
export function countVitest(file, { status, stdout, stderr }) {
  const report = readReport(file);
  if (!report) return { passed: 0, failed: 1, words: `${stdout}\n${stderr}` };
  const unloaded = report.testResults.filter(
    (suite) => suite.status === 'failed' && suite.assertionResults.length === 0,
  ).length;
  const failed = report.numFailedTests + unloaded;
  return {
    passed: report.numPassedTests,
    // An error outside any test also makes the run fail.
    failed: failed === 0 && status !== 0 ? 1 : failed,
    skipped: report.numPendingTests + report.numTodoTests,
    words: `${stdout}\n${stderr}`,
  };
}

/** Counts Playwright's report. A test that passed only at a second try would count as failed. */
export function countPlaywright(file, { status, stdout, stderr }) {
  const report = readReport(file);
  if (!report) return { passed: 0, failed: 1, words: `${stdout}\n${stderr}` };
  const { expected, unexpected, flaky, skipped } = report.stats;
  const failed = unexpected + flaky;
  return {
    passed: expected,
    failed: failed === 0 && status !== 0 ? 1 : failed,
    skipped,
    words: `${stdout}\n${stderr}`,
  };
}

function readReport(file) {
  if (!existsSync(file)) return null;
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}
