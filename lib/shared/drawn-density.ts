/** A drawn density has its heights at this many places, evenly from end to end, and straight lines between. */
export const DRAWN_PLACES = 21;
export const MOST_HEIGHT = 100;

export function drawnPlace(index: number, from: number, to: number): number {
  return Number((from + ((to - from) * index) / (DRAWN_PLACES - 1)).toPrecision(6));
}

/**
 * A density drawn by hand as a formula in the language of the studies: straight pieces through whole-numbered heights.
 * Its mass is whatever was drawn: a start density is normalised when it is used.
 */
export function drawnFormula(heights: number[], variable: string, from: number, to: number): string {
  const at = (value: number) => (value < 0 ? `(${value})` : String(value));
  let text = '';
  for (let i = 0; i + 1 < heights.length; i++) {
    const [low, high] = [drawnPlace(i, from, to), drawnPlace(i + 1, from, to)];
    const width = Number((high - low).toPrecision(6));
    const piece = `${heights[i]}+(${heights[i + 1]}-${heights[i]})*(${variable}-${at(low)})/${width}`;
    text += i + 2 < heights.length ? `${variable}<${at(high)}?${piece}:` : piece;
  }
  return text;
}

/** The heights behind a formula of `drawnFormula`; null for any other formula, or one drawn on another domain. */
export function drawnHeights(formula: string, variable: string, from: number, to: number): number[] | null {
  const pieces = [...formula.matchAll(/(?:^|[?:])(\d+)\+\((\d+)-\d+\)/g)];
  if (pieces.length !== DRAWN_PLACES - 1) return null;
  const heights = [Number(pieces[0][1]), ...pieces.map(([, , next]) => Number(next))];
  return drawnFormula(heights, variable, from, to) === formula ? heights : null;
}
