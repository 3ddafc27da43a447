import type { Executor } from '@/db/connect';
import { selectSetsOfModel, selectSetsOfUnit } from '@/db/queries/baseline';
import { selectFitsOfUnit } from '@/db/queries/fit';
import { baselineFor } from '@/lib/baseline/baseline-for';
import { pool } from '@/lib/baseline/pool';
import { currentFitOn } from '../unit/record-facts';

interface Of {
  organisationId: string;
  unitId: string;
  /** YYYY-MM-DD: today at the unit's site. */
  on: string;
}

/** The healthy baseline of a unit: its own sets, the pool of the model that is on it, and which of them counts for each figure. */
export async function gatherBaseline(tx: Executor, { organisationId, unitId, on }: Of) {
  const fits = await selectFitsOfUnit(tx, { organisationId, unitId });
  const current = currentFitOn(fits, on);
  const sets = await selectSetsOfUnit(tx, { organisationId, unitId });
  const pooled = current ? pool(await selectSetsOfModel(tx, { organisationId, modelId: current.modelId })) : {};
  // A compressor that came out and whose follower nobody recorded is no longer the one that was measured.
  const since = current?.installedOn ?? fits.flatMap(({ removedOn }) => removedOn ?? []).sort().at(-1) ?? null;
  const model = current ? { id: current.modelId, name: current.modelName } : null;
  return { sets, pooled, since, model, counts: baselineFor({ own: sets, since, pooled }) };
}
