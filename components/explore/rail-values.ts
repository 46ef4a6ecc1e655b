import type { Picture } from '@/lib/client/explore-core';
import { type Lane, laneValueAt } from '@/lib/client/rail-lanes';
import type { RailView } from '@/lib/client/side-store';
import { noiseLevel } from '@/lib/shared/bench-study';
import { formatDigits, NBSP } from '@/lib/shared/format-number';

export interface RailValue {
  value: number | null;
  text: string;
  spoken: string;
}

/** What the lanes say at the handle: the picture's own number where it has this noise level, else read off the curve. */
export function railValues(
  lanes: readonly Lane[],
  picture: Picture | null,
  rail: RailView,
  sigma: number,
): RailValue[] {
  const shown = picture && noiseLevel(picture.study) === sigma ? picture : null;
  return lanes.map((lane) => {
    const quantity = shown ? lane.inCase(shown.case) : null;
    const unit = lane.unit ? `${NBSP}${lane.unit}` : '';
    if (quantity) {
      const known = quantity.uncertainty > 0;
      const digits = formatDigits(quantity.value, {
        uncertainty: known ? quantity.uncertainty : null,
        digits: known ? 6 : 4,
      });
      return { value: quantity.value, text: digits, spoken: `${digits}${unit}` };
    }
    const value = rail.stale ? null : laneValueAt(lane, rail.points, sigma);
    if (value === null) return { value, text: '', spoken: 'not known' };
    const digits = formatDigits(value, { digits: 3 });
    return { value, text: `about ${digits}`, spoken: `about ${digits}${unit}` };
  });
}
