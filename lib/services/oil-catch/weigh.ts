import { selectFindings } from '@/db/queries/finding';
import { insertWeighing, selectWeighings, type OilCatch, type WeighingRow } from '@/db/queries/oil-catch';
import { PERMITTED } from '@/lib/auth/permissions';
import { SUM_BY_WEIGHT, textsOfWeighings, WRITTEN_HERE } from '@/lib/case/weighings';
import { conflict, invalid } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { measureUnit } from '@/lib/schemas/measures';
import { OIL_MEASURE, USUAL_SCALE_ERROR_KG, WEIGHING_MEASURES, weighInput } from '@/lib/schemas/oil-catch';
import { formatQuantity, parseError } from '@/lib/units';
import { lockCaseOf } from '../case/locked';
import { writeFinding } from '../case/write-finding';
import { writingOf } from '../case/writing';
import type { Ctx } from '../context';
import { defineWrite } from '../define';
import { decimalMarkOf, readMeasures, withUnit } from '../units-of-measure';
import { lockCatchOf, refuseCalled, refuseEnded } from './open-case';
import { planReminder } from './reminder';

/** What the scale can't show of what one bottle holds. */
const MOST_OIL_KG = 20;

/**
 * Weighs what was caught since the weighing before, and answers the check with the sum of all of them: the finding that
 * stood goes into the case's history. The id is the client's: sent twice, it is weighed once.
 */
export const weigh = defineWrite({
  name: 'weigh.oil-catch',
  doing: 'weigh oil for a case',
  roles: PERMITTED['case.work'],
  input: weighInput,
  run: async ({ tx, ctx, input: { id, caseId, catchId, oilError, note, ...typed }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId, catchId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const under = await lockCatchOf(tx, of);
    const weighings = await selectWeighings(tx, { ...of, catchIds: [catchId] });
    if (weighings.some((one) => one.id === id)) {
      unchanged();
      return { id, caseId };
    }
    refuseCalled(head);
    refuseEnded(under);
    const standing = weighings.filter(({ takenBackAt }) => takenBackAt === null);
    const { columns, asTyped } = readMeasures(ctx, WEIGHING_MEASURES, typed);
    const error = oilError ? readScaleError(ctx, oilError) : { si: USUAL_SCALE_ERROR_KG };
    const weighed = { ...columns, ...readWeighing({ columns, before: lastMeter(under, standing) }), massErrorKg: error.si };

    const at = ctx.now();
    const findingId = newId(at.getTime());
    const texts = textsOfWeighings([...standing, weighed]);
    await writeFinding(
      { tx, ctx, audit },
      {
        head,
        compiled,
        rows: await selectFindings(tx, of),
        input: { ...written(under, at), id: findingId, answer: { kind: 'sum', sum: SUM_BY_WEIGHT, inputs: texts, sureness: 'sure' } },
        writing: { ...writingOf(ctx), decimal: WRITTEN_HERE.decimal },
      },
    );
    const isNew = await insertWeighing(tx, { ...of, id, ...weighed, asTyped: error.asTyped ? { ...asTyped, massErrorKg: error.asTyped } : asTyped, note, personId: ctx.person.id, at, findingId });
    if (!isNew) throw conflict('This id belongs to another weighing.');
    await planReminder(tx, ctx.jobs, { ...of, from: at, everyDays: under.remindEveryDays });
    audit({ entity: 'oil-weighing', entityId: id, changed: { caseId, checkId: under.checkId, ...weighed, note } });
    return { id, caseId };
  },
});

/** What a finding of a catch has in common, whoever makes it. */
export const written = ({ checkId, stage }: Pick<OilCatch, 'checkId' | 'stage'>, at: Date) =>
  ({ checkId, stage, askedBecause: 'choice', deviceAt: at.toISOString(), clockOffsetMs: 0 }) as const;

/** The hour meter as it stood last; null: nobody read it, or an hour meter came in between that can't be told. */
const lastMeter = (under: OilCatch, standing: readonly WeighingRow[]): number | null => (standing.at(-1) ?? under).engineS;

interface Read {
  columns: { engineS: number | null; massKg: number | null; ranS: number | null };
  /** The hour meter when it was read before. */
  before: number | null;
}

function readWeighing({ columns: { engineS, massKg, ranS }, before }: Read): { massKg: number; ranS: number } {
  if (massKg === null) throw invalid({ oil: 'Enter what the oil weighed; 0 when there was none.' });
  if (massKg < 0 || massKg > MOST_OIL_KG) throw invalid({ oil: 'This is no weight of oil from a bottle.' });
  const ran = engineS !== null && before !== null ? engineS - before : ranS;
  if (ran === null) throw invalid(before === null ? { hoursRun: 'The hour meter was not read before: enter the hours run since.' } : { engineHours: 'Read the hour meter, or enter the hours run since.' });
  if (ran <= 0) {
    throw invalid(ran === ranS ? { hoursRun: 'The engine has to have run.' } : { engineHours: `The meter stood at ${formatQuantity(before ?? 0, { quantity: 'engineHours', unit: 'h' })} before.` });
  }
  return { massKg, ranS: ran };
}

/** How far the scale can be off. A figure alone is in the unit that stands beside its field. */
function readScaleError({ person, organisation }: Ctx, text: string): { si: number; asTyped?: string } {
  const error = parseError(text, { quantity: OIL_MEASURE.quantity, defaultUnit: measureUnit(person.units, OIL_MEASURE), decimal: decimalMarkOf(organisation.country) });
  if (!error.ok) throw invalid({ oilError: error.message });
  return { si: error.si, asTyped: withUnit(error, OIL_MEASURE.quantity) };
}
