import { FormulaError } from './formula-error';
import type { FormulaScope } from './formula-scope';
import { CONSTANTS, FUNCTIONS, type FunctionName } from './formula-tree';
import { FORMULA_LIMITS, type FormulaToken } from './lex-formula';
import { nearestName } from './nearest-name';

/** What is open around a token: the whole formula, a bracket, or the arguments of a function. */
interface Frame {
  opener: FormulaToken | null;
  call: FunctionName | null;
  arguments: number;
  /** `?` still waiting for their `:` */
  questions: FormulaToken[];
  /** `not` whose operand goes on */
  nots: number;
  /** powers in the tower so far, those around the bracket counted */
  powers: number;
}

/** Operators after which (or at the start, or after these signs) a condition may begin with `not`. */
const BEFORE_NOT = new Set(['(', ',', '?', ':', 'and', 'or', 'not']);

/**
 * Decides whether the tokens form a sentence of the language, without recursion, and writes them out for the parser.
 * Numbers and names become n0, n1, … with the index of their token, so that no name of the user's reaches the parser, and
 * each leaf of its tree leads back to a place in the text. `not` gets the bracket that makes it weaker than a comparison.
 * @param tokens from `lexFormula`
 * @param text the formula, for the messages
 * @param scope the names allowed, already checked
 * @returns the text for the parser
 * @throws FormulaError at the first token that does not fit, at unknown names (with the nearest known one), at a wrong
 *   number of arguments, at a multiplication without its sign, and beyond the limits of nesting. Cost: linear.
 */
export function checkGrammar(tokens: readonly FormulaToken[], text: string, scope: FormulaScope): string {
  if (tokens.length === 0) throw new FormulaError('The formula is empty', 0, 0, text);
  const written: string[] = [];
  const frames: Frame[] = [newFrame(null, null, 0)];
  let wantsOperand = true;
  let signs = 0;

  const fail = (message: string, token: FormulaToken): never => {
    throw new FormulaError(message, token.at, token.text.length, text);
  };
  const closeNots = (frame: Frame) => {
    written.push(')'.repeat(frame.nots));
    frame.nots = 0;
  };
  const checkDepth = (token: FormulaToken) => {
    let depth = frames.length - 1 + signs;
    for (const frame of frames) depth += frame.questions.length + frame.nots;
    if (depth > FORMULA_LIMITS.nesting) fail(`The formula is nested more than ${FORMULA_LIMITS.nesting} deep`, token);
  };

  for (let i = 0; i < tokens.length; i++) {
    const token = tokens[i];
    const frame = frames[frames.length - 1];
    const previous = i > 0 ? tokens[i - 1] : null;

    if (wantsOperand) {
      if (token.kind === 'number') {
        written.push(`n${i}`);
        wantsOperand = false;
        signs = 0;
      } else if (token.kind === 'name') {
        const called = tokens[i + 1]?.kind === '(';
        checkName(token, called, tokens[i + 1] ?? null, text, scope);
        written.push(`n${i}`);
        if (called) {
          frames.push(newFrame(token, token.text as FunctionName, previous?.text === '^' ? frame.powers : 0));
          written.push('(');
          checkDepth(token);
          signs = 0;
          i++;
        } else {
          wantsOperand = false;
          signs = 0;
        }
      } else if (token.kind === '(') {
        frames.push(newFrame(token, null, previous?.text === '^' || signs > 0 ? frame.powers : 0));
        written.push('(');
        checkDepth(token);
        signs = 0;
      } else if (token.text === '-' || token.text === '+') {
        signs++;
        checkDepth(token);
        written.push(token.text);
      } else if (token.text === 'not') {
        if (previous !== null && !BEFORE_NOT.has(previous.text)) fail('Put brackets around "not …" here', token);
        frame.nots++;
        checkDepth(token);
        written.push('not', '(');
      } else {
        throw missingOperand(token, previous, frame, text);
      }
      continue;
    }

    if (token.kind === 'number' || token.kind === 'name' || token.kind === '(' || token.text === 'not') {
      throw missingOperator(token, previous, text);
    }
    if (token.kind === 'operator') {
      if (token.text === '^') {
        if (++frame.powers > FORMULA_LIMITS.powers)
          fail(`A tower of powers has at most ${FORMULA_LIMITS.powers} steps`, token);
      } else frame.powers = 0;
      if (token.text === 'and' || token.text === 'or') closeNots(frame);
      written.push(token.text);
      wantsOperand = true;
      continue;
    }
    closeNots(frame);
    frame.powers = 0;
    if (token.kind === ')') {
      if (frame.opener === null) fail('This bracket closes nothing: there is no ( before it', token);
      closeFrame(frame, text);
      frames.pop();
      written.push(')');
      continue;
    }
    if (token.kind === ',') {
      if (frame.call === null)
        fail('A comma separates the arguments of a function; decimals are written with a point', token);
      if (frame.questions.length > 0) throw lonelyQuestion(frame, text);
      frame.arguments++;
    } else if (token.kind === '?') {
      frame.questions.push(token);
      checkDepth(token);
    } else if (frame.questions.pop() === undefined) {
      fail('This : has no ? before it; a choice is written condition ? value : other value', token);
    }
    // The parser wants a choice within a choice in brackets.
    written.push(token.kind === '?' ? '? (' : token.kind === ':' ? ') :' : ',');
    wantsOperand = true;
  }

  const frame = frames[frames.length - 1];
  if (wantsOperand) throw missingOperand(null, tokens[tokens.length - 1], frame, text);
  closeNots(frame);
  if (frame.opener !== null) {
    throw new FormulaError(
      'This bracket is never closed: a ) is missing',
      frame.opener.at,
      frame.opener.text.length,
      text,
    );
  }
  if (frame.questions.length > 0) throw lonelyQuestion(frame, text);
  return written.join(' ');
}

