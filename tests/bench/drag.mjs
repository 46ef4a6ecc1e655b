// Times a scripted drag of sigma on the bench in Chromium, from input event to paint.
//
//   SMIRR_URL=http://127.0.0.1:3000 node tests/bench/drag.mjs [--moves 200] [--delay density|spectrum|table] [--json]
//
// A move counts as done when density, spectrum and table all show its sigma (or a later one, where the page passed it
// over), seen in the frame after. --delay holds up every update of one of them by 100 ms on purpose: the figures must get
// worse, or the script measures nothing. Prints medians and 95th percentiles; a timing never makes it fail.
import { parseArgs } from 'node:util';
import { chromium } from '@playwright/test';

const PARTS = ['density', 'spectrum', 'table'];
const { values: options } = parseArgs({
  options: { moves: { type: 'string', default: '200' }, delay: { type: 'string' }, json: { type: 'boolean' } },
});
if (options.delay !== undefined && !PARTS.includes(options.delay))
  throw new Error(`--delay ${options.delay}: allowed are ${PARTS.join(', ')}`);
const base = process.env.SMIRR_URL ?? 'http://127.0.0.1:3000';
const moves = Number(options.moves);

const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking'],
});
try {
  const page = await browser.newPage({ viewport: { width: 1440, height: 1100 } });
  await page.addInitScript(watch, { delayed: options.delay ?? null });
  await page.goto(`${base}/explore?system=logistic&p.r=3.8&sigma=0.012&on=0,1,absorbing&points=1024`);
  await page.locator('[data-bench="settled"]').waitFor({ timeout: 60_000 });
  const handle = page.getByRole('slider', { name: /^Noise level/ }).last();
  const box = await handle.boundingBox();
  if (!box) throw new Error('no sigma slider on the page');
  const from = box.x + 0.4 * box.width;
  const y = box.y + box.height / 2;
  const right = box.x + 0.7 * box.width;
  await page.mouse.move(from, y);
  await page.mouse.down();
  for (let i = 0; i < moves; i++) {
    const part = (1 - Math.cos((2 * Math.PI * (i + 1)) / moves)) / 2;
    await page.mouse.move(from + (right - from) * part, y);
    await page.waitForTimeout(16);
  }
  await page.waitForTimeout(500);
  await page.mouse.up();
  const rest = Date.now();
  await page.locator('[data-bench="settled"]').waitFor({ timeout: 60_000 });
  const settle = Date.now() - rest;
  const times = await page.evaluate(() => globalThis.dragTimes());
  const sorted = times.done.toSorted((a, b) => a - b);
  const at = (q) => (sorted.length > 0 ? sorted[Math.min(sorted.length - 1, Math.floor(q * sorted.length))] : null);
  const figures = {
    moves: times.moves,
    done: sorted.length,
    median: at(0.5),
    p95: at(0.95),
    restToErrorBars: settle,
    delayed: options.delay ?? null,
  };
  if (options.json) process.stdout.write(`${JSON.stringify(figures)}\n`);
  else {
    process.stdout.write(
      `${figures.moves} moves, ${figures.done} shown: median ${figures.median?.toFixed(0)} ms, 95 % within ${figures.p95?.toFixed(0)} ms\n`,
    );
    process.stdout.write(
      `error bars ${settle} ms after rest${options.delay ? `; ${options.delay} held up by 100 ms on purpose` : ''}\n`,
    );
  }
} finally {
  await browser.close();
}

/** Runs in the page: notes when sigma is asked for and when each part shows it. */
function watch({ delayed }) {
  const parts = ['density', 'spectrum', 'table'];
  const asked = [];
  const done = [];
  const shown = {};
  if (delayed) {
    const set = Element.prototype.setAttribute;
    Element.prototype.setAttribute = function (name, value) {
      if (name === 'data-shown-sigma' && this.getAttribute('data-part') === delayed) {
        const until = performance.now() + 100;
        while (performance.now() < until);
      }
      set.call(this, name, value);
    };
  }
  addEventListener(
    'pointermove',
    (event) => {
      if (event.buttons !== 1) return;
      const begun = performance.now();
      // after the page's own handlers: the slider then tells the sigma that this move asked for
      setTimeout(() => {
        const slider = document.querySelector('[role="slider"][aria-label^="Noise level"]');
        if (slider) asked.push({ sigma: Number(slider.getAttribute('aria-valuenow')), begun, over: false });
      }, 0);
    },
    true,
  );
  new MutationObserver((records) => {
    for (const r of records) {
      const part = r.target.getAttribute('data-part');
      if (parts.includes(part)) shown[part] = Number(r.target.getAttribute('data-shown-sigma'));
    }
    const values = parts.map((p) => shown[p]);
    if (!values.every((v) => v === values[0])) return;
    // the last asked move with this sigma is done, and with it every earlier one that was passed over
    const last = asked.findLastIndex((a) => Math.abs(a.sigma / values[0] - 1) < 1e-12);
    if (last < 0) return;
    const waiting = asked.slice(0, last + 1).filter((a) => !a.over);
    for (const a of waiting) a.over = true;
    requestAnimationFrame(() => {
      const channel = new MessageChannel();
      channel.port1.onmessage = () => {
        const now = performance.now();
        for (const a of waiting) done.push(now - a.begun);
      };
      channel.port2.postMessage(null);
    });
  }).observe(document, { subtree: true, attributes: true, attributeFilter: ['data-shown-sigma'] });
  globalThis.dragTimes = () => ({ moves: asked.length, done });
}
