import { readFile, writeFile } from 'node:fs/promises';
import { ensureBundle } from './bundle.mjs';
import { fail, sayOnStandardError } from './say.mjs';

// Standard output is the result's alone.
sayOnStandardError();
try {
  const { main } = await import(await ensureBundle('cli'));
  process.exitCode = await main(process.argv.slice(2), {
    readFile: (path) => readFile(path, 'utf8'),
    writeFile: (path, text) => writeFile(path, text),
    stdout: process.stdout,
    stderr: process.stderr,
    isTerminal: Boolean(process.stderr.isTTY),
    runtime: `node ${process.versions.node}`,
    now: () => performance.now(),
  });
} catch (error) {
  fail(error);
}
