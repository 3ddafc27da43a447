import { customType, index, pgTable, primaryKey, text } from 'drizzle-orm/pg-core';
import { id, instant, organisationId, organisationPolicy } from './columns';
import { organisation } from './organisation';

const tsvector = customType<{ data: string }>({ dataType: () => 'tsvector' });

/**
 * The words of a row that can be searched for. Triggers of the rows' own tables keep it (drizzle/0016); nothing else
 * writes it, and a row that is hidden has none.
 *
 * It stands apart from those tables because of row-level security: an index on their words would never be used. What a
 * policy hides may not be shown to an operator that could leak it, and PostgreSQL counts `@@`, `LIKE` and `%` among
 * those, so that it first reads every row of the organisation. Here the owner is not held to the policy, and two of its
 * functions, which narrow by the organisation that the transaction has set, may use the indexes. They give ids and
 * nothing else; what an id stands for is read from its own table, under the policy.
 */
export const searchEntry = pgTable(
  'search_entry',
  {
    organisationId: organisationId().references(() => organisation.id),
    /** unit, case, fit, note, call, event: the table that the row is of */
    kind: text().notNull(),
    /** Of the row. */
    id: id(),
    words: tsvector().notNull(),
    /** Units only: the fleet number without what people leave out of it. */
    fleetKey: text(),
    /** When it was written: the newest first among equals. */
    at: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.kind, t.id] }),
    // With the organisation in front, so that a common word of another one costs nothing. Without a list of what is still to
    // be sorted in, which each search would have to read through: words are written seldom and looked for with every key.
    index('search_entry_words').using('gin', t.organisationId, t.words).with({ fastupdate: false }),
    index('search_entry_fleet_key').using('gin', t.organisationId, t.fleetKey.op('gin_trgm_ops')).with({ fastupdate: false }),
    organisationPolicy(),
  ],
).enableRLS();
