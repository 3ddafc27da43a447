import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectNoAxeViolations } from './support/axe';
import { launchBrowser, PHONE } from './support/browser';
import { openCaseOn } from './support/case-desk';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

describe('oil that is caught and weighed over days, on a phone', () => {
  let server: TestServer;
  let browser: Browser;
  let page: Page;
  let caseId: string;
  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(), launchBrowser()]);
    page = await (await browser.newContext(PHONE)).newPage();
    await signIn(page, server.url, 'technician');
    caseId = await openCaseOn(page);
  });
  afterAll(() => Promise.all([browser?.close(), server?.stop()]));

  const save = () => page.getByRole('button', { name: 'Save the weighing' }).click();

  it('begins behind its cautions, and loses nothing when something is refused', async () => {
    await page.goto(`${server.url}/cases/${caseId}/catch`);
    await page.getByText('The form opens when the cautions above are read.').waitFor();
    await expectNoAxeViolations(page);
    await page.getByRole('button', { name: /I have read this/ }).click();
    await page.getByLabel('Hour meter now').fill('a lot');
    await page.getByLabel('Where the bottle hangs').fill('left of the purge');
    await page.getByRole('button', { name: 'The bottle hangs: begin' }).click();
    await page.getByText('Not begun yet').waitFor();
    await expectNoAxeViolations(page);
    expect(await page.getByLabel('Where the bottle hangs').inputValue()).toBe('left of the purge');
    await page.getByLabel('Hour meter now').fill('4,100');
    await page.getByRole('button', { name: 'The bottle hangs: begin' }).click();
    await page.getByText(/The next reminder goes out on/).waitFor();
  });

  it('answers the check by all weighings together, which lead back to the sum behind it', async () => {
    await page.getByLabel('Oil in the bottle').fill('17.4 g');
    await page.getByLabel('Hour meter now').fill('4,120');
    await save();
    await page.getByText(/from 1 weighing over/).waitFor();
    await page.getByLabel('Oil in the bottle').fill('8.7 g');
    await page.getByLabel('Hour meter now').fill('4,130');
    await save();
    await page.getByText(/from 2 weighings over/).waitFor();
    await expectNoAxeViolations(page);
    await page.goto(`${server.url}/cases/${caseId}`);
    await page.getByText('Oil is being caught').waitFor();
    await page.getByText(/Oil caught per hour: 1\s*mL\/h/).first().waitFor();
    await page.getByRole('link', { name: /The sum behind Oil caught per hour/ }).first().click();
    await page.getByRole('heading', { name: 'Oil carry-over, caught and weighed', level: 1 }).waitFor();
    expect(await page.getByLabel('Oil weighed, all readings together', { exact: true }).inputValue()).toMatch(/^26\.1/);
    await page.getByRole('link', { name: 'Oil carry-over, caught in a cup' }).waitFor();
  });

  it('takes the last weighing back and the bottle down, and says on the case that it is', async () => {
    await page.goto(`${server.url}/cases/${caseId}/catch`);
    await page.getByText('Take the last weighing back').first().click();
    await page.getByLabel('What is wrong with it').fill('The bottle was on the scale');
    await page.getByRole('button', { name: 'Take it back' }).click();
    await page.getByText(/from 1 weighing over/).waitFor();
    await page.getByText('Take the bottle down').first().click();
    await page.getByRole('button', { name: 'The bottle is down' }).click();
    await page.getByRole('heading', { name: 'Oil caught per hour, done' }).waitFor();
    await page.goto(`${server.url}/cases/${caseId}`);
    await page.getByRole('heading', { name: 'Answered so far' }).waitFor();
    expect(await page.getByText('Oil is being caught').count()).toBe(0);
  });
});
