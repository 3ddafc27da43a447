import { sql } from 'drizzle-orm';
import { date, foreignKey, index, integer, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { StepMark } from '@/lib/schemas/repair';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { person } from './person';

/**
 * A remedy that was chosen for a case: by whom, for when and whom, and what came of it. One at a time for each remedy. The
 * id is the client's and the idempotency key. What is done step by step stands in `repair_step`.
 */
export const repair = pgTable(
  'repair',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    /** Of the case's edition, which says its steps. */
    remedyId: text().notNull(),
    chosenAt: instant().notNull(),
    chosenBy: uuid().notNull().references(() => person.id),
    /** Why it goes before what the plan had first; null: it was first. */
    whyBefore: text(),
    plannedOn: date({ mode: 'string' }),
    assignedTo: uuid().references(() => person.id),
    endedAt: instant(),
    endedBy: uuid().references(() => person.id),
    /** done, dropped */
    outcome: text(),
    whyDropped: text(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    uniqueIndex('repair_at_hand').on(t.organisationId, t.caseId, t.remedyId).where(sql`ended_at is null`),
    index('repair_case').on(t.organisationId, t.caseId, t.chosenAt),
    organisationPolicy(),
  ],
).enableRLS();

/** What was said of a step of a repair. Never updated: the last mark of a step is what holds. */
export const repairStep = pgTable(
  'repair_step',
  {
    organisationId: organisationId(),
    id: id(),
    repairId: uuid().notNull(),
    caseId: uuid().notNull(),
    /** Its place among the remedy's steps, from 0. */
    step: integer().notNull(),
    mark: text().$type<StepMark>().notNull(),
    /** A torque or another value, as the workshop had it from the maker: never invented here. */
    value: text(),
    note: text(),
    personId: uuid().notNull().references(() => person.id),
    at: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.repairId], foreignColumns: [repair.organisationId, repair.id] }),
    index('repair_step_repair').on(t.organisationId, t.repairId, t.at),
    organisationPolicy(),
  ],
).enableRLS();
