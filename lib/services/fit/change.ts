import { selectFit, selectFitsOfUnit, updateFit, type FitRow } from '@/db/queries/fit';
import { lockUnit, selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, notFound } from '@/lib/errors';
import { dayText } from '@/lib/schemas/day-text';
import { changeFitInput, takeOutFitInput } from '@/lib/schemas/fit';
import { siteDay } from '@/lib/case/site-day';
import { defineWrite, type Work } from '../define';
import { changedFields, refuseStale } from '../editing';
import { textsOf } from '../form-value';
import { refuseOverlap, refuseUnknownModel } from './create';
import { fitColumns } from './fit-columns';
import { rewriteFitReading } from './fit-readings';
import { fitFormValues } from './form-values';

/** Corrects a fit; refused when somebody else changed it since the form was opened. */
export const changeFit = defineWrite({
  name: 'change.fit',
  doing: 'change fits',
  roles: PERMITTED['unit.edit'],
  input: changeFitInput,
  run: async (work) => {
    const { fitId, version, ...typed } = work.input;
    const before = await lockFit(work, fitId);
    refuseStale(before, { version, what: 'fit', typed, stored: fitFormValues(before, work.ctx.person.units) });
    return store(work, before, typed);
  },
});

/** Takes a compressor off its unit: when, at what readings, and why. */
export const takeOutFit = defineWrite({
  name: 'take-out.fit',
  doing: 'take compressors off units',
  roles: PERMITTED['unit.edit'],
  input: takeOutFitInput,
  run: async (work) => {
    const { fitId, version, ...typed } = work.input;
    const before = await lockFit(work, fitId);
    if (before.removedOn) throw conflict(`This compressor came out already, on ${dayText(before.removedOn)}.`);
    const values = fitFormValues(before, work.ctx.person.units);
    refuseStale(before, { version, what: 'fit', typed, stored: values });
    const whole = changeFitInput.parse({ ...textsOf(values), ...typed, fitId, version });
    return store(work, before, whole);
  },
});

/** The fit, with its unit locked, so that fits of one unit are changed one after the other. */
async function lockFit({ tx, ctx }: Work<unknown>, fitId: string): Promise<FitRow> {
  const of = { organisationId: ctx.organisation.id, fitId };
  const found = await selectFit(tx, of);
  if (!found) throw notFound('fit');
  await lockUnit(tx, { organisationId: of.organisationId, unitId: found.unitId });
  const fit = await selectFit(tx, of);
  if (!fit) throw notFound('fit');
  return fit;
}

async function store(work: Work<unknown>, before: FitRow, typed: Parameters<typeof fitColumns>[1]) {
  const { tx, ctx, audit, unchanged } = work;
  const organisationId = ctx.organisation.id;
  const answer = { id: before.id, unitId: before.unitId };
  const unit = await selectUnit(tx, { organisationId, unitId: before.unitId });
  if (!unit) throw notFound('unit');
  const next = fitColumns(ctx, typed, siteDay(ctx.now(), unit.timeZone), before);
  const changed = changedFields(before, next);
  if (Object.keys(changed).length === 0) {
    unchanged();
    return answer;
  }
  if (changed.modelId) await refuseUnknownModel(work, next.modelId);
  const others = (await selectFitsOfUnit(tx, { organisationId, unitId: before.unitId })).filter((fit) => fit.id !== before.id);
  refuseOverlap(others, next);
  await rewriteFitReading(work, before, next, 'installed', typed);
  await rewriteFitReading(work, before, next, 'removed', typed);
  await updateFit(tx, { organisationId, fitId: before.id }, { ...changed, updatedAt: ctx.now() });
  audit({ entity: 'fit', entityId: before.id, changed });
  return answer;
}
