import AxeBuilder from '@axe-core/playwright';
import { test as base, expect, type Page } from '@playwright/test';

/** Every test fails on an error in the console, an uncaught one, or a violation of the content security policy. */
export const test = base.extend<{ quiet: undefined }>({
  quiet: [
    async ({ page }, use) => {
      const errors: string[] = [];
      page.on('console', (message) => {
        // A page that is asked for in order to be missing is no error.
        const missing = message.location().url.endsWith('/no-such-page');
        if (message.type() === 'error' && !missing) errors.push(message.text());
      });
      page.on('pageerror', (error) => errors.push(String(error)));
      await page.addInitScript(() => {
        document.addEventListener('securitypolicyviolation', (event) => {
          console.error(`policy violated: ${event.violatedDirective} ${event.blockedURI}`);
        });
      });
      await use(undefined);
      expect(errors).toEqual([]);
    },
    { auto: true },
  ],
});

export { expect };

/** Opens the bench and waits for the full pass: numbers with their uncertainties. */
export async function openBench(page: Page, query = ''): Promise<void> {
  await page.goto(`/explore${query}`);
  await settled(page);
}

export async function settled(page: Page): Promise<void> {
  await expect(page.locator('[data-bench]')).toHaveAttribute('data-bench', 'settled', { timeout: 40_000 });
}

/** What the bench shows: the density's path, the dots of the spectrum, the table's moduli, the mean exit time. */
export async function shown(page: Page) {
  const path = await page.locator('[data-series="density-with"]').getAttribute('d');
  const dots = await page
    .locator('[data-series="spectrum-with"] circle')
    .evaluateAll((marks) => marks.map((mark) => `${mark.getAttribute('cx')} ${mark.getAttribute('cy')}`).join());
  const moduli = await page.locator('[data-table="spectrum"] [data-cell="modulus"]').allTextContents();
  const exit = await page.locator('[data-number="mean-exit-time"]').textContent();
  return { path, dots, moduli: moduli.join(), exit };
}

export async function expectNoAxeFindings(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(
    violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 120)).join(' | ')}`),
  ).toEqual([]);
}
