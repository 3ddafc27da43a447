import { sql } from 'drizzle-orm';
import { foreignKey, index, jsonb, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { BreakInEventKind, BreakInFigures, HotCheck } from '@/lib/break-in';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { fit } from './fit';
import { person } from './person';

/** The first run of a fitted compressor under steady load. What happened in it stands in `break_in_event`. */
export const breakInRun = pgTable(
  'break_in_run',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    fitId: uuid().notNull(),
    /** By which it was run: the model's own, or the edition's. */
    figures: jsonb().$type<BreakInFigures>().notNull(),
    startedAt: instant().notNull(),
    startedBy: uuid().notNull().references(() => person.id),
    endedAt: instant(),
    endedBy: uuid().references(() => person.id),
    /** done, stopped */
    outcome: text(),
    whyStopped: text(),
    /** What was seen while it was hot; null: not looked yet. */
    hotCheck: jsonb().$type<HotCheck>(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    foreignKey({ columns: [t.organisationId, t.fitId], foreignColumns: [fit.organisationId, fit.id] }),
    uniqueIndex('break_in_run_under_way').on(t.organisationId, t.caseId).where(sql`ended_at is null`),
    index('break_in_run_case').on(t.organisationId, t.caseId, t.startedAt),
    organisationPolicy(),
  ],
).enableRLS();

/** What happened in a break-in run, as the device had it: paused and why, resumed, read. Never updated. */
export const breakInEvent = pgTable(
  'break_in_event',
  {
    organisationId: organisationId(),
    id: id(),
    runId: uuid().notNull(),
    caseId: uuid().notNull(),
    kind: text().$type<BreakInEventKind>().notNull(),
    reason: text(),
    /** As typed, and in Pa. */
    pressureTyped: text(),
    pressurePa: si(),
    personId: uuid().notNull().references(() => person.id),
    /** The device's clock, corrected. */
    at: instant().notNull(),
    receivedAt: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.runId], foreignColumns: [breakInRun.organisationId, breakInRun.id] }),
    index('break_in_event_run').on(t.organisationId, t.runId, t.at),
    organisationPolicy(),
  ],
).enableRLS();
