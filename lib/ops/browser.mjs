import { existsSync } from 'node:fs';
import { installDebian } from './debian.mjs';

/** The path of Chromium, installed from Debian if it is missing. */
export async function ensureChromium() {
  const file = process.env.CHROMIUM || '/usr/bin/chromium';
  if (!existsSync(file))
    await installDebian(['chromium'], { why: 'The browser tests run in Chromium.', expect: 'a minute or two' });
  return file;
}
