import { type Font, parse } from 'opentype.js';

// The faces of the pages once more, in the older packing that can be read here: their static cuts, which draw what the
// variable ones draw at these weights.
const files = {
  'sans 400': () => new URL('@fontsource/hanken-grotesk/files/hanken-grotesk-latin-400-normal.woff', import.meta.url),
  'sans 600': () => new URL('@fontsource/hanken-grotesk/files/hanken-grotesk-latin-600-normal.woff', import.meta.url),
  'mono 400': () =>
    new URL('@fontsource/spline-sans-mono/files/spline-sans-mono-latin-400-normal.woff', import.meta.url),
  'serif 400': () => new URL('@fontsource/stix-two-text/files/stix-two-text-latin-400-normal.woff', import.meta.url),
  'serif 400 italic': () =>
    new URL('@fontsource/stix-two-text/files/stix-two-text-latin-400-italic.woff', import.meta.url),
  'greek 400': () => new URL('@fontsource/stix-two-text/files/stix-two-text-greek-400-normal.woff', import.meta.url),
  'greek 400 italic': () =>
    new URL('@fontsource/stix-two-text/files/stix-two-text-greek-400-italic.woff', import.meta.url),
} as const;

export type FaceName = keyof typeof files;

/** How a text is set, as its computed style says. */
export interface TextStyle {
  family: string;
  weight: number;
  italic: boolean;
}

/** Faces that may hold a character of a text, the one that the page would take first. */
export function faceNames({ family, weight, italic }: TextStyle): FaceName[] {
  const first = family.split(',')[0].toLowerCase();
  const serif: FaceName[] = italic ? ['greek 400 italic', 'serif 400 italic'] : ['greek 400', 'serif 400'];
  if (first.includes('mono')) return ['mono 400', ...serif];
  if (/serif|greek|times/.test(first) && !first.includes('sans')) return serif;
  return [weight >= 550 ? 'sans 600' : 'sans 400', ...serif];
}

const loaded = new Map<FaceName, Promise<Font>>();

export function loadFace(name: FaceName): Promise<Font> {
  const known = loaded.get(name);
  if (known) return known;
  const face = fetch(files[name]())
    .then((response) => {
      if (!response.ok) throw new Error(`the face ${name} could not be read: ${response.status}`);
      return response.arrayBuffer();
    })
    .then((bytes) => parse(bytes));
  loaded.set(name, face);
  // A face that could not be had is asked for again the next time.
  face.catch(() => loaded.delete(name));
  return face;
}
