import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { COMPLAINT_CHECKS, openCaseOn, pressedComplaint, showComplaints, stateOnServer, tapComplaint, untilKept, untilSent } from './support/case-desk';
import { DESKTOP, launchBrowser, PHONE } from './support/browser';
import { startRelay, type Relay } from './support/relay';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

const TEN_MINUTES_MS = 600_000;
/** As the order has it: each sees the other's answers within this time. */
const SEEN_WITHIN_MS = 3_000;

describe('two people on one case, one of them with a clock ten minutes fast', () => {
  let server: TestServer;
  let browser: Browser;
  let wire: Relay;
  let right: Page;
  let fast: Page;
  let caseId: string;
  const check = COMPLAINT_CHECKS[1];
  const checkId = check?.id ?? '';
  const yes = { checkId, state: 'yes' };
  const no = { checkId, state: 'no' };

  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(), launchBrowser()]);
    wire = await startRelay(Number(new URL(server.url).port));
    right = await (await browser.newContext(PHONE)).newPage();
    const other = await browser.newContext(DESKTOP);
    await other.addInitScript((ahead) => {
      const Real = Date;
      class Shifted extends Real {
        constructor(...given: unknown[]) {
          if (given.length === 0) super(Real.now() + ahead);
          else super(...(given as [number]));
        }
        static override now() {
          return Real.now() + ahead;
        }
      }
      window.Date = Shifted as DateConstructor;
    }, TEN_MINUTES_MS);
    fast = await other.newPage();
    await signIn(right, `http://127.0.0.1:${wire.port}`, 'technician');
    await signIn(fast, server.url, 'engineer');
    caseId = await openCaseOn(right);
    await right.goto(`http://127.0.0.1:${wire.port}/cases/${caseId}`);
    await fast.goto(`${server.url}/cases/${caseId}`);
    await showComplaints(right);
    await showComplaints(fast);
    // The clock is learnt from what the server answers.
    await untilKept(right, caseId);
    await untilKept(fast, caseId);
  });
  afterAll(async () => {
    await browser?.close();
    await wire?.close();
    await server?.stop();
  });

  const answers = async () => (await stateOnServer(fast, caseId)).findings.filter((finding) => finding.checkId === checkId && finding.source !== 'record').map(({ answer, current, late }) => ({ answer, current, late }));

  it('each sees the other’s answer within three seconds', async () => {
    await tapComplaint(right, yes);
    await pressedComplaint(fast, yes).waitFor({ timeout: SEEN_WITHIN_MS });
    await tapComplaint(fast, no);
    await pressedComplaint(right, no).waitFor({ timeout: SEEN_WITHIN_MS });
  });

  it('the later answer stands, whatever its device’s clock says, and both are in the history', async () => {
    await tapComplaint(fast, yes);
    await pressedComplaint(right, yes).waitFor();
    await right.waitForTimeout(1_500);
    await tapComplaint(right, no);
    await untilSent(right);
    await pressedComplaint(fast, no).waitFor({ timeout: SEEN_WITHIN_MS });
    const given = await answers();
    expect(given.filter(({ current }) => current)).toEqual([{ answer: 'No', current: true, late: false }]);
    expect(given.length).toBeGreaterThanOrEqual(4);
    await right.getByText(/earlier answers?$/).click();
    await right.locator('s', { hasText: 'Yes' }).first().waitFor();
  });

  it('an answer from a device that was cut off comes late under a newer one: kept, not current, and says so', async () => {
    wire.cut();
    await tapComplaint(right, yes);
    await pressedComplaint(right, yes).waitFor();
    await fast.waitForTimeout(1_500);
    // "No" stands already for the other: changed to and fro, so that the newest is "no".
    await tapComplaint(fast, yes);
    await untilSent(fast);
    await tapComplaint(fast, no);
    await untilSent(fast);
    wire.mend();
    await untilSent(right);
    await pressedComplaint(right, no).waitFor();
    const given = await answers();
    expect(given.filter(({ current }) => current)).toEqual([{ answer: 'No', current: true, late: false }]);
    expect(given.filter(({ late }) => late)).toEqual([{ answer: 'Yes', current: false, late: true }]);
    await fast.getByText(/came late, under a newer answer/).waitFor({ state: 'attached', timeout: SEEN_WITHIN_MS });
  });
});
