import type { Definition } from '@/components/ui/DefinitionList';
import { measureText } from '@/components/units/MeasureField';
import { dayText } from '@/lib/schemas/day-text';
import { PARTS_WITH_IT } from '@/lib/schemas/fit';
import { termLabel } from '@/lib/schemas/terms';
import type { UnitPage } from '@/lib/services/unit/read';
import type { UnitPreferences } from '@/lib/units';

type Fit = Omit<UnitPage['fits'][number], 'ranM'>;

const readings = (day: string, odometerM: number | null, engineS: number | null, units: UnitPreferences) =>
  [dayText(day), measureText(odometerM, { quantity: 'distance' }, units), measureText(engineS, { quantity: 'engineHours' }, units)].filter(Boolean).join(', ');

/** When a compressor went on and came out, and at what. */
export const spanFacts = (fit: Fit, units: UnitPreferences): Definition[] => [
  { term: 'Model', value: fit.modelName },
  { term: 'New or rebuilt', value: termLabel('condition', fit.condition) },
  { term: 'Fitted', value: readings(fit.installedOn, fit.installedOdometerM, fit.installedEngineS, units), figure: true },
  ...(fit.removedOn
    ? [
        { term: 'Came out', value: readings(fit.removedOn, fit.removedOdometerM, fit.removedEngineS, units), figure: true },
        { term: 'Why it came out', value: termLabel('whyOut', fit.whyOut) },
      ]
    : []),
];

/** How it was fitted. */
export const practiceFacts = (fit: Fit): Definition[] => [
  { term: 'Sealant at the gasket', value: termLabel('sealant', fit.sealant) },
  ...PARTS_WITH_IT.map(({ field, label }) => ({ term: label, value: termLabel('withIt', fit[field]) })),
  { term: 'Old oil cleaned out', value: termLabel('yesNo', fit.systemCleaned) },
  { term: 'Break-in run', value: termLabel('yesNo', fit.breakInRun) },
  { term: 'Note', value: fit.note },
];
