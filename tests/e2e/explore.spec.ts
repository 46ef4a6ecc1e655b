import { readFile } from 'node:fs/promises';
import { expect, openBench, settled, shown, test } from './support';

test('sigma by keyboard: density, spectrum, table and exit time follow', async ({ page }) => {
  await openBench(page);
  const before = await shown(page);
  expect(before.path).toMatch(/^M[\d.]/);
  const slider = page.getByRole('slider', { name: 'Noise level sigma' });
  await slider.focus();
  for (let i = 0; i < 3; i++) await page.keyboard.press('Shift+ArrowRight');
  await expect(slider).toHaveAttribute('aria-valuenow', '0.015');
  await expect(page.getByRole('spinbutton', { name: 'sigma' })).toHaveValue('0.0150');
  await settled(page);
  const after = await shown(page);
  for (const part of ['path', 'dots', 'moduli', 'exit'] as const) expect(after[part], part).not.toBe(before[part]);
});

test('the numbers are those of the headless command', async ({ page }) => {
  await openBench(page);
  // 689073.2998 steps and 0.563938: what the headless command prints for the first study; no value from outside.
  await expect(page.locator('[data-number="mean-exit-time"]')).toContainText(/689\s073/);
  await expect(page.locator('[data-table="spectrum"] tbody tr').nth(1)).toContainText('0.56393');
});

test('mean exit times are those of an independent computation', async ({ page }) => {
  // The logistic map at r = 3.8 on [0, 1] with absorbing ends: a dense Gauss-Legendre Nyström discretisation, solved
  // once in 80-bit arithmetic for these two noise levels alone. Double precision: tests/published/logistic.ts.
  for (const [sigma, steps] of [
    ['0.02', 1615.5841434994911],
    ['0.05', 36.017821366791033],
  ] as const) {
    await openBench(page, `?system=logistic&p.r=3.8&sigma=${sigma}&on=0,1,absorbing`);
    const shownText = (await page.locator('[data-number="mean-exit-time"]').textContent()) ?? '';
    const number = Number(/[\d\s]+\.\d+/.exec(shownText)?.[0].replace(/\s/g, ''));
    // The compact form has six significant digits.
    expect(Math.abs(number / steps - 1)).toBeLessThan(1e-5);
  }
});

test('sigma by drag: the figures follow while it moves, uncertainties at rest', async ({ page }) => {
  await openBench(page);
  const before = await shown(page);
  const slider = page.getByRole('slider', { name: 'Noise level sigma' });
  await slider.scrollIntoViewIfNeeded();
  const box = await slider.boundingBox();
  if (!box) throw new Error('the slider has no place');
  const sigma = () => slider.getAttribute('aria-valuenow').then(Number);
  await page.mouse.move(box.x + box.width * 0.45, box.y + 15);
  await page.mouse.down();
  for (let i = 1; i <= 20; i++) await page.mouse.move(box.x + box.width * (0.45 + i * 0.01), box.y + 15);
  expect(await sigma()).toBeGreaterThan(0.03);
  await expect.poll(() => shown(page).then(({ path }) => path), { timeout: 20_000 }).not.toBe(before.path);
  await page.mouse.up();
  await settled(page);
  const after = await shown(page);
  for (const part of ['path', 'dots', 'moduli', 'exit'] as const) expect(after[part], part).not.toBe(before[part]);
  // One gesture is one step of undo.
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(slider).toHaveAttribute('aria-valuenow', '0.012');
});

test('a number inside the equation is dragged, stepped and typed', async ({ page }) => {
  await openBench(page);
  const r = page.getByRole('spinbutton', { name: 'r', exact: true });
  const box = await r.boundingBox();
  if (!box) throw new Error('r has no place');
  await page.mouse.move(box.x + 10, box.y + 10);
  await page.mouse.down();
  await page.mouse.move(box.x - 20, box.y + 10, { steps: 5 });
  await page.mouse.up();
  await expect(r).toHaveValue('3.79');
  await r.click();
  await page.keyboard.press('ArrowUp');
  await expect(r).toHaveValue('3.791');
  await page.keyboard.press('Shift+ArrowDown');
  await expect(r).toHaveValue('3.781');
  // A comma is read as a point.
  await r.fill('3,7');
  await page.keyboard.press('Enter');
  await expect(r).toHaveValue('3.70');
  await expect(r).toHaveAttribute('aria-valuenow', '3.7');
});

test('bad input is refused at the field in words and loses nothing', async ({ page }) => {
  await openBench(page);
  const before = await shown(page);
  const r = page.getByRole('spinbutton', { name: 'r', exact: true });
  await r.fill('1e9');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('alert').filter({ hasText: 'allowed: 0 to 5' })).toBeVisible();
  await expect(r).toHaveAttribute('aria-invalid', 'true');
  await page.keyboard.press('Escape');
  await expect(r).toHaveValue('3.80');

  const sigma = page.getByRole('spinbutton', { name: 'sigma' });
  await sigma.fill('-1');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('alert').filter({ hasText: 'sigma = -1' })).toBeVisible();
  await page.keyboard.press('Escape');

  const from = page.getByRole('spinbutton', { name: 'from' });
  await from.fill('2');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('alert').filter({ hasText: 'must be below' }).first()).toBeVisible();
  expect(await shown(page)).toEqual(before);
  await from.fill('0');
  await page.keyboard.press('Enter');
  await settled(page);
  expect(await shown(page)).toEqual(before);
});

