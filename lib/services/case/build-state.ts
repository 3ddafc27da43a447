import type { FindingRow } from '@/db/queries/finding';
import type { RunResult } from '@/db/schema';
import type { CompiledRulebook, Finding, Ranking, RecordFacts, SetUp } from '@/lib/diagnose';
import { explain } from '@/lib/diagnose/explain';
import { rankPairs } from '@/lib/diagnose/pairs';
import type { CaseState } from '@/lib/schemas/case-view';
import type { UnitPreferences } from '@/lib/units';
import { findingsForRanking } from './findings-for-ranking';
import { causeViews } from './view/causes';
import { findingViews, type NoteRow } from './view/findings';
import { whatNext } from './view/next';

export interface StateParts {
  compiled: CompiledRulebook;
  head: { id: string; version: number; status: string; vehicleState: SetUp; labourRatePerHour: number | null };
  rows: readonly FindingRow[];
  notes: readonly NoteRow[];
  run: { id: string; result: RunResult; recordFacts: RecordFacts; becauseOf: string | null; agreed: boolean };
  /** What the run before this one gave; null in the first. */
  previous: RunResult | null;
  acknowledged: CaseState['acknowledged'];
  units: UnitPreferences;
  /** The past instant that is shown; null: now. */
  at: Date | null;
}

/** A case as it stands, for the page and the API: pure, so that a past state is made as the present one is. */
export function buildState({ compiled, head, rows, notes, run, previous, acknowledged, units, at }: StateParts): CaseState {
  const findings = findingsForRanking(rows);
  const facts = run.recordFacts;
  const shown = findingViews(compiled, rows, notes, units);
  const because = shown.find((finding) => finding.id === run.becauseOf);
  const explanation = explain(compiled, findings, { facts });
  const { ranking } = explanation;
  return {
    caseId: head.id,
    version: head.version,
    status: statusOf(head.status),
    runId: run.id,
    at: at?.toISOString() ?? null,
    differs: !run.agreed || !isSame(ranking, run.result),
    vehicleState: head.vehicleState,
    causes: causeViews(compiled, explanation, previous, shown),
    fit: ranking.fit,
    suspicion: ranking.suspicion,
    because: because ? `${compiled.checks.get(because.checkId)?.check.name ?? ''}: ${because.answer}` : null,
    findings: shown,
    ...whatNext({ compiled, findings, recordFacts: facts, vehicleState: head.vehicleState, labourRatePerHour: head.labourRatePerHour }),
    pair: pairView(compiled, findings, facts),
    acknowledged,
  };
}

/** A run of record comes out the same when it is made again, to the last bit, or something is wrong. */
function isSame({ causes }: Ranking, kept: RunResult): boolean {
  return causes.length === kept.causes.length && causes.every(({ causeId, p }, i) => kept.causes[i]?.causeId === causeId && kept.causes[i]?.p === p);
}

function pairView(compiled: CompiledRulebook, findings: Finding[], facts: RecordFacts): CaseState['pair'] {
  const { offered, pairs } = rankPairs(compiled, findings, { facts });
  const [best] = pairs;
  return offered && best ? { causeIds: [...best.causeIds], leadDecibans: best.aheadDecibans } : null;
}

function statusOf(status: string): CaseState['status'] {
  if (status === 'open' || status === 'called' || status === 'closed') return status;
  throw new Error(`a case is ${status}`);
}
