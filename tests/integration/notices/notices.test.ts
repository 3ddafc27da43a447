import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test, vi } from 'vitest';
import { asTenant } from '@/db/connect';
import { newId } from '@/lib/ids';
import { createMailer, type Mailer } from '@/lib/mail';
import { assignCase } from '@/lib/services/case/assign';
import type { Ctx } from '@/lib/services/context';
import { invite } from '@/lib/services/invitation/invite';
import { sendMail, type Post } from '@/lib/services/mail/send';
import { endMembership } from '@/lib/services/membership/end';
import { readNoticeChoices, setNotices } from '@/lib/services/notice/choices';
import { browseNotices, countUnread, listNotices } from '@/lib/services/notice/list';
import { mailDailyNotices } from '@/lib/services/notice/mail-daily';
import { readAllNotices, readNotice } from '@/lib/services/notice/mark-read';
import { notify } from '@/lib/services/notice/notify';
import { chooseRepair } from '@/lib/services/repair/choose';
import { readRepairPlan } from '@/lib/services/repair/read-plan';
import { planRepair } from '@/lib/services/repair/work';
import { noStorage } from '@/lib/storage/none';
import { makeWorkshop, openACase } from '@/tests/integration/cases/support';
import { PostOffice } from '@/tests/integration/mail/post-office';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import type { Tenant } from '@/tests/support/tenant';

vi.hoisted(() => {
  process.env.LOG_LEVEL = 'silent';
});

let databases: TestDatabases;
let workshop: Tenant;
let chief: Ctx;
let clerk: Ctx;
let office: PostOffice;
let mailer: Mailer;
let post: Post;

beforeAll(async () => {
  [databases, office] = await Promise.all([openTestDatabases(), new PostOffice().open()]);
  mailer = createMailer(office.url, 'Carryover <carryover@carryover.test>');
  post = { db: databases.app, mailer, now: () => new Date(), baseUrl: 'https://carryover.test', secret: 'a secret for tests alone', storage: noStorage };
  workshop = await makeWorkshop(databases, { roles: ['manager'] });
  chief = workshop.ctx;
  clerk = await workshop.addPerson({ roles: ['administrator'] });
}, 60_000);
afterAll(async () => {
  mailer.close();
  await Promise.all([office.close(), databases.close()]);
});

const toldTo = async (ctx: Ctx) => (await browseNotices({ ctx, input: {} })).notices;
const rowsOf = async <Row>(query: ReturnType<typeof sql>) => (await workshop.asOwner((tx) => tx.execute(query))).rows as Row[];
const mailsTo = (ctx: Ctx) => rowsOf<{ id: string; kind: string; subject: string; state: string }>(sql`select id, kind, subject, state from mail where to_address = ${ctx.person.email} order by id`);
const tell = (ctx: Ctx, more: Partial<Parameters<typeof notify>[2]> = {}) =>
  asTenant(databases.app, { organisationId: workshop.organisationId }, (tx) =>
    notify(tx, chief, { organisationId: workshop.organisationId, personId: ctx.person.id, kind: 'assigned', caseId: null, key: newId(), about: {}, ...more }),
  );

const send = (mailId: string, isLast = false) => sendMail(post, { organisationId: workshop.organisationId, mailId }, { isLast });
/** The server refuses its address. */
async function bounce(mailId: string): Promise<void> {
  office.manner = 'refuses the address';
  await expect(send(mailId, true)).rejects.toThrow();
  office.manner = 'takes';
}

const give = (ctx: Ctx, caseId: string, to: Ctx | null) => assignCase({ ctx, input: { caseId, personId: to?.person.id ?? null } });

