import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import type { RankedCause } from '@/lib/diagnose/types';
import type { ExplainedCause, Explanation, Reason } from '@/lib/diagnose/explain';
import type { CaseReasons, CauseView, FindingView, ReasonView } from '@/lib/schemas/case-view';
import type { KeptRun } from '../rows';

/** Every cause with its level and how it moved since the run before, highest first. */
export function causeViews(causes: readonly RankedCause[], previous: KeptRun | null): CauseView[] {
  const before = new Map(previous?.causes.map(({ causeId, p }) => [causeId, p]));
  return causes.map(({ causeId, p, prior }) => ({
    causeId,
    p,
    prior,
    change: before.has(causeId) ? p - (before.get(causeId) ?? 0) : null,
  }));
}

/** The reasons of every cause that counted, most telling first. */
export function reasonViews(compiled: CompiledRulebook, { causes }: Explanation, shown: readonly FindingView[]): CaseReasons['causes'] {
  const answers = new Map(shown.map((finding) => [finding.id, finding]));
  return Object.fromEntries(causes.map((cause) => [cause.causeId, cause.reasons.flatMap((reason) => reasonView(compiled, cause, reason, answers))]));
}

function reasonView(
  compiled: CompiledRulebook,
  cause: ExplainedCause,
  reason: Reason,
  answers: ReadonlyMap<string, FindingView>,
): ReasonView[] {
  if (!reason.strength) return [];
  const [rule] = reason.rules;
  return [
    {
      findingIds: reason.findingIds,
      finding: reason.findingIds
        .map((id, index) => `${compiled.checks.get(reason.checkIds[index] ?? '')?.check.name ?? ''}: ${answers.get(id)?.answer ?? ''}`)
        .join(' and '),
      direction: reason.strength.direction,
      strength: reason.strength.word,
      decibans: reason.countedDecibans,
      note: rule?.note ?? FILLED_IN[reason.strength.direction],
      basis: rule?.basis ?? null,
      source: rule?.source ?? null,
      without: cause.p - (cause.withoutFinding.find(({ findingId }) => reason.findingIds.includes(findingId))?.changeInP ?? 0),
    },
  ];
}

/** A weight that the compiler filled in, so that a table adds up: what it says follows from the answers that were written. */
const FILLED_IN = {
  for: 'The other answers would count against this cause; this is the one they leave.',
  against: 'Another answer would have pointed to this cause; this one does not.',
};
