import { and, desc, eq, inArray, lte, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { run, type RunInputs } from '@/db/schema';

interface Of {
  organisationId: string;
  caseId: string;
}

export async function insertRun(db: Executor, row: typeof run.$inferInsert): Promise<void> {
  await db.insert(run).values(row);
}

const ofCase = ({ organisationId, caseId }: Of) => and(eq(run.organisationId, organisationId), eq(run.caseId, caseId));

/** The last two runs of a case, newest first; `by` shows a past state. */
export async function selectLastRuns(db: Executor, { by, ...of }: Of & { by?: Date }) {
  return db
    .select({ id: run.id, becauseOf: run.becauseOf, inputs: run.inputs, result: run.result, agreed: run.agreed, at: run.at })
    .from(run)
    .where(and(ofCase(of), ...(by ? [lte(run.at, by)] : [])))
    .orderBy(desc(run.at), desc(run.id))
    .limit(2);
}

/** What an answer needs of the run before it. */
export async function selectLatestRun(db: Executor, of: Of) {
  const [row] = await db
    .select({ id: run.id, recordFacts: sql<RunInputs['recordFacts']>`${run.inputs} -> 'recordFacts'`, result: run.result })
    .from(run)
    .where(ofCase(of))
    .orderBy(desc(run.at), desc(run.id))
    .limit(1);
  return row;
}

/** Everything that a run of record kept, to make it again. */
export async function selectRun(db: Executor, { organisationId, runId }: { organisationId: string; runId: string }) {
  const [row] = await db
    .select()
    .from(run)
    .where(and(eq(run.organisationId, organisationId), eq(run.id, runId)));
  return row;
}

/** The leading cause of each case, for lists: one row a case. */
export async function selectLeaders(db: Executor, { organisationId, caseIds }: { organisationId: string; caseIds: string[] }) {
  if (caseIds.length === 0) return [];
  return db
    .selectDistinctOn([run.caseId], {
      caseId: run.caseId,
      causeId: sql<string>`${run.result} #>> '{causes,0,causeId}'`,
      p: sql<number>`(${run.result} #>> '{causes,0,p}')::double precision`,
    })
    .from(run)
    .where(and(eq(run.organisationId, organisationId), inArray(run.caseId, caseIds)))
    .orderBy(run.caseId, desc(run.at), desc(run.id));
}
