import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { countPlaywright, countStatus, countVitest } from '@/lib/ops/tally.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(`${tmpdir()}/smirr-unit-`);
});
afterEach(() => rmSync(folder, { recursive: true }));

const ended = (status: number) => ({ status, stdout: 'out', stderr: 'err' });
function report(content: object): string {
  writeFileSync(`${folder}/report.json`, JSON.stringify(content));
  return `${folder}/report.json`;
}

describe('counting what passed and failed', () => {
  test('takes the numbers of a report', () => {
    const file = report({ numPassedTests: 5, numFailedTests: 2, numPendingTests: 1, numTodoTests: 0, testResults: [] });
    expect(countVitest(file, ended(1))).toMatchObject({ passed: 5, failed: 2, skipped: 1 });
    const browser = report({ stats: { expected: 3, unexpected: 1, flaky: 1, skipped: 2 } });
    expect(countPlaywright(browser, ended(1))).toMatchObject({ passed: 3, failed: 2, skipped: 2 });
  });

  test('a file that could not be loaded is a failure', () => {
    const file = report({
      numPassedTests: 5,
      numFailedTests: 0,
      numPendingTests: 0,
      numTodoTests: 0,
      testResults: [{ status: 'failed', assertionResults: [] }],
    });
    expect(countVitest(file, ended(1))).toMatchObject({ passed: 5, failed: 1 });
  });

  test('a run that ends badly is a failure even if its report says otherwise, or there is none', () => {
    const file = report({ numPassedTests: 5, numFailedTests: 0, numPendingTests: 0, numTodoTests: 0, testResults: [] });
    expect(countVitest(file, ended(1))).toMatchObject({ failed: 1 });
    expect(countVitest(`${folder}/none.json`, ended(0))).toMatchObject({ passed: 0, failed: 1 });
    expect(countPlaywright(`${folder}/none.json`, ended(0))).toMatchObject({ passed: 0, failed: 1 });
  });

  test('a command without tests counts once', () => {
    expect(countStatus(ended(0))).toMatchObject({ passed: 1, failed: 0 });
    expect(countStatus(ended(3))).toMatchObject({ passed: 0, failed: 1, words: 'out\nerr' });
  });
});
