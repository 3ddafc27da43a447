import { sql } from 'drizzle-orm';
import { customType, pgPolicy, timestamp, uuid } from 'drizzle-orm/pg-core';

/** The organisation that owns the row: first part of every tenant table's key, so that tenants can be spread later. */
export const organisationId = () => uuid().notNull();

/** uuid v7, made by whoever creates the row (a tablet without a connection included). */
export const id = () => uuid().notNull();

export const createdAt = () => timestamp({ withTimezone: true }).notNull().defaultNow();
export const instant = () => timestamp({ withTimezone: true });

/**
 * A double that stays a number in TypeScript. SI values are measurements: sixteen digits are more than any
 * instrument has, and `numeric` would come back as text.
 */
export const si = customType<{ data: number; driverData: number }>({ dataType: () => 'double precision' });

/**
 * The second wall: whatever a query forgets, it sees the rows of the organisation that its transaction has set and
 * no others; none when none is set (after a transaction the setting is '' and not null).
 */
export const ofThisOrganisation = sql`organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid`;

export const organisationPolicy = () =>
  pgPolicy('of_this_organisation', { as: 'permissive', for: 'all', using: ofThisOrganisation, withCheck: ofThisOrganisation });
