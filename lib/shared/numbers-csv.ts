export interface NumberColumn {
  name: string;
  /** "" for a number without a unit. */
  unit: string;
}

export interface NumberTable {
  columns: NumberColumn[];
  rows: (number | string | null)[][];
}

/** A table as CSV (RFC 4180): units in the head, every digit of every number, empty where there is none. */
export function numbersCsv({ columns, rows }: NumberTable, notes: string[] = []): string {
  const head = columns.map(({ name, unit }) => (unit === '' ? name : `${name} (${unit})`));
  const lines = [head, ...rows].map((row) => row.map(cell).join(','));
  // Notes stand in lines of their own, which readers of numbers skip by their first character.
  return `${[...notes.map((note) => `# ${note.replace(/[\r\n]+/g, ' ')}`), ...lines].join('\r\n')}\r\n`;
}

function cell(value: number | string | null): string {
  if (value === null) return '';
  // A text that a spreadsheet would take for a formula is kept a text.
  const text = typeof value === 'number' ? String(value) : value.replace(/^[=+\-@]/, "'$&");
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
