import { textOutlines } from './text-outlines';

const SVG = 'http://www.w3.org/2000/svg';

const carried = [
  'fill',
  'fill-opacity',
  'stroke',
  'stroke-width',
  'stroke-opacity',
  'stroke-dasharray',
  'stroke-linejoin',
  'stroke-linecap',
  'opacity',
  'font-family',
  'font-size',
  'font-style',
  'font-weight',
  'text-anchor',
] as const;

export interface FigureSvgOptions {
  text: 'outlines' | 'editable';
  colours: 'light' | 'screen';
  /** What the drawing cannot say: what its colours stand for, where its numbers come from. */
  description: string;
}

/** A figure as a file that stands alone: colours, faces and pictures that the page gave are written out. */
export async function figureSvg(figure: SVGSVGElement, options: FigureSvgOptions): Promise<string> {
  await document.fonts.ready;
  const { copy, twins } = options.colours === 'light' ? inLight(() => written(figure)) : written(figure);
  for (const text of options.text === 'outlines' ? figure.querySelectorAll('text') : []) {
    const outlines = await textOutlines(text, (part) => twins.get(part)?.getAttribute('fill') ?? null);
    if (outlines) twins.get(text)?.replaceWith(outlines);
  }
  if (!copy.querySelector('text')) withoutFaces(copy);
  const { width, height } = figure.viewBox.baseVal;
  copy.setAttribute('width', String(width));
  copy.setAttribute('height', String(height));
  const description = document.createElementNS(SVG, 'desc');
  description.textContent = options.description;
  copy.querySelector('title')?.after(description);
  return `<?xml version="1.0" encoding="UTF-8"?>\n${new XMLSerializer().serializeToString(copy)}\n`;
}

/** A copy with every style written out, and which of its elements stands for which of the figure's. */
function written(figure: SVGSVGElement): { copy: SVGSVGElement; twins: Map<Element, Element> } {
  const copy = figure.cloneNode(true) as SVGSVGElement;
  const originals = [figure, ...figure.querySelectorAll('*')];
  const copies = [copy, ...copy.querySelectorAll('*')];
  const twins = new Map(originals.map((original, i) => [original, copies[i]]));
  for (const [original, twin] of twins) writeOut(original, twin);
  for (const frame of figure.querySelectorAll('foreignObject')) twins.get(frame)?.replaceWith(asImage(frame));
  const paper = document.createElementNS(SVG, 'rect');
  paper.setAttribute('width', '100%');
  paper.setAttribute('height', '100%');
  paper.setAttribute('fill', getComputedStyle(document.documentElement).backgroundColor);
  const title = copy.querySelector('title');
  if (title) title.after(paper);
  else copy.prepend(paper);
  return { copy, twins };
}

/** A drawing without text needs no faces. */
function withoutFaces(copy: SVGSVGElement): void {
  for (const element of [copy, ...copy.querySelectorAll('*')])
    for (const name of carried) if (/^(font|text)-/.test(name)) element.removeAttribute(name);
}

/** Files go onto white paper more often than onto a dark screen. No frame is drawn in between. */
function inLight<T>(make: () => T): T {
  const { dataset } = document.documentElement;
  const before = dataset.theme;
  dataset.theme = 'light';
  try {
    return make();
  } finally {
    if (before === undefined) delete dataset.theme;
    else dataset.theme = before;
  }
}

function writeOut(original: Element, copy: Element): void {
  if (['title', 'desc'].includes(original.tagName)) return;
  copy.removeAttribute('class');
  if (original.tagName === 'clipPath' || original.closest('clipPath')) return;
  const style = getComputedStyle(original);
  const parent = original.parentElement && original.tagName !== 'svg' ? getComputedStyle(original.parentElement) : null;
  for (const name of carried) {
    const value = style.getPropertyValue(name);
    // What is inherited need not be repeated; opacity is not inherited, and 1 is its default.
    const inherited = name === 'opacity' ? value === '1' : parent?.getPropertyValue(name) === value;
    if (value !== '' && !inherited) copy.setAttribute(name, name === 'font-family' ? familyName(value) : value);
  }
}

/** The page's own names for its faces mean nothing elsewhere. */
function familyName(families: string): string {
  const first = families.split(',')[0].toLowerCase();
  if (first.includes('mono')) return "'Spline Sans Mono', monospace";
  return first.includes('serif') ? "'STIX Two Text', serif" : "'Hanken Grotesk', sans-serif";
}

/** What is painted on a canvas in the page is one picture in the file. */
function asImage(frame: Element): SVGImageElement {
  const image = document.createElementNS(SVG, 'image');
  for (const name of ['x', 'y', 'width', 'height']) image.setAttribute(name, frame.getAttribute(name) ?? '0');
  image.setAttribute('preserveAspectRatio', 'none');
  image.setAttribute('href', frame.querySelector('canvas')?.toDataURL('image/png') ?? '');
  return image;
}