describe('a case that is given to somebody', () => {
  test('is told to that person and to nobody else, in the app and at once by mail', async () => {
    const [mechanic, other] = [await workshop.addPerson(), await workshop.addPerson()];
    const caseId = await openACase(workshop);
    await give(chief, caseId, mechanic);
    expect(await toldTo(mechanic)).toMatchObject([{ kind: 'assigned', caseId, place: `/cases/${caseId}`, readAt: null, sentence: expect.stringMatching(new RegExp(`^${chief.person.name} gave you case \\d+, unit U-`)) }]);
    expect(await toldTo(other)).toEqual([]);
    expect(await toldTo(chief)).toEqual([]);
    const [mail] = await mailsTo(mechanic);
    expect(mail?.subject).toMatch(/^A case for you: case \d+, unit U-/);
    await send(mail?.id ?? '');
    const letters = office.takenBy(mechanic.person.email);
    expect(letters).toHaveLength(1);
    expect(letters[0]?.text).toContain(`https://carryover.test/cases/${caseId}`);
    expect(letters[0]?.text).toContain(`${chief.person.name} gave you case`);
  });

  test('is no news to whoever takes it, nor when he or she has it already', async () => {
    const mechanic = await workshop.addPerson();
    const caseId = await openACase(workshop);
    await give(mechanic, caseId, mechanic);
    expect(await toldTo(mechanic)).toEqual([]);
    await give(chief, caseId, mechanic);
    expect(await toldTo(mechanic)).toEqual([]);
    await give(chief, caseId, null);
    await give(chief, caseId, mechanic);
    expect(await toldTo(mechanic)).toHaveLength(1);
  });
});

test('a repair that is given to somebody is told once, and again when it comes back to the same', async () => {
  const [mechanic, other] = [await workshop.addPerson(), await workshop.addPerson()];
  const caseId = await openACase(workshop);
  const remedy = (await readRepairPlan({ ctx: chief, input: { caseId } })).remedies[0];
  const repairId = newId();
  const chosen = { id: repairId, caseId, remedyId: remedy?.remedyId ?? '', assignedTo: mechanic.person.id };
  await chooseRepair({ ctx: chief, input: chosen });
  await chooseRepair({ ctx: chief, input: chosen });
  await planRepair({ ctx: chief, input: { caseId, repairId, plannedOn: '2026-03-05', assignedTo: mechanic.person.id } });
  expect(await toldTo(mechanic)).toMatchObject([{ kind: 'repair-assigned', place: `/cases/${caseId}/repair`, sentence: expect.stringContaining(chief.person.name) }]);
  await planRepair({ ctx: chief, input: { caseId, repairId, plannedOn: null, assignedTo: other.person.id } });
  await planRepair({ ctx: chief, input: { caseId, repairId, plannedOn: null, assignedTo: mechanic.person.id } });
  expect([(await toldTo(other)).length, (await toldTo(mechanic)).length]).toEqual([1, 2]);
});

describe('telling', () => {
  test('goes by mail at once, with the day’s, or not, as the person has set', async () => {
    const mechanic = await workshop.addPerson();
    expect(await readNoticeChoices({ ctx: mechanic, input: {} })).toEqual({ assigned: 'at-once', 'repair-assigned': 'at-once', comeback: 'at-once', 'watch-due': 'daily', 'mail-bounced': 'at-once' });
    await tell(mechanic);
    expect(await mailsTo(mechanic)).toHaveLength(1);
    await setNotices({ ctx: mechanic, input: { assigned: 'never', comeback: 'daily' } });
    await tell(mechanic);
    await tell(mechanic, { kind: 'comeback' });
    expect(await mailsTo(mechanic)).toHaveLength(1);
    expect(await toldTo(mechanic)).toHaveLength(3);
    const asked = await rowsOf<{ at: Date }>(sql`select start_after as at from pgboss.job where name = 'mail-daily-notices' and data->>'personId' = ${mechanic.person.id}`);
    expect(asked).toHaveLength(1);
    expect(new Intl.DateTimeFormat('en-GB', { timeZone: 'America/Chicago', timeStyle: 'short' }).format(new Date(asked[0]?.at ?? 0))).toBe('06:00');
  });

  test('says the same thing once', async () => {
    const mechanic = await workshop.addPerson();
    for (let i = 0; i < 3; i++) await tell(mechanic, { key: 'the same' });
    expect([(await toldTo(mechanic)).length, (await mailsTo(mechanic)).length]).toEqual([1, 1]);
  });

  test('leaves out who left, and who may not see cases', async () => {
    const [gone, trainer] = [await workshop.addPerson(), await workshop.addPerson({ roles: ['trainer'] })];
    await endMembership({ ctx: clerk, input: { personId: gone.person.id } });
    await tell(gone);
    await tell(trainer, { caseId: await openACase(workshop) });
    expect([await toldTo(gone), await toldTo(trainer)]).toEqual([[], []]);
  });
});

