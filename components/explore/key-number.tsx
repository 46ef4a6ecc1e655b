import { COMPACT_DIGITS, formatDigits, formatUncertainty } from '@/lib/shared/format-number';
import type { Quantity } from '@/lib/shared/study-types';

interface KeyNumberProps {
  id: string;
  label: string;
  unit: string;
  quantity: Quantity | null | undefined;
  /** Words for a number that is not there. */
  absent: string;
  settled: boolean;
}

/** One number that the page is about: what it is, value and unit, uncertainty. */
export function KeyNumber({ id, label, unit, quantity, absent, settled }: KeyNumberProps) {
  return (
    <div data-number={id} className="sm:min-w-36">
      <dt className="text-[0.8125rem]">{label}</dt>
      <dd>
        {quantity ? (
          <>
            <span className="font-serif text-[1.5rem] font-semibold leading-snug">
              {formatDigits(quantity.value, {
                uncertainty: quantity.uncertainty,
                digits: quantity.uncertainty > 0 ? COMPACT_DIGITS : 4,
              })}
            </span>{' '}
            <span className="text-muted">{unit}</span>
            <span className={`figures block min-h-5 text-[0.8125rem] text-muted ${settled ? '' : 'opacity-40'}`}>
              {quantity.uncertainty > 0 && formatUncertainty(quantity.uncertainty)}
            </span>
          </>
        ) : (
          <span className="block min-h-14 max-w-56 py-1 text-[0.8125rem] text-muted">{absent}</span>
        )}
      </dd>
    </div>
  );
}
