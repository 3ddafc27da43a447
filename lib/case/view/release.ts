import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import type { ReleaseCheck } from '@/lib/diagnose/types';
import type { Judgement } from '@/lib/limits';
import type { ReleaseCheckView } from '@/lib/schemas/release';
import type { UnitPreferences } from '@/lib/units';
import { standingFindings } from '../current-findings';
import type { FindingRow } from '../rows';
import { shareOf } from '../share-of';
import { findingViews } from './findings';

/** A check of a release with its answer as it stood. */
export interface ReleasedOn {
  checkId: string;
  name: string;
  findingId: string;
  /** In the units of whoever released. */
  answer: string;
  valueSi: number | null;
  judgement: Judgement | null;
}

interface Asked {
  compiled: CompiledRulebook;
  /** Every finding of the case. */
  rows: readonly FindingRow[];
  /** The last work on the vehicle: what was measured before it proves nothing. null: none is known. */
  since: Date | null;
  units: UnitPreferences;
}

/** A measured value on the edge counts as out. */
const OUT_FROM = 0.5;

/**
 * What has to be measured before a release, and how it stands: the edition's checks, and those that oil which went
 * downstream adds. A value is in order by the limit that the organisation adopted, else by the edition's answers. An edition
 * without a proof asks for nothing, which is said by an empty list.
 */
export function releaseChecks({ compiled, rows, since, units }: Asked): ReleaseCheckView[] {
  const plan = compiled.rulebook.proof?.release;
  if (!plan) return [];
  const standing = standingFindings(rows);
  const wet = plan.oilDownstream.when.filter(({ check, states }) => standing.some(({ checkId, shares }) => checkId === check && shareOf(shares, states) > 0));
  const because = wet.map(({ check }) => compiled.checks.get(check)?.check.name ?? check).join(', ') || null;
  const views = new Map(findingViews(compiled, rows, [], units).map((view) => [view.id, view]));
  const of = (required: readonly ReleaseCheck[], why: string | null) =>
    required.map(({ check: checkId, inOrder }): ReleaseCheckView => {
      const row = standing.find((one) => one.checkId === checkId && one.stage.kind === 'release' && one.shares.length > 0);
      const stale = row !== undefined && since !== null && row.correctedAt < since;
      const view = row && views.get(row.id);
      return {
        checkId,
        name: compiled.checks.get(checkId)?.check.name ?? checkId,
        because: why,
        verdict: !row || stale ? 'missing' : isOut(row, inOrder) ? 'out' : 'in-order',
        measured: row && view ? { findingId: row.id, answer: view.answer, by: row.person, at: row.correctedAt.toISOString(), stale, judgement: view.judgement?.text ?? null } : null,
      };
    });
  return [...of(plan.checks, null), ...(wet.length > 0 ? of(plan.oilDownstream.checks, because) : [])];
}

const isOut = ({ judgement, shares }: Pick<FindingRow, 'judgement' | 'shares'>, inOrder: readonly string[]): boolean => (judgement ? judgement.verdict === 'out' : 1 - shareOf(shares, inOrder) >= OUT_FROM);

/** What still forbids a release, in a sentence; null: nothing. */
export function whyNotReleased(checks: readonly ReleaseCheckView[]): string | null {
  const named = (verdict: ReleaseCheckView['verdict']) => checks.filter((check) => check.verdict === verdict).map(({ name }) => name);
  const [missing, out] = [named('missing'), named('out')];
  const parts = [missing.length > 0 && `Still to measure after the repair: ${missing.join(', ')}.`, out.length > 0 && `Out: ${out.join(', ')}.`].filter(Boolean);
  return parts.length > 0 ? parts.join(' ') : null;
}
