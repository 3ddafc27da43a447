import { z } from 'zod';
import { checkbox, line, optionalLine, rowId } from './common';
import { filterId, filterOf, filterText, ordered } from './list';
import { day, measureText, optionalCount, optionalDay, reason, versionText } from './record';
import { optionalTerm, term } from './terms';

const facts = {
  fleetNumber: line('the fleet number', 40),
  siteId: z.uuid('Choose a site.'),
  vehicleKind: term('vehicleKind', 'Choose truck or bus.'),
  vocation: optionalTerm('vocation'),
  /** ISO 3166-1 alpha-2; the organisation's when it is left out. */
  country: z
    .union([z.literal(''), z.string().trim().toUpperCase().regex(/^[A-Z]{2}$/)], 'Give the two letters of the country, such as US.')
    .nullish()
    .transform((text) => text || null),
  builtOn: optionalDay,
  engineFamily: optionalLine(80),
  reservoirs: measureText,
  requiredReservoirs: measureText,
  reservoirCount: optionalCount(20),
  dryerCartridgeChangedOn: optionalDay,
  note: optionalLine(2000),
};

const readings = {
  odometer: measureText,
  engineHours: measureText,
  odometerReplaced: checkbox,
  engineHoursReplaced: checkbox,
};

export const createUnitInput = z.strictObject({
  id: rowId,
  ...facts,
  odometer: measureText,
  engineHours: measureText,
  /** The day of the readings; today at the unit's site when it is left out. */
  readOn: optionalDay,
});

export const changeUnitInput = z.strictObject({ unitId: rowId, version: versionText, ...facts });

export const unitIdInput = z.strictObject({ unitId: rowId });

export const hideUnitInput = z.strictObject({ unitId: rowId, reason });

export const showUnitInput = z.strictObject({ unitId: rowId, reason: optionalLine(500) });

export const addReadingInput = z.strictObject({ unitId: rowId, readOn: day('the day of the reading'), ...readings, note: optionalLine(500) });

/** Not `reason`: its form stands on one page with that of hiding the unit, and a field's name is its id. */
export const strikeReadingInput = z.strictObject({ unitId: rowId, readingId: rowId, whyWrong: reason });

export const UNIT_SORTS = ['number', 'site', 'kind', 'vocation', 'built'] as const;

export const listUnitsInput = z.object({
  q: filterText,
  site: filterId,
  vocation: filterOf(['long-haul', 'regional', 'stop-start', 'air-for-unloading']),
  kind: filterOf(['truck', 'bus']),
  hidden: filterOf(['yes']),
  ...ordered(UNIT_SORTS),
});
