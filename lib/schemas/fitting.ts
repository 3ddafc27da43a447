import { z } from 'zod';
import type { InstallPoint } from '@/lib/fitting';
import { rulebookId } from './case';
import { checkbox, optionalLine, rowId } from './common';
import { day, measureText } from './record';
import { optionalTerm, term } from './terms';

export const fittingsInput = z.strictObject({ caseId: rowId });

/** Begins a fitting: the new compressor is on the unit's record from here, and the one before it is off. */
export const startFittingInput = z.strictObject({
  id: rowId,
  caseId: rowId,
  newFitId: rowId,
  modelId: z.uuid('Choose a model.'),
  condition: term('condition', 'Choose new or rebuilt.'),
  installedOn: day('the day on which it is fitted'),
  installedOdometer: measureText,
  installedEngineHours: measureText,
  installedOdometerReplaced: checkbox,
  installedEngineHoursReplaced: checkbox,
  previousWhyOut: optionalTerm('whyOut'),
});

const ofFitting = { caseId: rowId, fittingId: rowId };

export const answerPointInput = z.strictObject({
  id: rowId,
  ...ofFitting,
  pointId: rulebookId,
  answer: z.string('Choose an answer.').regex(/^[a-z0-9-]{1,40}$/, 'Choose an answer.'),
  value: optionalLine(120),
  note: optionalLine(500),
});

export const finishFittingInput = z.strictObject(ofFitting);

/** What was last said of a point. */
export interface PointSaidView {
  answer: string;
  label: string;
  /** Known to shorten a compressor's life. */
  against: boolean;
  value: string | null;
  note: string | null;
  by: string;
  at: string;
}

export interface InstallPointView extends Omit<InstallPoint, 'onlyFor' | 'answers'> {
  answers: { id: string; label: string; asks: 'note' | 'value' | 'value-and-note' | null; against: boolean }[];
  said: PointSaidView | null;
}

/** The fitting of a compressor with its install record. */
export interface FittingView {
  id: string;
  fitId: string;
  modelName: string;
  installedOn: string;
  startedAt: string;
  startedBy: string;
  finishedAt: string | null;
  finishedBy: string | null;
  points: InstallPointView[];
}

export interface FittingsView {
  caseId: string;
  unitId: string;
  cautions: { id: string; text: string }[];
  /** Those that the reader has still to acknowledge today. */
  toRead: string[];
  fittings: FittingView[];
}
