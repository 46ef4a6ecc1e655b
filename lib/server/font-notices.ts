import { readFileSync } from 'node:fs';
import { join } from 'node:path';

export interface FontNotice {
  name: string;
  use: string;
  text: string;
}

const packages = [
  { name: 'STIX Two Text', use: 'titles and mathematics', folder: '@fontsource-variable/stix-two-text' },
  { name: 'Hanken Grotesk', use: 'the interface', folder: '@fontsource-variable/hanken-grotesk' },
  { name: 'Spline Sans Mono', use: 'figures and numbers', folder: '@fontsource/spline-sans-mono' },
];

/** The licence texts as the font packages ship them, so that a new version of a font brings its own notice. */
export function fontNotices(): FontNotice[] {
  return packages.map(({ name, use, folder }) => ({
    name,
    use,
    text: readFileSync(
      join(/* turbopackIgnore: true */ process.cwd(), 'node_modules', folder, 'LICENSE'),
      'utf8',
    ).trim(),
  }));
}
