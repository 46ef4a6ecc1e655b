'use client';

import { formatCount, formatDigits } from '@/lib/shared/format-number';
import { useExplore } from './explore-context';

/** What says how far the spectrum can be trusted. */
export function SpectrumLedger() {
  const picture = useExplore((state) => state.picture);
  const spectrum = picture?.case.spectrum;
  if (!picture || !spectrum) return null;
  const all = [...(spectrum.noisy ?? []), ...(spectrum.deterministic ?? [])];
  const unresolved = all.filter(({ resolved }) => resolved === false).length;
  const compared = picture.case.grid.compared.at(-1)?.[0];
  const parts: string[] = [];
  if (picture.settled && compared && spectrum.noisy) parts.push(`against ${formatCount(compared)} points`);
  if (spectrum.trace && picture.settled) {
    const { integral, sum, rest } = spectrum.trace;
    const agrees = Math.abs(integral - sum) <= rest + 1e-9;
    parts.push(agrees ? 'trace agrees' : `trace differs by ${formatDigits(Math.abs(integral - sum), { digits: 2 })}`);
  }
  if (unresolved > 0) parts.push(`${unresolved} unresolved, drawn faint`);
  return (
    <span className="flex flex-wrap gap-x-5">
      {parts.map((part) => (
        <span key={part}>{part}</span>
      ))}
    </span>
  );
}