test('the day’s mail tells all that waits in one, once, although it is asked for twice at the same time', async () => {
  const mechanic = await workshop.addPerson();
  for (let i = 0; i < 3; i++) await tell(mechanic, { kind: 'watch-due', about: { what: `reading ${i}` } });
  const [first] = await toldTo(mechanic);
  await readNotice({ ctx: mechanic, input: { noticeId: first?.id ?? '' } });
  const owner = { organisationId: workshop.organisationId, personId: mechanic.person.id };
  await Promise.all([1, 2, 3].map(() => mailDailyNotices(post, owner)));
  await mailDailyNotices(post, owner);
  const mails = await mailsTo(mechanic);
  expect(mails).toMatchObject([{ kind: 'daily-notices', subject: '2 notices since yesterday' }]);
  await send(mails[0]?.id ?? '');
  const [letter] = office.takenBy(mechanic.person.email);
  expect(letter?.text).toMatch(/reading 0[^]*reading 1/);
  expect(letter?.text).not.toContain('reading 2');
});

describe('a mail that was given up', () => {
  test('is told to whoever brought it about', async () => {
    const { invitationId } = await invite({ ctx: clerk, input: { email: `${crypto.randomUUID()}@people.test`, roles: ['technician'] } });
    const [mail] = await rowsOf<{ id: string }>(sql`select id from mail where entity_id = ${invitationId}`);
    await bounce(mail?.id ?? '');
    expect(await toldTo(clerk)).toMatchObject([{ kind: 'mail-bounced', place: null, sentence: expect.stringContaining('invites you to Carryover') }]);
    expect(await mailsTo(clerk)).toHaveLength(1);
  });

  test('is told in the app alone when it told notices itself', async () => {
    const mechanic = await workshop.addPerson();
    await tell(mechanic);
    const [mail] = await mailsTo(mechanic);
    await bounce(mail?.id ?? '');
    expect((await toldTo(mechanic)).map(({ kind }) => kind)).toEqual(['mail-bounced', 'assigned']);
    expect(await mailsTo(mechanic)).toMatchObject([{ state: 'given-up' }]);
  });
});

describe('reading', () => {
  test('is of one’s own notices alone, also among colleagues', async () => {
    const [mine, theirs] = [await workshop.addPerson(), await workshop.addPerson()];
    for (let i = 0; i < 3; i++) await tell(mine);
    const [one] = await toldTo(mine);
    const noticeId = one?.id ?? '';
    await expect(readNotice({ ctx: theirs, input: { noticeId } })).rejects.toMatchObject({ code: 'not-found' });
    await readAllNotices({ ctx: theirs, input: {} });
    expect(await countUnread({ ctx: mine, input: {} })).toBe(3);
    await readNotice({ ctx: mine, input: { noticeId } });
    await readNotice({ ctx: mine, input: { noticeId } });
    expect(await countUnread({ ctx: mine, input: {} })).toBe(2);
    expect((await browseNotices({ ctx: mine, input: { unread: 'yes' } })).notices).toHaveLength(2);
    expect(await readAllNotices({ ctx: mine, input: {} })).toEqual({ read: 2 });
    expect(await listNotices({ ctx: mine, input: {} })).toMatchObject({ unread: 0, total: 3 });
  });

  test('goes page by page as it goes all at once', async () => {
    const mechanic = await workshop.addPerson();
    for (let i = 0; i < 5; i++) await tell(mechanic);
    const seen: string[] = [];
    for (let cursor: string | undefined; ; ) {
      const { notices, next } = await browseNotices({ ctx: mechanic, input: { limit: 2, cursor } });
      seen.push(...notices.map(({ id }) => id));
      if (next === null) break;
      cursor = next;
    }
    expect(seen).toEqual((await toldTo(mechanic)).map(({ id }) => id));
  });
});
