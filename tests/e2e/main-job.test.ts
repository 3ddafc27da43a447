import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { STATIONS } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { accessibilityTree } from './support/accessibility-tree';
import { expectNoAxeViolations } from './support/axe';
import { launchBrowser, SIZES } from './support/browser';
import { press, tabTo, type, walkTo } from './support/keyboard';
import { startServer, type TestServer } from './support/server';
import { demoPerson } from './support/sign-in';

/** Clearly in the list of what was answered: the next thing may be done. */
const answeredCount = (page: Page) => page.locator('section[aria-labelledby=answered] > ul > li').count();

async function settled(page: Page, before: number) {
  await page.waitForFunction((count) => document.querySelectorAll('section[aria-labelledby=answered] > ul > li').length !== count, before);
  // The question stands until the next one is known.
  await page.locator('section[aria-labelledby=check-at-hand][aria-busy]').waitFor({ state: 'detached' });
}

/** Answers whatever is at hand as a person at the keyboard would; a value that nobody has is "can't tell". */
async function answerWhatIsAtHand(page: Page) {
  const atHand = page.locator('section[aria-labelledby=check-at-hand]');
  await atHand.waitFor();
  if (await atHand.getByRole('button', { name: /I have read this/ }).count()) {
    await press(page, /^I have read this/);
    await atHand.getByRole('button', { name: /I have read this/ }).waitFor({ state: 'detached' });
  }
  const before = await answeredCount(page);
  if (await atHand.getByRole('button', { name: 'Go on to the next check' }).count()) {
    await press(page, /^No$/);
    await settled(page, before);
    await press(page, /^Go on to the next check$/);
    return;
  }
  const first = atHand.getByRole('group', { name: /^Answers/ }).getByRole('button').first();
  const label = (await first.count()) ? await first.textContent() : null;
  await press(page, label === null ? /^Can’t tell$/ : new RegExp(`^${label.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')}$`));
  await settled(page, before);
}

describe.each(SIZES)('the main job by keyboard alone, on a %s', (_name, size) => {
  let server: TestServer;
  let browser: Browser;
  let page: Page;
  const complaints: string[] = [];
  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(), launchBrowser()]);
    page = await (await browser.newContext(size)).newPage();
    page.on('pageerror', (error) => complaints.push(error.message));
  });
  afterAll(() => Promise.all([browser?.close(), server?.stop()]));

  it('signs in', async () => {
    const { email, password } = demoPerson('technician');
    await page.goto(`${server.url}/sign-in`);
    await type(page, /address|e-?mail/i, email);
    await type(page, /^password/i, password);
    await page.keyboard.press('Enter');
    await page.waitForURL(/\/cases/);
    await page.getByRole('heading', { level: 1, name: 'Cases' }).waitFor();
    await expectNoAxeViolations(page);
  });

  it('opens a case on a unit made on the spot', async () => {
    await press(page, /^Open a case$/);
    await page.waitForURL(/\/cases\/new/);
    await page.getByRole('heading', { level: 1, name: 'Open a case' }).waitFor();
    await type(page, /^Unit/, 'KEY-1');
    await page.getByRole('radio', { name: /Add unit KEY-1/ }).waitFor();
    await press(page, /^Oil in the air system/, 'Space');
    await type(page, /^Odometer/, '410,000');
    await expectNoAxeViolations(page);
    await press(page, /^Open the case$/);
    await page.waitForURL(/\/cases\/[0-9a-f-]{36}$/);
    expect(await page.getByRole('heading', { level: 1 }).textContent()).toContain('KEY-1');
  });

  it('answers checks and sees the ranking move, with the focus on the next check', async () => {
    for (let i = 0; i < 4; i += 1) await answerWhatIsAtHand(page);
    expect(await answeredCount(page)).toBeGreaterThanOrEqual(4);
    expect(await page.getByRole('status').allTextContents()).toContainEqual(expect.stringMatching(/leads with/));
  });

  it('enters a measured value, with the message beside it when it can’t be right', async () => {
    await tabTo(page, /% suspicion/);
    // The stations are one stop; arrows walk them.
    await walkTo(page, /^Cylinder and head/);
    await page.keyboard.press('Enter');
    await press(page, /^Build-up/);
    const atHand = page.locator('section[aria-labelledby=check-at-hand]');
    await atHand.getByRole('heading', { level: 2 }).waitFor();
    await press(page, /^I have read this/);
    await type(page, /^You measured/, 'soon');
    await page.keyboard.press('Enter');
    await atHand.getByText(/soon/).first().waitFor();
    expect(await atHand.getByLabel(/You measured/).getAttribute('aria-invalid')).toBe('true');
    const before = await answeredCount(page);
    await atHand.getByLabel(/You measured/).focus();
    await page.keyboard.press('Control+A');
    await page.keyboard.type('48 s');
    await page.keyboard.press('Enter');
    await settled(page, before);
    expect(await page.locator('section[aria-labelledby=answered]').textContent()).toContain('48 s');
  });

  it('tells every cause and station by name and value to a screen reader', async () => {
    const more = page.locator('section[aria-labelledby=causes] > details > summary');
    await tabTo(page, new RegExp(((await more.textContent()) ?? '').slice(0, 10)));
    await page.keyboard.press('Enter');
    const tree = await accessibilityTree(page);
    const meters = new Map(tree.filter(({ role }) => role === 'meter').map(({ name, value }) => [name, value]));
    for (const { name } of defaultRulebook.causes) expect([name, meters.get(name)]).toEqual([name, expect.stringMatching(/^\d+$/)]);
    const buttons = tree.filter(({ role }) => role === 'button' || role === 'ToggleButton').map(({ name }) => name);
    for (const { name } of STATIONS) expect(buttons).toContainEqual(expect.stringMatching(new RegExp(`^${name}.*%.*open`)));
  });

  it('opens the reasons of the leading cause', async () => {
    const leader = page.locator('section[aria-labelledby=causes] > ol > li').first();
    const name = (await leader.locator('summary .font-bold').last().textContent()) ?? '';
    await tabTo(page, new RegExp(name.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')));
    await page.keyboard.press('Enter');
    await leader.getByText(/Without this/).first().waitFor();
    await expectNoAxeViolations(page);
  });

  it('undoes the last answer', async () => {
    const before = await answeredCount(page);
    await press(page, /^Undo the last answer$/);
    await settled(page, before);
    expect(await answeredCount(page)).toBe(before - 1);
  });

  it('calls the cause and takes the call back', async () => {
    await tabTo(page, /^Sure\s*I have seen it/);
    // A radio group is one stop; arrows and Space choose in it.
    await page.keyboard.press('Space');
    await press(page, /^Call the cause$/);
    await page.getByRole('button', { name: 'Reopen the case' }).waitFor();
    await expectNoAxeViolations(page);
    await type(page, /^Why reopen it/, 'The line was never looked at.');
    await press(page, /^Reopen the case$/);
    await page.getByRole('button', { name: 'Call the cause' }).waitFor();
  });

  it('shows the case as it was', async () => {
    await press(page, /^Slide back through this case$/);
    await page.getByRole('heading', { level: 1, name: /history/ }).waitFor();
    await tabTo(page, /^Moment/);
    await page.keyboard.press('Home');
    await page.getByText('Moved last by').waitFor({ state: 'detached' });
    await expectNoAxeViolations(page);
  });

  it('never complained in the console', () => {
    expect(complaints).toEqual([]);
  });
});
