import { foreignKey, index, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { SetUp } from '@/lib/diagnose/types';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { edition } from './edition';
import { fit } from './fit';
import { organisation, site } from './organisation';
import { person } from './person';
import { unit } from './unit';

/** One complaint on one unit, from opening to proven repair. */
export const cases = pgTable(
  'case',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    /** What people say aloud: counted for each organisation. */
    number: integer().notNull(),
    unitId: uuid().notNull(),
    siteId: uuid().notNull(),
    /** The fit on the unit when the case was opened, if it is known. */
    fitId: uuid(),
    /** The edition that its runs use. */
    editionId: uuid().notNull(),
    /** open, called, closed */
    status: text().notNull().default('open'),
    complaints: text().array().notNull(),
    complaintWords: text(),
    odometerM: si(),
    engineS: si(),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    /** Checks whose standing answer forbids the unit's release; empty: none known. Kept here so that lists need not rank. */
    releaseHolds: text().array().notNull().default([]),
    /** How the vehicle stands now: what the next check needs not be set up again. */
    vehicleState: jsonb().$type<SetUp>().notNull().default({}),
    assignedTo: uuid().references(() => person.id),
    /** Null: somebody at a gate, who called himself so. */
    openedBy: uuid().references(() => person.id),
    openedByName: text(),
    openedAt: instant().notNull(),
    closedAt: instant(),
    /** The case whose repair didn't hold. */
    comebackOf: uuid(),
    /** Counts every write to the case, so that a page can tell whether it is behind. */
    version: integer().notNull().default(1),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    unique('case_number').on(t.organisationId, t.number),
    foreignKey({ columns: [t.organisationId, t.unitId], foreignColumns: [unit.organisationId, unit.id] }),
    foreignKey({ columns: [t.organisationId, t.siteId], foreignColumns: [site.organisationId, site.id] }),
    foreignKey({ columns: [t.organisationId, t.fitId], foreignColumns: [fit.organisationId, fit.id] }),
    foreignKey({ columns: [t.organisationId, t.editionId], foreignColumns: [edition.organisationId, edition.id] }),
    foreignKey({ name: 'case_comeback_of', columns: [t.organisationId, t.comebackOf], foreignColumns: [t.organisationId, t.id] }),
    index('case_unit').on(t.organisationId, t.unitId, t.openedAt),
    index('case_status').on(t.organisationId, t.status, t.openedAt),
    organisationPolicy(),
  ],
).enableRLS();

/** What happened to a case that is no finding: opened, called, reopened, closed, assigned. Never updated. */
export const caseEvent = pgTable(
  'case_event',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    kind: text().notNull(),
    reason: text(),
    /** The call that it made or took back. */
    callId: uuid(),
    /** Null: somebody at a gate, who called himself so. */
    personId: uuid().references(() => person.id),
    byName: text(),
    at: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    index('case_event_case').on(t.organisationId, t.caseId, t.at),
    organisationPolicy(),
  ],
).enableRLS();

/**
 * A person naming the cause of a case. Never updated: a later call supersedes it, a reopening takes it back by an
 * event. `run_id` is the ranking that stood on the screen, so that only predictions made before proof are scored.
 */
export const call = pgTable(
  'call',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    mainCause: text().notNull(),
    contributingCauses: text().array().notNull(),
    /** sure, fairly-sure, guess */
    sureness: text().notNull(),
    /** none, seen, isolated, held-with-others */
    proof: text().notNull().default('none'),
    /** Asked for when the cause named doesn't lead. */
    whyNotLeading: text(),
    /** Words for a cause that the rulebook doesn't list. */
    unlistedCause: text(),
    runId: uuid(),
    supersedes: uuid(),
    personId: uuid().notNull().references(() => person.id),
    at: instant().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    index('call_case').on(t.organisationId, t.caseId, t.at),
    organisationPolicy(),
  ],
).enableRLS();
