import { sql } from 'drizzle-orm';
import { foreignKey, index, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { NoticeAbout, NoticeByMail, NoticeChoices, NoticeKind } from '@/lib/schemas/notice';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { mail } from './mail';
import { membership } from './person';

/**
 * What somebody is told: one row for each thing that happened, however often it is said (`key`). It stands in the app; by
 * mail it goes as the person had set when it happened. `mailId` is the mail that tells it, null while it waits for the
 * day's mail, or goes by none.
 */
export const notice = pgTable(
  'notice',
  {
    organisationId: organisationId(),
    id: id(),
    /** Whom it is for. */
    personId: uuid().notNull(),
    kind: text().$type<NoticeKind>().notNull(),
    key: text().notNull(),
    caseId: uuid(),
    /** What its sentence needs beside the case: ids and words of the trade, no name of a person. */
    about: jsonb().$type<NoticeAbout>().notNull(),
    byMail: text().$type<NoticeByMail>().notNull(),
    mailId: uuid(),
    readAt: instant(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    unique('notice_once').on(t.organisationId, t.personId, t.kind, t.key),
    foreignKey({ columns: [t.organisationId, t.personId], foreignColumns: [membership.organisationId, membership.personId] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    foreignKey({ columns: [t.organisationId, t.mailId], foreignColumns: [mail.organisationId, mail.id] }),
    index('notice_person').on(t.organisationId, t.personId, t.createdAt, t.id),
    index('notice_unread').on(t.organisationId, t.personId).where(sql`read_at is null`),
    index('notice_mail').on(t.organisationId, t.mailId),
    organisationPolicy(),
  ],
).enableRLS();

/** How somebody wants to be told by mail; a kind that it doesn't name, and nobody's row, is as usual. */
export const noticePreference = pgTable(
  'notice_preference',
  {
    organisationId: organisationId(),
    personId: uuid().notNull(),
    byMail: jsonb().$type<NoticeChoices>().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.personId] }),
    foreignKey({ columns: [t.organisationId, t.personId], foreignColumns: [membership.organisationId, membership.personId] }),
    organisationPolicy(),
  ],
).enableRLS();
