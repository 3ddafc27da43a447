import { date, foreignKey, index, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { fit } from './fit';
import { person } from './person';

/**
 * What was claimed for a case from a supplier or a warranty desk, and what came of it. Money is the organisation's
 * currency. Changed as it goes on; what it was before stands in the audit.
 */
export const claim = pgTable(
  'claim',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    toWhom: text().notNull(),
    theirReference: text(),
    sentOn: date({ mode: 'string' }).notNull(),
    amount: si(),
    /** sent, paid, part-paid, denied */
    state: text().notNull().default('sent'),
    settledOn: date({ mode: 'string' }),
    settledAmount: si(),
    /** Why it was denied, or paid in part. */
    why: text(),
    createdBy: uuid().notNull().references(() => person.id),
    createdAt: createdAt(),
    updatedAt: instant(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    index('claim_case').on(t.organisationId, t.caseId, t.sentOn),
    organisationPolicy(),
  ],
).enableRLS();

/** An old compressor that went back for its core, what it should bring and what it brought. Changed as a claim is. */
export const coreCredit = pgTable(
  'core_credit',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    /** The compressor that went back; null: not in the record. */
    fitId: uuid(),
    toWhom: text().notNull(),
    sentOn: date({ mode: 'string' }).notNull(),
    expectedAmount: si(),
    /** sent, credited, refused */
    state: text().notNull().default('sent'),
    settledOn: date({ mode: 'string' }),
    creditedAmount: si(),
    /** Why it was refused. */
    why: text(),
    createdBy: uuid().notNull().references(() => person.id),
    createdAt: createdAt(),
    updatedAt: instant(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    foreignKey({ columns: [t.organisationId, t.fitId], foreignColumns: [fit.organisationId, fit.id] }),
    index('core_credit_case').on(t.organisationId, t.caseId, t.sentOn),
    organisationPolicy(),
  ],
).enableRLS();
