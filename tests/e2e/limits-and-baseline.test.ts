import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectNoAxeViolations } from './support/axe';
import { DESKTOP, launchBrowser, PHONE } from './support/browser';
import { openCaseOn } from './support/case-desk';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

describe('what a unit is held to', () => {
  let server: TestServer;
  let browser: Browser;
  let technician: Page;
  let engineer: Page;
  let caseId: string;
  let unitPath: string;
  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(), launchBrowser()]);
    technician = await (await browser.newContext({ ...PHONE, colorScheme: 'dark' })).newPage();
    engineer = await (await browser.newContext(DESKTOP)).newPage();
    await signIn(technician, server.url, 'technician');
    await signIn(engineer, server.url, 'engineer');
    caseId = await openCaseOn(technician);
    const unitId = await technician.evaluate(async (id) => ((await (await fetch(`/api/v1/cases/${id}/record`)).json()) as { head: { unit: { id: string } } }).head.unit.id, caseId);
    unitPath = `${server.url}/units/${unitId}`;
  });
  afterAll(() => Promise.all([browser?.close(), server?.stop()]));

  it('is a limit that an engineer adopts from a published figure with its source, and withdraws with a reason', async () => {
    await engineer.goto(`${server.url}/settings/limits`);
    await engineer.getByRole('link', { name: 'Adopt a limit for Governor cut-out' }).click();
    await engineer.getByRole('link', { name: /120 psi to 140 psi/ }).click();
    await engineer.waitForURL(/from=us-cut-out/);
    // A page that is led to gets its title a moment after its content.
    await engineer.waitForFunction(() => document.title.startsWith('Adopt a limit'));
    await expectNoAxeViolations(engineer);
    await engineer.getByRole('button', { name: 'Adopt the limit' }).click();
    const adopted = engineer.getByRole('link', { name: '120 psi to 140 psi' });
    await adopted.waitFor();
    await engineer.waitForFunction(() => document.title.startsWith('Limits'));
    await expectNoAxeViolations(engineer);
    await adopted.click();
    await engineer.getByText('Withdraw this limit').first().click();
    await engineer.getByLabel('Why').fill('Our governors are set lower');
    await engineer.getByRole('button', { name: 'Withdraw this limit' }).click();
    await engineer.waitForURL(/\/settings\/limits$/);
    await engineer.getByRole('heading', { name: 'Limits', level: 1 }).waitFor();
    expect(await adopted.count()).toBe(0);
  });

  it('is its own healthy baseline, measured in one go on a phone, with nothing lost when something is refused', async () => {
    await technician.goto(`${unitPath}/baseline`);
    await expectNoAxeViolations(technician);
    const fields = technician.getByLabel(/^You measured/);
    await fields.nth(0).fill('24');
    await fields.nth(2).fill('soon');
    await technician.getByText('2 of 5 measured').waitFor();
    await technician.getByRole('button', { name: 'Save the set' }).click();
    await technician.locator('[aria-invalid=true]').first().waitFor();
    expect(await fields.nth(0).inputValue()).toBe('24');
    await fields.nth(2).fill('1.2 psi/min');
    await technician.getByRole('button', { name: 'Save the set' }).click();
    await technician.waitForURL(unitPath);
    await technician.getByRole('heading', { name: 'Healthy baseline' }).waitFor();
    await technician.goto(`${server.url}/cases/${caseId}`);
    await technician.getByRole('button', { name: /^Tanks and system, \d+% suspicion/ }).click();
    await technician.locator('section[aria-labelledby=station-checks]').getByRole('button', { name: /^Leak-down, brakes released/ }).click();
    await technician.getByRole('button', { name: /I have read this/ }).click();
    await technician.getByText(/Usual for this unit: 1\.2\s*psi\/min/).waitFor();
  });

  it('forbids the release when a value is out of its limit, says which, and is lifted on a value within it', async () => {
    // The demo adopted "less than 2 psi/min" of the driver's manual.
    await technician.getByText(/Limit your organisation adopted: less than 2\s*psi\/min/).waitFor();
    await technician.getByLabel(/You measured/).fill('4');
    await technician.getByRole('button', { name: /^Save/ }).first().click();
    await technician.getByRole('heading', { name: 'Do not release' }).waitFor();
    await technician.getByText(/Out of the limit your organisation adopted, less than 2\s*psi\/min/).first().waitFor();
    await technician.getByText(/above this unit’s own 1\.2\s*psi\/min/).first().waitFor();
    await technician.getByRole('button', { name: /^Change ?: Leak-down, brakes released/ }).first().click();
    await technician.getByLabel(/You measured/).fill('1');
    await technician.getByRole('button', { name: /^Save/ }).first().click();
    await technician.getByText(/passed since\. Somebody with the right to release lifts the flag/).waitFor();
    await technician.goto(unitPath);
    await technician.getByText('lifted by somebody with the right to release').waitFor();

    await engineer.goto(unitPath);
    await engineer.getByText('Lift it').click();
    const found = engineer.getByLabel('Measured or seen now');
    await found.fill('3 psi/min');
    await engineer.getByRole('button', { name: /^Lift “do not release”/ }).click();
    await engineer.getByText(/3 psi\/min is out of the limit your organisation adopted/).first().waitFor();
    await expectNoAxeViolations(engineer);
    await found.fill('1 psi/min');
    await engineer.getByRole('button', { name: /^Lift “do not release”/ }).click();
    await engineer.getByRole('heading', { name: '“Do not release” lifted' }).waitFor();
    expect(await engineer.getByRole('heading', { name: 'Do not release', exact: true }).count()).toBe(0);
    await technician.goto(`${server.url}/cases/${caseId}`);
    await technician.getByRole('heading', { level: 1 }).waitFor();
  });
});
