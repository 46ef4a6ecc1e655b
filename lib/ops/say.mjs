/**
 * What the commands print. Progress goes to standard error where a command's standard output is a result
 * (compute, bench), to standard output elsewhere.
 */

/** A failure that is the surroundings' doing (a port in use, no right to install): shown as words, without a stack. */
export class Obstacle extends Error {}

let stream = process.stdout;

/** Sends progress lines to standard error from now on. */
export function sayOnStandardError() {
  stream = process.stderr;
}

export function say(text) {
  stream.write(`${text}\n`);
}

export function seconds(since) {
  return `${((performance.now() - since) / 1000).toFixed(1)} s`;
}

/** Says what begins, waits for it, says how long it took. `expect` tells newcomers what is normal. */
export async function step(what, expect, work) {
  const since = performance.now();
  say(`- ${what}${expect ? ` (${expect})` : ''} …`);
  const result = await work();
  say(`  done in ${seconds(since)}`);
  return result;
}

/** Ends the process after a failure: words for an obstacle, the stack for a surprise. */
export function fail(error) {
  process.exitCode = 1;
  process.stderr.write(error instanceof Obstacle ? `\n${error.message}\n` : `\n${error?.stack ?? error}\n`);
}
