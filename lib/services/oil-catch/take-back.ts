import { selectFindings } from '@/db/queries/finding';
import { selectWeighings, updateWeighing } from '@/db/queries/oil-catch';
import { PERMITTED } from '@/lib/auth/permissions';
import { standingFindings } from '@/lib/case/current-findings';
import { SUM_BY_WEIGHT, textsOfWeighings, WRITTEN_HERE } from '@/lib/case/weighings';
import { conflict, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { takeBackWeighingInput } from '@/lib/schemas/oil-catch';
import { lockCaseOf } from '../case/locked';
import { writeFinding } from '../case/write-finding';
import { writingOf } from '../case/writing';
import { defineWrite } from '../define';
import { lockCatchOf, refuseCalled } from './open-case';
import { written } from './weigh';

/**
 * Takes a weighing back that was wrong: it counts no more, and the check is answered by the others, or open again. A check
 * that was answered otherwise since stays so. Only the last can be: the hours of those after it are counted from it.
 */
export const takeBackWeighing = defineWrite({
  name: 'take-back.oil-weighing',
  doing: 'weigh oil for a case',
  roles: PERMITTED['case.work'],
  input: takeBackWeighingInput,
  run: async ({ tx, ctx, input: { caseId, catchId, weighingId, whyTakenBack }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const under = await lockCatchOf(tx, { ...of, catchId });
    const all = await selectWeighings(tx, { ...of, catchIds: [catchId] });
    const weighing = all.find(({ id }) => id === weighingId);
    if (!weighing) throw notFound('weighing');
    if (weighing.takenBackAt) {
      unchanged();
      return { id: weighingId, caseId };
    }
    refuseCalled(head);
    const standing = all.filter(({ takenBackAt }) => takenBackAt === null);
    if (standing.at(-1)?.id !== weighingId) throw conflict('Take the later weighings back first: their hours are counted from this one.');

    const rows = await selectFindings(tx, of);
    const ours = new Set(all.flatMap(({ findingId, takenBackFindingId }) => [findingId, takenBackFindingId]));
    const answer = standingFindings(rows).find(({ checkId, stage }) => checkId === under.checkId && stage.kind === under.stage.kind);
    const at = ctx.now();
    const findingId = answer && ours.has(answer.id) ? newId(at.getTime()) : null;
    const others = standing.slice(0, -1);
    if (findingId) {
      await writeFinding(
        { tx, ctx, audit },
        {
          head,
          compiled,
          rows,
          input: { ...written(under, at), id: findingId, answer: others.length > 0 ? { kind: 'sum', sum: SUM_BY_WEIGHT, inputs: textsOfWeighings(others), sureness: 'sure' } : { kind: 'undo' } },
          writing: { ...writingOf(ctx), decimal: WRITTEN_HERE.decimal },
          atTheDesk: true,
        },
      );
    }
    await updateWeighing(tx, { ...of, weighingId }, { takenBackAt: at, takenBackBy: ctx.person.id, takenBackWhy: whyTakenBack, takenBackFindingId: findingId });
    audit({ entity: 'oil-weighing', entityId: weighingId, changed: { caseId, checkId: under.checkId, takenBack: true, reason: whyTakenBack } });
    return { id: weighingId, caseId };
  },
});
