import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { STATIONS } from '@/lib/diagnose';
import { expectNoAxeViolations } from './support/axe';
import { DESKTOP, launchBrowser, PHONE } from './support/browser';
import { answerAtHand, openCaseOn } from './support/case-desk';
import { tabTo } from './support/keyboard';
import { shiftsOn, watchShifts } from './support/layout-shift';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

const NARROW = { ...PHONE, viewport: { width: 320, height: 640 } } satisfies BrowserContextOptions;
/** A 1280 px window at 200 %. */
const ZOOMED = { viewport: { width: 640, height: 450 }, deviceScaleFactor: 2 } satisfies BrowserContextOptions;
const LEAST_TARGET_PX = 48;
const MOST_SHIFT = 0.02;

const station = (page: Page, name: string) => page.getByRole('button', { name: new RegExp(`^${name}, \\d+% suspicion`) });
const sidewaysPx = (page: Page) => page.evaluate(() => document.documentElement.scrollWidth - innerWidth);

/** Buttons, links and fields of the case that a finger is smaller than: name and size. */
const smallTargets = (page: Page) =>
  page.evaluate((least) => {
    const seen = [...document.querySelectorAll<HTMLElement>('[data-hand] :is(a, button, summary, input, select, label:has(input))')];
    return seen.flatMap((element) => {
      // A box to tick is as large as the label around it; a link within a sentence is exempt, as in WCAG.
      if (!element.checkVisibility() || element.classList.contains('sr-only') || element.matches('label input, p a')) return [];
      const { width, height } = element.getBoundingClientRect();
      return Math.min(width, height) < least - 0.5 ? [`${element.textContent || element.getAttribute('aria-label')}: ${width.toFixed(0)} x ${height.toFixed(0)}`] : [];
    });
  }, LEAST_TARGET_PX);

