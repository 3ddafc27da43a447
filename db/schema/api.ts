import { foreignKey, index, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { membership } from './person';

/**
 * A personal token for scripts: acts as its person in one organisation, within its scopes, until it expires or is
 * revoked. Only its hash is kept, so that it can be shown once and never read out of the database.
 */
export const apiToken = pgTable(
  'api_token',
  {
    organisationId: organisationId(),
    id: id(),
    personId: uuid().notNull(),
    name: text().notNull(),
    tokenHash: text().notNull(),
    /** Its last characters, to tell it from others. */
    ending: text().notNull(),
    scopes: text().array().notNull(),
    expiresAt: instant().notNull(),
    lastUsedAt: instant(),
    revokedAt: instant(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    // Asked before the organisation is known, and of 256 random bits: unique everywhere.
    unique('api_token_hash').on(t.tokenHash),
    foreignKey({ columns: [t.organisationId, t.personId], foreignColumns: [membership.organisationId, membership.personId] }),
    index('api_token_person').on(t.organisationId, t.personId),
    organisationPolicy(),
  ],
).enableRLS();

/**
 * What a write with an `Idempotency-Key` answered, written in the write's own transaction: the same request sent again
 * is answered from here. Swept after a day.
 */
export const idempotentAnswer = pgTable(
  'idempotent_answer',
  {
    organisationId: organisationId(),
    personId: uuid().notNull(),
    key: text().notNull(),
    /** Of the service and its input: the same key for another request is a mistake. */
    requestHash: text().notNull(),
    status: integer().notNull(),
    result: jsonb().$type<unknown>(),
    at: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.personId, t.key] }),
    foreignKey({ columns: [t.organisationId, t.personId], foreignColumns: [membership.organisationId, membership.personId] }),
    index('idempotent_answer_at').on(t.at),
    organisationPolicy(),
  ],
).enableRLS();
