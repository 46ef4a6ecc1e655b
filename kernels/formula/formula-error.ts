/** A fault in a formula's text, with its place: `length` characters from character `at` (0-based) of `text`. */
export class FormulaError extends RangeError {
  readonly at: number;
  readonly length: number;
  readonly text: string;

  /**
   * @param message what is wrong and what is allowed, in words
   * @param at index of the first character at fault, 0 to the length of the text
   * @param length how many characters are at fault, 0 where something is missing
   * @param text the whole formula
   */
  constructor(message: string, at: number, length: number, text: string) {
    super(message);
    this.name = 'FormulaError';
    this.at = at;
    this.length = length;
    this.text = text;
  }
}
