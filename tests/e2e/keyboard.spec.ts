import { readFile } from 'node:fs/promises';
import type { Page } from '@playwright/test';
import { expect, openBench, settled, test } from './support';

/** Presses Tab until an element of this role and name has the focus; fails where a whole round does not reach it. */
async function tabTo(page: Page, role: Parameters<Page['getByRole']>[0], name: string | RegExp) {
  const wanted = page.getByRole(role, { name }).first();
  for (let i = 0; i < 80; i++) {
    await page.keyboard.press('Tab');
    if (await wanted.evaluate((element) => element === document.activeElement)) return wanted;
  }
  throw new Error(`Tab does not reach ${role} ${name}`);
}

test('by keyboard alone: choose a system, change sigma, read the second eigenvalue, save an SVG', async ({ page }) => {
  await openBench(page);
  const field = await tabTo(page, 'combobox', 'System');
  await page.keyboard.type('ricker');
  await page.keyboard.press('Enter');
  await expect(field).toHaveValue(/^Ricker/);
  await settled(page);
  const second = page.locator('[data-table="spectrum"] tbody tr').nth(1);
  const before = await second.textContent();
  const sigma = await tabTo(page, 'slider', 'Noise level sigma');
  const level = Number(await sigma.getAttribute('aria-valuenow'));
  await page.keyboard.press('Shift+ArrowRight');
  await expect.poll(async () => Number(await sigma.getAttribute('aria-valuenow'))).toBeGreaterThan(level);
  await settled(page);
  await expect(second).toContainText(/^2.*0\.\d+.*\de-\d+$/s);
  expect(await second.textContent()).not.toBe(before);
  const download = page.waitForEvent('download');
  await tabTo(page, 'button', 'Save SVG: Density in the long run');
  await page.keyboard.press('Enter');
  expect(await readFile(await (await download).path(), 'utf8')).toContain('data-series="density-with"');
});

test('with reduced motion nothing is animated', async ({ page }) => {
  await page.emulateMedia({ reducedMotion: 'reduce' });
  await openBench(page);
  const running = await page.evaluate(() =>
    document.getAnimations().filter(({ effect }) => Number(effect?.getComputedTiming().duration) > 1),
  );
  expect(running).toEqual([]);
});

test('with forced colours curves and words stand out from the ground', async ({ page }) => {
  await page.emulateMedia({ forcedColors: 'active' });
  await openBench(page);
  const colours = await page.evaluate(() => {
    const ground = getComputedStyle(document.body.parentElement as Element).backgroundColor;
    const curve = document.querySelector('[data-series="density-with"]') as Element;
    const quiet = document.querySelector('[data-series="density-without"]') as Element;
    const words = [...document.querySelectorAll('button')].map((button) => {
      const { color, backgroundColor } = getComputedStyle(button);
      return [color, backgroundColor === 'rgba(0, 0, 0, 0)' ? ground : backgroundColor];
    });
    return { ground, curves: [curve, quiet].map((path) => getComputedStyle(path).stroke), words };
  });
  for (const curve of colours.curves) expect(curve).not.toBe(colours.ground);
  for (const [ink, ground] of colours.words) expect(ink).not.toBe(ground);
});

// 200 % zoom of a window of 1280 by 800 leaves 640 by 400 pixels of the page's own (WCAG 2.2, 1.4.4 and 1.4.10).
for (const [name, viewport] of [
  ['at 200 % zoom', { width: 640, height: 400 }],
  ['on a phone of 360 by 740', { width: 360, height: 740 }],
] as const) {
  test(`${name} the list of systems, file options and the start's editor fit without sideways scroll`, async ({
    page,
  }) => {
    await page.setViewportSize(viewport);
    await openBench(page);
    await page.getByRole('button', { name: 'Formula, ends, grid' }).click();
    await page.getByRole('combobox', { name: 'Start density' }).selectOption('drawn');
    await page.getByRole('button', { name: 'What is known' }).click();
    await page.getByRole('button', { name: 'File options: Density in the long run' }).click();
    await page.getByRole('combobox', { name: 'System' }).click();
    await expect(page.getByRole('option').first()).toBeVisible();
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(viewport.width);
  });
}

test('without noise the bench shows what the map does by itself', async ({ page }) => {
  // The logistic map at r = 4: density 1/(pi sqrt(x (1 - x))), Lyapunov exponent ln 2 (S. Ulam and J. von Neumann, 1947).
  const url = '?system=logistic&p.r=4&noise=none&on=0,1,reflecting';
  await openBench(page, url);
  const text = (await page.locator('[data-number="lyapunov-exponent"]').textContent()) ?? '';
  const [, value, uncertainty] = /(\d\.\d+)\D*±\s*([\d.e-]+)/.exec(text)?.map(Number) ?? [];
  expect(uncertainty).toBeLessThan(0.05);
  expect(Math.abs(value - Math.LN2)).toBeLessThanOrEqual(uncertainty);
  await expect(page.locator('[data-series="density-without"]')).toHaveAttribute('d', /^M/);
  await expect(page.locator('[data-series="density-with"]')).toHaveCount(0);
});
