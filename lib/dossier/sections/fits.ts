import { dayText } from '@/lib/schemas/day-text';
import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { PARTS_WITH_IT } from '@/lib/schemas/fit';
import { termLabel } from '@/lib/schemas/terms';
import { facts, heading, text } from '../blocks';
import { measured } from '../measured';
import type { Writer } from '../writer';

type Part = (typeof PARTS_WITH_IT)[number]['field'];

export interface FitPart extends Record<Part, string | null> {
  modelName: string;
  condition: string;
  installedOn: string;
  installedOdometerM: number | null;
  installedEngineS: number | null;
  removedOn: string | null;
  removedOdometerM: number | null;
  removedEngineS: number | null;
  whyOut: string | null;
  sealant: string | null;
  systemCleaned: string | null;
  breakInRun: string | null;
  note: string | null;
}

/** @param fits of the unit, the latest first */
export function fitsSection(fits: readonly FitPart[], { units }: Writer): DossierBlock[] {
  if (fits.length === 0) return text('No compressor of this unit is in the record.');
  const at = (day: string, odometerM: number | null, engineS: number | null) => [dayText(day), measured(odometerM, 'distance', units), measured(engineS, 'engineHours', units)].filter(Boolean).join(', ');
  return fits.flatMap((fit) => [
    ...heading(`${fit.modelName}, ${termLabel('condition', fit.condition)?.toLowerCase() ?? ''}, fitted ${dayText(fit.installedOn)}`),
    ...facts(
      ['Fitted', at(fit.installedOn, fit.installedOdometerM, fit.installedEngineS)],
      ['Came out', fit.removedOn ? at(fit.removedOn, fit.removedOdometerM, fit.removedEngineS) : 'It is on the unit'],
      ['Why it came out', termLabel('whyOut', fit.whyOut)],
      ['Sealant at the gasket', termLabel('sealant', fit.sealant)],
      ...PARTS_WITH_IT.map(({ field, label }) => [label, termLabel('withIt', fit[field])] as const),
      ['Old oil cleaned out', termLabel('yesNo', fit.systemCleaned)],
      ['Break-in run', termLabel('yesNo', fit.breakInRun)],
      ['Note', fit.note],
    ),
  ]);
}
