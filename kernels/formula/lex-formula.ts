import { FormulaError } from './formula-error';

/** Sizes beyond which a formula is refused. */
export const FORMULA_LIMITS = {
  /** characters */
  length: 2000,
  /** numbers, names, operators and brackets together */
  tokens: 600,
  /** brackets, signs and open conditions within one another */
  nesting: 60,
  /** powers in one tower, a^b^c^d^e */
  powers: 4,
  /** characters of a name */
  name: 32,
} as const;

export interface FormulaToken {
  kind: 'number' | 'name' | 'operator' | '(' | ')' | ',' | '?' | ':';
  /** as written */
  text: string;
  /** index of its first character */
  at: number;
}

const SPACE = /\s+/y;
const NUMBER = /(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?/y;
const NAME = /[A-Za-z][A-Za-z0-9_]*/y;
const SIGN = /<=|>=|==|!=|[-+*/^<>(),?:]/y;

/** What people write out of habit, and what to write here. */
const HABITS: [string, string][] = [
  ['**', 'a power is written with ^'],
  ['&&', 'write "and"'],
  ['||', 'write "or"'],
  ['&', 'write "and"'],
  ['|', 'write "or" for a choice of conditions, abs(…) for an absolute value'],
  ['=', 'write == to compare; a formula gives the value alone, without "x ="'],
  ['!', 'write "not" for a condition, != for "differs from"; there is no factorial'],
  ['%', 'write mod(a, b) for the remainder'],
  ['[', 'brackets are round: ( and )'],
  [']', 'brackets are round: ( and )'],
  ['{', 'brackets are round: ( and )'],
  ['}', 'brackets are round: ( and )'],
  ['"', 'a formula has no text in it'],
  ["'", 'a formula has no text and no prime in it'],
  ['`', 'a formula has no text in it'],
  [';', 'one formula has one value; arguments are separated by commas'],
  ['.', 'a point stands inside a number only'],
  ['_', 'a name begins with a letter'],
  ['−', 'write the minus sign as -'],
  ['–', 'write the minus sign as -'],
  ['×', 'write the multiplication sign as *'],
  ['·', 'write the multiplication sign as *'],
  ['÷', 'write the division sign as /'],
  ['≤', 'write <='],
  ['≥', 'write >='],
  ['≠', 'write !='],
  ['π', 'write pi'],
  ['²', 'write ^2'],
  ['³', 'write ^3'],
  ['√', 'write sqrt(…)'],
];

/**
 * Cuts a formula into tokens and keeps to the limits, before anything that recurses sees it.
 * @param text the formula; up to 2000 characters and 600 tokens
 * @returns the tokens in order, each with the index of its first character
 * @throws FormulaError at the first character outside the language, at a number beyond 1.8e308 or that vanishes, at a
 *   name of more than 32 characters, and where the limits are passed. Cost: linear in the length.
 */
export function lexFormula(text: string): FormulaToken[] {
  const { length, tokens: most } = FORMULA_LIMITS;
  if (text.length > length) {
    throw new FormulaError(`The formula has ${text.length} characters; at most ${length} are allowed`, length, 0, text);
  }
  const tokens: FormulaToken[] = [];
  const match = (pattern: RegExp, at: number) => {
    pattern.lastIndex = at;
    return pattern.exec(text)?.[0];
  };
  for (let at = 0; at < text.length; ) {
    const space = match(SPACE, at);
    if (space !== undefined) {
      at += space.length;
      continue;
    }
    if (text.startsWith('**', at)) throw unknownCharacter(text, at);
    const token = tokenAt(text, at, match);
    if (tokens.push(token) > most) {
      throw new FormulaError(`The formula has more than ${most} numbers, names and signs`, at, token.text.length, text);
    }
    at += token.text.length;
  }
  return tokens;
}

function tokenAt(text: string, at: number, match: (pattern: RegExp, at: number) => string | undefined): FormulaToken {
  const number = match(NUMBER, at);
  if (number !== undefined) {
    const value = Number(number);
    const shown = number.length > 24 ? `${number.slice(0, 20)}…` : number;
    if (!Number.isFinite(value))
      throw new FormulaError(`${shown} is too large: numbers go up to 1.79e308`, at, number.length, text);
    if (value === 0 && /[1-9]/.test(number.split(/[eE]/)[0])) {
      throw new FormulaError(`${shown} is too small: it would count as 0`, at, number.length, text);
    }
    return { kind: 'number', text: number, at };
  }
  const name = match(NAME, at);
  if (name !== undefined) {
    if (name.length > FORMULA_LIMITS.name) {
      throw new FormulaError(`A name has at most ${FORMULA_LIMITS.name} characters`, at, name.length, text);
    }
    return { kind: name === 'and' || name === 'or' || name === 'not' ? 'operator' : 'name', text: name, at };
  }
  const sign = match(SIGN, at);
  if (sign === undefined) throw unknownCharacter(text, at);
  return { kind: /[(),?:]/.test(sign) ? (sign as '(') : 'operator', text: sign, at };
}

function unknownCharacter(text: string, at: number): FormulaError {
  const habit = HABITS.find(([written]) => text.startsWith(written, at));
  const character = habit?.[0] ?? String.fromCodePoint(text.codePointAt(at) ?? 0);
  const shown = /[\p{C}]/u.test(character)
    ? `the character U+${(text.codePointAt(at) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`
    : character;
  const advice = habit?.[1] ?? 'it is no part of a formula';
  return new FormulaError(`${shown} cannot be used here: ${advice}`, at, character.length, text);
}
