import { z } from 'zod';
import { checkbox, optionalLine, rowId } from './common';
import { day, measureText, optionalDay, reason, versionText } from './record';
import { optionalTerm, term } from './terms';

/** What may have been changed with a compressor, or kept: column of a fit, and what it is called. */
export const PARTS_WITH_IT = [
  { field: 'dischargeLine', label: 'Discharge line' },
  { field: 'governor', label: 'Governor' },
  { field: 'feedLine', label: 'Oil feed line' },
  { field: 'intakeHose', label: 'Intake hose' },
  { field: 'dryerCartridge', label: 'Dryer cartridge' },
  { field: 'driveGear', label: 'Drive gear' },
] as const;

const installed = {
  modelId: z.uuid('Choose a model.'),
  condition: term('condition', 'Choose new or rebuilt.'),
  installedOn: day('the day on which it was fitted'),
  installedOdometer: measureText,
  installedEngineHours: measureText,
  sealant: optionalTerm('sealant'),
  dischargeLine: optionalTerm('withIt'),
  governor: optionalTerm('withIt'),
  feedLine: optionalTerm('withIt'),
  intakeHose: optionalTerm('withIt'),
  dryerCartridge: optionalTerm('withIt'),
  driveGear: optionalTerm('withIt'),
  systemCleaned: optionalTerm('yesNo'),
  breakInRun: optionalTerm('yesNo'),
  note: optionalLine(2000),
};

/** The instrument was replaced since the reading before. */
const installedReplaced = { installedOdometerReplaced: checkbox, installedEngineHoursReplaced: checkbox };
const removedReplaced = { removedOdometerReplaced: checkbox, removedEngineHoursReplaced: checkbox };

const removedReadings = { removedOdometer: measureText, removedEngineHours: measureText };

export const createFitInput = z.strictObject({
  id: rowId,
  unitId: rowId,
  ...installed,
  ...installedReplaced,
  /** Why the compressor that is on the unit comes out for this one; it then comes out at the same day and readings. */
  previousWhyOut: optionalTerm('whyOut'),
  /** Given for a fit of the past. */
  removedOn: optionalDay,
  ...removedReadings,
  ...removedReplaced,
  whyOut: optionalTerm('whyOut'),
});

export const changeFitInput = z.strictObject({
  fitId: rowId,
  version: versionText,
  ...installed,
  ...installedReplaced,
  removedOn: optionalDay,
  ...removedReadings,
  ...removedReplaced,
  whyOut: optionalTerm('whyOut'),
});

export const takeOutFitInput = z.strictObject({
  fitId: rowId,
  version: versionText,
  removedOn: day('the day on which it came out'),
  ...removedReadings,
  ...removedReplaced,
  whyOut: term('whyOut', 'Say why it came out.'),
});

export const hideFitInput = z.strictObject({ fitId: rowId, reason });

export const fitIdInput = z.strictObject({ unitId: rowId, fitId: rowId });
