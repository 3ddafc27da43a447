import { index, integer, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { organisation } from './organisation';

/** A line drawn on a photo: points in fractions of its width and height, so that any size of it can carry them. */
export interface Stroke {
  points: [x: number, y: number][];
}

/**
 * A photo of any owner (case, finding, fit, unit): the object lies in S3-compatible storage. The row is made before
 * the upload; what arrived is looked at before it counts. Marks stay apart from the picture, which is never changed.
 */
export const attachment = pgTable(
  'attachment',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    ownerKind: text().notNull(),
    ownerId: uuid().notNull(),
    /** The case that shows it, if any, and the check that it was taken for. */
    caseId: uuid(),
    checkId: text(),
    /** What of a repair or an install record it shows: "step/<repair>/<place>", "install/<point>". */
    place: text(),
    objectKey: text().notNull(),
    mediaType: text().notNull(),
    bytes: integer().notNull(),
    /** awaited: not uploaded yet; stored: arrived and is a picture; refused: arrived and isn't, with why */
    state: text().notNull().default('awaited'),
    refusal: text(),
    /** In pixels, once it has been looked at. */
    width: integer(),
    height: integer(),
    /** Made by the worker; null until then. */
    thumbnailKey: text(),
    description: text(),
    strokes: jsonb().$type<Stroke[]>().notNull().default([]),
    /** By the device's corrected clock. */
    takenAt: instant(),
    personId: uuid().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    index('attachment_owner').on(t.organisationId, t.ownerKind, t.ownerId),
    index('attachment_case').on(t.organisationId, t.caseId),
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
