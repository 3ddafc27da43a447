import type { CheckState, Condition, FactCondition, RootCondition } from './types';

/** What the rules see of a case: the state of each answered check, or a number inside its band. */
export type RuleFacts = ReadonlyMap<string, string | number>;
export type Predicate = (facts: RuleFacts) => boolean;

/**
 * Compiles a rule's conditions into one function with the meaning that the run of record gives them: no condition
 * holds on a check that is not answered. Since there is no `not`, knowing more can make a condition hold, never
 * stop it from holding.
 *
 * @param condition a condition that the schema has accepted
 * @returns a function of the facts; it throws nothing
 * @example compileCondition({ all: [{ fact: 'noise', operator: 'equal', value: 'knock' }] })(new Map([['noise', 'knock']])) // true
 */
export function compileCondition(condition: Condition): Predicate {
  if ('all' in condition) {
    const parts = condition.all.map(compileCondition);
    return (facts) => parts.every((holds) => holds(facts));
  }
  if ('any' in condition) {
    const parts = condition.any.map(compileCondition);
    return (facts) => parts.some((holds) => holds(facts));
  }
  return compileFact(condition);
}

function compileFact({ fact, operator, value }: FactCondition): Predicate {
  const known = (test: (found: string | number) => boolean): Predicate => (facts) => {
    const found = facts.get(fact);
    return found !== undefined && test(found);
  };
  switch (operator) {
    case 'equal':
      return known((found) => found === value);
    case 'notEqual':
      return known((found) => found !== value);
    case 'in':
      return known((found) => (value as readonly unknown[]).includes(found));
    case 'notIn':
      return known((found) => !(value as readonly unknown[]).includes(found));
    case 'lessThan':
      return known((found) => found < value);
    case 'greaterThanInclusive':
      return known((found) => found >= value);
  }
}

/** Ids of the checks that a condition mentions, sorted, each once. */
export function checksMentioned(condition: Condition | RootCondition): string[] {
  const found = new Set<string>();
  const visit = (node: Condition): void => {
    if ('all' in node) node.all.forEach(visit);
    else if ('any' in node) node.any.forEach(visit);
    else found.add(node.fact);
  };
  visit(condition);
  return [...found].sort();
}

/**
 * What the rules see for a state of a check: its id for a choice, a number inside the band for a measured check.
 * Thresholds lie at band edges, so any number inside does; the lower edge also proves that it belongs to the band.
 */
export function factOfState(kind: 'choice' | 'measured', state: CheckState): string | number {
  return kind === 'choice' ? state.id : (state.low ?? -Number.MAX_VALUE);
}
