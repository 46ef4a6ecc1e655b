const SIGNATURE = 8;
/** The header chunk: length, name, thirteen bytes, check sum. */
const HEADER = 25;
const METRES_PER_INCH = 0.0254;

/** A PNG that says how large it is to be printed: a pHYs chunk (PNG, third edition, 2025, section 11.3.4.3) is added. */
export function pngWithDensity(png: Uint8Array, dotsPerInch: number): Uint8Array<ArrayBuffer> {
  const chunk = new Uint8Array(21);
  const view = new DataView(chunk.buffer);
  const perMetre = Math.round(dotsPerInch / METRES_PER_INCH);
  view.setUint32(0, 9);
  chunk.set(new TextEncoder().encode('pHYs'), 4);
  view.setUint32(8, perMetre);
  view.setUint32(12, perMetre);
  // The unit: metres.
  view.setUint8(16, 1);
  view.setUint32(17, checkSum(chunk.subarray(4, 17)));
  const whole = new Uint8Array(png.length + chunk.length);
  const start = SIGNATURE + HEADER;
  whole.set(png.subarray(0, start));
  whole.set(chunk, start);
  whole.set(png.subarray(start), start + chunk.length);
  return whole;
}

/** CRC-32 as PNG has it (third edition, annex D). */
function checkSum(bytes: Uint8Array): number {
  let sum = 0xffffffff;
  for (const byte of bytes) {
    sum ^= byte;
    for (let bit = 0; bit < 8; bit++) sum = sum & 1 ? (sum >>> 1) ^ 0xedb88320 : sum >>> 1;
  }
  return (sum ^ 0xffffffff) >>> 0;
}
