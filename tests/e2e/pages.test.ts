import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { mailedLinks } from '@/scripts/screenshots/mailed-links';
import { become } from '@/scripts/screenshots/own-server';
import { SHOTS, type Shot } from '@/scripts/screenshots/pages';
import { findPlaces, type Places } from '@/scripts/screenshots/places';
import { expectNoAxeViolations } from './support/axe';
import { DESKTOP, launchBrowser, PHONE } from './support/browser';
import { press, tabTo, type } from './support/keyboard';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

const NARROW = { width: 320, height: 700 };

let server: TestServer;
let browser: Browser;
const pages = new Map<string, Page>();
const complaints: string[] = [];

/** A page of somebody signed in, one for each role; what its console complains about is kept. */
async function as(who: Shot['as']): Promise<Page> {
  const held = pages.get(who);
  if (held) return held;
  const page = await (await browser.newContext({ viewport: NARROW, reducedMotion: 'reduce' })).newPage();
  pages.set(who, page);
  if (who !== 'nobody') await signIn(page, server.url, who);
  page.on('pageerror', (error) => complaints.push(`${page.url()}: ${error.message}`));
  page.on('console', (message) => {
    // That an address isn't there is what its page is about.
    if (message.type() === 'error' && !/status of 404/.test(message.text())) complaints.push(`${page.url()}: ${message.text()} ${message.location().url}`);
  });
  return page;
}

async function go(who: Shot['as'], path: string): Promise<Page> {
  const page = await as(who);
  await page.goto(server.url + path);
  return page;
}

/** Whole pages of content may not need sideways scrolling; a wide table has a region of its own for that. */
async function expectItFits(page: Page) {
  const { wide, room } = await page.evaluate(() => ({ wide: document.documentElement.scrollWidth, room: document.documentElement.clientWidth }));
  expect(wide, `width of ${page.url()}`).toBeLessThanOrEqual(room);
}

async function expectAGoodPage(page: Page) {
  await page.locator('h1').waitFor();
  expect(await page.locator('h1').count(), `headings of ${page.url()}`).toBe(1);
  await expectItFits(page);
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme });
    await expectNoAxeViolations(page);
  }
}

const rowFocused = (page: Page) => page.evaluate(() => [...document.querySelectorAll('[data-row]')].findIndex((row) => row === document.activeElement));

/** The first `j` that is heard goes to the first row: before scripts are there, none is. */
const firstRowByKey = (page: Page) =>
  expect
    .poll(async () => {
      await page.keyboard.press('j');
      return rowFocused(page);
    })
    .toBe(0);

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), launchBrowser()]);
});
afterAll(() => Promise.all([browser?.close(), server?.stop()]));

describe('every page, at 320 px, light and dark', () => {
  let places: Places;
  beforeAll(async () => {
    places = { ...(await findPlaces(go)), ...(await mailedLinks(go, await as('nobody'), server.url, server.letters)) };
    complaints.length = 0;
  });

  it.each(SHOTS.filter(({ stage }) => (stage ?? 'seeded') === 'seeded').map((shot) => [shot.name, shot] as const))('%s', async (_, shot) => {
    const path = shot.path(places);
    expect(path, 'the demo has one').toBeDefined();
    await expectAGoodPage(await go(shot.as, path ?? '/'));
    expect(complaints.splice(0)).toEqual([]);
  });
});

describe('the case list by keyboard', () => {
  let page: Page;
  beforeAll(async () => {
    page = await (await browser.newContext(DESKTOP)).newPage();
    await signIn(page, server.url, 'manager');
  });

  it('steps through rows, opens one, and looks for a number', async () => {
    await page.goto(`${server.url}/cases?sort=unit&direction=asc`);
    await firstRowByKey(page);
    for (const [key, row] of [['j', 1], ['ArrowDown', 2], ['k', 1], ['ArrowUp', 0], ['k', 0]] as const) {
      await page.keyboard.press(key);
      expect([key, await rowFocused(page)]).toEqual([key, row]);
    }
    await page.keyboard.press('f');
    await page.keyboard.type('jk/1');
    expect(await page.getByLabel('Unit or case number').inputValue()).toBe('jk/1');
    await page.goto(`${server.url}/cases`);
    await firstRowByKey(page);
    await page.keyboard.press('Enter');
    await page.waitForURL(/\/cases\/[0-9a-f-]{36}$/);
  });

  it('leaves single keys alone when they are turned off, and says what they are', async () => {
    await page.goto(`${server.url}/cases`);
    await firstRowByKey(page);
    await page.getByText('Keys', { exact: true }).click();
    await page.getByLabel(/work on this device/).uncheck();
    await page.locator('h1').click();
    await page.keyboard.press('j');
    expect(await rowFocused(page)).toBe(-1);
    await page.locator('[data-row]').first().focus();
    await page.keyboard.press('ArrowDown');
    expect(await rowFocused(page)).toBe(1);
    await page.reload();
    // The device remembers; the server that drew the page can't know.
    await expect.poll(() => page.getByLabel(/work on this device/).isChecked(), { timeout: 10_000 }).toBe(false);
  });

  it('saves a view, uses it, renames it and deletes it', async () => {
    await page.goto(`${server.url}/cases?status=called&sort=unit&direction=asc`);
    await press(page, /^Save this view$/);
    await type(page, /^Name of the view$/, 'Called, by unit');
    await press(page, /^Save the view$/);
    const views = page.getByRole('navigation', { name: 'Views' });
    await views.getByRole('link', { name: 'Called, by unit' }).waitFor();
    await page.goto(`${server.url}/cases`);
    await press(page, /^Called, by unit$/);
    await page.waitForURL(/status=called/);
    expect(await views.locator('[aria-current]').allTextContents()).toEqual(['Called, by unit']);
    await expectNoAxeViolations(page);

    await press(page, /^Rename or delete a view$/);
    const name = page.getByLabel('Name of “Called, by unit”');
    await name.fill('Called');
    await name.press('Enter');
    await views.getByRole('link', { name: 'Called', exact: true }).waitFor();
    await page.getByRole('button', { name: 'Delete the view Called' }).click();
    await views.getByRole('link', { name: 'Called', exact: true }).waitFor({ state: 'detached' });
  });
});

