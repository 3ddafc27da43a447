import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectNoAxeViolations } from './support/axe';
import { launchBrowser, PHONE } from './support/browser';
import { openCaseOn } from './support/case-desk';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

describe('the repair plan, on a phone', () => {
  let server: TestServer;
  let browser: Browser;
  let page: Page;
  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(), launchBrowser()]);
    page = await (await browser.newContext({ ...PHONE, colorScheme: 'dark' })).newPage();
    await signIn(page, server.url, 'technician');
    await page.goto(`${server.url}/cases/${await openCaseOn(page)}/repair`);
  });
  afterAll(() => Promise.all([browser?.close(), server?.stop()]));

  const atHand = () => page.locator('section[aria-labelledby=at-hand]');

  it('begins with a reason in words, and shows no step before its cautions are read', async () => {
    await page.getByText(/^Do this first: .* likely, \d+ min to look\./).waitFor();
    await expectNoAxeViolations(page);
    await page.getByText(/^Choose it/).first().click();
    await page.getByRole('button', { name: 'Choose this repair' }).first().click();
    await atHand().waitFor();
    expect(await atHand().getByRole('button', { name: /^Done/ }).count()).toBe(0);
    await atHand().getByRole('button', { name: /I have read this/ }).click();
    await atHand().getByRole('button', { name: /^Done ?: step 1$/ }).waitFor();
    await expectNoAxeViolations(page);
  });

  it('keeps what was said of each step, with the value that was entered, and loses nothing typed at another', async () => {
    await atHand().locator('summary', { hasText: 'Value or note' }).nth(0).click();
    await atHand().locator('summary', { hasText: 'Value or note' }).nth(1).click();
    await atHand().getByRole('textbox', { name: /^Value/ }).nth(0).fill('30 lb ft');
    await atHand().getByRole('textbox', { name: /^Note/ }).nth(1).fill('half typed');
    await atHand().getByRole('button', { name: /^Done ?: step 1$/ }).click();
    await atHand().getByText('30 lb ft').waitFor();
    await page.getByText(/^1 of \d+ steps settled/).waitFor();
    // Step 1 is folded again, so that the note in sight is the other one.
    expect(await atHand().getByRole('textbox', { name: /^Note/ }).first().inputValue()).toBe('half typed');
  });

  it('says which steps are not done before it can be finished, and asks why something else goes first', async () => {
    await atHand().getByRole('button', { name: 'The repair is done' }).click();
    await page.getByText(/Not finished yet: steps 2, 3/).first().waitFor();
    const second = page.locator('section[aria-labelledby=order] > ol > li').nth(1);
    await second.getByText(/^Choose it/).click();
    await second.getByRole('button', { name: 'Choose this repair' }).click();
    await second.getByText(/The plan has another first/).first().waitFor();
    await expectNoAxeViolations(page);
  });
});
