import { completeRow, NORMALISED_WITHIN } from './complete-table';
import { decibansOf, natsOf } from './decibans';
import type { Problem } from './errors';
import { pathText } from './schema-limits';
import { tableRulesOf, type TableRule } from './schema-rules';
import type { Check, Rulebook } from './types';

/**
 * Tables that can't be true: with a cause's weights the chances of a check's answers would add up to more than one,
 * and the cause would gain whatever was answered.
 *
 * @param book a rulebook whose rules are sound each by itself
 * @returns one problem for each check and cause, naming the rule that weighs most and the largest weight allowed
 */
export function coherenceProblems(book: Rulebook): Problem[] {
  const tables = tableRulesOf(book);
  return book.checks.flatMap((check) => {
    const rules = tables.filter((table) => table.check === check);
    const causes = new Set(rules.flatMap(({ rule }) => Object.keys(rule.weights)));
    return [...causes].flatMap((cause) => rowProblem(check, cause, rules.filter(({ rule }) => Object.hasOwn(rule.weights, cause))));
  });
}

function rowProblem(check: Check, cause: string, rules: readonly TableRule[]): Problem[] {
  const backgrounds = check.states.map(({ background }) => background);
  const given = check.states.map((_, state) => {
    const decibans = rules.find(({ fires }) => fires[state])?.rule.weights[cause];
    return decibans === undefined ? undefined : natsOf(decibans);
  });
  const row = completeRow(backgrounds, given);
  if (row.coherent) return [];

  const parts = rules.map(({ rule, index, fires }) => {
    const background = backgrounds.reduce((sum, rate, state) => sum + (fires[state] ? rate : 0), 0);
    const decibans = rule.weights[cause] ?? 0;
    return { name: rule.name, index, background, decibans, share: background * Math.exp(natsOf(decibans)) };
  });
  const [most] = [...parts].sort((a, b) => b.share - a.share);
  if (!most) return [];
  const allGiven = given.every((nats) => nats !== undefined);
  const others = row.total - most.share;
  return [
    {
      rule: most.name,
      path: pathText(['rules', most.index, 'weights', cause]),
      message: allGiven
        ? `with "${cause}" the answers of "${check.id}" add up to ${row.total.toFixed(3)}, and every answer is given: it must be 1 within ${NORMALISED_WITHIN}`
        : `with "${cause}" the answers given of "${check.id}" add up to ${row.total.toFixed(3)}; the sum of background x 10^(dB/10) must stay below 1`,
      instead: allGiven
        ? wholeTableAdvice(most, others)
        : others < 1
          ? `the largest weight allowed here is ${below(decibansOf(Math.log((1 - others) / most.background)))} dB`
          : `lower the weights of ${parts.map(({ name }) => `"${name}"`).join(', ')} by more than ${(decibansOf(Math.log(row.total)) + 0.005).toFixed(2)} dB each`,
    },
  ];
}

function wholeTableAdvice(most: { decibans: number; background: number }, others: number): string {
  const advice = 'leave one answer out and it is filled in';
  return others < 1 ? `write ${decibansOf(Math.log((1 - others) / most.background)).toFixed(2)} dB, or ${advice}` : advice;
}

/** The largest weight with two decimals that is still below a bound. */
function below(bound: number): string {
  const floored = Math.floor(bound * 100) / 100;
  return (floored < bound ? floored : floored - 0.01).toFixed(2);
}
