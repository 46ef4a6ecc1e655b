'use client';

import { useEffect, useRef } from 'react';
import { type Colour, readColour, rowShades, STRIP_MARGIN, type StripRow, shadeColour } from './strip-picture';

interface StripCanvasProps {
  rows: readonly StripRow[];
  from: number;
  to: number;
  width: number;
  /** The densities belong to an earlier study. */
  stale: boolean;
}

const fallback: { paper: Colour; rain: Colour; ink: Colour } = {
  paper: [255, 255, 255],
  rain: [37, 106, 140],
  ink: [0, 0, 0],
};

/** The rows of the strip as pixels, drawn in place while something moves. */
export function StripCanvas({ rows, from, to, width, stale }: StripCanvasProps) {
  const ref = useRef<HTMLCanvasElement>(null);
  const { left, right } = STRIP_MARGIN;
  const inner = Math.max(width - left - right, 1);
  useEffect(() => {
    const canvas = ref.current;
    if (canvas === null) return;
    const draw = () => drawStrip(canvas, rows, from, to, inner);
    draw();
    // Another theme has other colours.
    const observer = new MutationObserver(draw);
    observer.observe(document.documentElement, { attributes: true, attributeFilter: ['data-theme'] });
    const media = matchMedia('(prefers-color-scheme: dark)');
    media.addEventListener('change', draw);
    return () => {
      observer.disconnect();
      media.removeEventListener('change', draw);
    };
  }, [rows, from, to, inner]);
  return <canvas ref={ref} data-strip className={`block size-full ${stale ? 'opacity-50' : ''}`} />;
}

function drawStrip(
  canvas: HTMLCanvasElement,
  rows: readonly StripRow[],
  from: number,
  to: number,
  columns: number,
): void {
  const context = canvas.getContext('2d');
  if (context === null || rows.length === 0) return;
  const style = getComputedStyle(document.documentElement);
  const colour = (name: 'paper' | 'rain' | 'ink') => readColour(style.getPropertyValue(`--${name}`)) ?? fallback[name];
  const [paper, rain, ink] = [colour('paper'), colour('rain'), colour('ink')];
  const tall = ROW_PIXELS;
  canvas.width = columns;
  canvas.height = rows.length * tall;
  const image = context.createImageData(columns, canvas.height);
  for (const [row, { curve }] of rows.entries()) {
    const shades = rowShades(curve, from, to, columns);
    for (let column = 0; column < columns; column++) {
      const [red, green, blue] = shadeColour(shades[column], paper, rain, ink);
      // The last line of a row stays paper and parts it from the next.
      for (let line = 0; line < tall - 1; line++) {
        const at = 4 * ((row * tall + line) * columns + column);
        image.data[at] = red;
        image.data[at + 1] = green;
        image.data[at + 2] = blue;
        image.data[at + 3] = 255;
      }
    }
  }
  context.putImageData(image, 0, 0);
}

const ROW_PIXELS = 10;
