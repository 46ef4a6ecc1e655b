import type { EigenvalueRow } from '@/lib/shared/eigenvalue-rows';
import { formatDigits, formatUncertainty, NBSP } from '@/lib/shared/format-number';

interface SpectrumTableProps {
  rows: EigenvalueRow[];
  /** Noise level that the rows belong to. */
  sigma: number | null;
  settled: boolean;
  chosen: number | null;
  onPoint(index: number | null): void;
  /** Index of the eigenvalue whose eigenfunctions are shown. */
  kept: number | null;
  onKeep(index: number): void;
}

const heads = ['', 'modulus', 'phase', 'lasts, steps', ''];

/** Eigenvalues with noise: how strong, how they turn, how long a pattern of theirs lasts. */
export function SpectrumTable({ rows, sigma, settled, chosen, onPoint, kept, onKeep }: SpectrumTableProps) {
  return (
    <table
      className="w-full whitespace-nowrap text-xs sm:text-[0.8125rem]"
      data-table="spectrum"
      data-part="table"
      data-shown-sigma={sigma ?? undefined}
    >
      <caption className="sr-only">Eigenvalues with noise; a conjugate pair stands in one row</caption>
      <thead>
        <tr className="border-b border-rule text-muted">
          <th scope="col" className="py-1 text-left font-normal">
            <span className="sr-only">place</span>
          </th>
          {heads.slice(1, 4).map((head) => (
            <th key={head} scope="col" className="py-1 pl-2 text-right font-medium">
              {head}
            </th>
          ))}
          <th scope="col" className="py-1 pl-2 text-right font-medium">
            <span className="sr-only">uncertainty of the eigenvalue</span>±
          </th>
        </tr>
      </thead>
      <tbody className="figures">
        {rows.map((row) => (
          <tr
            key={row.place}
            onPointerEnter={() => onPoint(row.index)}
            onPointerLeave={() => onPoint(null)}
            onClick={() => onKeep(row.index)}
            className={`cursor-pointer border-b border-rule-soft ${chosen === row.index ? 'bg-rain-soft' : ''}`}
          >
            <th scope="row" className="py-1 text-left font-normal">
              <button
                type="button"
                aria-pressed={kept === row.index}
                aria-label={`Eigenfunctions of eigenvalue ${row.place}`}
                // The row's own click does what this one would.
                className={`text-left underline decoration-rule underline-offset-4 hover:decoration-ink ${kept === row.index ? 'font-semibold decoration-ink' : ''}`}
              >
                {row.place}
              </button>
            </th>
            <td className="pl-2 text-right" data-cell="modulus">
              {formatDigits(row.modulus, { uncertainty: row.uncertainty, digits: row.uncertainty === null ? 4 : 10 })}
            </td>
            <td className="pl-2 text-right">
              <Phase row={row} />
            </td>
            <td className="pl-2 text-right">
              {formatDigits(row.lasts, {
                uncertainty: row.lastsUncertainty,
                digits: row.uncertainty === null ? 3 : 5,
                absent: 'for ever',
              })}
            </td>
            <td className={`pl-2 text-right text-muted ${settled ? '' : 'opacity-40'}`} data-cell="uncertainty">
              {formatUncertainty(row.uncertainty).replace(`±${NBSP}`, '')}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** In units of pi; a real eigenvalue's is 0 or pi exactly. */
function Phase({ row: { phase, pair, phaseUncertainty } }: { row: EigenvalueRow }) {
  if (!pair) return phase === 0 ? '0' : 'π';
  return `±${formatDigits(phase, { uncertainty: phaseUncertainty, digits: phaseUncertainty === null ? 3 : 5 })}${NBSP}π`;
}
