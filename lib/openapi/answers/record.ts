import { z } from 'zod';
import { asTyped, count, day, id, instant, list, si, texts } from './common';

/** Units, readings, fits, compressor models, sites. Measures are SI; what was typed stands beside them. */

const kept = { asTyped, note: z.string().nullable(), createdAt: instant, updatedAt: instant.nullable() };
const text = z.string().nullable();

export const unitList = list('units', z.object({ id, fleetNumber: z.string(), vehicleKind: z.string(), siteId: id, siteName: z.string() })).meta({ id: 'UnitList' });

export const unitAnswer = z
  .object({
    id,
    siteId: id,
    siteName: z.string(),
    timeZone: z.string(),
    fleetNumber: z.string(),
    vocation: text,
    country: z.string(),
    vehicleKind: z.string(),
    builtOn: day.nullable(),
    engineFamily: text,
    reservoirM3: si('m³'),
    requiredReservoirM3: si('m³'),
    reservoirCount: count.nullable(),
    dryerCartridgeChangedOn: day.nullable(),
    ...kept,
    hiddenAt: instant.nullable(),
    values: texts(
      'fleetNumber', 'siteId', 'vehicleKind', 'vocation', 'country', 'builtOn', 'engineFamily', 'reservoirs', 'requiredReservoirs',
      'reservoirCount', 'dryerCartridgeChangedOn', 'note',
    ),
  })
  .meta({ id: 'Unit' });

export const readingList = list(
  'readings',
  z.object({
    id,
    readOn: day,
    odometerM: si('m'),
    engineS: si('s'),
    odometerReplaced: z.boolean(),
    engineHoursReplaced: z.boolean(),
    asTyped,
    source: z.string(),
    note: text,
    by: text,
  }),
).meta({ id: 'ReadingList' });

const fit = z.object({
  id,
  unitId: id,
  modelId: id,
  modelName: z.string(),
  condition: z.string(),
  installedOn: day,
  installedOdometerM: si('m'),
  installedEngineS: si('s'),
  removedOn: day.nullable(),
  removedOdometerM: si('m'),
  removedEngineS: si('s'),
  whyOut: text,
  sealant: text,
  dischargeLine: text,
  governor: text,
  feedLine: text,
  intakeHose: text,
  dryerCartridge: text,
  driveGear: text,
  systemCleaned: text,
  breakInRun: text,
  ...kept,
});

export const fitList = list('fits', fit).meta({ id: 'FitList' });

export const fitAnswer = fit
  .extend({
    values: texts(
      'modelId', 'condition', 'installedOn', 'installedOdometer', 'installedEngineHours', 'removedOn', 'removedOdometer', 'removedEngineHours',
      'whyOut', 'sealant', 'dischargeLine', 'governor', 'feedLine', 'intakeHose', 'dryerCartridge', 'driveGear', 'systemCleaned', 'breakInRun', 'note',
    ),
  })
  .meta({ id: 'Fit' });

export const fitWritten = z.object({ id, unitId: id });
export const readingWritten = z.object({ unitId: id });

export const modelList = list(
  'models',
  z.object({ id, name: z.string(), displacementM3: si('m³'), cooling: text, intakeType: text, drainOpening: text }),
).meta({ id: 'ModelList' });

export const modelAnswer = z
  .object({
    id,
    name: z.string(),
    displacementM3: si('m³'),
    boreM: si('m'),
    strokeM: si('m'),
    cylinders: count.nullable(),
    driveRatio: si('turns of the compressor for one of the engine'),
    cooling: text,
    unloading: text,
    intakeType: text,
    drainOpening: text,
    oilFeedPlace: text,
    driveGear: text,
    portBoreM: si('m'),
    lineSizeM: si('m'),
    breakInEngineRpm: count.nullable(),
    breakInPressurePa: si('Pa'),
    breakInLeastS: si('s'),
    breakInMostS: si('s'),
    breakInSource: text,
    ...kept,
    hiddenAt: instant.nullable(),
    values: texts(
      'name', 'displacement', 'bore', 'stroke', 'cylinders', 'driveRatio', 'cooling', 'unloading', 'intakeType', 'drainOpening', 'oilFeedPlace',
      'driveGear', 'portBore', 'lineSize', 'breakInEngineRpm', 'breakInPressure', 'breakInLeast', 'breakInMost', 'breakInSource', 'note',
    ),
  })
  .meta({ id: 'CompressorModel' });

export const siteAnswer = z.object({ id, name: z.string(), timeZone: z.string() }).meta({ id: 'Site' });
export const siteList = list('sites', siteAnswer);
export const siteWritten = z.object({ siteId: id });
export const nothing = z.object({});
