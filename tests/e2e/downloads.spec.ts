import { execFileSync } from 'node:child_process';
import { readFile } from 'node:fs/promises';
import type { Page } from '@playwright/test';
import { FIRST_STUDY } from '@/lib/shared/bench-study';
import { studyHash } from '@/lib/shared/study-hash';
import { expect, openBench, test } from './support';

const DENSITY = 'Density in the long run';

async function saved(page: Page, label: string): Promise<Buffer> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: label }).click(),
  ]);
  return readFile(await download.path());
}

/** The same drawing by librsvg, which knows neither the page nor its fonts. */
function byRsvg(svg: string): Buffer {
  return execFileSync('rsvg-convert', ['--zoom', '2'], { input: svg });
}

const asData = (type: string, bytes: Buffer | string) => `data:${type};base64,${Buffer.from(bytes).toString('base64')}`;

/**
 * Mean difference of two pictures (of 255), and the share of pixels that differ by more than a quarter even from the
 * nearest of their neighbours: smoothing of edges differs between programs by less, a missing mark by more.
 */
async function difference(page: Page, first: string, second: string, width: number) {
  return page.evaluate(
    async ([one, two, across]) => {
      const pixels = async (address: string) => {
        const image = new Image();
        image.src = address;
        await image.decode();
        const canvas = document.createElement('canvas');
        canvas.width = across;
        canvas.height = Math.round((across * image.naturalHeight) / image.naturalWidth);
        const context = canvas.getContext('2d');
        if (!context) throw new Error('no canvas');
        context.drawImage(image, 0, 0, canvas.width, canvas.height);
        return context.getImageData(0, 0, canvas.width, canvas.height);
      };
      const [a, b] = [await pixels(one), await pixels(two)];
      if (a.width !== b.width || a.height !== b.height)
        throw new Error(`${a.width}x${a.height}, ${b.width}x${b.height}`);
      const grey = ({ data }: ImageData, at: number) => (data[4 * at] + data[4 * at + 1] + data[4 * at + 2]) / 3;
      const fromNearest = (one: ImageData, two: ImageData, x: number, y: number) => {
        let nearest = 255;
        for (let dy = -1; dy <= 1; dy++)
          for (let dx = -1; dx <= 1; dx++)
            nearest = Math.min(
              nearest,
              Math.abs(grey(one, y * one.width + x) - grey(two, (y + dy) * one.width + x + dx)),
            );
        return nearest;
      };
      let sum = 0;
      let far = 0;
      for (let y = 1; y < a.height - 1; y++) {
        for (let x = 1; x < a.width - 1; x++) {
          sum += Math.abs(grey(a, y * a.width + x) - grey(b, y * a.width + x));
          // Both ways: ink that one lacks is seen from the other alone.
          if (Math.max(fromNearest(a, b, x, y), fromNearest(b, a, x, y)) > 64) far++;
        }
      }
      const count = (a.width - 2) * (a.height - 2);
      return { mean: sum / count, far: far / count };
    },
    [first, second, width] as const,
  );
}

/** Boxes of all drawn elements that no clip holds back, as far as they leave the drawing. */
async function clipped(page: Page, svg: string): Promise<string[]> {
  return page.evaluate((source) => {
    const drawing = document.importNode(new DOMParser().parseFromString(source, 'image/svg+xml').documentElement, true);
    document.body.replaceChildren(drawing);
    const frame = drawing.getBoundingClientRect();
    return [...drawing.querySelectorAll('text, path, line, circle, image')]
      .filter((element) => element.closest('[clip-path], clipPath') === null)
      .flatMap((element) => {
        const { left, right, top, bottom } = element.getBoundingClientRect();
        const out = Math.max(frame.left - left, right - frame.right, frame.top - top, bottom - frame.bottom);
        return out > 0.01 ? [`${element.outerHTML.slice(0, 80)} by ${out.toFixed(2)}`] : [];
      });
  }, svg);
}