describe('the case page', () => {
  let server: TestServer;
  let browser: Browser;
  let path: string;
  let signedIn: Awaited<ReturnType<Awaited<ReturnType<Browser['newContext']>>['storageState']>>;
  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(), launchBrowser()]);
    const page = await (await browser.newContext(DESKTOP)).newPage();
    await signIn(page, server.url, 'technician');
    path = `/cases/${await openCaseOn(page)}`;
    signedIn = await page.context().storageState();
    await page.context().close();
  });
  afterAll(() => Promise.all([browser?.close(), server?.stop()]));
  afterEach(() => Promise.all(browser.contexts().map((context) => context.close())));

  async function open(options: BrowserContextOptions): Promise<Page> {
    const page = await (await browser.newContext({ ...options, storageState: signedIn })).newPage();
    await watchShifts(page);
    await page.goto(`${server.url}${path}`);
    // The page stands before its script runs; a tap before that would be lost on this test, though not on a person.
    await page.waitForFunction(() => Object.keys(document.querySelector('.oil-path-station') ?? {}).some((key) => key.startsWith('__react')));
    return page;
  }

  it.each([
    ['320 px', NARROW],
    ['200 % zoom', ZOOMED],
  ])('at %s shows and opens every station without scrolling sideways', async (_width, options) => {
    const page = await open(options);
    expect(await sidewaysPx(page)).toBeLessThanOrEqual(0);
    for (const { name } of STATIONS) {
      await station(page, name).click();
      await page.getByRole('heading', { level: 2, name, exact: true }).waitFor();
      expect([name, await sidewaysPx(page)]).toEqual([name, 0]);
    }
    await page.getByRole('button', { name: 'Back to the check that tells most' }).click();
    await page.locator('section[aria-labelledby=check-at-hand]').waitFor();
    expect(await page.locator('section[aria-labelledby=causes] [role=meter]').first().isVisible()).toBe(true);
  });

  it.each([
    ['phone', NARROW],
    ['desktop', DESKTOP],
  ])('has no target under 48 px on a %s', async (_size, options) => {
    const page = await open(options);
    expect(await smallTargets(page)).toEqual([]);
    await station(page, 'Cylinder and head').click();
    expect(await smallTargets(page)).toEqual([]);
    await showMeasured(page);
    expect(await smallTargets(page)).toEqual([]);
  });

  it('prints shares of stations and of what is not on the path that add up to 100, in the drawing and as a list', async () => {
    const page = await open(DESKTOP);
    const printed = async () => {
      const named = await page.getByRole('button', { name: /% suspicion, \d+ open$/ }).evaluateAll((buttons) => buttons.map((button) => [...button.children].map(({ textContent }) => textContent ?? '')));
      const shares = named.map(([name]) => Number(/(\d+)% suspicion/.exec(name ?? '')?.[1]));
      // What is heard is what is seen.
      expect(named.map(([, ...seen], i) => seen.join(' ').includes(`${shares[i]}%`))).toEqual(named.map(() => true));
      const none = Number(/(\d+)%/.exec((await page.getByText('Not on the path').locator('..').textContent()) ?? '')?.[1]);
      return [...shares, none];
    };
    const drawn = await printed();
    expect(drawn).toHaveLength(STATIONS.length + 1);
    expect(drawn.reduce((a, b) => a + b, 0)).toBe(100);
    await page.getByRole('button', { name: 'As a list' }).click();
    expect(await printed()).toEqual(drawn);
  });

  it.each([
    ['desktop', DESKTOP],
    ['phone', NARROW],
  ])('is one stop of the keyboard, and arrows walk it as it lies on a %s', async (_size, options) => {
    const page = await open(options);
    const focused = () => page.evaluate(() => document.activeElement?.textContent?.split(',')[0] ?? '');
    await tabTo(page, /% suspicion/);
    await page.keyboard.press('Home');
    const reached = new Map([[await focused(), [] as string[]]]);
    for (const [from, keys] of reached) {
      for (const key of ['ArrowRight', 'ArrowDown', 'ArrowLeft', 'ArrowUp']) {
        await page.keyboard.press('Home');
        for (const pressed of keys) await page.keyboard.press(pressed);
        expect(await focused()).toBe(from);
        await page.keyboard.press(key);
        const to = await focused();
        if (!reached.has(to)) reached.set(to, [...keys, key]);
      }
    }
    expect([...reached.keys()].sort()).toEqual(STATIONS.map(({ name }) => name).sort());
    await page.keyboard.press('Enter');
    await page.locator('#station-checks').waitFor();
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('station-checks');
  });

  it('puts answers on the side of the hand, and the server remembers which', async () => {
    const page = await open(PHONE);
    const sides = async () => {
      const dock = page.locator('.dock').first();
      const answers = await dock.locator('.dock-answers').boundingBox();
      const aside = await dock.locator('.dock-aside').boundingBox();
      return answers && aside && (answers.x > aside.x ? 'right' : 'left');
    };
    await station(page, 'Cylinder and head').click();
    await showMeasured(page);
    expect(await sides()).toBe('right');
    await page.getByText('Left hand').click();
    expect(await sides()).toBe('left');
    await page.reload();
    expect(await page.locator('[data-hand]').getAttribute('data-hand')).toBe('left');
  });

  it('takes a value from the large keys, with the field typable all the same', async () => {
    const page = await open(PHONE);
    await station(page, 'Cylinder and head').click();
    await showMeasured(page);
    const field = page.getByLabel(/You measured/);
    for (const key of ['4', '8', '9']) await page.getByRole('group', { name: 'Keypad' }).getByRole('button', { name: key, exact: true }).tap();
    await page.getByRole('button', { name: 'Delete the last character' }).tap();
    expect(await field.inputValue()).toBe('48');
    const keys = await page.locator('.keypad > button').evaluateAll((buttons) => buttons.map((button) => button.getBoundingClientRect()).map(({ width, height }) => Math.min(width, height)));
    expect(Math.min(...keys)).toBeGreaterThanOrEqual(56);
    await field.focus();
    await page.keyboard.press('End');
    await page.keyboard.type(' s');
    expect(await field.inputValue()).toBe('48 s');
  });

  it('moves nothing under reduced motion', async () => {
    const page = await open({ ...DESKTOP, reducedMotion: 'reduce' });
    await answerAtHand(page);
    expect(await page.evaluate(() => document.getAnimations().length)).toBe(0);
  });

  it('keeps drawing and glasses in forced colours', async () => {
    const page = await open({ ...DESKTOP, forcedColors: 'active' });
    const { edge, ground, outline } = await page.evaluate(() => {
      const tube = document.querySelector('.sight-glass-tube');
      const line = document.querySelector('.oil-path-wide');
      if (!tube || !line) throw new Error('no glass or no drawing');
      return { edge: getComputedStyle(tube).borderTopColor, ground: getComputedStyle(document.documentElement).backgroundColor, outline: getComputedStyle(line).stroke };
    });
    expect(edge).not.toBe(ground);
    expect(outline).not.toBe(ground);
    await expectNoAxeViolations(page);
  });

  it.each([
    ['light', 'desktop', DESKTOP],
    ['dark', 'phone', PHONE],
  ] as const)('has no axe violation in %s on a %s', async (colorScheme, _size, options) => {
    await expectNoAxeViolations(await open({ ...options, colorScheme }));
  });

  it.each([
    ['phone', PHONE, null],
    ['desktop', DESKTOP, null],
    // Whatever comes in more than half a second after the tap is no longer the tap's doing.
    ['phone that is slow, on a slow line', PHONE, { rate: 4, latency: 700 }],
  ])('shifts nothing while four checks are answered on a %s', async (_size, options, slow) => {
    const page = await open(options);
    if (slow) await slowDown(page, slow);
    for (let i = 0; i < 4; i += 1) await answerAtHand(page);
    await page.waitForTimeout(1000);
    const { sum, moved } = await shiftsOn(page);
    expect(sum, moved.join('\n')).toBeLessThanOrEqual(MOST_SHIFT);
  });
});

/** A processor so many times slower, and a line that takes so many ms to answer. */
async function slowDown(page: Page, { rate, latency }: { rate: number; latency: number }): Promise<void> {
  const devtools = await page.context().newCDPSession(page);
  await devtools.send('Emulation.setCPUThrottlingRate', { rate });
  await devtools.send('Network.enable');
  await devtools.send('Network.emulateNetworkConditions', { offline: false, latency, downloadThroughput: -1, uploadThroughput: -1 });
}

/** Brings a measured check of the cylinder to hand, its cautions read. */
async function showMeasured(page: Page): Promise<void> {
  await page.locator('section[aria-labelledby=station-checks]').getByRole('button', { name: /^Build-up/ }).click();
  const read = page.getByRole('button', { name: /I have read this/ });
  await page.locator('section[aria-labelledby=check-at-hand]').waitFor();
  if (await read.count()) {
    await read.click();
    await read.waitFor({ state: 'detached' });
  }
  await page.getByLabel(/You measured/).waitFor();
}