test('a formula is set as it is typed, and its fault pointed out at the character', async ({ page }) => {
  await openBench(page);
  await page.getByRole('button', { name: 'Formula, ends, grid' }).click();
  const field = page.getByRole('textbox', { name: /Next state/ });
  await field.fill('a*sin(pi*x)^2');
  const a = page.getByRole('spinbutton', { name: 'a', exact: true });
  await expect(a).toHaveValue('1');
  await expect(page.locator('[data-equation]')).toContainText('sin');
  await settled(page);
  const before = await shown(page);
  await field.fill('a*sin(pi*x');
  await expect(page.locator('mark')).toBeVisible();
  await expect(field).toHaveAttribute('aria-invalid', 'true');
  expect(await shown(page)).toEqual(before);
  await field.fill('a*sin(pi*y)');
  await expect(field).toHaveAttribute('aria-invalid', 'false');
});

test('a system is chosen from the catalogue', async ({ page }) => {
  await openBench(page);
  const before = await shown(page);
  const field = page.getByRole('combobox', { name: 'System' });
  await field.click();
  await field.fill('stretch folds');
  const options = page.getByRole('option');
  await expect(options).toHaveCount(2);
  await expect(options.first()).toContainText('Tent map');
  // What is known of it stands beside, before it is chosen.
  await expect(page.getByText('Lyapunov exponent (s = 2)')).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(field).toHaveValue('Logistic map');
  await field.fill('stretch folds');
  await options.first().click();
  await expect(field).toHaveValue('Tent map');
  await settled(page);
  expect((await shown(page)).path).not.toBe(before.path);
  await expect(page).toHaveURL(/system=tent/);
});

test('the address restores the study in a new page', async ({ page, context }) => {
  await openBench(page);
  const slider = page.getByRole('slider', { name: 'Noise level sigma' });
  await slider.focus();
  await page.keyboard.press('Shift+ArrowRight');
  await page.getByRole('textbox', { name: 'Title of the study' }).fill('Gate amplifier (invented)');
  await settled(page);
  await expect(page).toHaveURL(/sigma=0\.013.*title=Gate%20amplifier/);
  const here = await shown(page);
  const other = await context.newPage();
  await other.goto(page.url());
  await settled(other);
  expect(await shown(other)).toEqual(here);
  await expect(other.getByRole('textbox', { name: 'Title of the study' })).toHaveValue('Gate amplifier (invented)');
});

test('junk in the address gives a message and the first study', async ({ page }) => {
  await openBench(page, '?system=logistic&sigma=banana&on=1,0');
  await expect(page.getByRole('alert').filter({ hasText: 'banana is not a number' })).toBeVisible();
  await expect(page.getByRole('spinbutton', { name: 'sigma' })).toHaveValue('0.0120');
});

test('a study goes to a file and comes back; a wrong file is refused in words', async ({ page }) => {
  await openBench(page, '?system=tent&sigma=0.05&on=0,1,reflecting&title=Tent');
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save file' }).click(),
  ]);
  expect(download.suggestedFilename()).toBe('tent.json');
  const text = await readFile(await download.path(), 'utf8');
  expect(JSON.parse(text)).toMatchObject({
    format: 'smirr-study',
    version: 1,
    system: { id: 'tent' },
    noise: { sigma: 0.05 },
  });
  await page.goto('/explore');
  await settled(page);
  const open = (name: string, content: string) =>
    page
      .getByLabel('Study file to open')
      .setInputFiles({ name, mimeType: 'application/json', buffer: Buffer.from(content) });
  await open('bad.json', '{"format":"smirr-study","version":1,"colour":"red"}');
  await expect(page.getByRole('alert').filter({ hasText: 'bad.json' })).toContainText('colour');
  await open('worse.json', '{');
  await expect(page.getByRole('alert').filter({ hasText: 'worse.json' })).toContainText('JSON');
  await open('tent.json', text);
  await expect(page.getByRole('spinbutton', { name: 'sigma' })).toHaveValue('0.0500');
  await settled(page);
  await expect(page).toHaveURL(/system=tent/);
});

test('long work shows that it runs, and Stop stops it', async ({ page }) => {
  await openBench(page);
  const before = await shown(page);
  // Small noise on a fine grid: far more than half a second.
  await page.getByRole('button', { name: 'Formula, ends, grid' }).click();
  await page.getByLabel('Grid').selectOption({ label: '16 384 points' });
  const stop = page.getByRole('button', { name: 'Stop' });
  await expect(stop).toBeVisible({ timeout: 10_000 });
  const began = Date.now();
  await stop.click();
  await expect(stop).toBeHidden({ timeout: 5_000 });
  expect(Date.now() - began).toBeLessThan(3_000);
  expect((await shown(page)).moduli).toBe(before.moduli);
});

test('figures go to files: an SVG that stands alone, a CSV with units and source', async ({ page }) => {
  await openBench(page);
  const [svgFile] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save SVG: Density in the long run' }).click(),
  ]);
  const svg = await readFile(await svgFile.path(), 'utf8');
  expect(svg).toContain('<title>Density in the long run</title>');
  expect(svg).toMatch(/data-series="density-with"[^>]*stroke="rgb\(37, 106, 140\)"/);
  expect(svg).not.toContain('class=');
  const [csvFile] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Save CSV: Density in the long run' }).click(),
  ]);
  const csv = await readFile(await csvFile.path(), 'utf8');
  expect(csv).toMatch(/^# study sha256: [0-9a-f]{64}\r?\n# Smirr, study: \{/);
  expect(csv).toContain('x,density with noise,"uncertainty with noise, at most",density without noise');
  expect(csv.trim().split('\r\n').length).toBeGreaterThan(200);
});
