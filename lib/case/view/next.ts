import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { nextChecks, type NextChecks, type Suggestion } from '@/lib/diagnose/next-checks';
import { openChecks } from '@/lib/diagnose/next-checks-open';
import type { Finding, RecordFacts, SetUp } from '@/lib/diagnose/types';
import { createWhatIf } from '@/lib/diagnose/what-if';
import type { NextView, RepairView } from '@/lib/schemas/case-view';
import { rankOptions } from '../findings-for-ranking';

interface Asked {
  compiled: CompiledRulebook;
  findings: readonly Finding[];
  recordFacts: RecordFacts;
  vehicleState: SetUp;
  labourRatePerHour: number | null;
}

/** More than this is a list to read, not a suggestion to take. */
const MOST_SUGGESTIONS = 6;

/** What to check next, and what would be repaired as things stand. */
export function whatNext({ compiled, findings, recordFacts, vehicleState, labourRatePerHour }: Asked): {
  next: NextView;
  repairs: RepairView[];
} {
  const options = rankOptions(findings, recordFacts);
  const open = openChecks(createWhatIf(compiled, findings, options), findings, options.stages);
  const chosen = nextChecks(open, {
    vehicle: { ...vehicleState, access: vehicleState.access ?? [] },
    money: labourRatePerHour === null ? {} : { labourRatePerHour },
  });
  return { next: nextView(compiled, chosen), repairs: repairViews(compiled, chosen) };
}

function nextView(compiled: CompiledRulebook, chosen: NextChecks): NextView {
  return {
    suggestions: chosen.suggestions.slice(0, MOST_SUGGESTIONS).map((suggestion) => ({
      checkIds: [...suggestion.checkIds],
      panelId: suggestion.panelId ?? null,
      word: suggestion.word,
      bits: suggestion.bits,
      minutes: suggestion.minutes,
      setUpMinutes: suggestion.setUpMinutes,
      because: becauseOf(compiled, suggestion),
    })),
    stop: chosen.enoughIsKnown,
    stopReason: chosen.enoughIsKnown
      ? 'Enough is known; repair. No check that is still open would save more than the time it takes.'
      : null,
    spoiled: chosen.spoiled,
  };
}

function becauseOf(compiled: CompiledRulebook, { why, checkIds }: Suggestion): string | null {
  if (why.kind === 'chosen') return checkIds.length > 1 ? 'These two tell more together than one by one.' : null;
  const names = why.checkIds.map((id) => `“${compiled.checks.get(id)?.check.name ?? id}”`);
  return `Waits: it would spoil ${names.join(' and ')}.`;
}

function repairViews(compiled: CompiledRulebook, { repair }: NextChecks): RepairView[] {
  const remedies = new Map(compiled.rulebook.remedies.map((remedy) => [remedy.id, remedy]));
  return repair.steps.flatMap((step) => {
    const remedy = remedies.get(step.remedyId);
    return remedy
      ? [{ remedyId: remedy.id, name: remedy.name, causeIds: step.causeIds, p: step.p, lookMinutes: remedy.look.minutes, fixMinutes: remedy.fix.minutes }]
      : [];
  });
}
