import { readFileSync, writeFileSync } from 'node:fs';
import { ensureBundle } from './bundle.mjs';
import { fail, Obstacle, sayOnStandardError } from './say.mjs';

// Standard output is the result's alone.
sayOnStandardError();
// Whoever reads the result may have read enough of it (`| head`).
process.stdout.on('error', (error) => {
  if (error.code !== 'EPIPE') throw error;
});
try {
  const { main } = await import(await ensureBundle('cli'));
  process.exitCode = await main(process.argv.slice(2), {
    readFile: (path) => readFileSync(path, 'utf8'),
    writeFile,
    stdout: (text) => process.stdout.write(text),
    stderr: (text) => process.stderr.write(text),
    isTerminal: Boolean(process.stderr.isTTY),
    runtime: `node ${process.versions.node}`,
    now: () => performance.now(),
  });
} catch (error) {
  fail(error);
  // A result that cannot be put where it was asked for is a wrong call, not a failure of the calculation.
  if (error instanceof Obstacle) process.exitCode = 2;
}

function writeFile(path, text) {
  try {
    writeFileSync(path, text);
  } catch (error) {
    throw new Obstacle(`${path}: cannot be written: ${error.message}`);
  }
}
