import { sql } from 'drizzle-orm';
import { foreignKey, index, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { fit } from './fit';
import { person } from './person';

/** The fitting of a compressor in a case: its fit is made when it begins. One under way for each case. The id is the client's. */
export const fitting = pgTable(
  'fitting',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    fitId: uuid().notNull(),
    startedAt: instant().notNull(),
    startedBy: uuid().notNull().references(() => person.id),
    finishedAt: instant(),
    finishedBy: uuid().references(() => person.id),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    foreignKey({ columns: [t.organisationId, t.fitId], foreignColumns: [fit.organisationId, fit.id] }),
    uniqueIndex('fitting_under_way').on(t.organisationId, t.caseId).where(sql`finished_at is null`),
    index('fitting_case').on(t.organisationId, t.caseId, t.startedAt),
    organisationPolicy(),
  ],
).enableRLS();

/** What was said of a point of the install record. Never updated: the last answer to a point is what holds. */
export const installAnswer = pgTable(
  'install_answer',
  {
    organisationId: organisationId(),
    id: id(),
    fittingId: uuid().notNull(),
    caseId: uuid().notNull(),
    /** Of lib/fitting/points. */
    pointId: text().notNull(),
    answer: text().notNull(),
    /** A bore, a torque: as the workshop measured it or had it from the maker. */
    value: text(),
    note: text(),
    personId: uuid().notNull().references(() => person.id),
    at: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.fittingId], foreignColumns: [fitting.organisationId, fitting.id] }),
    index('install_answer_fitting').on(t.organisationId, t.fittingId, t.at),
    organisationPolicy(),
  ],
).enableRLS();
