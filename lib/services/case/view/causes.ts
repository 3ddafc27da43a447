import type { RunResult } from '@/db/schema';
import type { CompiledRulebook } from '@/lib/diagnose';
import type { ExplainedCause, Explanation, Reason } from '@/lib/diagnose/explain';
import type { CauseView, FindingView, ReasonView } from '@/lib/schemas/case-view';

/** Every cause with its level, how it moved since the run before, and the reasons that counted, most telling first. */
export function causeViews(
  compiled: CompiledRulebook,
  { causes }: Explanation,
  previous: RunResult | null,
  shown: readonly FindingView[],
): CauseView[] {
  const before = new Map(previous?.causes.map(({ causeId, p }) => [causeId, p]));
  const answers = new Map(shown.map((finding) => [finding.id, finding]));
  return causes.map((cause) => ({
    causeId: cause.causeId,
    p: cause.p,
    prior: cause.prior,
    change: before.has(cause.causeId) ? cause.p - (before.get(cause.causeId) ?? 0) : null,
    reasons: cause.reasons.flatMap((reason) => reasonView(compiled, cause, reason, answers)),
  }));
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
