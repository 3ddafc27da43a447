import type { Transaction } from '@/db/connect';
import { insertRun } from '@/db/queries/run';
import type { RunInputs, RunResult } from '@/db/schema';
import { rankOptions } from '@/lib/case/findings-for-ranking';
import type { CompiledRulebook, Finding, Ranking, RecordFacts } from '@/lib/diagnose';
import { runOfRecord } from '@/lib/diagnose/record-run';
import { newId } from '@/lib/ids';

interface Asked {
  organisationId: string;
  caseId: string;
  editionId: string;
  compiled: CompiledRulebook;
  findings: Finding[];
  recordFacts: RecordFacts;
  /** The finding that changed something; null when the case was opened. */
  becauseOf: string | null;
  at: Date;
}

export interface MadeRun {
  id: string;
  ranking: Ranking;
  recordFacts: RecordFacts;
  becauseOf: string | null;
  differs: boolean;
}

/** Ranks by the rule engine and keeps the run, with all that it takes to make it again. */
export async function makeRun(tx: Transaction, asked: Asked): Promise<MadeRun> {
  const { compiled, findings, recordFacts } = asked;
  const started = performance.now();
  const { ranking, agreed, difference } = await runOfRecord(compiled, findings, rankOptions(findings, recordFacts));
  const id = newId(asked.at.getTime());
  await insertRun(tx, {
    organisationId: asked.organisationId,
    id,
    caseId: asked.caseId,
    editionId: asked.editionId,
    rankerVersion: ranking.rankerVersion,
    inputs: inputsOf(compiled, findings, recordFacts),
    result: resultOf(ranking),
    becauseOf: asked.becauseOf,
    agreed,
    difference: difference ?? null,
    durationMs: performance.now() - started,
    at: asked.at,
  });
  return { id, ranking, recordFacts, becauseOf: asked.becauseOf, differs: !agreed };
}

function inputsOf(compiled: CompiledRulebook, findings: Finding[], recordFacts: RecordFacts): RunInputs {
  const { settings, evidenceGroups } = compiled.rulebook;
  return {
    findings,
    recordFacts,
    beta: settings.beta,
    rho: Object.fromEntries(evidenceGroups.map((group) => [group.id, group.rho ?? settings.defaultRho])),
    limits: {},
  };
}

function resultOf(ranking: Ranking): RunResult {
  return {
    causes: ranking.causes.map(({ causeId, p, scoreNats }) => ({ causeId, p, scoreNats })),
    fired: ranking.fired,
    fit: ranking.fit,
  };
}
