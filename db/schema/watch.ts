import { sql } from 'drizzle-orm';
import { foreignKey, index, jsonb, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { StateShare, WatchPlan } from '@/lib/diagnose/types';
import type { Judgement } from '@/lib/limits';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { person } from './person';
import { unit } from './unit';

/** What has to be true for a watch to prove anything, and what was said of it when it began. */
export interface BeginAnswer {
  statement: string;
  answer: 'yes' | 'no' | 'not-applicable';
  why: string | null;
}

/**
 * A repair that is watched: from its beginning until a person says that it held, came back or was lost sight of. One under way
 * for a case. The plan is kept as it stood, since its edition may change. The id is the client's and the idempotency key.
 */
export const watch = pgTable(
  'watch',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    unitId: uuid().notNull(),
    causeId: text().notNull(),
    plan: jsonb().$type<WatchPlan>().notNull(),
    begin: jsonb().$type<BeginAnswer[]>().notNull(),
    startedAt: instant().notNull(),
    startedBy: uuid().notNull().references(() => person.id),
    odometerM: si(),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    /** When somebody is told next of what is due; a job that was queued for another time does nothing. */
    remindAt: instant(),
    endedAt: instant(),
    endedBy: uuid().references(() => person.id),
    /** held, comeback, lost */
    outcome: text(),
    why: text(),
    /** Of the call that its end wrote. */
    proof: text(),
    comebackCaseId: uuid(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    foreignKey({ columns: [t.organisationId, t.unitId], foreignColumns: [unit.organisationId, unit.id] }),
    foreignKey({ name: 'watch_comeback_case', columns: [t.organisationId, t.comebackCaseId], foreignColumns: [cases.organisationId, cases.id] }),
    uniqueIndex('watch_under_way').on(t.organisationId, t.caseId).where(sql`ended_at is null`),
    index('watch_case').on(t.organisationId, t.caseId, t.startedAt),
    organisationPolicy(),
  ],
).enableRLS();

/** A link with which somebody who has no sign-in adds one reading, once. Its secret is not kept: it is signed. */
export const watchLink = pgTable(
  'watch_link',
  {
    organisationId: organisationId(),
    id: id(),
    watchId: uuid().notNull(),
    caseId: uuid().notNull(),
    /** What is to be read. */
    checkId: text().notNull(),
    /** A name, as whoever made it put it. */
    forWhom: text().notNull(),
    expiresAt: instant().notNull(),
    usedAt: instant(),
    revokedAt: instant(),
    revokedBy: uuid().references(() => person.id),
    createdBy: uuid().notNull().references(() => person.id),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.watchId], foreignColumns: [watch.organisationId, watch.id] }),
    index('watch_link_watch').on(t.organisationId, t.watchId, t.createdAt),
    organisationPolicy(),
  ],
).enableRLS();

/** What was read of a repair that is watched. Never updated: a wrong one is taken back, with who and why. */
export const watchReading = pgTable(
  'watch_reading',
  {
    organisationId: organisationId(),
    id: id(),
    watchId: uuid().notNull(),
    caseId: uuid().notNull(),
    checkId: text().notNull(),
    /** state, measured */
    kind: text().notNull(),
    shares: jsonb().$type<StateShare[]>().notNull(),
    valueTyped: text(),
    unit: text(),
    valueSi: si(),
    judgement: jsonb().$type<Judgement>(),
    /** in-order, not-in-order */
    verdict: text().notNull(),
    note: text(),
    odometerM: si(),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    /** Null: it came by a link, from whoever called himself so. */
    personId: uuid().references(() => person.id),
    byName: text(),
    linkId: uuid(),
    at: instant().notNull(),
    takenBackAt: instant(),
    takenBackBy: uuid().references(() => person.id),
    takenBackWhy: text(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.watchId], foreignColumns: [watch.organisationId, watch.id] }),
    foreignKey({ columns: [t.organisationId, t.linkId], foreignColumns: [watchLink.organisationId, watchLink.id] }),
    index('watch_reading_watch').on(t.organisationId, t.watchId, t.at),
    organisationPolicy(),
  ],
).enableRLS();
