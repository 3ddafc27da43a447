import { z } from 'zod';
import { rulebookId, stageInput } from './case';
import { optionalLine, rowId } from './common';
import type { MeasureField } from './measures';
import { measureText, optionalCount, reason } from './record';

/** How far the scale can be off, where nobody says: as the bench takes it. */
export const USUAL_SCALE_ERROR_KG = 5e-4;
export const USUAL_SCALE_ERROR = '0.5 g';

export const OIL_MEASURE = { quantity: 'mass', like: 'g' } as const;

export const CATCH_MEASURES = [{ field: 'engineHours', column: 'engineS', quantity: 'engineHours' }] as const satisfies readonly MeasureField[];

export const WEIGHING_MEASURES = [
  ...CATCH_MEASURES,
  { field: 'oil', column: 'massKg', ...OIL_MEASURE },
  { field: 'hoursRun', column: 'ranS', quantity: 'engineHours' },
] as const satisfies readonly MeasureField[];

const remindEveryDays = optionalCount(60);

export const startCatchInput = z.strictObject({
  id: rowId,
  caseId: rowId,
  checkId: rulebookId,
  stage: stageInput.default({ kind: 'diagnosis' }),
  /** As typed: "4,120 h". */
  engineHours: measureText,
  place: optionalLine(120),
  remindEveryDays,
});

export const weighInput = z.strictObject({
  id: rowId,
  caseId: rowId,
  catchId: rowId,
  /** As typed: "12.5 g". */
  oil: measureText,
  oilError: measureText,
  engineHours: measureText,
  /** Since the weighing before, where no meter tells. */
  hoursRun: measureText,
  note: optionalLine(500),
});

const ofCatch = { caseId: rowId, catchId: rowId };

export const remindCatchInput = z.strictObject({ ...ofCatch, remindEveryDays });
export const endCatchInput = z.strictObject({ ...ofCatch, whyEnded: optionalLine(500) });
export const takeBackWeighingInput = z.strictObject({ ...ofCatch, weighingId: rowId, whyTakenBack: reason });
export const caseOnly = z.strictObject({ caseId: rowId });
