import { completeRow } from './complete-table';
import type { CompiledCheck, CompiledGroup, CompiledRule, CompiledRulebook } from './compiled';
import { natsOf } from './decibans';
import { RulebookError } from './errors';
import { sortedBy } from './order';
import { checksMentioned, compileCondition, factOfState, type RuleFacts } from './predicates';
import type { Check, Rule, Rulebook } from './types';

/**
 * Compiles a rulebook that `parseRulebook` has accepted. It does no other checking, and needs neither Zod nor the
 * engine, so that a browser can do it with the edition it was sent; anything else goes through `compileRulebook`.
 *
 * @param rulebook a valid rulebook; it is kept, not copied, and must not be changed afterwards
 * @returns the tables completed, the rules indexed and their conditions compiled
 * @throws RulebookError where a table can't be completed, which `parseRulebook` would have said
 */
export function compileTrusted(rulebook: Rulebook): CompiledRulebook {
  const causes = sortedBy(rulebook.causes, (cause) => cause.id);
  const causeIds = causes.map((cause) => cause.id);
  const causeIndex = new Map(causeIds.map((id, index) => [id, index]));
  const priorSum = causes.reduce((sum, cause) => sum + cause.prior, 0);
  const priors = Float64Array.from(causes, (cause) => cause.prior / priorSum);

  const rules = sortedBy(rulebook.rules, (rule) => rule.name).map((rule) => compileRule(rulebook, causeIds, rule));
  const compoundRules = rules.filter((rule) => rule.kind === 'compound');
  const checks = sortedBy(rulebook.checks, (check) => check.id).map((check) => {
    const own = rules.filter((rule) => rule.kind === 'table' && rule.checkIds[0] === check.id);
    return compileCheck(rulebook, causeIds, check, own, compoundRules);
  });
  const normalised = new Map(checks.flatMap((check) => check.tableRules).map((rule) => [rule.name, rule]));

  return {
    rulebook,
    settings: rulebook.settings,
    causeIds,
    causeIndex,
    priors,
    checks: new Map(checks.map((check) => [check.id, check])),
    rules: new Map(rules.map((rule) => [rule.name, normalised.get(rule.name) ?? rule])),
    compoundRules,
  };
}

function compileRule(rulebook: Rulebook, causeIds: readonly string[], rule: Rule): CompiledRule {
  const checkIds = checksMentioned(rule.conditions);
  const kind = checkIds.length === 1 ? 'table' : 'compound';
  const weights = new Map(Object.entries(rule.weights));
  return {
    name: rule.name,
    rule,
    kind,
    checkIds,
    holds: compileCondition(rule.conditions),
    group: groupOf(rulebook, rule.group, kind === 'table' ? `check:${checkIds[0]}` : `rule:${rule.name}`),
    nats: causeIds.map((id) => {
      const decibans = weights.get(id);
      return decibans === undefined ? undefined : natsOf(decibans);
    }),
  };
}

function groupOf(rulebook: Rulebook, named: string | undefined, own: string): CompiledGroup {
  const { defaultRho } = rulebook.settings;
  if (named === undefined) return { id: own, rho: defaultRho };
  return { id: named, rho: rulebook.evidenceGroups.find((group) => group.id === named)?.rho ?? defaultRho };
}

function compileCheck(
  rulebook: Rulebook,
  causeIds: readonly string[],
  check: Check,
  rules: readonly CompiledRule[],
  compoundRules: readonly CompiledRule[],
): CompiledCheck {
  const facts = check.states.map((state) => factOfState(check.kind, state));
  const backgrounds = check.states.map((state) => state.background);
  const seenAs = facts.map((fact): RuleFacts => new Map([[check.id, fact]]));
  const fires = rules.map((rule) => seenAs.map((seen) => rule.holds(seen)));

  const rows = causeIds.map((causeId, cause) => {
    const given = facts.map((_, state) => rules.find((rule, r) => fires[r]?.[state] && rule.nats[cause] !== undefined)?.nats[cause]);
    const row = completeRow(backgrounds, given);
    if (!row.coherent) throw new RulebookError([incoherent(check.id, causeId, row.total)]);
    return { ...row, nats: given.map((nats) => (nats === undefined ? row.fill : nats - row.excess)) };
  });
  const tableRules = rules.map((rule) => ({
    ...rule,
    nats: rule.nats.map((nats, cause) => (nats === undefined ? undefined : nats - (rows[cause]?.excess ?? 0))),
  }));

  return {
    id: check.id,
    check,
    stateIds: check.states.map((state) => state.id),
    stateIndex: new Map(check.states.map((state, index) => [state.id, index])),
    facts,
    backgrounds,
    group: tableRules[0]?.group ?? groupOf(rulebook, undefined, `check:${check.id}`),
    tableRules,
    rulesByState: facts.map((_, state) => tableRules.filter((_rule, r) => fires[r]?.[state])),
    fill: Float64Array.from(rows, (row) => row.fill),
    table: facts.map((_, state) => Float64Array.from(rows, (row) => row.nats[state] ?? 0)),
    compoundRules: compoundRules.filter((rule) => rule.checkIds.includes(check.id)),
    reliability: check.reliability ?? rulebook.settings.defaultReliability,
  };
}

function incoherent(checkId: string, causeId: string, total: number) {
  return {
    path: `checks "${checkId}"`,
    message: `the weights of "${causeId}" make its answers add up to ${total.toFixed(3)}`,
    instead: 'run parseRulebook first: it names the rule and the largest weight allowed',
  };
}
