import { spawn } from 'node:child_process';
import { closeSync, existsSync, mkdirSync, openSync, readFileSync, renameSync, statSync } from 'node:fs';
import { root } from './paths.mjs';
import { endGroup, processRecord } from './processes.mjs';
import { sleep, tail } from './run.mjs';
import { Obstacle } from './say.mjs';

/**
 * Starts the web server on the loopback address and waits until it is ready. Its output goes to `logFile`.
 * Returns `{ address, process, ended, stop }`; `ended` resolves with words when it ends, asked to or not.
 */
export async function startWeb({ port, databaseUrl, logFile, development = false, env = {} }) {
  mkdirSync(logFile.slice(0, logFile.lastIndexOf('/')), { recursive: true });
  if (existsSync(logFile) && statSync(logFile).size > 10_000_000) renameSync(logFile, `${logFile}.1`);
  const log = openSync(logFile, 'a', 0o600);
  const child = spawn(
    process.execPath,
    ['node_modules/next/dist/bin/next', development ? 'dev' : 'start', '-H', '127.0.0.1', '-p', String(port)],
    {
      cwd: root,
      // A group of its own: Ctrl-C in a terminal reaches this command alone, which then ends things in order.
      detached: true,
      stdio: ['ignore', log, log],
      env: {
        ...process.env,
        ...env,
        NODE_ENV: development ? 'development' : 'production',
        NEXT_TELEMETRY_DISABLED: '1',
        DATABASE_URL: databaseUrl,
        PORT: String(port),
      },
    },
  );
  closeSync(log);
  const ended = new Promise((resolve) => {
    child.once('error', (error) => resolve(error.message));
    child.once('exit', (status, signal) => resolve(signal ? `signal ${signal}` : `exit status ${status}`));
  });
  const record = processRecord(child.pid);
  const address = `http://127.0.0.1:${port}`;
  const server = { address, process: record, ended, stop: () => endGroup(record) };
  const outcome = await Promise.race([
    waitReady(address),
    ended.then((how) => `The web server ended at once (${how}).`),
  ]);
  if (outcome === null) return server;
  await server.stop();
  throw new Obstacle(`${outcome} Its last words (${logFile}):\n\n${tail(readFileSync(logFile, 'utf8'), 20)}`);
}

/** Null once the server can work; else, after a minute, what it lacks in words. */
async function waitReady(address) {
  let last = 'It does not answer.';
  for (const until = Date.now() + 60_000; Date.now() < until; await sleep(100)) {
    try {
      const answer = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(20_000) });
      if (answer.ok) return null;
      last = (await answer.json()).message;
    } catch {
      // Not listening yet.
    }
  }
  return `The web server is not ready after a minute. ${last}`;
}
