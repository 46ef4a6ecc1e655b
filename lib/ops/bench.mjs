import { ensureBundle } from './bundle.mjs';
import { installDebian } from './debian.mjs';
import { run } from './run.mjs';
import { fail, sayOnStandardError } from './say.mjs';

sayOnStandardError();
try {
  const args = process.argv.slice(2);
  if (args.includes('--peer')) await ensureNumericalPython();
  const { main } = await import(await ensureBundle('bench'));
  process.exitCode = (await main(args)) ?? 0;
} catch (error) {
  fail(error);
}

/** The comparison runs on Debian's Python, which is the one these packages belong to. */
async function ensureNumericalPython() {
  if ((await run('/usr/bin/python3', ['-c', 'import numpy, scipy'])).status === 0) return;
  await installDebian(['python3-numpy', 'python3-scipy'], {
    why: 'The comparison needs NumPy and SciPy.',
    expect: 'up to a minute',
  });
}
