import { readFile } from 'node:fs/promises';
import { expect, openBench, settled, test } from './support';

test('steps are scrubbed by keyboard and played, with their numbers', async ({ page }) => {
  await openBench(page);
  const slider = page.getByRole('slider', { name: 'Step', exact: true });
  await expect(slider).toHaveAttribute('aria-valuetext', /mass 1/);
  await slider.press('ArrowDown');
  await expect(slider).toHaveAttribute('aria-valuenow', '1');
  // One step of a narrow Gaussian about 0.22: r (m - m² - s²) = 3.8 (0.22 - 0.0484 - 0.0004) = 0.65056, the noise adds nothing.
  await expect(slider).toHaveAttribute('aria-valuetext', /mean 0\.6506,/);
  await slider.press('End');
  await expect(slider).toHaveAttribute('aria-valuenow', '16');
  await page.getByRole('button', { name: 'Play', exact: true }).click();
  await expect(slider).toHaveAttribute('aria-valuenow', '2', { timeout: 10_000 });
  await page.getByRole('button', { name: 'Pause' }).click();
  const row = page.locator('[data-series="step-chosen"]');
  const y = await row.getAttribute('y');
  await page.getByRole('button', { name: 'Back to the start' }).click();
  await expect(row).not.toHaveAttribute('y', y ?? '');
  await expect(slider).toHaveAttribute('aria-valuenow', '0');
});

test('the strip goes to a file as one image between its axes', async ({ page }) => {
  await openBench(page);
  await expect(page.getByRole('slider', { name: 'Step', exact: true })).toHaveAttribute('aria-valuetext', /mass 1/);
  const [file] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save SVG: From the start, step by step' }).click(),
  ]);
  const svg = await readFile(await file.path(), 'utf8');
  expect(svg.match(/<image/g)).toHaveLength(1);
  expect(svg).toContain('data:image/png;base64,');
});

test('an eigenvalue is chosen by keyboard: its eigenfunctions, and trails of all', async ({ page }) => {
  await openBench(page);
  await expect(page.locator('[data-series="spectrum-trails"] path').first()).toHaveAttribute('d', /^M.*L/, {
    timeout: 20_000,
  });
  const second = page.getByRole('button', { name: 'Eigenfunctions of eigenvalue 2, 3' });
  await second.press('Enter');
  await expect(second).toHaveAttribute('aria-pressed', 'true');
  await expect(page.locator('[data-mode="1"]')).toBeVisible({ timeout: 15_000 });
  const curve = page.locator('[data-series="mode-density"]');
  await expect(curve).toHaveAttribute('d', /^M/);
  await expect(page.locator('[data-series="mode-density-envelope"]')).toHaveCount(2);
  const before = await curve.getAttribute('d');
  await page.getByRole('slider', { name: 'Noise level sigma' }).press('Shift+ArrowRight');
  await settled(page);
  await expect(curve).not.toHaveAttribute('d', before ?? '');
  // The first eigenfunction is the long-run density: real, without an envelope.
  await page.getByRole('button', { name: 'Eigenfunctions of eigenvalue 1', exact: true }).press('Enter');
  await expect(page.locator('[data-mode="0"]')).toBeVisible({ timeout: 15_000 });
  await expect(page.locator('[data-series="mode-density-envelope"]')).toHaveCount(0);
});
