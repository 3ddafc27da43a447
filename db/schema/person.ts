import { sql } from 'drizzle-orm';
import { boolean, check, foreignKey, index, integer, jsonb, pgPolicy, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant, ofThisOrganisation, organisationId, organisationPolicy } from './columns';
import { organisation, site } from './organisation';

/** At least one, and each of those in lib/auth/roles.ts. */
const ROLES_KNOWN = sql`cardinality(roles) > 0 and roles <@ array['technician', 'engineer', 'manager', 'trainer', 'administrator']`;

const signedIn = sql`nullif(current_setting('app.person_id', true), '')::uuid`;

/**
 * Somebody with a sign-in: one address, any number of organisations. The only place where names stand, so that
 * erasing a person is one update. Visible: oneself, and whoever is or was in the organisation set (cases name
 * them). The application's role changes only the person signed in, never reads a password hash and adds nobody:
 * what happens before somebody is signed in goes through functions of the owner's (drizzle/0002_before_sign_in.sql).
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
      for: 'select',
      using: sql`id = ${signedIn} or exists (select 1 from membership m where m.person_id = person.id and m.organisation_id = nullif(current_setting('app.organisation_id', true), '')::uuid)`,
    }),
    pgPolicy('changed_by_oneself', { for: 'update', using: sql`id = ${signedIn}`, withCheck: sql`id = ${signedIn}` }),
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
    pgPolicy('changed_in_this_organisation', { for: 'update', using: ofThisOrganisation, withCheck: ofThisOrganisation }),
    check('membership_roles', ROLES_KNOWN),
    check('membership_release_has_basis', sql`not may_release or release_basis is not null`),
  ],
).enableRLS();

/**
 * A mailed link that makes a membership. Single use. The token is made when the mail is sent and only its hash is
 * kept, so that no link can be read out of the database or the job queue; sending again makes a new one.
 */
export const invitation = pgTable(
  'invitation',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    /** Null once it is accepted or withdrawn: an address then stands with the person, or nowhere. */
    email: text(),
    roles: text().array().notNull(),
    siteId: uuid(),
    /** Null until the mail is on its way. */
    tokenHash: text().unique('invitation_token'),
    expiresAt: instant().notNull(),
    acceptedAt: instant(),
    acceptedBy: uuid().references(() => person.id),
    withdrawnAt: instant(),
    invitedBy: uuid().notNull().references(() => person.id),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.siteId], foreignColumns: [site.organisationId, site.id] }),
    // One open invitation for an address: the others have none any more.
    unique('invitation_email').on(t.organisationId, t.email),
    check('invitation_roles', ROLES_KNOWN),
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
