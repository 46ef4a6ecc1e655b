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

/** A figure as a file that stands alone: the colours and faces that the page's style sheet gave are written out. */
export function figureSvg(figure: SVGSVGElement): string {
  const copy = figure.cloneNode(true) as SVGSVGElement;
  copy.setAttribute('xmlns', 'http://www.w3.org/2000/svg');
  copy.removeAttribute('class');
  const originals = [figure, ...figure.querySelectorAll('*')];
  const copies = [copy, ...copy.querySelectorAll('*')];
  for (const [i, original] of originals.entries()) writeOut(original, copies[i]);
  const paper = document.createElementNS('http://www.w3.org/2000/svg', 'rect');
  paper.setAttribute('width', '100%');
  paper.setAttribute('height', '100%');
  paper.setAttribute('fill', getComputedStyle(document.documentElement).backgroundColor);
  copy.querySelector('title')?.after(paper);
  return `<?xml version="1.0" encoding="UTF-8"?>\n${new XMLSerializer().serializeToString(copy)}\n`;
}

function writeOut(original: Element, copy: Element): void {
  if (['title', 'desc', 'clipPath'].includes(original.tagName)) return;
  const style = getComputedStyle(original);
  const parent = original.parentElement && original.tagName !== 'svg' ? getComputedStyle(original.parentElement) : null;
  for (const name of carried) {
    const value = style.getPropertyValue(name);
    // What is inherited need not be repeated; opacity is not inherited, and 1 is its default.
    const inherited = name === 'opacity' ? value === '1' : parent?.getPropertyValue(name) === value;
    if (value !== '' && !inherited) copy.setAttribute(name, value);
  }
  copy.removeAttribute('class');
}
