import { sql } from 'drizzle-orm';
import { boolean, char, integer, pgPolicy, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, organisationId, organisationPolicy, si } from './columns';

const itself = sql`id = nullif(current_setting('app.organisation_id', true), '')::uuid`;

/**
 * A tenant: a fleet, a dealer, a rebuilder. Its currency is that of every amount of money it sees; its labour rate
 * replaces the rulebook's in the order of repairs.
 */
export const organisation = pgTable(
  'organisation',
  {
    id: uuid().primaryKey(),
    name: text().notNull(),
    country: char({ length: 2 }).notNull(),
    currency: char({ length: 3 }).notNull(),
    labourRatePerHour: si(),
    /** Next case number; taken under a row lock so that numbers have no gaps a customer would ask about. */
    nextCaseNumber: integer().notNull().default(1),
    /** The same of its dossiers. */
    nextDossierNumber: integer().notNull().default(1),
    isDemo: boolean().notNull().default(false),
    createdAt: createdAt(),
  },
  () => [pgPolicy('itself', { for: 'all', using: itself, withCheck: itself })],
).enableRLS();

/** A workshop or depot of an organisation. Days (a caution's, a watch's) are counted in its time zone. */
export const site = pgTable(
  'site',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    name: text().notNull(),
    timeZone: text().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    unique('site_name').on(t.organisationId, t.name),
    organisationPolicy(),
  ],
).enableRLS();
