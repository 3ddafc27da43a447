import { LIMITS } from './schema-limits';
import { shown } from './schema-messages';
import type { CheckState, FactCondition, RootCondition } from './types';

/** What the conditions need to know of a check. */
export interface KnownCheck {
  id: string;
  kind: 'choice' | 'measured';
  states: readonly CheckState[];
}

type Report = (path: readonly PropertyKey[], message: string, instead: string) => void;

const CHOICE_OPERATORS = ['equal', 'notEqual', 'in', 'notIn'] as const;
const MEASURED_OPERATORS = ['lessThan', 'greaterThanInclusive'] as const;

/** Keys of json-rules-engine that are refused, and why. */
const REFUSED_KEYS = new Map([
  ['not', ['"not" would hold on checks that nobody has answered', 'use notEqual or notIn on the check itself']],
  ['condition', ['a named condition can’t be followed here', 'write the conditions out']],
  ['path', ['"path" would be run as an expression', 'leave it out: a check has one plain answer']],
  ['params', ['a check takes no "params"', 'leave it out']],
  ['priority', ['conditions have no order', 'leave "priority" out']],
]);

/**
 * Checks a rule's conditions: the engine's traps, one by one, each with a message of its own.
 *
 * @param raw the conditions as written
 * @param checks checks of the rulebook, by id
 * @param report takes the place below "conditions", what is wrong, and what to write instead
 * @returns the conditions, or undefined when something was reported
 */
export function readConditions(raw: unknown, checks: ReadonlyMap<string, KnownCheck>, report: Report): RootCondition | undefined {
  let sound = true;
  let count = 0;
  const refuse: Report = (path, message, instead) => {
    sound = false;
    report(path, message, instead);
  };

  function visit(node: unknown, path: readonly PropertyKey[], isRoot: boolean): void {
    count += 1;
    if (count === LIMITS.conditionsInARule + 1) refuse(path, `more than ${LIMITS.conditionsInARule} conditions`, 'split the rule');
    if (count > LIMITS.conditionsInARule) return;
    if (typeof node !== 'object' || node === null || Array.isArray(node)) {
      return refuse(path, `${shown(node)} is not a condition`, 'write { "all": [...] } or { "any": [...] }');
    }
    const keys = Object.keys(node);
    for (const key of keys) {
      const [message, instead] = REFUSED_KEYS.get(key) ?? [];
      if (message !== undefined && instead !== undefined) refuse([...path, key], message, instead);
    }
    const known = keys.filter((key) => !REFUSED_KEYS.has(key));
    const joins = known.filter((key) => key === 'all' || key === 'any');
    if (joins.length === 2) {
      return refuse(path, '"any" beside "all": the engine would look at "any" alone', 'nest one in the other: { "all": [..., { "any": [...] }] }');
    }
    const [join] = joins;
    const allowed = join ? [join] : ['fact', 'operator', 'value'];
    for (const key of known.filter((each) => !allowed.includes(each))) {
      refuse([...path, key], `unknown key "${key}"`, `leave it out; known here: ${allowed.join(', ')}`);
    }
    if (join) return visitList((node as Record<string, unknown>)[join], [...path, join]);
    if (keys.some((key) => key === 'not' || key === 'condition')) return undefined;
    if (isRoot) return refuse(path, 'the root is neither "all" nor "any"', 'write { "all": [...] } around it');
    return readFact(node, path, checks, refuse);
  }

  function visitList(list: unknown, path: readonly PropertyKey[]): void {
    if (path.length / 2 > LIMITS.conditionDepth) return refuse(path, `nested more than ${LIMITS.conditionDepth} deep`, 'write it flatter');
    if (!Array.isArray(list)) return refuse(path, `${shown(list)} is not a list`, 'write a list of conditions');
    if (list.length === 0) return refuse(path, 'an empty list would always hold', 'name at least one condition');
    list.forEach((item, index) => visit(item, [...path, index], false));
  }

  visit(raw, [], true);
  return sound ? (raw as RootCondition) : undefined;
}

function readFact(node: object, path: readonly PropertyKey[], checks: ReadonlyMap<string, KnownCheck>, refuse: Report): void {
  const { fact, operator, value } = node as Partial<Record<keyof FactCondition, unknown>>;
  const check = typeof fact === 'string' ? checks.get(fact) : undefined;
  if (!check) {
    return refuse([...path, 'fact'], fact === undefined ? 'is missing' : `there is no check ${shown(fact)}`, 'write the id of a check');
  }
  const operators: readonly string[] = check.kind === 'measured' ? MEASURED_OPERATORS : CHOICE_OPERATORS;
  if (typeof operator !== 'string' || !operators.includes(operator)) {
    return refuse([...path, 'operator'], operatorMessage(check, operator), operatorAdvice(check, operator));
  }
  const at = [...path, 'value'];
  if (check.kind === 'measured') return readThreshold(check, value, at, refuse);
  if (operator === 'equal' || operator === 'notEqual') return readState(check, value, at, refuse);
  if (!Array.isArray(value) || value.length === 0) {
    return refuse(at, `"${operator}" needs a list of answers, and not an empty one`, `write a list of ${answersOf(check)}`);
  }
  value.forEach((state, index) => readState(check, state, [...at, index], refuse));
  if (new Set(value).size < value.length) refuse(at, 'an answer stands there twice', 'name each answer once');
}

function readState(check: KnownCheck, value: unknown, path: readonly PropertyKey[], refuse: Report): void {
  if (check.states.some((state) => state.id === value)) return;
  refuse(path, `"${check.id}" has no answer ${shown(value)}`, `write ${answersOf(check)}`);
}

function readThreshold(check: KnownCheck, value: unknown, path: readonly PropertyKey[], refuse: Report): void {
  const edges = check.states.flatMap((state) => state.low ?? []);
  const advice = `write one of the band edges as a number in SI: ${edges.join(', ')}`;
  if (check.states.some((state) => state.id === value)) {
    return refuse(path, `${shown(value)} is a band, and "${check.id}" is measured`, `compare with the band's edges; ${advice}`);
  }
  if (typeof value !== 'number') return refuse(path, `${shown(value)} is not a number`, advice);
  if (!edges.includes(value)) refuse(path, `${value} is not an edge of a band of "${check.id}"`, advice);
}

function operatorMessage(check: KnownCheck, operator: unknown): string {
  if (operator === undefined) return 'is missing';
  if (check.kind === 'measured' && (operator === 'lessThanInclusive' || operator === 'greaterThan')) {
    return `"${operator}" would cut a band in two: bands hold their lower edge and not their upper`;
  }
  return `${shown(operator)} can’t be asked of "${check.id}", which is ${check.kind === 'measured' ? 'measured' : 'a choice'}`;
}

function operatorAdvice(check: KnownCheck, operator: unknown): string {
  if (check.kind === 'choice') return 'write equal, notEqual, in or notIn';
  if (operator === 'lessThanInclusive') return 'write lessThan';
  if (operator === 'greaterThan') return 'write greaterThanInclusive';
  return 'write lessThan or greaterThanInclusive, with a band edge';
}

function answersOf(check: KnownCheck): string {
  return check.states.map((state) => `"${state.id}"`).join(' or ');
}
