import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { freePort } from '@/lib/ops/ports.mjs';
import { processRecord } from '@/lib/ops/processes.mjs';

export type Started = Awaited<ReturnType<typeof runStart>>;

/** Runs the start command with a data folder and a port of its own; resolves once it is ready or has ended. */
export async function runStart(
  data: string,
  more: { port?: number; env?: Record<string, string>; throughNpm?: boolean } = {},
) {
  const port = more.port ?? (await freePort());
  const [command, ...args] = more.throughNpm ? ['npm', 'start'] : [process.execPath, 'lib/ops/start.mjs'];
  const child = spawn(command, args, {
    // As on a bare machine: a path, and nothing else of the caller's.
    env: { PATH: process.env.PATH ?? '', NODE_ENV: 'production', SMIRR_DATA: data, PORT: String(port), ...more.env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let output = '';
  const ended = new Promise<number | null>((resolve) => child.once('close', resolve));
  const ready = new Promise<boolean>((resolve) => {
    const take = (part: Buffer) => {
      output += part;
      if (/Smirr is ready/.test(output)) resolve(true);
    };
    child.stdout.on('data', take);
    child.stderr.on('data', take);
    child.once('close', () => resolve(false));
  });
  return {
    ready: await ready,
    port,
    address: `http://127.0.0.1:${port}`,
    pid: child.pid as number,
    output: () => output,
    signal: (name: NodeJS.Signals) => child.kill(name),
    ended,
  };
}

/** The web server and the database server of a running start, as records that tell whether they still live. */
export function serversOf(data: string) {
  const web = JSON.parse(readFileSync(`${data}/running.json`, 'utf8')).web as { pid: number; begin: number };
  const database = processRecord(Number(readFileSync(`${data}/postgres/postmaster.pid`, 'utf8').split('\n')[0]));
  return { web, database };
}
