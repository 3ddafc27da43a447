import { findingsFromRecord, overRecord } from '@/lib/diagnose/findings-from-record';
import { compileRulebook, sharesOf, type Answer, type CompiledRulebook, type Finding, type RecordFacts } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';

export const compiled: CompiledRulebook = compileRulebook(defaultRulebook);

export type Sureness = 'sure' | 'think-so';

/** An answer as a case states it: a state of a choice, or a reading in SI. */
export interface Given {
  check: string;
  answer: string | number;
}

/** An answer to a choice. */
export const says = (check: string, answer: string): Given => ({ check, answer });

/** A reading, SI, with the usual error of its instrument. */
export const reads = (check: string, value: number): Given => ({ check, answer: value });

/** One given answer as a finding at diagnosis. */
export function findingOf({ check: id, answer: given }: Given, sureness: Sureness = 'sure'): Finding {
  const check = compiled.checks.get(id);
  if (!check) throw new Error(`the default rulebook has no check "${id}"`);
  const answer: Answer =
    typeof given === 'string'
      ? { kind: 'state', state: given, sureness }
      : { kind: 'measured', value: given, error: check.check.usualError ?? 0, sureness };
  return { id: `asked:${id}`, checkId: id, stage: { kind: 'diagnosis' }, ...sharesOf(check, answer) };
}

/** What was answered, over what the record knows. */
export function findingsOf(given: readonly Given[], facts: RecordFacts = {}): Finding[] {
  return overRecord(given.map((each) => findingOf(each)), findingsFromRecord(compiled, facts));
}

/** The same finding, answered "think so". */
export function thoughtSo(finding: Finding): Finding {
  return { ...finding, reliability: compiled.checks.get(finding.checkId)?.reliability ?? 1 };
}
