import { insertBaselineSet, selectBaselineSet } from '@/db/queries/baseline';
import { selectFitsOfUnit } from '@/db/queries/fit';
import { lockUnit, selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { conflict, notFound } from '@/lib/errors';
import { CONDITION_MEASURES, recordBaselineInput } from '@/lib/schemas/baseline';
import { refuseFutureDay } from '../days';
import { defineWrite } from '../define';
import { currentFitOn } from '../unit/record-facts';
import { readMeasures } from '../units-of-measure';
import { readFigures } from './read-figures';

/** Writes down what was measured on a unit in good order. The id is the client's: sent twice, it is written once. */
export const recordBaseline = defineWrite({
  name: 'record.baseline-set',
  doing: 'measure healthy baselines',
  roles: PERMITTED['case.work'],
  input: recordBaselineInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const { id, unitId, occasion, measuredOn, note, ...typed } = input;
    const of = { organisationId: ctx.organisation.id, unitId };
    await lockUnit(tx, of);
    const unit = await selectUnit(tx, of);
    if (!unit) throw notFound('unit');
    const held = await selectBaselineSet(tx, { ...of, setId: id });
    if (held && held.unitId !== unitId) throw takenId();
    if (held) {
      unchanged();
      return { id, unitId };
    }
    refuseFutureDay({ measuredOn }, siteDay(ctx.now(), unit.timeZone));
    const figures = readFigures(ctx, typed);
    const { columns: conditions, asTyped } = readMeasures(ctx, CONDITION_MEASURES, typed);
    const fit = currentFitOn(await selectFitsOfUnit(tx, of), measuredOn);
    const set = { unitId, fitId: fit?.id ?? null, modelId: fit?.modelId ?? null, occasion, measuredOn, conditions, asTyped, note };
    if (!(await insertBaselineSet(tx, { ...set, organisationId: of.organisationId, id, createdBy: ctx.person.id, createdAt: ctx.now() }, figures))) throw takenId();
    audit({ entity: 'baseline-set', entityId: id, changed: { ...set, ...Object.fromEntries(figures.map(({ figure, valueTyped }) => [figure, valueTyped])) } });
    return { id, unitId };
  },
});

const takenId = () => conflict('This id belongs to another set.');
