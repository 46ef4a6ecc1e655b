import { faceNames, loadFace, type TextStyle } from './glyph-faces';

const SVG = 'http://www.w3.org/2000/svg';

/**
 * A text of a drawing as outlines: the glyphs stand where the browser has set them, so kerning and anchors hold.
 * Null where a character is in none of the shipped faces: such a text stays a text.
 *
 * @param text the element as it stands in the page
 * @param inkOf the colour that an element of the text has in the file; null where it is inherited from above the text
 */
export async function textOutlines(
  text: SVGTextElement,
  inkOf: (element: Element) => string | null,
): Promise<SVGGElement | null> {
  const group = document.createElementNS(SVG, 'g');
  const runs = [...textRuns(text)];
  const length = runs.reduce((sum, { characters }) => sum + characters.join('').length, 0);
  // Where the browser has dropped spaces, its places are not ours.
  if (length !== text.getNumberOfChars()) return null;
  let place = 0;
  for (const run of runs) {
    const style = getComputedStyle(run.parent);
    const wanted = textStyle(style);
    const size = Number.parseFloat(style.fontSize);
    let outline = '';
    for (const character of run.characters) {
      // Places are counted in UTF-16 units, as the browser counts them.
      const at = place;
      place += character.length;
      if (character.trim() === '') continue;
      const glyph = await findGlyph(character, wanted);
      if (glyph === null) return null;
      const { x, y } = text.getStartPositionOfChar(at);
      outline += glyph.getPath(x, y, size).toPathData(2);
    }
    if (outline === '') continue;
    const path = document.createElementNS(SVG, 'path');
    path.setAttribute('d', outline);
    const ink = inkOf(run.parent) ?? inkOf(text);
    if (ink !== null) path.setAttribute('fill', ink);
    group.append(path);
  }
  group.setAttribute('stroke', 'none');
  for (const name of ['transform', 'opacity']) {
    const value = text.getAttribute(name);
    if (value !== null) group.setAttribute(name, value);
  }
  return group;
}

async function findGlyph(character: string, style: TextStyle) {
  for (const name of faceNames(style)) {
    const face = await loadFace(name);
    const index = face.charToGlyphIndex(character);
    if (index > 0) return face.glyphs.get(index);
  }
  return null;
}

function textStyle(style: CSSStyleDeclaration): TextStyle {
  return { family: style.fontFamily, weight: Number(style.fontWeight), italic: style.fontStyle === 'italic' };
}

interface TextRun {
  parent: Element;
  characters: string[];
}

function* textRuns(text: SVGTextElement): Generator<TextRun> {
  const walker = document.createTreeWalker(text, NodeFilter.SHOW_TEXT);
  for (let node = walker.nextNode(); node; node = walker.nextNode()) {
    if (node.parentElement) yield { parent: node.parentElement, characters: [...(node.textContent ?? '')] };
  }
}
