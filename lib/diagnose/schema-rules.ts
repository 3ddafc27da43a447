import type { Problem } from './errors';
import { checksMentioned, compileCondition, factOfState } from './predicates';
import { LIMITS, pathText } from './schema-limits';
import { SOMETHING_ELSE, type Check, type Rule, type Rulebook } from './types';

/** Compound weights, decibans: they correct what the tables say, and may not take over. */
export const COMPOUND_LIMIT = 10;

/** A table rule with the states in which it fires. */
export interface TableRule {
  rule: Rule;
  index: number;
  check: Check;
  fires: readonly boolean[];
}

/** The rules about one check, with the states in which each fires. */
export function tableRulesOf(book: Rulebook): TableRule[] {
  const checks = new Map(book.checks.map((check) => [check.id, check]));
  return book.rules.flatMap((rule, index) => {
    const ids = checksMentioned(rule.conditions);
    const check = ids.length === 1 ? checks.get(ids[0] ?? '') : undefined;
    if (!check) return [];
    const holds = compileCondition(rule.conditions);
    const fires = check.states.map((state) => holds(new Map([[check.id, factOfState(check.kind, state)]])));
    return [{ rule, index, check, fires }];
  });
}

/**
 * What is wrong with the rules taken together, once each condition by itself is sound.
 *
 * @param book a rulebook whose conditions have been read
 * @returns every problem found
 */
export function ruleProblems(book: Rulebook): Problem[] {
  const found: Problem[] = [];
  const add = (index: number, path: readonly PropertyKey[], message: string, instead: string) =>
    found.push({ rule: book.rules[index]?.name, path: pathText(['rules', index, ...path]), message, instead });

  book.rules.forEach((rule, index) => {
    if (Object.hasOwn(rule.weights, SOMETHING_ELSE)) {
      add(index, ['weights', SOMETHING_ELSE], '"something else" sits at the background rates by definition', 'leave it out');
    }
    if (checksMentioned(rule.conditions).length > 1) compoundProblems(book, rule, (path, ...words) => add(index, path, ...words));
  });

  const tables = tableRulesOf(book);
  for (const { rule, index, check, fires } of tables) {
    if (fires.every(Boolean)) add(index, ['conditions'], `it fires on every answer of "${check.id}"`, 'name only the answers that tell something');
    if (!fires.some(Boolean)) add(index, ['conditions'], `no answer of "${check.id}" makes it fire`, 'check its conditions against each other');
    const first = tables.find((other) => other.check === check);
    if (first && first.rule.group !== rule.group) {
      add(
        index,
        ['group'],
        `it is in ${groupName(rule)}, but rule "${first.rule.name}" on the same check is in ${groupName(first.rule)}`,
        'put all rules on one check in the same group, or in none',
      );
    }
  }
  tables.forEach(({ rule, index, check, fires }, later) => {
    for (const earlier of tables.slice(0, later).filter((other) => other.check === check)) {
      const state = check.states.find((_, i) => fires[i] && earlier.fires[i]);
      const cause = state && Object.keys(rule.weights).find((id) => Object.hasOwn(earlier.rule.weights, id));
      if (!state || cause === undefined) continue;
      add(
        index,
        ['weights', cause],
        `rule "${earlier.rule.name}" gives "${cause}" a weight for "${state.id}" too`,
        'give each cause one weight for each answer',
      );
    }
  });
  return found;
}

function groupName({ group }: Rule): string {
  return group === undefined ? 'no group' : `group "${group}"`;
}

function compoundProblems(book: Rulebook, rule: Rule, add: (path: readonly PropertyKey[], message: string, instead: string) => void): void {
  for (const [cause, decibans] of Object.entries(rule.weights)) {
    if (Math.abs(decibans) <= COMPOUND_LIMIT) continue;
    add(
      ['weights', cause],
      `${decibans} dB for "${cause}": a rule over several checks may weigh ${COMPOUND_LIMIT} dB at most either way`,
      `write ${Math.sign(decibans) * COMPOUND_LIMIT} or nearer to 0, and put the rest in the tables of the checks`,
    );
  }
  const ids = checksMentioned(rule.conditions);
  if (ids.length > LIMITS.checksInARule) {
    return add(['conditions'], `it looks at ${ids.length} checks`, `look at ${LIMITS.checksInARule} at most`);
  }
  const answers = ids.map((id) => {
    const check = book.checks.find((each) => each.id === id);
    return check?.states.map((state) => [id, factOfState(check.kind, state)] as const) ?? [];
  });
  const combinations = answers.reduce((product, states) => product * states.length, 1);
  if (combinations > LIMITS.combinationsInARule) {
    return add(['conditions'], `its checks have ${combinations} combinations of answers`, `look at fewer checks: ${LIMITS.combinationsInARule} combinations at most`);
  }
  const holds = compileCondition(rule.conditions);
  let fired = 0;
  for (let number = 0; number < combinations; number += 1) {
    let rest = number;
    const facts = answers.map((states) => {
      const state = states[rest % states.length] ?? ['', ''];
      rest = Math.floor(rest / states.length);
      return state;
    });
    if (holds(new Map(facts))) fired += 1;
  }
  if (fired === 0) add(['conditions'], 'no combination of answers makes it fire', 'check its conditions against each other');
  if (fired === combinations) add(['conditions'], 'it fires whatever its checks show', 'name only the answers that tell something');
}
