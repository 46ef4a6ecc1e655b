import { fileName, saveFile } from '@/lib/client/save-file';
import { type NumberTable, numbersCsv } from '@/lib/shared/numbers-csv';
import { studyHash } from '@/lib/shared/study-hash';
import type { StudyFile } from '@/lib/shared/study-types';
import { figurePng, type PngSize } from './figure-png';
import { figureSvg } from './figure-svg';

export interface DownloadOptions {
  text: 'outlines' | 'editable';
  colours: 'light' | 'screen';
  png: PngSize;
}

export interface SavedFigure {
  title: string;
  /** Where the drawing stands; of several only one is shown at a time. */
  drawing: HTMLElement;
  /** Legend and ledger line in words. */
  words: string;
  study: StudyFile | null;
}

export async function saveFigureSvg(figure: SavedFigure, options: DownloadOptions): Promise<void> {
  const { svg } = await drawn(figure, options);
  saveFile(fileName(figure.title, 'svg'), 'image/svg+xml', svg);
}

export async function saveFigurePng(figure: SavedFigure, options: DownloadOptions): Promise<void> {
  // Painted here: letters need no outlines, and the picture has those of the file.
  const { svg, width, height } = await drawn(figure, { ...options, text: 'outlines' });
  saveFile(fileName(figure.title, 'png'), 'image/png', await figurePng(svg, width, height, options.png));
}

export async function saveFigureCsv(title: string, table: NumberTable, notes: string[], study: StudyFile | null) {
  saveFile(fileName(title, 'csv'), 'text/csv', numbersCsv(table, [await hashNote(study), ...notes]));
}

async function drawn({ title, drawing, words, study }: SavedFigure, { text, colours }: DownloadOptions) {
  const shown = [...drawing.querySelectorAll<SVGSVGElement>('svg[role="img"]')].find(
    (svg) => svg.getClientRects().length > 0,
  );
  if (!shown) throw new Error('the figure is not drawn yet');
  const description = [title, words, await hashNote(study)].filter((part) => part !== '').join('. ');
  const { width, height } = shown.viewBox.baseVal;
  return { svg: await figureSvg(shown, { text, colours, description }), width, height };
}

async function hashNote(study: StudyFile | null): Promise<string> {
  if (study === null) return 'study not known';
  // Browsers compute hashes on pages that came over https, or from the same machine.
  if (!globalThis.crypto?.subtle) return 'study sha256: not computed, the page did not come over https';
  return `study sha256: ${await studyHash(study)}`;
}
