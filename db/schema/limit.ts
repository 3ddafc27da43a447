import { boolean, char, date, foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { compressorModel } from './compressor-model';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { organisation } from './organisation';
import { person } from './person';

/**
 * A limit that the organisation adopted for a measured check, with its source. Never changed: another takes its place, and
 * what was judged by it keeps it. Of several that fit a unit the one that names most of it holds, then the newest.
 */
export const adoptedLimit = pgTable(
  'adopted_limit',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    /** By its id in the rulebook. */
    checkId: text().notNull(),
    /** What it is for; null: any. */
    modelId: uuid(),
    country: char({ length: 2 }),
    vehicleKind: text(),
    /** Built on the day or later; built before the day. */
    builtFrom: date({ mode: 'string' }),
    builtBefore: date({ mode: 'string' }),
    leastSi: si(),
    mostSi: si(),
    /** The highest value itself is past the limit: "less than 2". */
    below: boolean().notNull().default(false),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    source: text().notNull(),
    personId: uuid().notNull().references(() => person.id),
    createdAt: createdAt(),
    withdrawnAt: instant(),
    withdrawnBy: uuid().references(() => person.id),
    withdrawnReason: text(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.modelId], foreignColumns: [compressorModel.organisationId, compressorModel.id] }),
    index('adopted_limit_check').on(t.organisationId, t.checkId),
    organisationPolicy(),
  ],
).enableRLS();