for (const figure of [DENSITY, 'Spectrum']) {
  test(`${figure}: an SVG that librsvg and the browser draw alike, nothing clipped`, async ({ page, context }) => {
    await openBench(page);
    const svg = (await saved(page, `Save SVG: ${figure}`)).toString();
    expect(/<text|class=|font-family/.exec(svg)?.[0]).toBeUndefined();
    expect(svg).toContain(`<title>${figure}`);
    expect(svg).toMatch(/<desc>[^<]*with noise[^<]*study sha256: [0-9a-f]{64}<\/desc>/);
    const blank = await context.newPage();
    const width = 2 * Number(/ width="(\d+)"/.exec(svg)?.[1]);
    const other = asData('image/png', byRsvg(svg));
    const alike = await difference(blank, asData('image/svg+xml', svg), other, width);
    expect(alike.mean).toBeLessThan(1);
    expect(alike.far).toBeLessThan(2e-5);
    // The measure sees a single letter that is missing.
    const lacking = svg.replace(/<g stroke="none"><path d="[^"]*"\/>/, '<g stroke="none">');
    expect(lacking.length).toBeLessThan(svg.length);
    const worse = await difference(blank, asData('image/svg+xml', lacking), other, width);
    expect(worse.far).toBeGreaterThan(4e-5);
    expect(await clipped(blank, svg)).toEqual([]);
    // The boxes see a drawing that is cut.
    expect(await clipped(blank, svg.replace(/viewBox="0 0 [\d.]+/, 'viewBox="20 0 100'))).not.toEqual([]);
  });
}

test('outlines stand where the page has its letters; editable text names the real fonts', async ({ page, context }) => {
  await openBench(page);
  const outlined = (await saved(page, `Save SVG: ${DENSITY}`)).toString();
  const shown = await page.getByRole('img', { name: DENSITY }).evaluate((svg) => {
    svg.removeAttribute('class');
    const { left, top } = svg.getBoundingClientRect();
    return [...svg.querySelectorAll('text')].map((text) => {
      const box = text.getBoundingClientRect();
      return { left: box.left - left, right: box.right - left, top: box.top - top, bottom: box.bottom - top };
    });
  });
  const blank = await context.newPage();
  const boxes = await blank.evaluate((source) => {
    const drawing = document.importNode(new DOMParser().parseFromString(source, 'image/svg+xml').documentElement, true);
    document.body.style.margin = '0';
    document.body.replaceChildren(drawing);
    return [...drawing.querySelectorAll('g[stroke="none"]')].map((group) => {
      const { left, right, top, bottom } = group.getBoundingClientRect();
      return { left, right, top, bottom };
    });
  }, outlined);
  expect(boxes.length).toBe(shown.length);
  expect(boxes.length).toBeGreaterThan(8);
  for (const [i, box] of boxes.entries()) {
    // Ink lies inside the advance box, but for a slanted letter's overhang.
    expect(Math.abs(box.left - shown[i].left), `text ${i}`).toBeLessThan(2.5);
    expect(Math.abs(box.right - shown[i].right), `text ${i}`).toBeLessThan(2.5);
    expect(box.top).toBeGreaterThanOrEqual(shown[i].top - 0.5);
    expect(box.bottom).toBeLessThanOrEqual(shown[i].bottom + 0.5);
  }
  await page.getByRole('button', { name: `File options: ${DENSITY}` }).click();
  await page.getByLabel('SVG text').selectOption('editable');
  const editable = (await saved(page, `Save SVG: ${DENSITY}`)).toString();
  expect(editable).toMatch(/<text[^>]*>0\.2<\/text>/);
  expect(editable).toContain('Spline Sans Mono');
});

test('PNG: on screen, twice, and as wide as it is to be printed', async ({ page }) => {
  await openBench(page);
  const size = (png: Buffer) => [png.readUInt32BE(16), png.readUInt32BE(20)];
  const box = await page.getByRole('img', { name: DENSITY }).boundingBox();
  const wide = Math.round(box?.width ?? 0);
  const tall = Math.round(box?.height ?? 0);
  const twice = await saved(page, `Save PNG: ${DENSITY}`);
  expect(size(twice)).toEqual([2 * wide, 2 * tall]);
  await page.getByRole('button', { name: `File options: ${DENSITY}` }).click();
  await page.getByLabel('PNG size').selectOption('1');
  expect(size(await saved(page, `Save PNG: ${DENSITY}`))).toEqual([wide, tall]);
  await page.getByLabel('PNG size').selectOption('print');
  await page.getByLabel('Width, mm').fill('5');
  await expect(page.getByRole('alert').filter({ hasText: '5 mm; allowed: 20 to 600 mm' })).toBeVisible();
  await page.getByLabel('Width, mm').fill('85');
  const print = await saved(page, `Save PNG: ${DENSITY}`);
  // 85 mm at 300 dots per inch of 25.4 mm: 1003.9.
  expect(size(print)[0]).toBe(1004);
  // pHYs (PNG, third edition, 11.3.4.3): 300 dots per inch are 11811 per metre, unit 1.
  const at = print.indexOf('pHYs');
  expect([print.readUInt32BE(at + 4), print.readUInt32BE(at + 8), print[at + 12]]).toEqual([11811, 11811, 1]);
  // A decoder that checks sums takes it.
  const decoded = await page.evaluate(
    async (address) => {
      const image = new Image();
      image.src = address;
      await image.decode();
      return image.naturalWidth;
    },
    asData('image/png', print),
  );
  expect(decoded).toBe(1004);
});

test('CSV: units, uncertainties and the hash of the study', async ({ page }) => {
  await openBench(page);
  const csv = (await saved(page, `Save CSV: ${DENSITY}`)).toString();
  expect(csv).toContain(`# study sha256: ${await studyHash(FIRST_STUDY)}\r\n`);
  const lines = csv.trim().split('\r\n');
  const head = lines.findIndex((line) => !line.startsWith('#'));
  expect(lines[head]).toBe('x,density with noise,"uncertainty with noise, at most",density without noise');
  for (const line of lines.slice(head + 1, head + 20)) expect(Number(line.split(',')[2])).toBeGreaterThan(0);
  const withUnit = '?system=logistic&p.r=3.8&sigma=0.012&on=0,1,absorbing&more={"system":{"units":["V"]}}';
  await openBench(page, withUnit);
  const volts = (await saved(page, `Save CSV: ${DENSITY}`)).toString();
  expect(volts).toContain('x (V),density with noise (per V)');
  expect(volts).not.toContain(await studyHash(FIRST_STUDY));
});

test('the figure of the start page is saved as it is shown, on a phone too', async ({ page }) => {
  await page.setViewportSize({ width: 360, height: 740 });
  await page.goto('/');
  const svg = (await saved(page, 'Save SVG: Logistic map')).toString();
  expect(svg).toMatch(/viewBox="0 0 328 260"/);
  expect(svg).toMatch(/study sha256: [0-9a-f]{64}/);
});
