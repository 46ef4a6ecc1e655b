import { readFile } from 'node:fs/promises';
import type { Page } from '@playwright/test';
import { expect, openBench, settled, test } from './support';

const rail = (page: Page) => page.locator('[data-rail]');
const curve = (page: Page, lane: string) => page.locator(`[data-series="rail-${lane}"]`);
const complete = (page: Page) => expect(rail(page)).toHaveAttribute('data-rail', 'complete', { timeout: 20_000 });

test('the rail draws its lanes, with the numbers of the picture at the handle', async ({ page }) => {
  await openBench(page);
  await complete(page);
  for (const lane of ['meanTime', 'relaxationTime', 'lyapunov'])
    expect(await curve(page, lane).getAttribute('d')).toMatch(/^M[\d.,L]+/);
  // 689073.2998 steps and 1.74578 steps: dense Gauss-Legendre Nyström computation at r = 3.8, sigma = 0.012.
  await expect(page.locator('[data-lane-value="meanTime"]')).toContainText(/689\s073/);
  await expect(page.locator('[data-lane-value="relaxationTime"]')).toContainText('1.7457');
  const before = await curve(page, 'meanTime').getAttribute('d');
  await page.getByRole('slider', { name: 'Noise level sigma' }).focus();
  await page.keyboard.press('Shift+ArrowRight');
  await settled(page);
  expect(await curve(page, 'meanTime').getAttribute('d')).toBe(before);
});

test('a parameter marks the rail stale until it is computed again', async ({ page }) => {
  await openBench(page);
  await complete(page);
  const before = await curve(page, 'meanTime').getAttribute('d');
  const r = page.getByRole('spinbutton', { name: 'r', exact: true });
  await r.fill('3.6');
  await page.keyboard.press('Enter');
  await expect(rail(page)).toHaveAttribute('data-rail', 'stale');
  await expect(rail(page)).toContainText('out of date');
  const began = Date.now();
  await complete(page);
  test.info().annotations.push({ type: 'rail', description: `${Date.now() - began} ms` });
  expect(await curve(page, 'meanTime').getAttribute('d')).not.toBe(before);
  await page.getByRole('button', { name: 'Undo' }).click();
  // What was computed once is at hand.
  await complete(page);
  expect(await curve(page, 'meanTime').getAttribute('d')).toBe(before);
});

test('lanes, zoom and a limit, by keyboard', async ({ page }) => {
  await openBench(page);
  await complete(page);
  await page.getByRole('checkbox', { name: 'entropy' }).press('Space');
  await page.getByRole('checkbox', { name: 'relaxation time' }).press('Space');
  await expect(curve(page, 'entropy')).toHaveCount(1);
  await expect(curve(page, 'relaxationTime')).toHaveCount(0);
  const slider = page.getByRole('slider', { name: 'Noise level sigma' });
  await slider.press('+');
  await expect(slider).not.toHaveAttribute('aria-valuemax', '0.5');
  await complete(page);
  await slider.press('0');
  await expect(slider).toHaveAttribute('aria-valuemax', '0.5');
  const limit = page.getByRole('textbox', { name: /stays at least/ });
  await limit.fill('1000');
  await expect(page.locator('[data-series="limit"]')).toContainText(/stays 1\s000 steps on average/);
  // Mean exit time 1000 at sigma near 0.0213, read off the picture of the design: between 0.02 and 0.025.
  await expect(rail(page)).toContainText(/up to σ of about 0\.02[0-4]/);
  await limit.fill('many');
  await expect(rail(page).getByRole('alert')).toBeVisible();
});

test('pins become a sweep of the study file', async ({ page }) => {
  await openBench(page);
  await complete(page);
  const pin = page.getByRole('button', { name: /Pin this/ });
  await pin.click();
  await expect(pin).toBeDisabled();
  await page.getByRole('slider', { name: 'Noise level sigma' }).press('Shift+ArrowRight');
  await pin.click();
  await page.getByRole('button', { name: 'Sweep the pins' }).click();
  await expect(page).toHaveURL(/sweep/);
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save the study file with its sweep' }).click(),
  ]);
  const study = JSON.parse(await readFile(await download.path(), 'utf8'));
  expect(study.sweep).toEqual([{ over: 'noise.sigma', values: [0.012, 0.013] }]);
  await page.reload();
  await settled(page);
  await expect(page.getByRole('list', { name: 'Pinned noise levels' }).getByRole('listitem')).toHaveCount(2);
});

test('a finger on a phone drags the handle', async ({ browser }) => {
  const context = await browser.newContext({ viewport: { width: 360, height: 740 }, hasTouch: true });
  const page = await context.newPage();
  await openBench(page);
  const slider = page.getByRole('slider', { name: 'Noise level sigma' });
  const box = await slider.boundingBox();
  if (!box) throw new Error('the rail has no place');
  expect(box.y + box.height).toBeLessThanOrEqual(740);
  await page.touchscreen.tap(box.x + box.width * 0.8, box.y + 30);
  expect(Number(await slider.getAttribute('aria-valuenow'))).toBeGreaterThan(0.05);
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(360);
  await context.close();
});
