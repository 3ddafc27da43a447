import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import type { SetUp } from '@/lib/diagnose/types';
import type { CaseState } from '@/lib/schemas/case-view';
import type { UnitPreferences } from '@/lib/units';
import { findingsForRanking } from './findings-for-ranking';
import { releaseHolds } from './release-holds';
import { causeViews } from './view/causes';
import type { FindingRow, KeptRun, NoteRow, ShownRun } from './rows';
import { findingViews } from './view/findings';
import { whatNext } from './view/next';

export interface StateParts {
  compiled: CompiledRulebook;
  head: { id: string; version: number; status: string; vehicleState: SetUp; labourRatePerHour: number | null };
  rows: readonly FindingRow[];
  notes: readonly NoteRow[];
  run: ShownRun;
  /** What the run before this one gave; null in the first. */
  previous: KeptRun | null;
  acknowledged: CaseState['acknowledged'];
  units: UnitPreferences;
  /** The past instant that is shown; null: now. */
  at: Date | null;
}

/** A case as it stands, for the page and the API: pure, so that a past state is made as the present one is. */
export function buildState({ compiled, head, rows, notes, run, previous, acknowledged, units, at }: StateParts): CaseState {
  const findings = findingsForRanking(rows);
  const { recordFacts } = run;
  const shown = findingViews(compiled, rows, notes, units);
  const because = shown.find((finding) => finding.id === run.becauseOf);
  const { ranking } = run;
  return {
    caseId: head.id,
    version: head.version,
    status: statusOf(head.status),
    runId: run.id,
    at: at?.toISOString() ?? null,
    differs: run.differs,
    vehicleState: head.vehicleState,
    causes: causeViews(ranking.causes, previous),
    fit: ranking.fit,
    suspicion: ranking.suspicion,
    because: because ? `${compiled.checks.get(because.checkId)?.check.name ?? ''}: ${because.answer}` : null,
    findings: shown,
    ...whatNext({ compiled, findings, recordFacts, vehicleState: head.vehicleState, labourRatePerHour: head.labourRatePerHour }),
    acknowledged,
    releaseHolds: releaseHolds(compiled, rows),
  };
}

function statusOf(status: string): CaseState['status'] {
  if (status === 'open' || status === 'called' || status === 'closed') return status;
  throw new Error(`a case is ${status}`);
}
