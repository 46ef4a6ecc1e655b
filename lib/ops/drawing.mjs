import { existsSync } from 'node:fs';
import { installDebian } from './debian.mjs';

/** A second program that draws SVG, to see that exported figures do not depend on the browser that made them. */
export async function ensureRsvg() {
  if (existsSync('/usr/bin/rsvg-convert')) return;
  await installDebian(['librsvg2-bin'], {
    why: 'Exported figures are drawn by a second program too.',
    expect: 'seconds',
  });
}
