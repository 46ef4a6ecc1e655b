export type ParsedNumber = { value: number } | { fault: string };

/**
 * Reads a number as people type it: a comma or a point for decimals, spaces between thousands, any dash for a minus.
 * Both a comma and a point in one number can mean two things, so that is refused.
 */
export function parseNumber(text: string): ParsedNumber {
  const plain = text
    .trim()
    .replace(/[\s\u00a0\u2009\u202f]/g, '')
    .replace(/[\u2212\u2010-\u2014]/g, '-');
  if (plain === '') return { fault: 'a number is needed' };
  if (plain.includes(',') && plain.includes('.')) {
    return { fault: `${text.trim()}: write either a point or a comma, for decimals only` };
  }
  const pointed = plain.replace(',', '.');
  if (!/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(pointed)) return { fault: `${text.trim()} is not a number` };
  const value = Number(pointed);
  if (!Number.isFinite(value)) return { fault: `${text.trim()} is too large; the largest is 1.8e308` };
  return { value: value === 0 ? 0 : value };
}
