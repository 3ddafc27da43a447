import type { Transaction } from '@/db/connect';
import { selectBreakInEvents, selectBreakInRuns } from '@/db/queries/break-in';
import { selectFittings, selectInstallAnswers } from '@/db/queries/fitting';
import { selectReleases } from '@/db/queries/release';
import { selectWatches, selectWatchReadings } from '@/db/queries/watch';
import { answerText } from '@/lib/case/view/answer-text';
import type { CompiledRulebook } from '@/lib/diagnose';
import type { DossierParts } from '@/lib/dossier/content';
import { pointsFor, saidOf, standingAnswers } from '@/lib/fitting';
import { BEGIN_WORDS } from '@/lib/schemas/watch';
import { runOf } from '../break-in/work';
import type { Ctx } from '../context';

interface Of {
  organisationId: string;
  caseId: string;
  compiled: CompiledRulebook;
  causeName: (id: string) => string;
}

/** What of a dossier comes after the call: how it was fitted, run in, released, and what was read since. */
export async function gatherProof(tx: Transaction, ctx: Pick<Ctx, 'person'>, { compiled, causeName, ...of }: Of): Promise<Pick<DossierParts, 'installs' | 'breakIns' | 'releases' | 'watches'>> {
  const answers = await selectInstallAnswers(tx, of);
  const events = await selectBreakInEvents(tx, of);
  const checkOf = (checkId: string) => compiled.checks.get(checkId)?.check;
  const watches = [];
  for (const { row } of (await selectWatches(tx, of)).reverse()) {
    const readings = (await selectWatchReadings(tx, { ...of, watchId: row.id })).filter(({ row: one }) => one.takenBackAt === null);
    watches.push({
      cause: causeName(row.causeId),
      plan: row.plan.name,
      startedAt: row.startedAt,
      begin: row.begin.map(({ statement, answer, why }) => ({ statement, said: [BEGIN_WORDS[answer], why].filter(Boolean).join(': ') })),
      readings: readings.map(({ row: one, by }) => ({
        check: checkOf(one.checkId)?.name ?? one.checkId,
        answer: answerText(checkOf(one.checkId), { ...one, errorSi: null }, ctx.person.units),
        isInOrder: one.verdict === 'in-order',
        by: by ?? one.byName ?? '',
        at: one.at,
      })),
      endedAt: row.endedAt,
      outcome: row.outcome,
      why: row.why,
      proof: row.proof,
    });
  }
  return {
    installs: (await selectFittings(tx, of)).map((fitting) => {
      const said = standingAnswers(answers.filter(({ fittingId }) => fittingId === fitting.id));
      return {
        modelName: fitting.modelName,
        installedOn: fitting.installedOn,
        finishedAt: fitting.finishedAt,
        points: pointsFor(fitting).map((point) => {
          const answer = said.get(point.id);
          return { name: point.name, said: answer ? saidOf(point, answer) : null };
        }),
      };
    }),
    breakIns: (await selectBreakInRuns(tx, of)).map((row) => ({ run: runOf(row, events), startedBy: row.startedBy, outcome: row.outcome, whyStopped: row.whyStopped, figures: row.figures, hotCheck: row.hotCheck })),
    releases: await selectReleases(tx, of),
    watches,
  };
}
