import type { ModelRow } from '@/db/queries/compressor-model';
import { BREAK_IN_MEASURES, MODEL_MEASURES } from '@/lib/schemas/measures';
import type { UnitPreferences } from '@/lib/units';
import { chosen, plain, type FormValue } from '../form-value';
import { fieldText } from '../units-of-measure';

/** The fields of the form as a model fills them. */
export function modelFormValues(row: ModelRow, units: UnitPreferences) {
  const measures = Object.fromEntries([...MODEL_MEASURES, ...BREAK_IN_MEASURES].map((measure) => [measure.field, plain(fieldText(units, measure, row))]));
  return {
    ...(measures as Record<(typeof MODEL_MEASURES | typeof BREAK_IN_MEASURES)[number]['field'], FormValue>),
    name: plain(row.name),
    cylinders: plain(row.cylinders),
    cooling: chosen('cooling', row.cooling),
    unloading: chosen('unloading', row.unloading),
    intakeType: chosen('intakeType', row.intakeType),
    drainOpening: chosen('drainOpening', row.drainOpening),
    oilFeedPlace: chosen('oilFeedPlace', row.oilFeedPlace),
    driveGear: chosen('driveGear', row.driveGear),
    breakInEngineRpm: plain(row.breakInEngineRpm),
    breakInSource: plain(row.breakInSource),
    note: plain(row.note),
  };
}
