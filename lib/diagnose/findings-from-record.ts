import type { CompiledCheck, CompiledRulebook } from './compiled';
import { FindingError } from './errors';
import { sharesOf } from './shares';
import type { Finding, RecordFacts, StateShare } from './types';

/**
 * The findings that unit, compressor model and fit already answer. A fact that is missing, a text that the check does
 * not list ("unknown"), or a number that the check calls impossible answers nothing.
 *
 * @param compiled the rulebook
 * @param facts facts by name; numbers in SI
 * @returns one sure finding at diagnosis for each check answered, sorted by check; its id is "record:<check>"
 * @example findingsFromRecord(compiled, { drainOpening: 'small-hole' })
 */
export function findingsFromRecord(compiled: CompiledRulebook, facts: RecordFacts): Finding[] {
  const known = new Map(Object.entries(facts));
  return [...compiled.checks.values()].flatMap((check): Finding[] => {
    const fact = check.check.fromRecord && known.get(check.check.fromRecord.fact);
    const shares = fact === undefined ? [] : sharesFromFact(check, fact);
    if (shares.length === 0) return [];
    return [{ id: `record:${check.id}`, checkId: check.id, stage: { kind: 'diagnosis' }, shares, reliability: 1 }];
  });
}

function sharesFromFact(check: CompiledCheck, fact: string | number): StateShare[] {
  if (check.check.kind === 'choice') {
    const states = check.check.fromRecord?.states;
    const state = states ? new Map(Object.entries(states)).get(String(fact)) : String(fact);
    return state !== undefined && check.stateIndex.has(state) ? [{ state, share: 1 }] : [];
  }
  if (typeof fact !== 'number') return [];
  try {
    return sharesOf(check, { kind: 'measured', value: fact, error: 0, sureness: 'sure' }).shares;
  } catch (error) {
    if (error instanceof FindingError && error.code === 'out-of-range') return [];
    throw error;
  }
}

/**
 * Puts what people answered over what the record says. An answer given at diagnosis overrules the record; "can't
 * tell" does not, since it says nothing.
 *
 * @param answered current findings of a case
 * @param fromRecord from `findingsFromRecord`
 * @returns both, without the record's where the check is answered
 */
export function overRecord(answered: readonly Finding[], fromRecord: readonly Finding[]): Finding[] {
  const says = new Set(answered.filter(({ shares, stage }) => shares.length > 0 && stage.kind === 'diagnosis').map(({ checkId }) => checkId));
  return [...answered, ...fromRecord.filter(({ checkId }) => !says.has(checkId))];
}
