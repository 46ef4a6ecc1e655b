import { scaleLinear } from 'd3-scale';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { fittingTicks } from '@/components/figures/axis';
import { DensityFigure } from '@/components/figures/density-figure';
import { cellValue, mergedCells, nearestIndex } from '@/components/figures/density-path';
import { densityTop } from '@/components/figures/density-scales';
import { SpectrumFigure } from '@/components/figures/spectrum-figure';
import { formatTick } from '@/lib/shared/format-number';

const noisy = { x: [0.1, 0.3, 0.5, 0.7, 0.9], values: [0, 1, 2, 1, 0] };
const cells = { x: [0.125, 0.375, 0.625, 0.875], values: [4, 0, 0, 0] };

describe('a density', () => {
  const draw = (width: number) =>
    renderToStaticMarkup(
      <DensityFigure
        noisy={noisy}
        without={cells}
        from={0}
        to={1}
        variable="x, V"
        title="Density"
        width={width}
        height={300}
      />,
    );

  it('is drawn on the server, with its unit, the one without noise as steps', () => {
    const svg = draw(700);
    expect(svg).toContain('<title>Density</title>');
    expect(svg).toContain('density, per V');
    expect(svg).toMatch(/data-series="density-with" d="M/);
    expect(svg).not.toMatch(/NaN|Infinity/);
  });

  it('without data is an empty plot, not a broken one', () => {
    const svg = renderToStaticMarkup(
      <DensityFigure
        noisy={null}
        without={null}
        from={-2}
        to={2}
        variable="x"
        title="Density"
        width={328}
        height={300}
      />,
    );
    expect(svg).not.toMatch(/NaN|Infinity|data-series/);
  });

  it('keeps every mark within the drawing', () => {
    const numbers = [...draw(328).matchAll(/ (?:x|x1|x2|cx)="(-?[\d.]+)"/g)].map(([, value]) => Number(value));
    expect(Math.min(...numbers)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...numbers)).toBeLessThanOrEqual(328);
  });

  it('is cut at one and a half times the peak with noise, where the one without is sharper', () => {
    expect(densityTop(noisy, { x: [0], values: [1000] })).toBe(3);
    expect(densityTop(noisy, null)).toBeCloseTo(2.16, 12);
  });
});

it('merging cells keeps their mass', () => {
  const fine = {
    x: Array.from({ length: 96 }, (_, i) => (i + 0.5) / 96),
    values: Array.from({ length: 96 }, (_, i) => i % 7),
  };
  const { values } = mergedCells(fine, 32);
  expect(values).toHaveLength(32);
  const mean = (list: number[]) => list.reduce((sum, value) => sum + value, 0) / list.length;
  expect(mean(values)).toBeCloseTo(mean(fine.values), 12);
});

it('the readout takes the nearest point, and the cell that holds a place', () => {
  expect(nearestIndex(noisy.x, 0.41)).toBe(2);
  expect(nearestIndex(noisy.x, -5)).toBe(0);
  expect(nearestIndex(noisy.x, 5)).toBe(4);
  expect(cellValue(cells, 0.24)).toBe(4);
  expect(cellValue(cells, 0.26)).toBe(0);
  expect(cellValue(cells, 1.2)).toBeNull();
});

it.each([
  [0, 1, 250],
  [-1e6, 1e6, 250],
  [0.001, 0.0015, 250],
  [0, 6.283185, 700],
])('ticks from %d to %d on %i pixels do not touch', (from, to, pixels) => {
  const scale = scaleLinear([from, to], [0, pixels]);
  const ticks = fittingTicks(scale, 16);
  expect(ticks.length).toBeGreaterThanOrEqual(2);
  for (let i = 1; i < ticks.length; i++) {
    const half = (formatTick(ticks[i]).length + formatTick(ticks[i - 1]).length) * 3.6;
    expect(scale(ticks[i]) - scale(ticks[i - 1])).toBeGreaterThan(half);
  }
});

it('eigenvalues stand where they are: real part right, imaginary part up, unresolved ones faint', () => {
  const one = (re: number, im: number, resolved = true) => ({
    re,
    im,
    modulus: Math.hypot(re, im),
    residual: 0,
    uncertainty: 1e-12,
    multiplicity: 1,
    resolved,
  });
  const svg = renderToStaticMarkup(
    <SpectrumFigure noisy={[one(1, 0), one(0, 0.5)]} without={[one(0, -0.5, false)]} title="Spectrum" size={240} />,
  );
  expect(svg).toContain('<circle cx="220" cy="120" r="5" opacity="1"');
  expect(svg).toContain('<circle cx="120" cy="70" r="5" opacity="1"');
  expect(svg).toMatch(/d="M120 165\.5l4\.5 4\.5[^"]*" opacity="0\.35"/);
});
