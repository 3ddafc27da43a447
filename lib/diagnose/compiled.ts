import type { Predicate } from './predicates';
import type { Check, Rule, Rulebook, RulebookSettings } from './types';

/** An evidence group, or a check's table or compound rule that is a group of its own. */
export interface CompiledGroup {
  /** An evidence group's id, "check:<id>" or "rule:<name>". */
  id: string;
  /** Attenuation, [0, 1]. */
  rho: number;
}

export interface CompiledRule {
  name: string;
  rule: Rule;
  /** A table rule's conditions mention one check, a compound rule's two or more. */
  kind: 'table' | 'compound';
  /** Checks mentioned, sorted. */
  checkIds: readonly string[];
  holds: Predicate;
  group: CompiledGroup;
  /**
   * Weight in nats by cause, in the order of `causeIds`; undefined where the rule says nothing of the cause. A
   * table rule's weights are normalised where its author gave every answer.
   */
  nats: readonly (number | undefined)[];
}

export interface CompiledCheck {
  id: string;
  check: Check;
  stateIds: readonly string[];
  stateIndex: ReadonlyMap<string, number>;
  /** What rules see of each state: its id, or a number inside the band. */
  facts: readonly (string | number)[];
  /** b_v of each state. */
  backgrounds: readonly number[];
  group: CompiledGroup;
  /** Table rules of this check, sorted by name. */
  tableRules: readonly CompiledRule[];
  /** Those that fire in each state. */
  rulesByState: readonly (readonly CompiledRule[])[];
  /** Weight of every state that has none given, nats, by cause. */
  fill: Float64Array;
  /** The completed table: w_cv in nats, by state, then by cause. */
  table: readonly Float64Array[];
  /** Compound rules that mention this check, sorted by name. */
  compoundRules: readonly CompiledRule[];
  /** Reliability of "think so". */
  reliability: number;
}

/**
 * A rulebook made ready to rank. Everything is sorted by id or name, so that the order in which a rulebook is
 * written never reaches a result, not even its last bit.
 */
export interface CompiledRulebook {
  rulebook: Rulebook;
  settings: RulebookSettings;
  /** Sorted; every Float64Array by cause follows this order. */
  causeIds: readonly string[];
  causeIndex: ReadonlyMap<string, number>;
  /** Share of all cases, by cause; sums to 1. */
  priors: Float64Array;
  /** By id, in the order of ids. */
  checks: ReadonlyMap<string, CompiledCheck>;
  /** By name, in the order of names. */
  rules: ReadonlyMap<string, CompiledRule>;
  /** Sorted by name. */
  compoundRules: readonly CompiledRule[];
}
