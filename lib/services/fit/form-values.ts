import type { FitRow } from '@/db/queries/fit';
import { PARTS_WITH_IT } from '@/lib/schemas/fit';
import { INSTALLED_MEASURES, REMOVED_MEASURES } from '@/lib/schemas/measures';
import type { UnitPreferences } from '@/lib/units';
import { chosen, plain, type FormValue } from '../form-value';
import { fieldText } from '../units-of-measure';

/** The fields of the form as a fit fills them. */
export function fitFormValues(row: FitRow, units: UnitPreferences) {
  const measures = Object.fromEntries([...INSTALLED_MEASURES, ...REMOVED_MEASURES].map((measure) => [measure.field, plain(fieldText(units, measure, row))]));
  const parts = Object.fromEntries(PARTS_WITH_IT.map(({ field }) => [field, chosen('withIt', row[field])]));
  return {
    ...(measures as Record<(typeof INSTALLED_MEASURES | typeof REMOVED_MEASURES)[number]['field'], FormValue>),
    ...(parts as Record<(typeof PARTS_WITH_IT)[number]['field'], FormValue>),
    modelId: { text: row.modelId, shown: row.modelName },
    condition: chosen('condition', row.condition),
    installedOn: plain(row.installedOn),
    removedOn: plain(row.removedOn),
    whyOut: chosen('whyOut', row.whyOut),
    sealant: chosen('sealant', row.sealant),
    systemCleaned: chosen('yesNo', row.systemCleaned),
    breakInRun: chosen('yesNo', row.breakInRun),
    note: plain(row.note),
  };
}
