/** A rulebook of the size that the order names: 200 rules, 60 checks of 4 answers, 28 causes; 20 checks answered. */
import type { Finding, Rule, Rulebook } from '@/lib/diagnose';
import { book, cause, choice, finding, rule, somethingElse } from '@/tests/support/rulebook-parts';
import { seededRandom, type Random } from '@/tests/support/random';

const CAUSES = 27;
const CHECKS = 60;
const TABLE_RULES_A_CHECK = 3;
const COMPOUND_RULES = 20;
const GROUPS = 8;
const ANSWERED = 20;
const STATES = ['a', 'b', 'c', 'd'] as const;

export function benchCase(seed = 7): { rulebook: Rulebook; findings: Finding[] } {
  const random = seededRandom(seed);
  const causeIds = Array.from({ length: CAUSES }, (_, i) => `cause-${i}`);
  const checks = Array.from({ length: CHECKS }, (_, i) => choice(`check-${i}`, Object.fromEntries(STATES.map((state) => [state, 1 / STATES.length]))));
  const tableRules = checks.flatMap(({ id }, i) => tableRulesOf(random, id, `group-${i % GROUPS}`, causeIds));
  const compoundRules = Array.from({ length: COMPOUND_RULES }, (_, i) => {
    const [first, second] = random.shuffle(checks);
    return rule(`compound ${i}`, { [first?.id ?? '']: random.pick(STATES), [second?.id ?? '']: random.pick(STATES) }, { [random.pick(causeIds)]: random.between(-8, 8) });
  });
  return {
    rulebook: book({
      causes: [...causeIds.map((id) => cause(id, 0.94 / CAUSES)), somethingElse(0.06)],
      checks,
      rules: [...tableRules, ...compoundRules],
      evidenceGroups: Array.from({ length: GROUPS }, (_, i) => ({ id: `group-${i}`, name: `Group ${i}` })),
    }),
    findings: checks.slice(0, ANSWERED).map(({ id }) => finding(id, random.pick(STATES))),
  };
}

/** Three of the four answers tell something, each of five causes; the fourth is what is left. */
function tableRulesOf(random: Random, checkId: string, group: string, causeIds: readonly string[]): Rule[] {
  return STATES.slice(0, TABLE_RULES_A_CHECK).map((state) => {
    const weights = Object.fromEntries(random.shuffle(causeIds).slice(0, 5).map((id) => [id, random.between(-8, 0.8)]));
    return rule(`${checkId} ${state}`, { [checkId]: state }, weights, { group });
  });
}
