import Papa from 'papaparse';
import { parseNumber } from './parse-number';

/** More would make every change of the study slow; the headless command takes ten times as many. */
export const MOST_SAMPLES = 100_000;

export interface SampleColumns {
  /** Names of the head line, or "column 1" and so on. */
  columns: string[];
  read(column: number): { samples: number[] } | { fault: string };
}

interface Line {
  number: number;
  cells: string[];
}

/**
 * Samples from a text: one number a line, or a column of a table separated by commas, semicolons or tabs. Empty lines
 * and lines that begin with # are passed over. In a table separated by commas decimals need a point.
 */
export function readSamples(text: string): SampleColumns | { fault: string } {
  const { data } = Papa.parse<string[]>(text.replace(/^\ufeff/, ''), { delimiter: delimiterOf(text) });
  const lines: Line[] = data
    .map((cells, i) => ({ number: i + 1, cells }))
    .filter(({ cells }) => cells.some((cell) => cell.trim() !== '') && !cells[0].startsWith('#'));
  if (lines.length === 0) return { fault: 'the file holds no numbers' };
  const [first, ...rest] = lines;
  const headed = rest.length > 0 && first.cells.every((cell) => 'fault' in parseNumber(cell));
  const columns = first.cells.map((name, i) => (headed && name.trim() !== '' ? name.trim() : `column ${i + 1}`));
  return { columns, read: (column) => numbersOf(headed ? rest : lines, column) };
}

function numbersOf(lines: Line[], column: number): { samples: number[] } | { fault: string } {
  if (lines.length > MOST_SAMPLES) {
    return { fault: `line ${lines[MOST_SAMPLES].number}: more than ${MOST_SAMPLES} samples; leave some out` };
  }
  const samples: number[] = [];
  for (const { number, cells } of lines) {
    const cell = cells[column];
    if (cell === undefined)
      return { fault: `line ${number}: has ${cells.length} columns, column ${column + 1} is missing` };
    const parsed = parseNumber(cell);
    if ('fault' in parsed) return { fault: `line ${number}: ${parsed.fault}` };
    samples.push(parsed.value);
  }
  return { samples };
}

/** Semicolons and tabs leave the comma to the decimals. */
function delimiterOf(text: string): string {
  const line = text.split(/\r?\n/).find((candidate) => candidate.trim() !== '' && !candidate.startsWith('#')) ?? '';
  if (line.includes('\t')) return '\t';
  return line.includes(';') ? ';' : ',';
}
