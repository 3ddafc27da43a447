import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectNoAxeViolations } from './support/axe';
import { DESKTOP, launchBrowser, PHONE } from './support/browser';
import { openCaseOn, stateOnServer, untilCached, untilSent } from './support/case-desk';
import { startRelay, type Relay } from './support/relay';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

const seconds = (face: string | null) => {
  const [minutes = '0', rest = '0'] = (face ?? '').split(':');
  return Number(minutes) * 60 + Number(rest);
};

describe('the bench', () => {
  let server: TestServer;
  let wire: Relay;
  let browser: Browser;
  let context: BrowserContext;
  let page: Page;
  let url: string;
  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(), launchBrowser()]);
    wire = await startRelay(Number(new URL(server.url).port));
    url = `http://127.0.0.1:${wire.port}`;
    context = await browser.newContext(PHONE);
    page = await context.newPage();
    await signIn(page, url, 'technician');
  });
  afterAll(async () => {
    await browser?.close();
    await wire?.close();
    await server?.stop();
  });

  const result = (of = page) => of.getByTestId('result');
  const hydrated = (of = page) => of.waitForFunction(() => Object.keys(document.querySelector('[data-testid=stopwatch] button, form input') ?? {}).some((key) => key.startsWith('__react')));
  const face = async (of = page) => seconds(await of.getByRole('timer').textContent());

  it('answers as one types, says what is wrong beside the field, and keeps all of it in its address', async () => {
    await page.goto(`${url}/bench/time-loaded`);
    await hydrated();
    await page.locator('#loaded').fill('1:30');
    await page.locator('#unloaded').fill('10:30');
    // Bureau of Energy Efficiency's worked example: 1.5 min loaded, 10.5 min unloaded, 12.5 %.
    await expect.poll(() => result().textContent()).toBe('12.5 %');
    await page.locator('#loaded').fill('soon');
    await page.getByText(/soon/).first().waitFor();
    expect(await page.locator('#loaded').getAttribute('aria-invalid')).toBe('true');
    await page.locator('#loaded').fill('90');
    await page.waitForURL(/loaded=90\+s/);
    const other = await (await browser.newContext({ storageState: await context.storageState() })).newPage();
    await other.goto(page.url());
    expect(await result(other).textContent()).toBe('12.5 %');
    await other.context().close();
  });

  it('takes a reading from the large keys at its foot, which stay where they are from field to field', async () => {
    const phone = await (await browser.newContext({ ...PHONE, storageState: await context.storageState() })).newPage();
    await phone.goto(`${url}/bench/time-loaded`);
    await hydrated(phone);
    const keypad = phone.getByRole('group', { name: 'Keypad' });
    expect(await keypad.count()).toBe(0);
    await phone.locator('#loaded').tap();
    await phone.locator('#loaded').fill('');
    for (const key of ['9', '0', '1']) await keypad.getByRole('button', { name: key, exact: true }).tap();
    await phone.getByRole('button', { name: 'Delete the last character' }).tap();
    expect(await phone.locator('#loaded').inputValue()).toBe('90');
    const keys = await phone.locator('.keypad > button').evaluateAll((buttons) => buttons.map((button) => button.getBoundingClientRect()).map(({ width, height }) => Math.min(width, height)));
    expect(Math.min(...keys)).toBeGreaterThanOrEqual(56);
    const top = (await keypad.boundingBox())?.y;
    await phone.locator('#unloaded').tap();
    await phone.locator('#unloaded').fill('630');
    expect((await keypad.boundingBox())?.y).toBe(top);
    await expect.poll(() => result(phone).textContent()).toBe('12.5 %');
    await phone.getByRole('button', { name: 'Keypad', exact: true }).tap();
    expect(await keypad.count()).toBe(0);
    expect(await phone.locator('#unloaded').getAttribute('inputmode')).toBe('decimal');
    await phone.context().close();
  });

  it('draws what the shape tells, with the same in words and as a table', async () => {
    await page.goto(`${url}/bench/head-pressure?narrowedBore=6+mm`);
    await page.locator('canvas').waitFor();
    expect(await page.getByTestId('plot-summary').textContent()).toMatch(/^Pressure at the head: from .+ to .+/);
    await page.getByText('The same as a table').click();
    expect(await page.getByRole('row').count()).toBeGreaterThan(8);
    await expectNoAxeViolations(page);
  });

  it('finds the sudden fall in a survey of the line, and keeps the survey in its address', async () => {
    await page.goto(`${url}/bench/line-survey?${new URLSearchParams({ distance1: '0 ft', temperature1: '390 °F', distance2: '2 ft', temperature2: '375 °F', distance3: '4 ft', temperature3: '270 °F', distance4: '8 ft' })}`);
    await hydrated();
    await page.locator('#temperature4').fill('240');
    await expect.poll(() => result().textContent()).toBe('A sudden fall');
    await page.waitForURL(/temperature4=240/);
    await page.locator('canvas').waitFor();
    expect(await page.getByTestId('plot-summary').textContent()).toBe('Temperature of the line: from 390 °F at 0 ft to 240 °F at 8 ft, read at 4 points.');
    await page.getByText('The same as a table').click();
    await expectNoAxeViolations(page);
  });

  it('keeps the clock’s time through a hidden page, slowed timers and a reload', async () => {
    await page.goto(`${url}/bench/leak-down`);
    await hydrated();
    await page.getByRole('button', { name: 'Start', exact: true }).click();
    const startedAt = Date.now();
    const session = await context.newCDPSession(page);
    // A page in the background: hidden, and its timers stopped.
    const front = await context.newPage();
    await front.goto(`${url}/bench`);
    await session.send('Emulation.setScriptExecutionDisabled', { value: true });
    await front.waitForTimeout(3_000);
    await session.send('Emulation.setScriptExecutionDisabled', { value: false });
    await front.close();
    await page.bringToFront();
    await expect.poll(async () => Math.abs((await face()) - (Date.now() - startedAt) / 1000)).toBeLessThan(0.6);
    await page.reload();
    await hydrated();
    await expect.poll(async () => Math.abs((await face()) - (Date.now() - startedAt) / 1000)).toBeLessThan(0.6);
    await page.getByRole('button', { name: 'Stop, and read the gauge' }).click();
    const took = (Date.now() - startedAt) / 1000;
    const held = await face();
    expect(Math.abs(held - took)).toBeLessThan(0.6);
    await page.waitForTimeout(700);
    expect(await face()).toBe(held);
    expect(Math.abs(Number.parseFloat(await page.locator('#time').inputValue()) - held)).toBeLessThan(0.11);
  });

  it('writes a sum into a case, leads back to it, and lets a later one take its place', async () => {
    const caseId = await openCaseOn(page);
    await page.goto(`${url}/cases/${caseId}`);
    await page.getByRole('button', { name: /^Cylinder and head/ }).first().click();
    await page.locator('section[aria-labelledby=station-checks]').getByRole('button', { name: /^Build-up/ }).click();
    await page.getByRole('button', { name: /I have read this/ }).click();
    await page.getByRole('link', { name: 'Work it out on the bench' }).click();
    await page.waitForURL(/\/bench\/measured-build-up/);
    await hydrated();
    await page.locator('#time').fill('48');
    await page.locator('#actualVolume').fill('7200 in3');
    await page.locator('#requiredVolume').fill('5568 in3');
    const write = page.getByRole('button', { name: 'Write it into the case' });
    await expect.poll(() => result().textContent()).toBe('37.1 s');
    await write.click();
    await page.waitForURL(`${url}/cases/${caseId}`);
    await untilSent(page);
    const [kept] = (await stateOnServer(page, caseId)).findings.filter(({ checkId }) => checkId === 'build-up-time');
    expect(kept).toMatchObject({ source: 'sum', current: true, sum: { id: 'measured-build-up', search: { time: '48 s', actualVolume: '7200 in³' } } });

    await page.locator(`[data-finding="${kept?.id}"]`).getByRole('link', { name: /^The sum/ }).click();
    await page.waitForURL(/\/bench\/measured-build-up/);
    await hydrated();
    expect(await result().textContent()).toBe('37.1 s');
    await page.getByText(/It replaces 37\.1/).waitFor();
    await page.locator('#time').fill('24');
    await expect.poll(() => result().textContent()).toBe('18.6 s');
    await write.click();
    await page.waitForURL(`${url}/cases/${caseId}`);
    await untilSent(page);
    const findings = (await stateOnServer(page, caseId)).findings.filter(({ checkId }) => checkId === 'build-up-time');
    expect(findings.map(({ answer, current }) => [answer.split(' ')[0], current])).toEqual([['18.6', true], ['37.1', false]]);
  });

  it('works without a connection, for readings that it was never opened with', async () => {
    await page.goto(`${url}/cases`);
    await untilCached(page, '/bench/carry-over-by-weight');
    await untilCached(page, '/bench/line-survey');
    wire.cut();
    await page.goto(`${url}/bench/time-loaded?loaded=2+min&unloaded=6+min`);
    await expect.poll(() => result().textContent()).toBe('25 %');
    await page.locator('#unloaded').fill('2:00');
    await expect.poll(() => result().textContent()).toBe('50 %');
    await page.goto(`${url}/bench/line-survey?distance2=1+ft&temperature2=300+%C2%B0F`);
    await expect.poll(() => page.locator('#temperature2').inputValue()).toBe('300');
    wire.mend();
  });

  it('fits a desktop too, and is worked by the keyboard alone', async () => {
    const desk = await (await browser.newContext({ ...DESKTOP, storageState: await context.storageState() })).newPage();
    await desk.goto(`${url}/bench`);
    await desk.getByRole('link', { name: /^Leak-down/ }).focus();
    await desk.keyboard.press('Enter');
    await desk.waitForURL(/leak-down/);
    await hydrated(desk);
    await desk.locator('#volume').focus();
    await desk.keyboard.press('ControlOrMeta+a');
    await desk.keyboard.type('4');
    await desk.waitForURL(/volume=4\+ft/);
    await expectNoAxeViolations(desk);
  });
});
