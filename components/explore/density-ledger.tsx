'use client';

import { formatCount, formatDigits, formatUncertainty } from '@/lib/shared/format-number';
import { useExplore } from './explore-context';

/** What says how far the density can be trusted: mass lost, uncertainty and the grid behind it, the second way. */
export function DensityLedger() {
  const picture = useExplore((state) => state.picture);
  if (picture === null) return null;
  const { stationary, grid } = picture.case;
  if (!stationary) return null;
  const lost = stationary.lostPerStep;
  const compared = grid.compared.at(-1)?.[0];
  const { secondWay, uncertainty } = stationary;
  const parts: string[] = [`${formatCount(grid.points[0])} points`];
  if (lost && lost.value > 0) {
    parts.push(`mass lost per step ${formatDigits(lost.value, { uncertainty: lost.uncertainty, digits: 3 })}`);
  }
  if (picture.settled && uncertainty !== null) {
    parts.push(
      `density ${formatUncertainty(uncertainty)}${compared ? `, against ${formatCount(compared)} points` : ''}`,
    );
  }
  const peak = Math.max(...stationary.values);
  if (picture.settled && secondWay) {
    const allowed = Math.max(10 * (uncertainty ?? 0), 1e-9 * peak);
    const far = secondWay.difference * peak;
    parts.push(far <= allowed ? 'two ways agree' : `two ways differ by ${formatUncertainty(far).slice(2)}`);
  }
  if (!grid.resolved) parts.push('the grid is too coarse for this noise: choose more points');
  return (
    <span className="flex flex-wrap gap-x-5">
      {parts.map((part) => (
        <span key={part}>{part}</span>
      ))}
    </span>
  );
}
