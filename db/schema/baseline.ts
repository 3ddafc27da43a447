import { date, foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import type { FigureId } from '@/lib/baseline/figures';
import type { Conditions, Occasion } from '@/lib/baseline/set';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { compressorModel } from './compressor-model';
import { fit } from './fit';
import { unit } from './unit';

/**
 * What was measured on a unit in good order on a day. Never updated; one that was wrong is hidden, with a removal that
 * says why, and counts no more. The id is made on the device and is the idempotency key.
 */
export const baselineSet = pgTable(
  'baseline_set',
  {
    organisationId: organisationId(),
    id: id(),
    unitId: uuid().notNull(),
    /** The compressor that was on the unit on that day, and its model, as the record had them then; null: it had none. */
    fitId: uuid(),
    modelId: uuid(),
    /** service, proved-repair */
    occasion: text().$type<Occasion>().notNull(),
    measuredOn: date({ mode: 'string' }).notNull(),
    /** SI; as typed beside it, by the same names. */
    conditions: jsonb().$type<Conditions>().notNull(),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    note: text(),
    createdBy: uuid(),
    createdAt: createdAt(),
    hiddenAt: instant(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.unitId], foreignColumns: [unit.organisationId, unit.id] }),
    foreignKey({ columns: [t.organisationId, t.fitId], foreignColumns: [fit.organisationId, fit.id] }),
    foreignKey({ columns: [t.organisationId, t.modelId], foreignColumns: [compressorModel.organisationId, compressorModel.id] }),
    index('baseline_set_unit').on(t.organisationId, t.unitId, t.measuredOn),
    index('baseline_set_model').on(t.organisationId, t.modelId),
    organisationPolicy(),
  ],
).enableRLS();

/** One figure of a set, with what was typed for it. */
export const baselineFigure = pgTable(
  'baseline_figure',
  {
    organisationId: organisationId(),
    setId: uuid().notNull(),
    /** build-up-time, head-temperature, leak-down-released, share-loaded, oil-carried */
    figure: text().$type<FigureId>().notNull(),
    valueSi: si().notNull(),
    errorSi: si().notNull(),
    valueTyped: text().notNull(),
    /** null: the instrument's usual error was taken. */
    errorTyped: text(),
    /** In which the value was understood. */
    unit: text().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.setId, t.figure] }),
    foreignKey({ columns: [t.organisationId, t.setId], foreignColumns: [baselineSet.organisationId, baselineSet.id] }),
    organisationPolicy(),
  ],
).enableRLS();
