import { boolean, char, date, foreignKey, index, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { organisation, site } from './organisation';

/** A vehicle, known by its fleet number. */
export const unit = pgTable(
  'unit',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    siteId: uuid().notNull(),
    fleetNumber: text().notNull(),
    /** long-haul, regional, stop-start, air-for-unloading */
    vocation: text(),
    country: char({ length: 2 }).notNull(),
    /** truck, bus */
    vehicleKind: text().notNull(),
    builtOn: date({ mode: 'string' }),
    engineFamily: text(),
    /** Volume of all reservoirs, and what the rule asks for, m3: build-up is judged by their ratio. */
    reservoirM3: si(),
    requiredReservoirM3: si(),
    reservoirCount: integer(),
    /** The last time by itself; a change with a compressor stands with the fit. */
    dryerCartridgeChangedOn: date({ mode: 'string' }),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    note: text(),
    createdAt: createdAt(),
    updatedAt: instant(),
    hiddenAt: instant(),
    createdBy: uuid(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    unique('unit_fleet_number').on(t.organisationId, t.fleetNumber),
    foreignKey({ columns: [t.organisationId, t.siteId], foreignColumns: [site.organisationId, site.id] }),
    index('unit_site').on(t.organisationId, t.siteId),
    organisationPolicy(),
  ],
).enableRLS();

/**
 * Odometer and engine hours of a unit on a date. Never updated. A lower odometer than an earlier one is refused
 * unless the instrument was replaced, which the row then says: distances are summed over such breaks.
 */
export const unitReading = pgTable(
  'unit_reading',
  {
    organisationId: organisationId(),
    id: id(),
    unitId: uuid().notNull(),
    readOn: date({ mode: 'string' }).notNull(),
    odometerM: si(),
    engineS: si(),
    odometerReplaced: boolean().notNull().default(false),
    engineHoursReplaced: boolean().notNull().default(false),
    asTyped: jsonb().$type<Record<string, string>>().notNull().default({}),
    /** unit, fit, case: what it was entered with */
    source: text().notNull(),
    note: text(),
    createdBy: uuid(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.unitId], foreignColumns: [unit.organisationId, unit.id] }),
    index('unit_reading_unit').on(t.organisationId, t.unitId, t.readOn),
    organisationPolicy(),
  ],
).enableRLS();
