import { sql } from 'drizzle-orm';
import { foreignKey, index, jsonb, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import type { Judgement } from '@/lib/limits';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { person } from './person';
import { unit } from './unit';

/**
 * "Do not release" on a unit: what a check found against it. It outlives the case, and a passing answer alone does not end
 * it: somebody with the right lifts it, and what was measured then and by what right is kept. It also ends when the answer
 * that placed it is taken back.
 */
export const unitHold = pgTable(
  'unit_hold',
  {
    organisationId: organisationId(),
    id: id(),
    unitId: uuid().notNull(),
    /** Where it was found, and by which check of that case's rulebook. */
    caseId: uuid().notNull(),
    checkId: text().notNull(),
    findingId: uuid(),
    placedAt: instant().notNull(),
    /** The answer, of any case of the unit, that has passed since; null: still to pass. */
    passedBy: uuid(),
    passedAt: instant(),
    endedAt: instant(),
    /** lifted, taken-back */
    ended: text(),
    endedBy: uuid().references(() => person.id),
    /** What was measured, or seen, at lifting. */
    liftFound: text(),
    liftValueSi: si(),
    liftJudgement: jsonb().$type<Judgement>(),
    /** By what right: as it stood with the membership. */
    liftBasis: text(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.unitId], foreignColumns: [unit.organisationId, unit.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    uniqueIndex('unit_hold_standing').on(t.organisationId, t.unitId, t.checkId).where(sql`ended_at is null`),
    index('unit_hold_unit').on(t.organisationId, t.unitId, t.placedAt),
    organisationPolicy(),
  ],
).enableRLS();
