import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectNoAxeViolations } from './support/axe';
import { DESKTOP, launchBrowser } from './support/browser';
import { shiftsOn, watchShifts } from './support/layout-shift';
import { startRelay, type Relay } from './support/relay';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

let server: TestServer;
let wire: Relay;
let browser: Browser;
let page: Page;
let url: string;
let fleetNumber: string;

const dialog = () => page.getByRole('dialog', { name: 'Search' });
const box = () => dialog().getByRole('combobox');
const options = () => dialog().getByRole('option');
/** What the box says is chosen, in words. */
const chosen = () =>
  page.evaluate(() => {
    const id = document.querySelector('dialog[open] [role=combobox]')?.getAttribute('aria-activedescendant');
    return id ? (document.getElementById(id)?.textContent ?? null) : null;
  });
/** Before scripts are there nobody hears the key. */
const openByKey = (key: string) =>
  expect
    .poll(async () => {
      if (await dialog().isVisible()) return true;
      await page.keyboard.press(key);
      return dialog().isVisible();
    }, { timeout: 20_000 })
    .toBe(true);

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), launchBrowser()]);
  wire = await startRelay(Number(new URL(server.url).port));
  url = `http://127.0.0.1:${wire.port}`;
  page = await (await browser.newContext(DESKTOP)).newPage();
  await watchShifts(page);
  await signIn(page, url, 'technician');
  await page.goto(`${url}/units`);
  fleetNumber = (await page.locator('tbody th a').first().textContent())?.trim() ?? '';
});
afterAll(async () => {
  await browser?.close();
  await wire?.close();
  await server?.stop();
});

describe('the search by keyboard', () => {
  it('finds a unit by its number, written otherwise, and goes to its page', async () => {
    await page.goto(`${url}/bench`);
    await openByKey('/');
    expect(await box().evaluate((field) => field === document.activeElement)).toBe(true);
    // A slash in a field is a slash.
    await page.keyboard.type(`/${fleetNumber.replaceAll('-', ' ').toLowerCase()}`);
    await options().first().waitFor();
    await dialog().getByRole('status').filter({ hasText: /^Found: .*unit/ }).waitFor();
    await dialog().getByRole('group', { name: /^Units/ }).waitFor();
    await expectNoAxeViolations(page, 'dialog');

    expect(await chosen()).toBeNull();
    await page.keyboard.press('ArrowDown');
    expect(await chosen()).toContain(fleetNumber);
    await expectNoAxeViolations(page, 'dialog');
    // Past the first lies the box, and before it the last, which leads to all of it.
    await page.keyboard.press('ArrowUp');
    expect(await chosen()).toBeNull();
    await page.keyboard.press('ArrowUp');
    expect(await chosen()).toBe('Show all that is found');
    for (const key of ['ArrowDown', 'ArrowDown', 'Enter']) await page.keyboard.press(key);
    await page.waitForURL(/\/units\/[0-9a-f-]{36}$/);
    await page.getByRole('heading', { level: 1 }).filter({ hasText: fleetNumber }).waitFor();
    expect(await dialog().count()).toBe(0);
  });

  it('opens by Ctrl and K from a field, too, closes by Escape and gives the focus back', async () => {
    await page.goto(`${url}/units`);
    const field = page.getByRole('textbox', { name: 'Number' });
    await field.focus();
    await page.keyboard.press('/');
    expect(await field.inputValue()).toBe('/');
    await openByKey('Control+k');
    await page.keyboard.type('zzzz');
    await dialog().getByRole('status').filter({ hasText: 'Nothing is found' }).waitFor();
    await page.keyboard.press('Escape');
    await dialog().waitFor({ state: 'detached' });
    expect(await field.evaluate((one) => one === document.activeElement)).toBe(true);
  });

  it('keeps letters that are typed before it has come, and none of them works the page below', async () => {
    await page.goto(`${url}/cases`);
    // All within one turn, in which nothing can have been fetched; before scripts are there nobody hears the first.
    const typed = () =>
      page.evaluate(() => {
        const isHeard = (key: string) => !document.body.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }));
        return isHeard('/') && ['n', 'j', 'k'].every(isHeard);
      });
    await expect.poll(typed, { timeout: 20_000 }).toBe(true);
    await box().waitFor();
    expect(await box().inputValue()).toBe('njk');
    expect(new URL(page.url()).pathname).toBe('/cases');
    await page.keyboard.press('Escape');
    await dialog().waitFor({ state: 'detached' });
  });

  it('leads to all that is found by Enter, on a page that can be used before its scripts have come', async () => {
    await page.goto(`${url}/units`);
    await openByKey('Control+k');
    await page.keyboard.type('oil');
    await options().first().waitFor();
    await page.keyboard.press('Enter');
    await page.waitForURL(/\/search\?q=oil$/);
    await page.getByRole('heading', { level: 2, name: /^Cases/ }).waitFor();
    await expectNoAxeViolations(page);

    const plain = await (await browser.newContext({ ...DESKTOP, serviceWorkers: 'block', storageState: await page.context().storageState() })).newPage();
    await plain.route('**/_next/static/**/*.js', (route) => route.abort());
    await plain.goto(`${url}/units`);
    await plain.getByRole('link', { name: 'Search', exact: true }).click();
    await plain.getByLabel('Units, cases, notes, rulebook').fill(fleetNumber);
    await plain.getByRole('main').getByRole('button', { name: 'Search' }).click();
    await plain.getByRole('main').getByRole('link').filter({ hasText: fleetNumber }).first().waitFor();
    await plain.context().close();
  });

  it('leaves everything in its place while answers come', async () => {
    await page.goto(`${url}/units`);
    await openByKey('/');
    for (const letter of 'drain zz') {
      await page.keyboard.type(letter);
      await dialog().locator('[aria-busy=false]').waitFor();
    }
    const { sum, moved } = await shiftsOn(page);
    expect(sum, moved.join('\n')).toBeLessThan(0.01);
  });

  it('says when there is no connection, and what there is instead', async () => {
    await page.goto(`${url}/units`);
    await openByKey('/');
    wire.cut();
    await page.keyboard.type('oil');
    await dialog().getByRole('paragraph').filter({ hasText: /^No connection to Carryover.*under Cases\.$/ }).waitFor();
    await expectNoAxeViolations(page, 'dialog');
    wire.mend();
    await dialog().getByRole('button', { name: 'Try again' }).click();
    await options().first().waitFor();
  });
});
