import type { Browser, BrowserContext, Page } from 'playwright-core';
import { setTimeout as sleep } from 'node:timers/promises';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { selectFindings } from '@/db/queries/finding';
import { seededRandom } from '@/tests/support/random';
import { makeTenant, type Tenant } from '@/tests/support/tenant';
import { launchBrowser, PHONE } from './support/browser';
import { COMPLAINT_CHECKS, showComplaints, tapComplaint, untilKept, untilSent, type Tap } from './support/case-desk';
import { startKillable, type Killable } from './support/killable';
import { signInAs } from './support/sign-in';

const MOMENTS = 60;
const PASSWORD = 'a password for these tests';
type Victim = 'server' | 'database' | 'worker' | 'connection' | 'tab';
const VICTIMS: readonly Victim[] = ['server', 'database', 'worker', 'connection', 'tab'];

describe('an answer between tap and save', () => {
  let carryover: Killable;
  let browser: Browser;
  let context: BrowserContext;
  let page: Page;
  let tenant: Tenant;
  const caseId = newId();
  /** Ids of findings that the page showed as saved or kept, ever. */
  const shown = new Set<string>();
  const taps: Tap[] = [];

  beforeAll(async () => {
    [carryover, browser] = await Promise.all([startKillable(), launchBrowser()]);
    tenant = await makeTenant(carryover.databases, { rulebook: defaultRulebook, email: 'bay@killable.test', password: PASSWORD });
    await openCase({
      ctx: tenant.ctx,
      input: { id: caseId, unit: { kind: 'new', id: newId(), fleetNumber: 'KILL-1', siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] },
    });
    context = await browser.newContext(PHONE);
    // What is shown as kept is noted the instant it is in the page, whatever happens to the page next.
    await context.exposeBinding('noteShown', (_source, id: string) => void shown.add(id));
    await context.addInitScript(() => {
      const note = (window as unknown as { noteShown(id: string): void }).noteShown;
      new MutationObserver(() => document.querySelectorAll<HTMLElement>('[data-finding]').forEach(({ dataset }) => note(dataset.finding ?? ''))).observe(document, { childList: true, subtree: true, attributes: true });
    });
    page = await context.newPage();
    await signInAs(page, carryover.url, { email: 'bay@killable.test', password: PASSWORD });
    await open();
    // Until the device has what it takes to do without a server: the page itself as well.
    await untilKept(page, caseId);
  }, 240_000);
  afterAll(() => Promise.all([browser?.close(), carryover?.stop()]));

  async function open() {
    await page.goto(`${carryover.url}/cases/${caseId}`);
    await showComplaints(page);
  }

  /** An answer that isn't given now, so that the tap says something. */
  async function tapSomething(random: ReturnType<typeof seededRandom>) {
    const check = random.pick(COMPLAINT_CHECKS);
    const last = taps.findLast(({ checkId }) => checkId === check.id);
    // The complaint that the case was opened with is answered already.
    const held = last?.state ?? (check.id === 'complaint-oil' ? 'yes' : undefined);
    const tap = { checkId: check.id, state: random.pick(check.states.filter(({ id }) => id !== held)).id };
    taps.push(tap);
    await tapComplaint(page, tap);
  }

  async function strike(victim: Victim) {
    if (victim === 'server') await carryover.killWeb();
    if (victim === 'database') await carryover.killDatabase();
    if (victim === 'worker') await carryover.killWorker();
    if (victim === 'connection') {
      carryover.webWire.cut();
      await sleep(1_500);
      carryover.webWire.mend();
    }
    if (victim === 'tab') {
      await page.close({ runBeforeUnload: false });
      page = await context.newPage();
      await open();
    }
  }

  const stored = async () => (await tenant.asOwner((tx) => selectFindings(tx, { organisationId: tenant.organisationId, caseId }))).filter(({ askedBecause }) => askedBecause === 'panel');

  it(`survives ${MOMENTS} moments at which something is killed: nothing shown is lost, nothing is there twice, the order is kept`, async () => {
    const random = seededRandom(60);
    const victims = random.shuffle(Array.from({ length: MOMENTS }, (_, i) => VICTIMS[i % VICTIMS.length] as Victim));
    for (const victim of victims) {
      await tapSomething(random);
      await sleep(random.below(400));
      await strike(victim);
      await untilSent(page);
      await showComplaints(page);
    }

    const rows = await stored();
    const ids = rows.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    // Nothing that was shown is missing. (What the record and the opening said is shown too, and is not of the panel.)
    const all = new Set((await tenant.asOwner((tx) => selectFindings(tx, { organisationId: tenant.organisationId, caseId }))).map(({ id }) => id));
    expect([...shown].filter((id) => !all.has(id))).toEqual([]);

    // Each row is a tap, in the order of the taps, none twice; a tap whose tab was killed before the device had it, and
    // so before it was shown, is the only kind that may be missing.
    const inOrder = [...rows].sort((a, b) => a.correctedAt.getTime() - b.correctedAt.getTime());
    let next = 0;
    for (const row of inOrder) {
      const at = taps.findIndex((tap, i) => i >= next && tap.checkId === row.checkId && tap.state === row.shares[0]?.state);
      expect(at, `${row.checkId} ${row.shares[0]?.state} after tap ${next}`).toBeGreaterThanOrEqual(0);
      next = at + 1;
    }
    const tabsKilled = victims.filter((victim) => victim === 'tab').length;
    expect(taps.length - rows.length).toBeLessThanOrEqual(tabsKilled);
    console.log(`${taps.length} taps, ${rows.length} kept, ${shown.size} shown`);
  }, 1_200_000);
});
