import { selectModel } from '@/db/queries/compressor-model';
import { selectFitsOfUnit } from '@/db/queries/fit';
import { selectUnit } from '@/db/queries/unit';
import { selectReadings } from '@/db/queries/unit-reading';
import type { Executor } from '@/db/connect';
import type { RecordFacts } from '@/lib/diagnose';
import { notFound } from '@/lib/errors';
import { currentFitOn, recordFactsOf } from './record-facts';

/** The compressor on a unit on a day (YYYY-MM-DD), and what the record knows that a check would ask. */
export async function unitRecord(
  tx: Executor,
  { organisationId, unitId, on }: { organisationId: string; unitId: string; on: string },
): Promise<{ fitId: string | null; facts: RecordFacts }> {
  const unit = await selectUnit(tx, { organisationId, unitId });
  if (!unit) throw notFound('unit');
  const fits = await selectFitsOfUnit(tx, { organisationId, unitId });
  const readings = await selectReadings(tx, { organisationId, unitId });
  const current = currentFitOn(fits, on);
  const model = current && (await selectModel(tx, { organisationId, modelId: current.modelId }));
  return { fitId: current?.id ?? null, facts: recordFactsOf({ unit, fits, model, readings }, on) };
}
