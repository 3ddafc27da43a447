import { integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { organisation } from './organisation';

/**
 * An organisation's own record of a kind of compressor. Measures are SI; `asTyped` keeps what was entered by
 * column name. What is unknown is null, never a guess.
 */
export const compressorModel = pgTable(
  'compressor_model',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    name: text().notNull(),
    displacementM3: si(),
    boreM: si(),
    strokeM: si(),
    cylinders: integer(),
    /** Compressor turns for one of the engine. */
    driveRatio: si(),
    /** What cools the head: coolant, air */
    cooling: text(),
    /** head-unloader, inlet-unloader, discharge-unloader, clutch */
    unloading: text(),
    /** naturally-aspirated, boosted */
    intakeType: text(),
    /** large-cavity, small-hole */
    drainOpening: text(),
    /** rear, side, through-drive */
    oilFeedPlace: text(),
    /** steel, fibre */
    driveGear: text(),
    portBoreM: si(),
    lineSizeM: si(),
    /** How it is run in, where its maker says otherwise than the rulebook; null: as the rulebook has it. */
    breakInEngineRpm: integer(),
    breakInPressurePa: si(),
    breakInLeastS: si(),
    breakInMostS: si(),
    /** Where they are from; null: there are none. */
    breakInSource: text(),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    note: text(),
    createdAt: createdAt(),
    updatedAt: instant(),
    hiddenAt: instant(),
    createdBy: uuid(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    unique('compressor_model_name').on(t.organisationId, t.name),
    organisationPolicy(),
  ],
).enableRLS();
