import { expect, expectNoAxeFindings, openBench, settled, test } from './support';

for (const colorScheme of ['light', 'dark'] as const) {
  test.describe(`in the ${colorScheme} theme`, () => {
    test.use({ colorScheme });

    test('axe finds nothing on the pages', async ({ page }) => {
      for (const path of ['/', '/licences', '/no-such-page']) {
        const response = await page.goto(path);
        expect(response?.status()).toBe(path === '/no-such-page' ? 404 : 200);
        await expectNoAxeFindings(page);
      }
    });

    test('axe finds nothing on the bench, settings and numbers open', async ({ page }) => {
      await openBench(page);
      await page.getByRole('button', { name: 'Formula, ends, grid' }).click();
      for (const button of await page.getByRole('button', { name: 'Numbers' }).all()) await button.click();
      await expectNoAxeFindings(page);
    });
  });
}

test('the theme that was chosen is there before the first paint of the next page', async ({ page }) => {
  await page.goto('/');
  await page.getByRole('button', { name: 'Light or dark' }).click();
  await expect(page.locator('html')).toHaveAttribute('data-theme', 'dark');
  const paper = await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);
  expect(paper).toBe('rgb(18, 24, 30)');
  await page.reload({ waitUntil: 'commit' });
  await expect(page.locator('html')).toHaveAttribute('data-theme', 'dark');
  expect(await page.context().cookies()).toEqual([]);
});

test('the start page draws its figure on the server', async ({ request }) => {
  const html = await (await request.get('/')).text();
  expect(html).toMatch(/data-series="density-with" d="M/);
  expect(html).toMatch(/689\s073/);
});

test('the fonts’ licences are shown in full', async ({ page }) => {
  await page.goto('/licences');
  for (const name of ['STIX Two Text', 'Hanken Grotesk', 'Spline Sans Mono']) {
    const section = page.locator('section', { has: page.getByRole('heading', { name }) });
    await section.getByText('The licence in full').click();
    await expect(section.getByText(/SIL OPEN FONT LICENSE Version 1\.1/i)).toBeVisible();
  }
});

test.describe('on a phone of 360 by 740', () => {
  test.use({ viewport: { width: 360, height: 740 }, hasTouch: true });

  test('no page scrolls sideways', async ({ page }) => {
    for (const path of ['/', '/explore', '/licences']) {
      await page.goto(path);
      if (path === '/explore') {
        await settled(page);
        await page.getByRole('button', { name: 'Formula, ends, grid' }).click();
      }
      expect(await page.evaluate(() => document.documentElement.scrollWidth), path).toBe(360);
    }
  });

  test('the noise slider stays in reach of the thumb', async ({ page }) => {
    await openBench(page);
    const slider = page.getByRole('slider', { name: 'Noise level sigma' });
    await expect(slider).toBeInViewport();
    await page.locator('[data-table="spectrum"]').scrollIntoViewIfNeeded();
    await expect(slider).toBeInViewport();
  });
});

test('layout shifts stay below 0.02', async ({ page }) => {
  await page.addInitScript(() => {
    const total = { shift: 0 };
    Object.assign(window, { total });
    new PerformanceObserver((list) => {
      for (const entry of list.getEntries()) total.shift += (entry as unknown as { value: number }).value;
    }).observe({ type: 'layout-shift', buffered: true });
  });
  for (const path of ['/', '/explore']) {
    await page.goto(path);
    if (path === '/explore') await settled(page);
    await page.evaluate(() => document.fonts.ready.then(() => new Promise((done) => setTimeout(done, 500))));
    const { shift } = await page.evaluate(() => (window as unknown as { total: { shift: number } }).total);
    expect(shift, path).toBeLessThan(0.02);
  }
});
