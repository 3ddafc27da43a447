import { integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { Rulebook } from '@/lib/diagnose/types';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { organisation } from './organisation';

/** The product's own rulebook, edition by edition: what every organisation's first edition is a copy of. Immutable. */
export const upstreamEdition = pgTable('upstream_edition', {
  number: integer().primaryKey(),
  rulebook: jsonb().$type<Rulebook>().notNull(),
  /** sha256 of the canonical JSON, so that a seed knows whether the product has a newer one. */
  digest: text().notNull(),
  publishedAt: createdAt(),
});

/** A published state of an organisation's rulebook. Immutable: a case can always be run again with the one it had. */
export const edition = pgTable(
  'edition',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    number: integer().notNull(),
    rulebook: jsonb().$type<Rulebook>().notNull(),
    /** Number of the upstream edition that it descends from: the base of a three-way merge. */
    upstreamNumber: integer().references(() => upstreamEdition.number),
    /** Edition of this organisation that the draft branched from. */
    parentId: uuid(),
    reason: text().notNull(),
    publishedBy: uuid(),
    publishedAt: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    unique('edition_number').on(t.organisationId, t.number),
    organisationPolicy(),
  ],
).enableRLS();
