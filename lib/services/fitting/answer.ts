import { selectFit, updateFit } from '@/db/queries/fit';
import { finishFittingRow, insertInstallAnswer, selectFittings, selectInstallAnswers } from '@/db/queries/fitting';
import type { Transaction } from '@/db/connect';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, invalid, notFound } from '@/lib/errors';
import { missingWith, pointsFor, practiceOf, standingAnswers } from '@/lib/fitting';
import { answerPointInput, finishFittingInput } from '@/lib/schemas/fitting';
import { lockCaseOf } from '../case/locked';
import { refuseUnread } from '../case/write-finding';
import { defineWrite, type Work } from '../define';
import { changedFields } from '../editing';
import { refuseClosed } from '../repair/locked';
import { fittingWork } from './work';

/**
 * Answers a point of the install record. What it says of a part is the fit's practice record from then on. The id is the
 * client's: sent twice, it is said once.
 */
export const answerPoint = defineWrite({
  name: 'answer.install-point',
  doing: 'fit compressors',
  roles: PERMITTED['case.work'],
  input: answerPointInput,
  run: async (work) => {
    const { tx, ctx, audit, unchanged, input } = work;
    const { id, caseId, fittingId, pointId, answer, value, note } = input;
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const row = await fittingOf(tx, { ...of, fittingId });
    const said = (await selectInstallAnswers(tx, of)).filter((one) => one.fittingId === fittingId);
    const known = said.find((one) => one.id === id);
    if (known) {
      if (known.pointId !== pointId) throw conflict('This id belongs to another point.');
      unchanged();
      return { id, caseId };
    }
    refuseClosed(head);
    if (row.finishedAt) throw conflict('This fitting is finished. What was done later is a repair of its own.');
    const option = pointsFor(row).find((point) => point.id === pointId)?.answers.find((one) => one.id === answer);
    if (!option) throw invalid({ answer: 'This is not an answer to this point.' });
    const missing = missingWith(option, { value, note });
    if (missing) throw invalid({ [missing.field]: missing.message });
    await refuseUnread(tx, ctx, { head, compiled, check: fittingWork(compiled) });
    const written = await insertInstallAnswer(tx, { ...of, id, fittingId, pointId, answer, value, note, personId: ctx.person.id, at: ctx.now() });
    if (!written) throw conflict('This id belongs to another point.');
    audit({ entity: 'fitting', entityId: fittingId, changed: { caseId, pointId, answer, value, note } });
    await keepPractice(work, row.fitId, practiceOf([...said, { pointId, answer }]));
    return { id, caseId };
  },
});

/** Finishes a fitting: every point has been answered. */
export const finishFitting = defineWrite({
  name: 'finish.fitting',
  doing: 'fit compressors',
  roles: PERMITTED['case.work'],
  input: finishFittingInput,
  run: async ({ tx, ctx, input: { caseId, fittingId }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    await lockCaseOf(tx, of);
    const row = await fittingOf(tx, { ...of, fittingId });
    if (row.finishedAt) {
      unchanged();
      return { id: fittingId, caseId };
    }
    const said = standingAnswers((await selectInstallAnswers(tx, of)).filter((one) => one.fittingId === fittingId));
    const open = pointsFor(row).filter(({ id }) => !said.has(id));
    if (open.length > 0) throw conflict(`Not finished yet. Still to answer: ${open.map(({ name }) => name).join(', ')}.`);
    await finishFittingRow(tx, { ...of, fittingId }, { finishedAt: ctx.now(), finishedBy: ctx.person.id });
    audit({ entity: 'fitting', entityId: fittingId, changed: { caseId, finished: true } });
    return { id: fittingId, caseId };
  },
});

async function fittingOf(tx: Transaction, { fittingId, ...of }: { organisationId: string; caseId: string; fittingId: string }) {
  const row = (await selectFittings(tx, of)).find(({ id }) => id === fittingId);
  if (!row) throw notFound('fitting');
  return row;
}

/** Puts what was answered on the fit's record, where it says something else. */
async function keepPractice({ tx, ctx, audit }: Work<unknown>, fitId: string, practice: ReturnType<typeof practiceOf>): Promise<void> {
  const of = { organisationId: ctx.organisation.id, fitId };
  const fit = await selectFit(tx, of);
  if (!fit) return;
  const changed = changedFields(fit, practice);
  if (Object.keys(changed).length === 0) return;
  await updateFit(tx, of, { ...changed, updatedAt: ctx.now() });
  audit({ entity: 'fit', entityId: fitId, changed });
}
