import type { Transaction } from '@/db/connect';
import type { selectCaseHead } from '@/db/queries/case';
import { selectFindingNotes, selectFindings } from '@/db/queries/finding';
import { selectLastRuns } from '@/db/queries/run';
import type { RunResult } from '@/db/schema';
import type { StateParts } from '@/lib/case/build-state';
import { findingsForRanking, rankOptions } from '@/lib/case/findings-for-ranking';
import { rank, type Ranking } from '@/lib/diagnose';
import { notFound } from '@/lib/errors';
import type { Ctx } from '../context';
import { workOn } from './work-on';

type Head = NonNullable<Awaited<ReturnType<typeof selectCaseHead>>>;

/**
 * Reads what a case's state is made of: now, or as it was at an instant, by what had been received until then.
 *
 * @throws AppError "not-found" for a case that isn't there, or that wasn't there yet
 */
export async function gatherState(tx: Transaction, ctx: Ctx, { caseId, at = null }: { caseId: string; at?: Date | null }): Promise<StateParts & { caseHead: Head }> {
  const of = { organisationId: ctx.organisation.id, caseId };
  const { caseHead: head, compiled, acknowledged } = await workOn(tx, ctx, caseId);
  const until = at ?? undefined;
  const rows = await selectFindings(tx, { ...of, receivedBy: until });
  const notes = await selectFindingNotes(tx, { ...of, by: until });
  const [run, previous] = await selectLastRuns(tx, { ...of, by: until });
  if (!run) throw notFound('state of the case');
  const { recordFacts } = run.inputs;
  const findings = findingsForRanking(rows);
  const ranking = rank(compiled, findings, rankOptions(findings, recordFacts));
  return {
    caseHead: head,
    compiled,
    head,
    rows,
    notes,
    run: { id: run.id, becauseOf: run.becauseOf, recordFacts, ranking, differs: !run.agreed || !isSame(ranking, run.result) },
    previous: previous?.result ?? null,
    acknowledged,
    units: ctx.person.units,
    at,
  };
}

/** A run of record comes out the same when it is made again, to the last bit, or something is wrong. */
function isSame({ causes }: Ranking, kept: RunResult): boolean {
  return causes.length === kept.causes.length && causes.every(({ causeId, p }, i) => kept.causes[i]?.causeId === causeId && kept.causes[i]?.p === p);
}
