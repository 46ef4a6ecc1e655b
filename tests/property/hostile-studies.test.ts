import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { main } from '@/kernels/cli';
import {
  brokenTexts,
  goodStudy,
  type HostileFile,
  hostileFiles,
  nearKeys,
  strangeValues,
} from '../support/kernel-hostile-studies';
import { seeded } from '../support/kernel-maps';

function command({ text }: { text: string }) {
  const out: string[] = [];
  const err: string[] = [];
  const began = performance.now();
  const status = main(['study.json'], {
    readFile: () => text,
    writeFile: () => {
      throw new Error('nothing is to be written');
    },
    stdout: (s) => out.push(s),
    stderr: (s) => err.push(s),
    isTerminal: false,
    runtime: 'test',
    now: () => performance.now(),
  });
  return { status, stdout: out.join(''), stderr: err.join(''), seconds: (performance.now() - began) / 1000 };
}

/** Exit status 2, `path: reason` lines, nothing else, within a second. */
function expectRefused(file: HostileFile) {
  const { status, stdout, stderr, seconds } = command(file);
  expect(status, `${file.why}: ${stderr}`).toBe(2);
  expect(stdout, file.why).toBe('');
  expect(stderr.endsWith('\n'), file.why).toBe(true);
  for (const line of stderr.trimEnd().split('\n')) {
    expect(line, file.why).toMatch(/^.{1,300}?: \S.{3,}$/s);
    expect(line.length, file.why).toBeLessThan(1500);
    expect(line, file.why).not.toMatch(/undefined|\[object|TypeError|at .*\.ts:/);
  }
  expect(seconds, `${file.why}: seconds`).toBeLessThan(1);
}

describe('malformed and hostile study files', () => {
  it('are more than two hundred, each of its own kind', () => {
    expect(hostileFiles.length).toBeGreaterThan(200);
    expect(new Set(hostileFiles.map((f) => f.why)).size).toBe(hostileFiles.length);
  });

  it('differ from a study that is computed', () => {
    const { status, stdout, stderr } = command({ text: JSON.stringify(goodStudy()) });
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
    expect(JSON.parse(stdout).cases.length).toBe(2);
  });

  it.each(hostileFiles.map((f) => [f.why, f] as const))(
    '%s: is refused with path and reason, nothing else',
    (_, file) => {
      expectRefused(file);
    },
  );

  it.each(nearKeys.map((k) => [k.path.join('.'), k] as const))(
    'the key %s: its known neighbour is named',
    (_, { text, near }) => {
      expect(command({ text }).stderr).toContain(`did you mean ${near}?`);
    },
  );

  it('cut short anywhere or with a bracket missing are refused', () => {
    fc.assert(fc.property(brokenTexts, expectRefused), seeded(150));
  });

  it('with any JSON in any place are refused in words, or computed where the value fits', () => {
    fc.assert(
      fc.property(strangeValues, (file) => {
        const { status, stdout } = command(file);
        expect([0, 2, 3], file.why).toContain(status);
        if (status === 2) expectRefused(file);
        else expect(JSON.parse(stdout).format).toBe('smirr-result');
      }),
      seeded(150),
    );
  });

  it('do not reach the prototype of all objects', () => {
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
  });
});
