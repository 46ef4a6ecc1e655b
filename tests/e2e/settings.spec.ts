import type { Page } from '@playwright/test';
import { expect, expectNoAxeFindings, openBench, settled, test } from './support';

async function openSettings(page: Page, query = '') {
  await openBench(page, query);
  await page.getByRole('button', { name: 'Formula, ends, grid' }).click();
  return page.getByRole('combobox', { name: 'Start density' });
}

/** The start as the address holds it. */
async function start(page: Page): Promise<unknown> {
  const more = new URL(page.url()).searchParams.get('more');
  return more === null ? null : (JSON.parse(more).ask?.density?.start ?? null);
}

test('the start density: uniform, Gaussian, a point; wrong numbers are refused at the field', async ({ page }) => {
  const kind = await openSettings(page);
  await kind.selectOption('uniform');
  await expect.poll(() => start(page)).toEqual({ kind: 'uniform' });
  await kind.selectOption('gaussian');
  await page.getByLabel('Mean', { exact: true }).fill('0,4');
  await page.getByLabel('Standard deviation').fill('0.05');
  await expect.poll(() => start(page)).toEqual({ kind: 'gaussian', mean: [0.4], sd: [0.05] });
  await page.getByLabel('Mean', { exact: true }).fill('1.5');
  await expect(
    page.getByRole('alert').filter({ hasText: '1.5 lies outside the domain; allowed: 0 to 1' }),
  ).toBeVisible();
  await page.getByLabel('Standard deviation').fill('-1');
  await expect(page.getByRole('alert').filter({ hasText: '-1 on a domain of length 1' })).toBeVisible();
  await page.waitForTimeout(400);
  expect(await start(page)).toEqual({ kind: 'gaussian', mean: [0.4], sd: [0.05] });
  await kind.selectOption('point');
  await page.getByLabel('At', { exact: true }).fill('0.25');
  await expect.poll(() => start(page)).toEqual({ kind: 'point', at: [0.25] });
  await kind.selectOption('usual');
  await expect.poll(() => start(page)).toBeNull();
  await settled(page);
});

test('the start density as a formula: a fault is said, what was good stays', async ({ page }) => {
  const kind = await openSettings(page);
  await kind.selectOption('formula');
  const field = page.getByLabel('proportional to');
  await field.fill('x*(1-x)');
  await expect.poll(() => start(page)).toEqual({ kind: 'formula', formula: 'x*(1-x)' });
  await field.fill('x*(1-');
  await expect(field).toHaveAttribute('aria-invalid', 'true');
  await expect(page.getByRole('alert').filter({ hasText: 'character' })).toBeVisible();
  expect(await start(page)).toEqual({ kind: 'formula', formula: 'x*(1-x)' });
  await settled(page);
});

test('the start density drawn by hand, with the pointer and by keyboard', async ({ page }) => {
  const kind = await openSettings(page);
  await kind.selectOption('drawn');
  const handle = (place: string) => page.getByRole('slider', { name: `Height at x = ${place}`, exact: true });
  await expect(handle('0.25')).toHaveAttribute('aria-valuenow', '80');
  await handle('0').focus();
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('Shift+ArrowUp');
  await page.keyboard.press('ArrowDown');
  await expect(handle('0.05')).toHaveAttribute('aria-valuenow', '9');
  await expect(handle('0.05')).toBeFocused();
  const box = await page.getByRole('group', { name: 'drawn by hand' }).locator('svg').boundingBox();
  if (!box) throw new Error('the drawing has no place');
  await page.mouse.move(box.x + box.width * 0.6, box.y + box.height * 0.5);
  await page.mouse.down();
  await page.mouse.move(box.x + box.width * 0.9, box.y + box.height * 0.2, { steps: 4 });
  await page.mouse.up();
  const raised = Number(await handle('0.9').getAttribute('aria-valuenow'));
  expect(raised).toBeGreaterThan(60);
  await settled(page);
  await expect.poll(async () => JSON.stringify(await start(page))).toContain('x<0.05?');
  // The drawing is restored from the address; one stroke is one step of undo.
  await page.reload();
  await settled(page);
  await page.getByRole('button', { name: 'Formula, ends, grid' }).click();
  await expect(handle('0.9')).toHaveAttribute('aria-valuenow', String(raised));
  await expectNoAxeFindings(page);
});

test('the start density from a file of samples; faults with their line', async ({ page }) => {
  const kind = await openSettings(page);
  await kind.selectOption('samples');
  const give = (name: string, text: string) =>
    page.getByLabel('File of samples').setInputFiles({ name, mimeType: 'text/csv', buffer: Buffer.from(text) });
  await give('bad.csv', '0.1\n0.2\nabc\n');
  await expect(page.getByRole('alert').filter({ hasText: 'bad.csv, line 3: abc is not a number' })).toBeVisible();
  expect(await start(page)).toBeNull();
  await give('table.csv', 't,V\n5,0.1\n6,0.2\n7,0.3\n');
  await expect(page.getByRole('alert').filter({ hasText: '5 lies outside the domain' })).toBeVisible();
  await page.getByLabel('Column').selectOption({ label: 'V' });
  await expect.poll(() => start(page)).toEqual({ kind: 'samples', samples: [0.1, 0.2, 0.3] });
  await expect(page.getByText('3 samples').first()).toBeVisible();
  await settled(page);
});

test('ends that are not computed yet are not offered; another title computes nothing', async ({ page }) => {
  await openSettings(page);
  expect(await page.getByLabel('At the low end').or(page.getByLabel('Ends')).first().textContent()).not.toContain(
    'holding',
  );
  const moved = page.evaluate(
    () =>
      new Promise<boolean>((done) => {
        const bench = document.querySelector('[data-bench]');
        if (!bench) throw new Error('no bench');
        new MutationObserver(() => done(true)).observe(bench, { attributes: true });
        setTimeout(() => done(false), 1500);
      }),
  );
  await page.getByRole('textbox', { name: 'Title of the study' }).fill('Another title');
  expect(await moved).toBe(false);
  await expect(page).toHaveURL(/title=Another%20title/);
});

test('the list of systems is walked by keyboard and read aloud', async ({ page }) => {
  await openBench(page);
  const field = page.getByRole('combobox', { name: 'System' });
  await field.focus();
  await page.keyboard.press('ArrowDown');
  await expect(field).toHaveAttribute('aria-expanded', 'true');
  const active = async () => {
    const id = await field.getAttribute('aria-activedescendant');
    return page.locator(`[id="${id}"]`).textContent();
  };
  expect(await active()).toContain('Logistic map');
  await page.keyboard.press('ArrowDown');
  expect(await active()).not.toContain('Logistic map');
  await expectNoAxeFindings(page);
  await page.keyboard.press('Escape');
  await expect(field).toHaveAttribute('aria-expanded', 'false');
  await page.keyboard.type('no such thing');
  await expect(page.getByRole('option')).toHaveCount(1);
  await page.keyboard.press('Enter');
  await expect(field).toHaveValue('A formula of your own');
  await expect(page.getByRole('textbox', { name: /Next state/ })).toHaveValue('r*x*(1 - x)');
  await settled(page);
});
