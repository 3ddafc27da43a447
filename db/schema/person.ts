import { sql } from 'drizzle-orm';
import { boolean, foreignKey, index, integer, jsonb, pgPolicy, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant, ofThisOrganisation, organisationId, organisationPolicy } from './columns';
import { organisation, site } from './organisation';

const signedIn = sql`nullif(current_setting('app.person_id', true), '')::uuid`;

/**
 * Somebody with a sign-in: one address, any number of organisations. The only place where names stand, so that
 * erasing a person is one update. Visible: oneself, and whoever shares the organisation set. Signing in reads it
 * through a function of the owner's, since nobody is signed in yet.
 */
export const person = pgTable(
  'person',
  {
    id: uuid().primaryKey(),
    /** Lower case; what people type is lowered before it is compared. */
    email: text().notNull().unique('person_email'),
    name: text().notNull(),
    /** argon2id; null until an invitation is accepted. */
    passwordHash: text(),
    /** Every signed-in cookie carries it; raising it signs all of them out. */
    sessionVersion: integer().notNull().default(1),
    /** Quantity to unit, as lib/units names them; null: the organisation's country decides. */
    unitPreferences: jsonb().$type<Record<string, string>>(),
    createdAt: createdAt(),
    erasedAt: instant(),
  },
  () => [
    pgPolicy('oneself_or_colleague', {
      for: 'all',
      using: sql`id = ${signedIn} or exists (select 1 from membership m where m.person_id = person.id and m.organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid)`,
      withCheck: sql`true`,
    }),
  ],
).enableRLS();

/** A person in an organisation, with what he or she may do there. */
export const membership = pgTable(
  'membership',
  {
    organisationId: organisationId().references(() => organisation.id),
    personId: uuid().notNull().references(() => person.id),
    /** technician, engineer, manager, trainer, administrator: several allowed. */
    roles: text().array().notNull(),
    siteId: uuid(),
    /** The right to release vehicles is the administrator's to give, with its basis. */
    mayRelease: boolean().notNull().default(false),
    releaseBasis: text(),
    /** Set when somebody leaves; the row stays, because cases cite it. */
    endedAt: instant(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.personId] }),
    foreignKey({ columns: [t.organisationId, t.siteId], foreignColumns: [site.organisationId, site.id] }),
    index('membership_person').on(t.personId),
    pgPolicy('of_this_organisation_or_ones_own', {
      for: 'select',
      using: sql`${ofThisOrganisation} or person_id = ${signedIn}`,
    }),
    pgPolicy('written_in_this_organisation', { for: 'all', using: ofThisOrganisation, withCheck: ofThisOrganisation }),
  ],
).enableRLS();

/** A mailed link that makes a membership. Single use; only the hash of its token is kept. */
export const invitation = pgTable(
  'invitation',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    email: text().notNull(),
    name: text().notNull(),
    roles: text().array().notNull(),
    siteId: uuid(),
    tokenHash: text().notNull().unique('invitation_token'),
    expiresAt: instant().notNull(),
    acceptedAt: instant(),
    withdrawnAt: instant(),
    invitedBy: uuid().notNull().references(() => person.id),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.siteId], foreignColumns: [site.organisationId, site.id] }),
    organisationPolicy(),
  ],
).enableRLS();

/**
 * A mailed link that sets a password. Nobody is signed in when it is used, so that only the owner's functions
 * touch it: row-level security without a policy shows it to nobody else.
 */
export const passwordReset = pgTable('password_reset', {
  id: uuid().primaryKey(),
  personId: uuid().notNull().references(() => person.id),
  tokenHash: text().notNull().unique('password_reset_token'),
  expiresAt: instant().notNull(),
  usedAt: instant(),
  createdAt: createdAt(),
}).enableRLS();

/** Counts of tries by key (address, or network address) in a window, to slow guessing. Holds hashes, no addresses. */
export const attempt = pgTable(
  'attempt',
  {
    key: text().notNull(),
    windowStart: instant().notNull(),
    count: integer().notNull(),
  },
  (t) => [primaryKey({ columns: [t.key, t.windowStart] })],
);
