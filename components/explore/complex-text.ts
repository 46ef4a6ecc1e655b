import { formatDigits } from '@/lib/shared/format-number';
import type { Eigenvalue } from '@/lib/shared/study-types';

/** "-0.4553 + 0.3328 i", to the digits that its uncertainty leaves. */
export function complexText({ re, im, uncertainty }: Eigenvalue): string {
  const options = { uncertainty, digits: uncertainty === null ? 4 : 10 };
  if (im === 0) return formatDigits(re, options);
  return `${formatDigits(re, options)} ${im < 0 ? '-' : '+'} ${formatDigits(Math.abs(im), options)} i`;
}
