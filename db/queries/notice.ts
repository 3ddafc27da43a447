import { and, asc, count, desc, eq, isNull, lt, or, sql, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { cases, membership, notice, noticePreference, person, site, unit } from '@/db/schema';
import type { NoticeChoices } from '@/lib/schemas/notice';

interface Owner {
  organisationId: string;
  personId: string;
}

const ofOwner = ({ organisationId, personId }: Owner) => and(eq(notice.organisationId, organisationId), eq(notice.personId, personId));

const columns = {
  id: notice.id,
  kind: notice.kind,
  caseId: notice.caseId,
  caseNumber: cases.number,
  fleetNumber: unit.fleetNumber,
  by: person.name,
  what: sql<string | null>`${notice.about} ->> 'what'`,
  createdAt: notice.createdAt,
  readAt: notice.readAt,
};

const selectTold = (db: Executor) =>
  db
    .select(columns)
    .from(notice)
    .leftJoin(cases, and(eq(cases.organisationId, notice.organisationId), eq(cases.id, notice.caseId)))
    .leftJoin(unit, and(eq(unit.organisationId, cases.organisationId), eq(unit.id, cases.unitId)))
    .leftJoin(person, sql`${person.id} = (${notice.about} ->> 'by')::uuid`);

export type NoticeRow = Awaited<ReturnType<typeof selectTold>>[number];

interface Part {
  isUnread?: boolean;
  after?: readonly [string, string];
  limit: number;
  offset?: number;
}

/** What one person was told, the newest first; nobody else sees it. */
export const selectNotices = (db: Executor, { isUnread, after, limit, offset = 0, ...owner }: Owner & Part) =>
  selectTold(db).where(and(ofOwner(owner), isUnread ? isNull(notice.readAt) : undefined, after && olderThan(after))).orderBy(desc(notice.createdAt), desc(notice.id)).limit(limit).offset(offset);

const olderThan = ([at, id]: readonly [string, string]): SQL | undefined => or(lt(notice.createdAt, new Date(at)), and(eq(notice.createdAt, new Date(at)), lt(notice.id, id)));

export async function countNotices(db: Executor, { isUnread, ...owner }: Owner & { isUnread?: boolean }): Promise<number> {
  const [row] = await db.select({ count: count() }).from(notice).where(and(ofOwner(owner), isUnread ? isNull(notice.readAt) : undefined));
  return row?.count ?? 0;
}

export async function findNotice(db: Executor, { noticeId, ...owner }: Owner & { noticeId: string }): Promise<NoticeRow | undefined> {
  const [row] = await selectTold(db).where(and(ofOwner(owner), eq(notice.id, noticeId)));
  return row;
}

/** Those that a mail tells, the oldest first. */
export const selectNoticesOfMail = (db: Executor, { organisationId, mailId }: { organisationId: string; mailId: string }) =>
  selectTold(db).where(and(eq(notice.organisationId, organisationId), eq(notice.mailId, mailId))).orderBy(asc(notice.createdAt), asc(notice.id));

/** Whether it was written: not when this was said to the person before. */
export async function insertNotice(db: Executor, row: typeof notice.$inferInsert): Promise<boolean> {
  return (await db.insert(notice).values(row).onConflictDoNothing().returning({ id: notice.id })).length > 0;
}

export async function noteNoticeMail(db: Executor, { organisationId, noticeId, mailId }: { organisationId: string; noticeId: string; mailId: string }): Promise<void> {
  await db.update(notice).set({ mailId }).where(and(eq(notice.organisationId, organisationId), eq(notice.id, noticeId)));
}

/** Marks one, or all of a person's. @returns how many were unread until now */
export async function markNoticesRead(db: Executor, { noticeId, at, ...owner }: Owner & { noticeId?: string; at: Date }): Promise<number> {
  const rows = await db
    .update(notice)
    .set({ readAt: at })
    .where(and(ofOwner(owner), isNull(notice.readAt), noticeId === undefined ? undefined : eq(notice.id, noticeId)))
    .returning({ id: notice.id });
  return rows.length;
}

/** Those that wait for the day's mail and were not read meanwhile, locked, so that they are told by one mail alone. */
export async function lockNoticesForTheDay(db: Executor, owner: Owner): Promise<string[]> {
  const rows = await db
    .select({ id: notice.id })
    .from(notice)
    .where(and(ofOwner(owner), eq(notice.byMail, 'daily'), isNull(notice.mailId), isNull(notice.readAt)))
    .orderBy(asc(notice.id))
    .for('update');
  return rows.map(({ id }) => id);
}

export async function selectNoticeChoices(db: Executor, { organisationId, personId }: Owner): Promise<NoticeChoices> {
  const [row] = await db.select({ byMail: noticePreference.byMail }).from(noticePreference).where(and(eq(noticePreference.organisationId, organisationId), eq(noticePreference.personId, personId)));
  return row?.byMail ?? {};
}

export async function upsertNoticeChoices(db: Executor, row: Owner & { byMail: NoticeChoices }): Promise<void> {
  await db.insert(noticePreference).values(row).onConflictDoUpdate({ target: [noticePreference.organisationId, noticePreference.personId], set: { byMail: row.byMail } });
}

/** The time zone of the site that somebody works at, else of the organisation's first. */
export async function timeZoneOf(db: Executor, { organisationId, personId }: Owner): Promise<string> {
  const [row] = await db
    .select({ timeZone: site.timeZone })
    .from(membership)
    .innerJoin(site, eq(site.organisationId, membership.organisationId))
    .where(and(eq(membership.organisationId, organisationId), eq(membership.personId, personId)))
    .orderBy(sql`${site.id} = ${membership.siteId} desc nulls last`, asc(site.createdAt), asc(site.id))
    .limit(1);
  return row?.timeZone ?? 'UTC';
}
