import { date, foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { compressorModel } from './compressor-model';
import { unit } from './unit';

/**
 * One compressor on one unit, from a date, odometer and engine hours to others, with how it was fitted and why it
 * came out. What was changed with it is 'changed', 'kept' or null (nobody knows).
 */
export const fit = pgTable(
  'fit',
  {
    organisationId: organisationId(),
    id: id(),
    unitId: uuid().notNull(),
    modelId: uuid().notNull(),
    /** new, rebuilt */
    condition: text().notNull(),
    installedOn: date({ mode: 'string' }).notNull(),
    installedOdometerM: si(),
    installedEngineS: si(),
    removedOn: date({ mode: 'string' }),
    removedOdometerM: si(),
    removedEngineS: si(),
    /** failed-seen, not-the-cause, precaution, unknown */
    whyOut: text(),
    /** none, thin-film, spray-adhesive, heavy-bead, unknown */
    sealant: text(),
    dischargeLine: text(),
    governor: text(),
    feedLine: text(),
    intakeHose: text(),
    dryerCartridge: text(),
    driveGear: text(),
    /** yes, no */
    systemCleaned: text(),
    breakInRun: text(),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    note: text(),
    createdAt: createdAt(),
    updatedAt: instant(),
    hiddenAt: instant(),
    createdBy: uuid(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.unitId], foreignColumns: [unit.organisationId, unit.id] }),
    foreignKey({ columns: [t.organisationId, t.modelId], foreignColumns: [compressorModel.organisationId, compressorModel.id] }),
    index('fit_unit').on(t.organisationId, t.unitId, t.installedOn),
    index('fit_model').on(t.organisationId, t.modelId),
    organisationPolicy(),
  ],
).enableRLS();