function newFrame(opener: FormulaToken | null, call: FunctionName | null, powers: number): Frame {
  return { opener, call, arguments: 1, questions: [], nots: 0, powers };
}

function closeFrame(frame: Frame, text: string): void {
  if (frame.questions.length > 0) throw lonelyQuestion(frame, text);
  if (frame.call !== null && frame.opener !== null) checkArity(frame.call, frame.arguments, frame.opener, text);
}

function checkArity(name: FunctionName, given: number, at: FormulaToken, text: string): void {
  const [least, most] = FUNCTIONS[name];
  if (given >= least && given <= most) return;
  const allowed = least === most ? `${least} argument${least === 1 ? '' : 's'}` : `${least} to ${most} arguments`;
  throw new FormulaError(`${name} takes ${allowed}, not ${given}`, at.at, at.text.length, text);
}

function lonelyQuestion(frame: Frame, text: string): FormulaError {
  const { at } = frame.questions[frame.questions.length - 1];
  return new FormulaError('This ? has no : after it; a choice is written condition ? value : other value', at, 1, text);
}

function checkName(
  token: FormulaToken,
  called: boolean,
  next: FormulaToken | null,
  text: string,
  scope: FormulaScope,
): void {
  const name = token.text;
  const fail = (message: string) => {
    throw new FormulaError(message, token.at, name.length, text);
  };
  const isFunction = Object.hasOwn(FUNCTIONS, name);
  const own = scope.variables.includes(name) || scope.parameters.includes(name);
  const value = own || Object.hasOwn(CONSTANTS, name) || (name === 't' && scope.time === true);
  if (isFunction && !called) fail(`${name} is a function: write ${name}(…)`);
  if (isFunction || (value && !called)) return;
  if (value && next !== null) {
    throw new FormulaError(`${name} is not a function; for a product write ${name}*(…)`, next.at, 1, text);
  }
  if (name === 't') fail('t, the time, can be used in continuous time only');
  const values = [...scope.variables, ...scope.parameters, ...Object.keys(CONSTANTS), ...(scope.time ? ['t'] : [])];
  const functions = Object.keys(FUNCTIONS);
  if (name === 'ln') fail('ln is written log: the natural logarithm');
  const near = nearestName(name, called ? functions : values) ?? nearestName(name, called ? values : functions);
  const what = called ? 'no function of the language' : 'not known here';
  const known = called ? functions.join(', ') : values.slice(0, 20).join(', ');
  fail(`"${name}" is ${what}; ${near === null ? `known: ${known}` : `did you mean ${near}?`}`);
}

function missingOperand(
  token: FormulaToken | null,
  previous: FormulaToken | null,
  frame: Frame,
  text: string,
): FormulaError {
  const at = token?.at ?? text.length;
  const length = token?.text.length ?? 0;
  if (token?.kind === ')' && frame.call !== null && previous?.kind === '(') {
    return new FormulaError(`${frame.call} needs its argument in the brackets`, at, length, text);
  }
  if (token?.kind === ')' && frame.opener === null) {
    return new FormulaError('This bracket closes nothing: there is no ( before it', at, length, text);
  }
  const where = previous === null ? 'at the start' : `after ${previous.text}`;
  const found = token === null ? 'the formula ends' : `${token.text} stands here`;
  return new FormulaError(`A number, a name or a bracket is missing ${where}: ${found}`, at, length, text);
}

function missingOperator(token: FormulaToken, previous: FormulaToken | null, text: string): FormulaError {
  const left = previous?.text ?? '';
  const length = token.text.length;
  if (previous?.kind === 'number' && token.kind === 'number') {
    return new FormulaError('Two numbers follow one another without a sign between them', token.at, length, text);
  }
  if (token.text === 'not') return new FormulaError('Write "and not" or "or not"', token.at, length, text);
  if (['mod', 'xor', 'to', 'in'].includes(token.text)) {
    return new FormulaError(
      `${token.text} does not stand between two values; the remainder is mod(a, b)`,
      token.at,
      length,
      text,
    );
  }
  const right = token.kind === '(' ? '(…)' : token.text;
  const product = `${previous?.kind === ')' ? '(…)' : left}*${right}`;
  return new FormulaError(`A multiplication needs its sign: write ${product}`, token.at, length, text);
}
