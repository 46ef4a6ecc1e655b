import type { StartDensity } from '@/lib/client/side-requests';
import { formatCount, formatEntry } from '@/lib/shared/format-number';

/** "from a Gaussian at 0.22, sd 0.02": a start density in words. */
export function startWords(start: StartDensity, unit: string | undefined): string {
  const text = (value: unknown) => `${formatEntry(Number([value].flat()[0]))}${unit ? ` ${unit}` : ''}`;
  switch (start.kind) {
    case 'uniform':
      return 'uniform';
    case 'gaussian':
      return `Gaussian at ${text(start.mean)}, sd ${text(start.sd)}`;
    case 'point':
      return `point at ${text(start.at)}`;
    case 'formula':
      return start.formula;
    case 'samples':
      return `${formatCount(start.samples.length)} samples`;
  }
}
