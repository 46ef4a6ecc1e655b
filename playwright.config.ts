import { defineConfig } from '@playwright/test';

// The server is started by `npm test` (or by hand: `npm start`, then `npx playwright test`).
export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: process.env.SMIRR_E2E_OUTPUT ?? 'test-results',
  // Two cores are shared by the server, the browser and its workers.
  workers: 1,
  timeout: 60_000,
  retries: 0,
  forbidOnly: process.env.CI !== undefined,
  reporter: process.env.SMIRR_E2E_REPORT
    ? [['list'], ['json', { outputFile: process.env.SMIRR_E2E_REPORT }]]
    : [['list']],
  use: {
    baseURL: process.env.SMIRR_URL ?? 'http://127.0.0.1:3000',
    browserName: 'chromium',
    locale: 'en-GB',
    timezoneId: 'UTC',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
      args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking'],
    },
  },
});
