import { sql } from 'drizzle-orm';
import { foreignKey, index, integer, jsonb, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { Stage } from '@/lib/diagnose/types';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { person } from './person';

/**
 * Oil that is being caught over days for a check of a case: from a clean start until somebody takes the bottle down. One
 * at a time for a check. Each weighing writes a finding by the sum of all until then, so that the check is answered from
 * the first weighing on. The id is the client's and the idempotency key.
 */
export const oilCatch = pgTable(
  'oil_catch',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    checkId: text().notNull(),
    stage: jsonb().$type<Stage>().notNull(),
    startedAt: instant().notNull(),
    startedBy: uuid().notNull().references(() => person.id),
    /** Hour meter at the clean start; null: the vehicle has none that can be read. */
    engineS: si(),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    /** Where the bottle hangs. */
    place: text(),
    remindEveryDays: integer(),
    /** When the next mail goes out unless somebody weighs before; a job that was queued for another time does nothing. */
    remindAt: instant(),
    endedAt: instant(),
    endedBy: uuid().references(() => person.id),
    endedWhy: text(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    uniqueIndex('oil_catch_under_way').on(t.organisationId, t.caseId, t.checkId).where(sql`ended_at is null`),
    index('oil_catch_case').on(t.organisationId, t.caseId, t.startedAt),
    organisationPolicy(),
  ],
).enableRLS();

/** What was in the bottle since the weighing before. Never updated: a wrong one is taken back, with who and why. */
export const oilWeighing = pgTable(
  'oil_weighing',
  {
    organisationId: organisationId(),
    id: id(),
    catchId: uuid().notNull(),
    caseId: uuid().notNull(),
    massKg: si().notNull(),
    /** How far the scale can be off. */
    massErrorKg: si().notNull(),
    /** Hour meter at the weighing; null: only the hours since the one before are known. */
    engineS: si(),
    /** That the engine ran since the weighing before. */
    ranS: si().notNull(),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    note: text(),
    personId: uuid().notNull().references(() => person.id),
    at: instant().notNull(),
    /** What it was written into the case as: the sum of all weighings until then. */
    findingId: uuid().notNull(),
    takenBackAt: instant(),
    takenBackBy: uuid().references(() => person.id),
    takenBackWhy: text(),
    /** What was written of the others then; null: the check had been answered otherwise meanwhile, and stays so. */
    takenBackFindingId: uuid(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.catchId], foreignColumns: [oilCatch.organisationId, oilCatch.id] }),
    index('oil_weighing_catch').on(t.organisationId, t.catchId, t.at),
    organisationPolicy(),
  ],
).enableRLS();
