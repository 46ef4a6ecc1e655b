import { ALL_DIGITS, formatDigits } from '@/lib/shared/format-number';
import type { NumberTable } from '@/lib/shared/numbers-csv';

/** A figure's numbers for those who cannot see it, or want to read them off. Scrolls on its own, keyboard included. */
export function NumberTableView({ table, caption }: { table: NumberTable; caption: string }) {
  return (
    <section
      className="mt-2 max-h-72 overflow-auto border-y border-rule"
      // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be reachable by keyboard
      tabIndex={0}
      aria-label={`Numbers: ${caption}`}
    >
      <table className="w-full text-[0.8125rem]">
        <caption className="sr-only">{caption}</caption>
        <thead className="sticky top-0 bg-paper">
          <tr>
            {table.columns.map(({ name, unit }) => (
              <th key={name} scope="col" className="px-2 py-1 text-right font-medium text-muted">
                {unit === '' ? name : `${name}, ${unit}`}
              </th>
            ))}
          </tr>
        </thead>
        <tbody className="figures">
          {table.rows.map((row) => (
            <tr key={String(row[0])} className="border-t border-rule-soft">
              {row.map((value, column) => (
                <td key={table.columns[column].name} className="px-2 py-0.5 text-right">
                  {typeof value === 'string' ? value : formatDigits(value, { digits: ALL_DIGITS, absent: '' })}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
