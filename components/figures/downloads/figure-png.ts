import { pngWithDensity } from './png-density';

/** Dots of a screen's pixel, and of print. */
const SCREEN_DPI = 96;
const PRINT_DPI = 300;
const MM_PER_INCH = 25.4;
/** Browsers refuse larger canvases, or paint nothing on them. */
const MOST_PIXELS = 8192;

export type PngSize = { scale: 1 | 2 } | { millimetres: number };

/** A drawing as PNG, at a multiple of its size on screen or as wide as it is to be printed at 300 dots per inch. */
export async function figurePng(svg: string, width: number, height: number, size: PngSize): Promise<Blob> {
  const across = 'scale' in size ? width * size.scale : (size.millimetres / MM_PER_INCH) * PRINT_DPI;
  const dotsPerInch = 'scale' in size ? SCREEN_DPI * size.scale : PRINT_DPI;
  const columns = Math.round(across);
  const rows = Math.round((across * height) / width);
  if (!(columns >= 1 && Math.max(columns, rows) <= MOST_PIXELS))
    throw new RangeError(`a picture of ${columns} by ${rows} pixels; allowed: up to ${MOST_PIXELS} either way`);
  const image = new Image();
  // The drawing is scaled before it is painted: painted first, its lines would blur.
  const scaled = svg.replace(/(<svg[^>]*? width=")[^"]*("[^>]*? height=")[^"]*"/, `$1${columns}$2${rows}"`);
  const address = URL.createObjectURL(new Blob([scaled], { type: 'image/svg+xml' }));
  try {
    image.src = address;
    await image.decode();
    const canvas = document.createElement('canvas');
    canvas.width = columns;
    canvas.height = rows;
    canvas.getContext('2d')?.drawImage(image, 0, 0, columns, rows);
    const blob = await new Promise<Blob | null>((done) => canvas.toBlob(done, 'image/png'));
    if (blob === null) throw new Error('this browser could not paint the picture');
    return new Blob([pngWithDensity(new Uint8Array(await blob.arrayBuffer()), dotsPerInch)], { type: 'image/png' });
  } finally {
    URL.revokeObjectURL(address);
  }
}
