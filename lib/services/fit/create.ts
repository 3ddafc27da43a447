import type { z } from 'zod';
import { selectModel } from '@/db/queries/compressor-model';
import { insertFit, selectFit, selectFitsOfUnit, updateFit, type FitRow } from '@/db/queries/fit';
import { lockUnit, selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, invalid, notFound } from '@/lib/errors';
import { dayText } from '@/lib/schemas/day-text';
import { createFitInput } from '@/lib/schemas/fit';
import { siteDay } from '@/lib/case/site-day';
import { defineWrite, type Work } from '../define';
import { fitColumns } from './fit-columns';
import { writeFitReading } from './fit-readings';
import { overlaps } from './overlap';

/**
 * Records a compressor that was fitted to a unit. The one that is on it comes out for it when it is said why. Sent
 * twice (the same id), it records one.
 */
export const createFit = defineWrite({
  name: 'create.fit',
  doing: 'record fits',
  roles: PERMITTED['unit.edit'],
  input: createFitInput,
  run: (work) => writeFit(work),
});

/** Writes a fit with all that follows from it on the unit's record, within whatever made it necessary. */
export async function writeFit(work: Work<z.output<typeof createFitInput>>): Promise<{ id: string; unitId: string }> {
  const { tx, ctx, audit, unchanged } = work;
  const { id, unitId, previousWhyOut, ...typed } = work.input;
  const organisationId = ctx.organisation.id;
  await lockUnit(tx, { organisationId, unitId });
  const unit = await selectUnit(tx, { organisationId, unitId });
  if (!unit) throw notFound('unit');
  if (await selectFit(tx, { organisationId, fitId: id })) {
    unchanged();
    return { id, unitId };
  }
  const columns = fitColumns(ctx, typed, siteDay(ctx.now(), unit.timeZone));
  await refuseUnknownModel(work, columns.modelId);

  const fits = await selectFitsOfUnit(tx, { organisationId, unitId });
  const standing = fits.find((fit) => fit.removedOn === null && fit.installedOn <= columns.installedOn);
  if (previousWhyOut && !standing) throw invalid({ previousWhyOut: 'No compressor was on the unit on that day that could come out. Leave this open.' });
  if (standing && previousWhyOut) await takeOutFor(work, standing, { ...columns, whyOut: previousWhyOut });
  else if (standing && overlaps(standing, columns)) {
    throw invalid({ previousWhyOut: `The ${standing.modelName} fitted on ${dayText(standing.installedOn)} is still on the unit. Say why it comes out.` });
  }
  refuseOverlap(fits.filter((fit) => fit !== standing), columns);

  await writeFitReading(work, { ...columns, unitId }, 'installed', typed);
  await writeFitReading(work, { ...columns, unitId }, 'removed', typed);
  if (!(await insertFit(tx, { ...columns, organisationId, id, unitId, createdBy: ctx.person.id }))) throw conflict('This id belongs to something else.');
  audit({ entity: 'fit', entityId: id, changed: { unitId, ...columns } });
  return { id, unitId };
}

/** The compressor before comes out on the day, and at the readings, at which the new one goes on. */
async function takeOutFor(
  { tx, ctx, audit }: Work<unknown>,
  standing: FitRow,
  next: { installedOn: string; installedOdometerM: number | null; installedEngineS: number | null; asTyped: Record<string, string>; whyOut: string },
): Promise<void> {
  const { installedOdometerM, installedEngineS } = next.asTyped;
  const change = {
    removedOn: next.installedOn,
    removedOdometerM: next.installedOdometerM,
    removedEngineS: next.installedEngineS,
    whyOut: next.whyOut,
    asTyped: { ...standing.asTyped, ...(installedOdometerM && { removedOdometerM: installedOdometerM }), ...(installedEngineS && { removedEngineS: installedEngineS }) },
  };
  await updateFit(tx, { organisationId: ctx.organisation.id, fitId: standing.id }, { ...change, updatedAt: ctx.now() });
  audit({ entity: 'fit', entityId: standing.id, changed: change });
}

/** @throws AppError "invalid" beside the day on which another compressor was on the unit */
export function refuseOverlap(others: readonly FitRow[], span: { installedOn: string; removedOn: string | null }): void {
  const other = others.find((fit) => overlaps(fit, span));
  if (!other) return;
  const until = other.removedOn ? `from ${dayText(other.installedOn)} to ${dayText(other.removedOn)}` : `since ${dayText(other.installedOn)}`;
  const field = other.installedOn > span.installedOn ? 'removedOn' : 'installedOn';
  throw invalid({ [field]: `The ${other.modelName} was on the unit ${until}. Two can’t be on it at once.` });
}

/** @throws AppError "invalid" beside `modelId` */
export async function refuseUnknownModel({ tx, ctx }: Work<unknown>, modelId: string): Promise<void> {
  const model = await selectModel(tx, { organisationId: ctx.organisation.id, modelId });
  if (!model || model.hiddenAt) throw invalid({ modelId: 'This model is not in the list any more. Choose another.' });
}
