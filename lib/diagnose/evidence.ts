import type { CompiledGroup, CompiledRule, CompiledRulebook } from './compiled';
import { evidenceNats } from './contributions';
import { byCodeUnits, sortedBy } from './order';
import { factsOf, type UsedFinding } from './used-findings';

/** Which rules fired: what the engine and the compiled predicates must agree on. */
export interface Fired {
  /** For each used finding, for each of its states with a share: the table rules that fired. */
  tables: readonly (readonly (readonly CompiledRule[])[])[];
  compounds: readonly CompiledRule[];
}

/** What one finding or one compound rule says of every cause, before attenuation. */
export interface EvidenceItem {
  kind: 'table' | 'compound';
  findingIds: string[];
  checkIds: string[];
  group: CompiledGroup;
  /** Rules that fired for it, sorted by name. */
  rules: readonly CompiledRule[];
  /** W by cause, nats. */
  nats: Float64Array;
}

/** The rules that fire by the compiled predicates. */
export function firedByPredicates(compiled: CompiledRulebook, used: readonly UsedFinding[]): Fired {
  const facts = factsOf(used);
  return {
    tables: used.map(({ check, states }) => states.map(({ index }) => check.rulesByState[index] ?? [])),
    compounds: compiled.compoundRules.filter((rule) => rule.holds(facts)),
  };
}

/** Names of all rules that fired, sorted, each once. */
export function firedNames(fired: Fired): string[] {
  const names = [...fired.tables.flat(2), ...fired.compounds].map((rule) => rule.name);
  return [...new Set(names)].sort(byCodeUnits);
}

/**
 * What the findings say, given which rules fired: one item for each finding, in the order of checks, then one for
 * each compound rule that fired, in the order of names. Every sum over evidence is taken in this order.
 *
 * A compound rule is as sure as all the findings it looks at together: its reliability is the product of theirs.
 */
export function evidenceItems(compiled: CompiledRulebook, used: readonly UsedFinding[], fired: Fired): EvidenceItem[] {
  const byCheck = new Map(used.map((each) => [each.check.id, each]));
  return [
    ...used.map((each, index) => tableItem(compiled, each, fired.tables[index] ?? [])),
    ...sortedBy(fired.compounds, (rule) => rule.name).map((rule) => compoundItem(rule, byCheck)),
  ];
}

function tableItem(
  compiled: CompiledRulebook,
  { finding, check, states }: UsedFinding,
  firedByState: readonly (readonly CompiledRule[])[],
): EvidenceItem {
  const shares = states.map(({ share }) => share);
  const weight = (rules: readonly CompiledRule[], cause: number) =>
    rules.find((rule) => rule.nats[cause] !== undefined)?.nats[cause] ?? check.fill[cause] ?? 0;
  return {
    kind: 'table',
    findingIds: [finding.id],
    checkIds: [check.id],
    group: check.group,
    rules: sortedBy([...new Set(firedByState.flat())], (rule) => rule.name),
    nats: Float64Array.from(compiled.causeIds, (_, cause) =>
      evidenceNats(states.map((_state, i) => weight(firedByState[i] ?? [], cause)), shares, finding.reliability),
    ),
  };
}

function compoundItem(rule: CompiledRule, byCheck: ReadonlyMap<string, UsedFinding>): EvidenceItem {
  const seen = rule.checkIds.flatMap((id) => byCheck.get(id) ?? []);
  const reliability = seen.reduce((product, { finding }) => product * finding.reliability, 1);
  return {
    kind: 'compound',
    findingIds: seen.map(({ finding }) => finding.id),
    checkIds: seen.map(({ check }) => check.id),
    group: rule.group,
    rules: [rule],
    nats: compoundNats(rule, reliability),
  };
}

/** W of a compound rule by cause, nats, when what it looks at is only so reliable. */
export function compoundNats(rule: CompiledRule, reliability: number): Float64Array {
  return Float64Array.from(rule.nats, (nats) => evidenceNats([nats ?? 0], [1], reliability));
}
