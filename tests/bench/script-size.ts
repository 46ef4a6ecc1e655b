import { chromium } from '@playwright/test';

/**
 * Compressed script that a page asks for before anybody touches it, workers apart, in kB of 1000 bytes:
 * `SMIRR_URL=http://127.0.0.1:3000 npx tsx tests/bench/script-size.ts`. The bench's limits: `/` 200, `/explore` 300.
 */
const limits = { '/': 200, '/explore': 300 };
const address = process.env.SMIRR_URL ?? 'http://127.0.0.1:3000';

const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking'],
});
let over = 0;
for (const [path, limit] of Object.entries(limits)) {
  const page = await browser.newPage();
  const session = await page.context().newCDPSession(page);
  await session.send('Network.enable');
  await session.send('Network.setCacheDisabled', { cacheDisabled: true });
  // The session is that of the page: what a worker asks for by itself is not among these.
  const scripts = new Map<string, { url: string; bytes: number }>();
  session.on('Network.responseReceived', ({ requestId, type, response }) => {
    if (type === 'Script') scripts.set(requestId, { url: response.url, bytes: 0 });
  });
  session.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
    const script = scripts.get(requestId);
    if (script) script.bytes = encodedDataLength;
  });
  await page.goto(`${address}${path}`, { waitUntil: 'networkidle' });
  if (path === '/explore') await page.waitForSelector('[data-bench="settled"]', { timeout: 60_000 });
  const total = [...scripts.values()].reduce((sum, { bytes }) => sum + bytes, 0) / 1000;
  if (total > limit) over++;
  console.log(`${path}: ${total.toFixed(1)} kB in ${scripts.size} scripts, limit ${limit} kB`);
  await page.close();
}
await browser.close();
process.exitCode = over > 0 ? 1 : 0;