describe('the history of a case', () => {
  let page: Page;
  let caseId: string;
  beforeAll(async () => {
    page = await (await browser.newContext(PHONE)).newPage();
    await signIn(page, server.url, 'technician');
    caseId = (await findPlaces(go)).calledCase ?? '';
    await page.goto(`${server.url}/cases/${caseId}/history`);
  });
  const leader = () => page.locator('section[aria-labelledby=causes] ol [data-cause]').first().getAttribute('data-cause');
  const said = () => page.getByRole('slider').getAttribute('aria-valuetext');

  it('slides back by keyboard, changing page and address, and comes back the same', async () => {
    const [now, saidNow] = [await leader(), await said()];
    await tabTo(page, /^Moment/);
    await page.keyboard.press('Home');
    await page.waitForURL(/\?at=/);
    await page.getByText('As in all cases: nothing has moved it yet.').waitFor();
    expect(await said()).toMatch(/\d{4}, \d\d:\d\d: .*Case opened/);
    expect(await page.getByRole('button', { name: 'Earlier' }).isDisabled()).toBe(true);

    await page.reload();
    await page.getByText('As in all cases: nothing has moved it yet.').waitFor();
    await page.getByRole('slider').focus();
    await page.keyboard.press('End');
    await page.getByText('As in all cases: nothing has moved it yet.').waitFor({ state: 'detached' });
    await expect.poll(leader).toBe(now);
    expect(await said()).toBe(saidNow);
  });

  it('lays two moments beside each other', async () => {
    await page.getByLabel('Compare with').selectOption({ index: 1 });
    const table = page.getByRole('table', { name: 'The ranking at two moments' });
    await table.waitFor();
    expect(await table.getByRole('row').count()).toBeGreaterThan(3);
    expect(await page.locator('section[aria-labelledby=between] li').count()).toBeGreaterThan(0);
    await expectItFits(page);
    await expectNoAxeViolations(page);
    const address = page.url();
    await page.goto(address);
    await table.waitFor();
  });
});

describe('what may not be released', () => {
  it('says so in the list, on the unit and on each of its cases', async () => {
    const page = await go('technician', '/cases?held=yes');
    const row = page.getByRole('row').filter({ hasText: 'Do not release' }).first();
    await row.getByRole('link').click();
    await page.getByRole('heading', { name: 'Do not release' }).waitFor();
    await expectNoAxeViolations(page);
    await page.locator('main a[href^="/units/"]').first().click();
    await page.waitForURL(/\/units\//);
    await page.getByRole('heading', { name: 'Do not release' }).waitFor();
    await expectNoAxeViolations(page);
  });
});

// Last: nothing is left of the demo afterwards.
describe('when there is nothing, and when something breaks', () => {
  it('says what to do next', async () => {
    await become(server.database.superuserUrl, 'emptied');
    for (const shot of SHOTS.filter(({ stage }) => stage === 'emptied')) await expectAGoodPage(await go(shot.as, shot.path({}) ?? '/'));
  });

  it('says what happened, what was kept and a reference that stands in the log', async () => {
    await become(server.database.superuserUrl, 'broken');
    for (const shot of SHOTS.filter(({ stage }) => stage === 'broken')) {
      const page = await go(shot.as, shot.path({}) ?? '/');
      await page.getByRole('heading', { name: 'This page did not come up' }).waitFor();
      await expectAGoodPage(page);
      expect(await page.getByRole('banner').getByText('Menu').count(), 'inside the shell').toBe(1);
      expect(await page.getByText('Whatever was saved before is kept').count()).toBe(1);
      const reference = await page.locator('[data-reference]').textContent();
      const lines = server.webLog().split('\n').filter((line) => line.includes(`"reference":"${reference}"`));
      expect(lines.length, `reference ${reference} in the log`).toBeGreaterThan(0);
      expect(JSON.parse(lines[0] ?? '{}')).toMatchObject({ route: expect.any(String), err: expect.anything() });
    }
  });
});
