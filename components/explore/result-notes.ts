import type { Picture } from '@/lib/client/explore-core';

/** Lines that tell where the numbers of a file come from. */
export function resultNotes(picture: Picture | null): string[] {
  if (picture === null) return [];
  const { study, case: shown, settled } = picture;
  return [
    `Smirr, study: ${JSON.stringify({ ...study, notes: undefined, ask: undefined })}`,
    `computed on ${shown.grid.points.join(' x ')} points`,
    settled && shown.stationary?.uncertainty
      ? `largest uncertainty of the density with noise: ${shown.stationary.uncertainty}`
      : 'computed without uncertainties',
  ];
}
