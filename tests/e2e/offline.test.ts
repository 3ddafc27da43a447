import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { answerAtHand, openCaseOn, rankingOn, stateOnServer, unsentOn, untilCached, untilKept, untilSent } from './support/case-desk';
import { launchBrowser, PHONE } from './support/browser';
import { startRelay, type Relay } from './support/relay';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

describe('a case without a connection', () => {
  let server: TestServer;
  let wire: Relay;
  let browser: Browser;
  let context: BrowserContext;
  let page: Page;
  let url: string;
  let caseId: string;
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

  const strip = () => page.getByTestId('sync');

  it('goes on from the second answer, through a reload and a closed tab, and the server ranks it the same to 1e-12', async () => {
    caseId = await openCaseOn(page);
    await page.goto(`${url}/cases/${caseId}`);
    await answerAtHand(page);
    await untilSent(page);
    await untilKept(page, caseId);
    const { findings } = await stateOnServer(page, caseId);

    wire.cut();
    for (let i = 0; i < 4; i += 1) await answerAtHand(page);
    await strip().getByText('No connection').waitFor();
    await strip().getByText(/provisional/).waitFor();
    const kept = await unsentOn(page);
    expect(kept).toBeGreaterThanOrEqual(4);
    const before = await rankingOn(page);

    await page.reload();
    await page.getByRole('heading', { level: 1, name: /^Case/ }).waitFor();
    await strip().getByText(/provisional/).waitFor();
    expect(await unsentOn(page)).toBe(kept);
    expect(await rankingOn(page)).toEqual(before);

    await page.close();
    page = await context.newPage();
    await page.goto(`${url}/cases/${caseId}`);
    await strip().getByText(/provisional/).waitFor();
    expect(await rankingOn(page)).toEqual(before);
    for (let i = 0; i < 6; i += 1) await answerAtHand(page);
    const provisional = await rankingOn(page);
    expect(provisional).not.toEqual(before);
    const count = await page.locator('[data-finding]').count();

    wire.mend();
    await untilSent(page);
    await strip().getByText('No connection').waitFor({ state: 'detached' });
    const served = await stateOnServer(page, caseId);
    expect(served.findings.length).toBeGreaterThanOrEqual(findings.length + 10);
    expect(await page.locator('[data-finding]').count()).toBe(count);
    expect(await page.locator('[data-waits]').count()).toBe(0);
    expect(served.causes.map((cause) => cause.causeId)).toEqual(provisional.map(([causeId]) => causeId));
    served.causes.forEach(({ p }, i) => expect(Math.abs(p - (provisional[i]?.[1] ?? NaN))).toBeLessThan(1e-12));
    expect(await strip().getByText(/ranks otherwise/).count()).toBe(0);
  });

  it('keeps what waits when the session ends, and sends it after signing in again', async () => {
    const before = (await stateOnServer(page, caseId)).version;
    await context.clearCookies();
    await answerAtHand(page);
    await strip().getByText('You are signed out').waitFor();
    expect(await unsentOn(page)).toBeGreaterThanOrEqual(1);
    await strip().getByRole('link', { name: 'Sign in again' }).click();
    await page.waitForURL(/\/sign-in/);
    await signIn(page, url, 'technician');
    await untilSent(page);
    expect((await stateOnServer(page, caseId)).version).toBeGreaterThan(before);
  });

  it('says when the server ranks otherwise, because somebody else answered meanwhile', async () => {
    await page.goto(`${url}/cases/${caseId}`);
    await untilKept(page, caseId);
    wire.cut();
    await answerAtHand(page);
    await strip().getByText(/provisional/).waitFor();
    const other = await (await browser.newContext()).newPage();
    await signIn(other, server.url, 'engineer');
    await other.goto(`${server.url}/cases/${caseId}`);
    const suggested = other.locator('section[aria-labelledby=next-checks] button').nth(2);
    await suggested.click();
    await answerAtHand(other);
    await untilSent(other);
    await other.context().close();
    wire.mend();
    await untilSent(page);
    await strip().getByText(/ranks otherwise/).waitFor();
  });

  it('opens the kept list of cases too, and says so of a page that is not kept', async () => {
    await page.goto(`${url}/cases`);
    await untilCached(page, '/cases');
    wire.cut();
    await page.goto(`${url}/cases`);
    await page.getByRole('heading', { level: 1, name: 'Cases' }).waitFor();
    await page.goto(`${url}/cases/00000000-0000-7000-8000-000000000000`);
    await page.getByRole('heading', { name: 'No connection' }).waitFor();
    wire.mend();
  });

  it('leaves nothing on the device after signing out, and asks first when something waits', async () => {
    await page.goto(`${url}/cases/${caseId}`);
    await untilKept(page, caseId);
    wire.cut();
    await answerAtHand(page);
    await page.locator('header details summary').last().click();
    await page.getByRole('button', { name: 'Sign out', exact: true }).click();
    await page.getByText(/on this device only/).waitFor();
    wire.mend();
    await untilSent(page);
    await page.getByRole('button', { name: /^Sign out/ }).click();
    await page.waitForURL(`${url}/`);
    const left = await page.evaluate(async () => {
      const request = indexedDB.open('carryover');
      const db = await new Promise<IDBDatabase>((resolve) => (request.onsuccess = () => resolve(request.result)));
      const counts = await Promise.all(
        [...db.objectStoreNames].map((name) => new Promise<number>((resolve) => {
          const count = db.transaction(name).objectStore(name).count();
          count.onsuccess = () => resolve(count.result);
        })),
      );
      return { rows: counts.reduce((sum, count) => sum + count, 0), caches: (await caches.keys()).filter((name) => name !== 'carryover-static') };
    });
    expect(left).toEqual({ rows: 0, caches: [] });
  });
});
