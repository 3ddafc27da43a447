import { foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import type { ReleasedOn } from '@/lib/case/view/release';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { person } from './person';
import { unit } from './unit';

/** A unit was released after a repair: by whom, by what right, and on which measurements. Never updated. */
export const release = pgTable(
  'release',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    unitId: uuid().notNull(),
    releasedAt: instant().notNull(),
    releasedBy: uuid().notNull().references(() => person.id),
    /** By what right: as it stood with the membership. */
    basis: text(),
    /** Every check that was required, with its answer as it stood. */
    on: jsonb().$type<ReleasedOn[]>().notNull(),
    note: text(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    foreignKey({ columns: [t.organisationId, t.unitId], foreignColumns: [unit.organisationId, unit.id] }),
    index('release_case').on(t.organisationId, t.caseId, t.releasedAt),
    organisationPolicy(),
  ],
).enableRLS();
