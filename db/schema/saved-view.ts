import { foreignKey, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, organisationId, organisationPolicy } from './columns';
import { membership } from './person';

/** The filters of a list under a name, for the person who saved them. */
export const savedView = pgTable(
  'saved_view',
  {
    organisationId: organisationId(),
    id: id(),
    personId: uuid().notNull(),
    /** cases, units */
    list: text().notNull(),
    name: text().notNull(),
    /** As it stands in the address: "status=open&site=…" */
    query: text().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    unique('saved_view_name').on(t.organisationId, t.personId, t.list, t.name),
    foreignKey({ columns: [t.organisationId, t.personId], foreignColumns: [membership.organisationId, membership.personId] }),
    organisationPolicy(),
  ],
).enableRLS();
