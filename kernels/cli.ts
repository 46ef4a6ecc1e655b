import { z } from 'zod';
import { run } from './run';
import { studySchema } from './spec';
import type { Fault } from './study/fault';
import { parseStudy } from './study/parse-study';
import { StudyRefused } from './study/study-refused';

/** What the command needs of the machine it runs on. */
export interface CommandHost {
  readFile(path: string): string;
  writeFile(path: string, text: string): void;
  stdout(text: string): void;
  stderr(text: string): void;
  /** whether standard error is a terminal that can show a progress bar */
  readonly isTerminal: boolean;
  readonly runtime: string;
  /** milliseconds, for the progress bar only */
  now(): number;
}

const USAGE = 'usage: npm run -s compute -- STUDY.json [--out RESULT.json] | --schema';
/** Bytes of a study file that are read at most: a million samples of full precision fit. */
const LARGEST_FILE = 64 * 1024 * 1024;

/**
 * The headless command: a study file in, a result file out.
 *
 * @param argv arguments after the command's name
 * @returns exit status: 0 computed; 2 the file (or the call) is wrong, one line per fault on standard error; 3 computed,
 *   but something asked for could not be had: the result's warnings say what
 */
export function main(argv: readonly string[], host: CommandHost): number {
  const args = [...argv];
  if (args.length === 1 && args[0] === '--schema') {
    host.stdout(`${JSON.stringify(z.toJSONSchema(studySchema, { io: 'input' }), null, 2)}\n`);
    return 0;
  }
  const outAt = args.indexOf('--out');
  const out = outAt >= 0 ? args.splice(outAt, 2)[1] : null;
  if (args.length !== 1 || args[0].startsWith('--') || out === undefined) {
    host.stderr(`${USAGE}\n`);
    return 2;
  }
  let text: string;
  try {
    text = host.readFile(args[0]);
  } catch (error) {
    return refuse(host, [{ path: args[0], message: `cannot be read: ${(error as Error).message}` }]);
  }
  if (text.length > LARGEST_FILE)
    return refuse(host, [
      { path: args[0], message: `is ${text.length} characters long; allowed: at most ${LARGEST_FILE}` },
    ]);
  let input: unknown;
  try {
    input = JSON.parse(text);
  } catch (error) {
    return refuse(host, [{ path: args[0], message: `is no JSON: ${(error as Error).message}` }]);
  }
  const parsed = parseStudy(input);
  if (!parsed.study) return refuse(host, parsed.faults ?? []);
  const bar = progressBar(host);
  try {
    const result = run(parsed.study, { runtime: host.runtime, checkpoint: bar.show });
    bar.clear();
    const json = `${JSON.stringify(result)}\n`;
    if (out === null) host.stdout(json);
    else host.writeFile(out, json);
    for (const w of result.warnings) host.stderr(`${w.at === null ? '' : `cases[${w.at}]: `}${w.message}\n`);
    return result.warnings.length > 0 ? 3 : 0;
  } catch (error) {
    bar.clear();
    if (error instanceof StudyRefused) return refuse(host, error.faults);
    throw error;
  }
}

function refuse(host: CommandHost, faults: readonly Fault[]): 2 {
  for (const { path, message } of faults) host.stderr(`${path || 'study'}: ${message.replaceAll('\n', ' ')}\n`);
  return 2;
}

function progressBar(host: CommandHost) {
  const WIDTH = 30;
  const began = host.now();
  let last = began;
  let shown = false;
  return {
    show(done: number, total: number) {
      if (!host.isTerminal) return;
      const now = host.now();
      if (now - began < 500 || now - last < 100) return;
      last = now;
      shown = true;
      const part = Math.min(1, done / total);
      const left = part > 0.01 ? ` ${Math.ceil(((now - began) / 1000) * (1 / part - 1))} s left` : '';
      const filled = Math.round(part * WIDTH);
      host.stderr(`\r[${'='.repeat(filled)}${' '.repeat(WIDTH - filled)}] ${Math.floor(done)}/${total}${left}  `);
    },
    clear() {
      if (shown) host.stderr(`\r${' '.repeat(WIDTH + 30)}\r`);
    },
  };
}
