import { selectModel } from '@/db/queries/compressor-model';
import { selectFitsOfUnit } from '@/db/queries/fit';
import { selectUnit } from '@/db/queries/unit';
import { waysTo } from '@/lib/air-and-oil/sums';
import { PERMITTED } from '@/lib/auth/permissions';
import { knownInputs } from '@/lib/bench/known-inputs';
import { standingFindings } from '@/lib/case/current-findings';
import { siteDay } from '@/lib/case/site-day';
import { answerText } from '@/lib/case/view/answer-text';
import { notFound } from '@/lib/errors';
import { sumTargetInput } from '@/lib/schemas/bench';
import { gatherState } from '../case/gather-state';
import { defineRead } from '../define';
import { currentFitOn } from '../unit/record-facts';

/** The check of a case that a sum of the bench is to answer: what stands there, and what the records know of the sum's inputs. */
export const readSumTarget = defineRead({
  name: 'read.sum-target',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: sumTargetInput,
  run: async ({ tx, ctx, input: { caseId, checkId, sumId } }) => {
    const { organisation, person } = ctx;
    const { caseHead, compiled, rows } = await gatherState(tx, ctx, { caseId });
    const check = compiled.checks.get(checkId)?.check;
    if (!check?.sum) throw notFound('check');
    if (!waysTo(check.sum.id).some(({ id }) => id === sumId)) throw notFound('sum of this check');
    const of = { organisationId: organisation.id, unitId: caseHead.unitId };
    const unit = await selectUnit(tx, of);
    const fit = currentFitOn(await selectFitsOfUnit(tx, of), siteDay(caseHead.openedAt, caseHead.timeZone));
    const model = fit && (await selectModel(tx, { organisationId: organisation.id, modelId: fit.modelId }));
    const standing = standingFindings(rows).find((row) => row.checkId === checkId && row.stage.kind === 'diagnosis' && row.shares.length > 0);
    return {
      target: {
        caseId,
        caseName: `case ${caseHead.number}, unit ${caseHead.fleetNumber}`,
        checkId,
        checkName: check.name,
        output: check.sum.output,
        standing: standing ? answerText(check, standing, person.units) : null,
        open: caseHead.status === 'open',
        reader: { personId: person.id, organisationId: organisation.id },
      },
      known: knownInputs(sumId, {
        reservoirM3: unit?.reservoirM3 ?? null,
        requiredReservoirM3: unit?.requiredReservoirM3 ?? null,
        displacementM3: model?.displacementM3 ?? null,
        boreM: model?.boreM ?? null,
        strokeM: model?.strokeM ?? null,
        cylinders: model?.cylinders ?? null,
        driveRatio: model?.driveRatio ?? null,
        lineSizeM: model?.lineSizeM ?? null,
      }),
    };
  },
});
