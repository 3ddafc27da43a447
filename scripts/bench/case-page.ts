/**
 * The case page as a phone meets it: how much script it takes until the first answer can be saved, how long a tap takes
 * to show, and whether anything jumps.
 */
import { gzipSync } from 'node:zlib';
import type { Browser, Page } from 'playwright-core';
import { answerAtHand } from '@/tests/e2e/support/case-desk';
import { launchBrowser, PHONE } from '@/tests/e2e/support/browser';
import { shiftsOn, watchShifts, type Shifts } from '@/tests/e2e/support/layout-shift';
import { signInAs } from '@/tests/e2e/support/sign-in';
import { startBenchServer, type BenchServer } from './server';
import { sumPage } from './sum-page';

const SLOWER = 4;
const TAPS = 24;
/** What must not be among the first scripts, by words that survive minifying. */
const NEVER_FIRST = { 'chart library': /chartArea|doughnut/, 'rules engine': /json-rules-engine|almanac/i };

/** Every script that came before `until` resolved, gzipped as a server would. */
async function scriptsOf(browser: Browser, visit: (page: Page) => Promise<void>) {
  const context = await browser.newContext(PHONE);
  const page = await context.newPage();
  const bodies: Promise<Buffer>[] = [];
  let counting = false;
  page.on('response', (response) => counting && response.request().resourceType() === 'script' && bodies.push(response.body()));
  await visit(Object.assign(page, { startCounting: () => (counting = true) }));
  counting = false;
  const texts = await Promise.all(bodies);
  await context.close();
  return { bytes: texts.reduce((sum, text) => sum + gzipSync(text).length, 0), text: Buffer.concat(texts).toString() };
}

const start = (page: Page) => (page as Page & { startCounting(): void }).startCounting();

async function scripts(browser: Browser, { url, signIn, caseIds }: BenchServer) {
  const bare = await scriptsOf(browser, async (page) => {
    start(page);
    // The page of no address stands under the root layout and nothing else.
    await page.goto(`${url}/no-such-page`, { waitUntil: 'networkidle' });
  });
  const whole = await scriptsOf(browser, async (page) => {
    await signInAs(page, url, signIn);
    const saved = page.waitForRequest((request) => request.method() === 'POST' && request.url().endsWith('/findings'));
    start(page);
    await page.goto(`${url}/cases/${caseIds[0]}`);
    await page.getByRole('button', { name: 'Can’t tell' }).first().click();
    await saved;
  });
  const found = Object.entries(NEVER_FIRST).filter(([, words]) => words.test(whole.text)).map(([name]) => name);
  return { bare: bare.bytes, whole: whole.bytes, found };
}

/** From the tap to the next frame, in ms: what Event Timing measures, without its rounding to 8 ms. */
const LISTEN_FOR_TAPS = () => {
  document.addEventListener(
    'click',
    (event) => requestAnimationFrame(() => {
      const channel = new MessageChannel();
      channel.port1.onmessage = () => ((window as unknown as { tapMs: number }).tapMs = performance.now() - event.timeStamp);
      channel.port2.postMessage(null);
    }),
    { capture: true },
  );
};

async function tapTime(page: Page, tap: () => Promise<void>): Promise<number> {
  await page.evaluate(() => ((window as unknown as { tapMs: number }).tapMs = -1));
  await tap();
  await page.waitForFunction(() => (window as unknown as { tapMs: number }).tapMs >= 0);
  return page.evaluate(() => (window as unknown as { tapMs: number }).tapMs);
}

async function slowed(page: Page): Promise<void> {
  const session = await page.context().newCDPSession(page);
  await session.send('Emulation.setCPUThrottlingRate', { rate: SLOWER });
}

/** Taps on an answer, and taps that only toggle a class, each on a page of its own. */
async function taps(browser: Browser, { url, signIn, caseIds }: BenchServer) {
  const context = await browser.newContext(PHONE);
  const page = await context.newPage();
  await watchShifts(page);
  await page.addInitScript(LISTEN_FOR_TAPS);
  await signInAs(page, url, signIn);
  await page.goto(`${url}/cases/${caseIds[1]}`);
  await page.waitForLoadState('networkidle').catch(() => undefined);
  await slowed(page);

  const plain = await context.newPage();
  await plain.addInitScript(LISTEN_FOR_TAPS);
  await plain.goto(`${url}/api/v1/openapi.json`);
  await plain.setContent('<style>.on{background:#d08a1e}</style><button style="min-height:56px" onclick="this.classList.toggle(\'on\')">Toggle</button>');
  await plain.evaluate(LISTEN_FOR_TAPS);
  await slowed(plain);

  let at = 1;
  let worst: Shifts = { sum: 0, moved: [] };
  const shifts = async () => {
    const here = await shiftsOn(page);
    if (here.sum >= worst.sum) worst = here;
    return worst;
  };
  const cannotTell = page.locator('section[aria-labelledby=check-at-hand]').getByRole('button', { name: 'Can’t tell' }).first();
  return {
    answer: async () => {
      await page.bringToFront();
      // Where enough is known nothing is asked any more: on with the next case.
      while (!(await cannotTell.isVisible())) {
        await shifts();
        await page.goto(`${url}/cases/${caseIds[(at += 1)]}`);
        await cannotTell.waitFor();
        await page.waitForTimeout(1_500);
      }
      const heading = await page.locator('#check-at-hand').textContent();
      const ms = await tapTime(page, () => cannotTell.click());
      // The next question, however long the server takes; then whatever comes after it.
      await page.waitForFunction((was) => document.getElementById('check-at-hand')?.textContent !== was, heading, { timeout: 3_000 }).catch(() => undefined);
      await page.waitForTimeout(700);
      // A panel stays at hand until one goes on from it.
      if ((await page.locator('#check-at-hand').textContent()) === heading) await answerAtHand(page);
      return ms;
    },
    toggle: async () => {
      await plain.bringToFront();
      return tapTime(plain, () => plain.getByRole('button').click());
    },
    /** Of the page that moved most. */
    shifts,
    close: () => context.close(),
  };
}

export async function casePage() {
  const [server, browser] = await Promise.all([startBenchServer({ cases: 12 }), launchBrowser()]);
  return {
    scripts: () => scripts(browser, server),
    taps: () => taps(browser, server),
    keys: () => sumPage(browser, server),
    turns: { pairs: TAPS, warmUp: 3 },
    slower: SLOWER,
    close: async () => {
      await browser.close();
      await server.stop();
    },
  };
}
