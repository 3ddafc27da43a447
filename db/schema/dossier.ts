import { foreignKey, index, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { DossierContent } from '@/lib/schemas/dossier-content';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { mail } from './mail';
import { person } from './person';

/**
 * One document of a case, as it was when somebody made it. What it says is never changed: its hash is printed on it, and
 * whoever holds it can ask whether it is the one. Its PDF is made of that content by the worker, and of nothing else.
 */
export const dossier = pgTable(
  'dossier',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    /** Counted by the organisation. */
    number: integer().notNull(),
    /** "D-2026-00012", as it is printed. */
    reference: text().notNull(),
    madeAt: instant().notNull(),
    madeBy: uuid().notNull().references(() => person.id),
    /** a4, letter */
    paper: text().notNull(),
    /** What was left out, as it was chosen: ids of sections and photos, names, fleet. */
    leftOut: jsonb().$type<{ sections: string[]; photoIds: string[]; names: boolean; fleet: boolean }>().notNull(),
    content: jsonb().$type<DossierContent>().notNull(),
    /** SHA-256 of the content in canonical JSON, hexadecimal. */
    contentHash: text().notNull(),
    /** Of the PDF: waiting, made, failed */
    state: text().notNull().default('waiting'),
    objectKey: text(),
    bytes: integer(),
    /** SHA-256 of the PDF's bytes, hexadecimal. */
    pdfHash: text(),
    /** Why it failed, in words. */
    error: text(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    unique('dossier_number').on(t.organisationId, t.number),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    index('dossier_case').on(t.organisationId, t.caseId, t.madeAt),
    organisationPolicy(),
  ],
).enableRLS();

/**
 * The hashes of a dossier and of its PDF: all that somebody is told by who holds one and is nobody here. Apart from what
 * it says, because a function of the owner looks here across organisations. Never updated.
 */
export const dossierSeal = pgTable(
  'dossier_seal',
  {
    organisationId: organisationId(),
    dossierId: uuid().notNull(),
    /** content, pdf */
    kind: text().notNull(),
    reference: text().notNull(),
    /** SHA-256, hexadecimal. */
    hash: text().notNull(),
    madeAt: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.dossierId, t.kind] }),
    foreignKey({ columns: [t.organisationId, t.dossierId], foreignColumns: [dossier.organisationId, dossier.id] }),
    index('dossier_seal_hash').on(t.hash),
    organisationPolicy(),
  ],
).enableRLS();

/** A dossier that was sent to somebody: where its mail stands, the mail itself says. Never updated. */
export const dossierSending = pgTable(
  'dossier_sending',
  {
    organisationId: organisationId(),
    id: id(),
    dossierId: uuid().notNull(),
    caseId: uuid().notNull(),
    toAddress: text().notNull(),
    words: text(),
    mailId: uuid().notNull(),
    sentBy: uuid().notNull().references(() => person.id),
    at: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.dossierId], foreignColumns: [dossier.organisationId, dossier.id] }),
    foreignKey({ columns: [t.organisationId, t.mailId], foreignColumns: [mail.organisationId, mail.id] }),
    index('dossier_sending_case').on(t.organisationId, t.caseId, t.at),
    organisationPolicy(),
  ],
).enableRLS();
