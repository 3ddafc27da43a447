import { byStage, stageKey } from '@/lib/diagnose/stages';
import type { Finding, RecordFacts, Stage } from '@/lib/diagnose/types';
import { standingFindings } from './current-findings';
import type { FindingRow } from './rows';

type Row = Pick<FindingRow, 'id' | 'checkId' | 'stage' | 'source' | 'shares' | 'reliability' | 'kind' | 'correctedAt' | 'receivedAt'>;

const DIAGNOSIS: Stage = { kind: 'diagnosis' };

/**
 * The answers that stand as the ranker takes them, in an order that doesn't depend on when they came: those of the
 * diagnosis, and what was seen when something was opened at a repair, of checks that the diagnosis left open. A reading after
 * a repair is of another vehicle, and never contradicts the one that led to it; readings for a release or a watch rank nothing.
 */
export function findingsForRanking(rows: readonly Row[]): Finding[] {
  const standing = standingFindings(rows).sort((a, b) => byStage(a.stage, b.stage));
  const answered = new Set<string>();
  const used = standing.filter((row) => {
    const { kind } = row.stage;
    if (kind !== 'diagnosis' && (kind !== 'after-remedy' || row.source !== 'remedy' || row.shares.length === 0 || answered.has(row.checkId))) return false;
    if (row.shares.length > 0) answered.add(row.checkId);
    return true;
  });
  // What was left open by "can't tell" and seen at a repair is answered now.
  const seen = new Set(used.filter(({ stage }) => stage.kind === 'after-remedy').map(({ checkId }) => checkId));
  return used
    .filter(({ checkId, stage }) => stage.kind === 'after-remedy' || !seen.has(checkId))
    .map(({ id, checkId, stage, shares, reliability }) => ({ id, checkId, stage, shares, reliability }))
    .sort((a, b) => (a.id < b.id ? -1 : 1));
}

/**
 * With what these findings are ranked. Whoever ranks a case, or explains or looks ahead in one, goes by this: a call that
 * forgot the stages would leave out what was seen at a repair.
 */
export const rankOptions = (findings: readonly Pick<Finding, 'stage'>[], facts: RecordFacts) => ({ facts, stages: stagesOf(findings) });

/** The stages that a ranking of these findings uses: those that they are of, and the diagnosis in any case. */
export function stagesOf(findings: readonly Pick<Finding, 'stage'>[]): Stage[] {
  const stages = new Map([DIAGNOSIS, ...findings.map(({ stage }) => stage)].map((stage) => [stageKey(stage), stage]));
  return [...stages.values()].sort(byStage);
}
