/** The heaviest sum of the bench as one types: working out and drawing anew, against a page that only echoes the key. */
import type { Browser, Page } from 'playwright-core';
import { signInAs } from '@/tests/e2e/support/sign-in';
import type { BenchServer } from './server';

/** An iteration in an iteration, a band over nine inputs, and a plot of 81 points. */
const SLOWEST = '/bench/head-pressure';
const FIELD = '#narrowedBore';

/** From the key to the frame that shows what it did, in ms. What is put off until later is waited for: the plot as well. */
const LISTEN_FOR_KEYS = () => {
  document.addEventListener(
    'input',
    (event) => requestAnimationFrame(() => {
      const channel = new MessageChannel();
      channel.port1.onmessage = () => requestIdleCallback(() => ((window as unknown as { keyMs: number }).keyMs = performance.now() - event.timeStamp));
      channel.port2.postMessage(null);
    }),
    { capture: true },
  );
};

async function keyTime(page: Page, field: string, key: string): Promise<number> {
  await page.bringToFront();
  await page.evaluate(() => ((window as unknown as { keyMs: number }).keyMs = -1));
  await page.locator(field).press(key);
  await page.waitForFunction(() => (window as unknown as { keyMs: number }).keyMs >= 0);
  return page.evaluate(() => (window as unknown as { keyMs: number }).keyMs);
}

export async function sumPage(browser: Browser, { url, signIn }: BenchServer) {
  const context = await browser.newContext();
  const page = await context.newPage();
  await page.addInitScript(LISTEN_FOR_KEYS);
  await signInAs(page, url, signIn);
  await page.goto(url + SLOWEST);
  await page.locator('canvas').waitFor();
  await page.locator(FIELD).fill('0.2');

  const plain = await context.newPage();
  await plain.goto(`${url}/api/v1/openapi.json`);
  await plain.setContent('<input id="echo" oninput="this.nextElementSibling.textContent = this.value"><output></output>');
  await plain.evaluate(LISTEN_FOR_KEYS);

  // A digit, and away with it: the field stays in its range.
  const digitOrNone = () => {
    let typed = false;
    return () => ((typed = !typed) ? '5' : 'Backspace');
  };
  const [onSum, onEcho] = [digitOrNone(), digitOrNone()];
  return {
    sum: () => keyTime(page, FIELD, onSum()),
    echo: () => keyTime(plain, '#echo', onEcho()),
    turns: { pairs: 40, warmUp: 5 },
    close: () => context.close(),
  };
}
