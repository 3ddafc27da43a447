import type { Page } from 'playwright-core';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import type { CaseState } from '@/lib/schemas/case-view';

/** Yes or no, without cautions: one tap each, as often as one likes. */
const COMPLAINTS = defaultRulebook.panels.find(({ id }) => id === 'complaints');
export const COMPLAINT_CHECKS = (COMPLAINTS?.checks ?? []).flatMap((id) => defaultRulebook.checks.find((check) => check.id === id) ?? []);

export interface Tap {
  checkId: string;
  state: string;
}

/** Brings the panel of complaints to hand, as somebody does who knows what he wants. */
export async function showComplaints(page: Page): Promise<void> {
  const prompt = COMPLAINTS?.prompt ?? '';
  if ((await page.locator('#check-at-hand').textContent({ timeout: 10_000 }).catch(() => '')) === prompt) return;
  await page.getByRole('button', { name: /^Vehicle and history/ }).first().click();
  await page.locator('section[aria-labelledby=station-checks]').getByRole('button', { name: new RegExp(`^${COMPLAINTS?.title}`) }).click();
  await page.getByRole('heading', { name: prompt }).waitFor();
}

/** Taps an answer on the panel once it can be tapped. */
export async function tapComplaint(page: Page, { checkId, state }: Tap): Promise<void> {
  const check = COMPLAINT_CHECKS.find(({ id }) => id === checkId);
  const button = page
    .getByRole('group', { name: check?.name ?? '', exact: true })
    .getByRole('button', { name: check?.states.find(({ id }) => id === state)?.label ?? '', exact: true });
  await button.and(page.locator(':not([aria-disabled=true]):not([aria-pressed=true])')).waitFor({ timeout: 30_000 });
  await button.click({ noWaitAfter: true });
}

export const pressedComplaint = (page: Page, { checkId, state }: Tap) => {
  const check = COMPLAINT_CHECKS.find(({ id }) => id === checkId);
  return page
    .getByRole('group', { name: check?.name ?? '', exact: true })
    .getByRole('button', { name: check?.states.find(({ id }) => id === state)?.label ?? '', exact: true, pressed: true });
};

/** How many entries are on the device and not on the server. */
export const unsentOn = (page: Page): Promise<number> =>
  page.evaluate(
    () =>
      new Promise<number>((resolve, reject) => {
        const request = indexedDB.open('carryover');
        request.onerror = () => reject(request.error);
        request.onsuccess = () => {
          const all = request.result.transaction('waiting').objectStore('waiting').getAll();
          all.onsuccess = () => {
            request.result.close();
            resolve((all.result as { sentAt?: number }[]).filter(({ sentAt }) => sentAt === undefined).length);
          };
        };
      }),
  );

/** Until nothing waits on the device any more. */
export async function untilSent(page: Page, withinMs = 60_000): Promise<void> {
  for (const deadline = Date.now() + withinMs; Date.now() < deadline; await page.waitForTimeout(100)) if ((await unsentOn(page)) === 0) return;
  throw new Error(`${await unsentOn(page)} entries still wait on the device`);
}

/** Until a page is on the device. */
export async function untilCached(page: Page, path: string): Promise<void> {
  const isHere = () => page.evaluate(async (of) => (await caches.match(of)) !== undefined, path);
  for (const deadline = Date.now() + 60_000; Date.now() < deadline; await page.waitForTimeout(250)) if (await isHere()) return;
  throw new Error(`the device does not keep ${path}`);
}

/** Until the device has what it takes to go on alone, after a reload as well: pages, files, the case's kit, the edition. */
export async function untilKept(page: Page, caseId: string): Promise<void> {
  const isKept = () =>
    page.evaluate(
      (id) =>
        new Promise<boolean>((resolve) => {
          const request = indexedDB.open('carryover');
          request.onsuccess = () => {
            const held = request.result.transaction('device').objectStore('device').get('kept-cases');
            held.onsuccess = () => {
              request.result.close();
              resolve(((held.result as string[] | undefined) ?? []).includes(id));
            };
          };
        }),
      caseId,
    );
  for (const deadline = Date.now() + 60_000; Date.now() < deadline; await page.waitForTimeout(250)) if (await isKept()) return;
  throw new Error(`the device does not keep case ${caseId}`);
}

/** Opens a case on a unit of the person's organisation by the API that the page itself uses. @returns its id */
export async function openCaseOn(page: Page): Promise<string> {
  const id = newId();
  await page.evaluate(async ([caseId, unitId]) => {
    const { sites } = (await (await fetch('/api/v1/sites')).json()) as { sites: { id: string }[] };
    const unit = { kind: 'new', id: unitId, fleetNumber: `E2E-${unitId?.slice(-6)}`, siteId: sites[0]?.id, vehicleKind: 'truck' };
    const response = await fetch('/api/v1/cases', {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify({ id: caseId, unit, complaints: ['complaint-oil'] }),
    });
    if (!response.ok) throw new Error(await response.text());
  }, [id, newId()] as const);
  return id;
}

/** The case as the server has it. */
export const stateOnServer = (page: Page, caseId: string): Promise<CaseState> =>
  page.evaluate(async (id) => (await fetch(`/api/v1/cases/${id}`)).json() as Promise<CaseState>, caseId);

/** The ranking in the page, to the last digit: cause and p, the leader first. */
export const rankingOn = (page: Page): Promise<[string, number][]> =>
  page.evaluate(() => [...document.querySelectorAll<HTMLElement>('[data-cause]')].map(({ dataset }) => [dataset.cause ?? '', Number(dataset.p)]));

/**
 * Answers whatever is at hand by touch: the first answer, or that one can't tell. The question may change under the hand
 * when another ranking comes in; then what has come is answered.
 */
export async function answerAtHand(page: Page): Promise<void> {
  const atHand = page.locator('section[aria-labelledby=check-at-hand]');
  const heading = (await page.locator('#check-at-hand').textContent()) ?? '';
  const answered = () => page.waitForFunction((was) => document.getElementById('check-at-hand')?.textContent !== was, heading, { timeout: 20_000 });
  const tap = (button: ReturnType<Page['locator']>) => button.click({ timeout: 3_000 });
  for (let tries = 0; tries < 5; tries += 1) {
    if ((await page.locator('#check-at-hand').textContent()) !== heading) return;
    const read = atHand.getByRole('button', { name: /I have read this/ });
    const goOn = atHand.getByRole('button', { name: 'Go on to the next check' });
    const choices = atHand.getByRole('group', { name: /^Answers/ }).getByRole('button');
    try {
      if (await read.count()) await tap(read);
      else if (await goOn.count()) {
        await tap(atHand.getByRole('button', { name: 'No', exact: true, pressed: false }).first());
        await atHand.getByRole('button', { name: 'No', exact: true, pressed: true }).first().waitFor({ timeout: 10_000 });
        await tap(goOn);
        await answered();
        return;
      } else {
        await tap((await choices.count()) ? choices.first() : atHand.getByRole('button', { name: 'Can’t tell' }).first());
        await answered();
        return;
      }
    } catch (error) {
      if (tries === 4) throw error;
    }
  }
}
