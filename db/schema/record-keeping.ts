import { index, integer, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { organisation } from './organisation';

/** A file of any owner (case, finding, fit, unit): the object lies in S3-compatible storage. */
export const attachment = pgTable(
  'attachment',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    ownerKind: text().notNull(),
    ownerId: uuid().notNull(),
    objectKey: text().notNull(),
    mediaType: text().notNull(),
    bytes: integer().notNull(),
    description: text(),
    personId: uuid().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    index('attachment_owner').on(t.organisationId, t.ownerKind, t.ownerId),
    organisationPolicy(),
  ],
).enableRLS();

/** Nothing that a case may cite is deleted: it is hidden, with who and why; showing it again is a row of its own. */
export const removal = pgTable(
  'removal',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    entity: text().notNull(),
    entityId: uuid().notNull(),
    /** hide, show */
    kind: text().notNull(),
    reason: text().notNull(),
    personId: uuid().notNull(),
    at: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    index('removal_entity').on(t.organisationId, t.entity, t.entityId),
    organisationPolicy(),
  ],
).enableRLS();

/**
 * A row beside every write, in its transaction: who, what, which fields to what. The application's role may add and
 * read, not change or delete. Holds ids of people, never names.
 */
export const audit = pgTable(
  'audit',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    at: createdAt(),
    personId: uuid(),
    /** verb.entity, as the service is named: "open.case" */
    action: text().notNull(),
    entity: text().notNull(),
    entityId: text().notNull(),
    changed: jsonb().$type<Record<string, unknown>>().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    index('audit_entity').on(t.organisationId, t.entity, t.entityId, t.at),
    index('audit_at').on(t.organisationId, t.at),
    organisationPolicy(),
  ],
).enableRLS();
