import { selectFittings, selectInstallAnswers, type FittingRow, type InstallAnswerRow } from '@/db/queries/fitting';
import { PERMITTED } from '@/lib/auth/permissions';
import { unreadOf } from '@/lib/case/view/work-cautions';
import { pointsFor, saidOf, standingAnswers, type InstallPoint } from '@/lib/fitting';
import { fittingsInput, type FittingsView, type FittingView, type InstallPointView } from '@/lib/schemas/fitting';
import { workOn } from '../case/work-on';
import { defineRead } from '../define';
import { fittingWork } from './work';

/** The fittings of a case, each with its install record. */
export const listFittings = defineRead({
  name: 'list.fitting',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: fittingsInput,
  run: async ({ tx, ctx, input: { caseId } }): Promise<FittingsView> => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { caseHead, compiled, acknowledged } = await workOn(tx, ctx, caseId);
    const answers = await selectInstallAnswers(tx, of);
    return {
      caseId,
      unitId: caseHead.unitId,
      ...unreadOf(compiled, fittingWork(compiled), acknowledged),
      fittings: (await selectFittings(tx, of)).map((row) => fittingView(row, answers.filter(({ fittingId }) => fittingId === row.id))),
    };
  },
});

function fittingView(row: FittingRow, answers: readonly InstallAnswerRow[]): FittingView {
  const said = standingAnswers(answers);
  const { id, fitId, modelName, installedOn, startedBy, finishedBy } = row;
  return {
    id,
    fitId,
    modelName,
    installedOn,
    startedAt: row.startedAt.toISOString(),
    startedBy,
    finishedAt: row.finishedAt?.toISOString() ?? null,
    finishedBy,
    points: pointsFor(row).map((point) => pointView(point, said.get(point.id))),
  };
}

function pointView({ onlyFor: _, ...point }: InstallPoint, answer: InstallAnswerRow | undefined): InstallPointView {
  const said = answer && saidOf(point, answer);
  return {
    ...point,
    answers: point.answers.map(({ id, label, asks, against }) => ({ id, label, asks: asks ?? null, against: against ?? false })),
    said: said ? { answer: said.answer, label: said.label, against: said.against, value: said.value, note: said.note, by: said.by, at: said.at.toISOString() } : null,
  };
}
