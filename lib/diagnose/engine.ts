/** Everything that touches json-rules-engine. Kept off `index.ts`, so that no browser loads it. */
import { Engine, Operator, Rule as EngineRule } from 'json-rules-engine';
import type { CompiledRule } from './compiled';
import { byCodeUnits } from './order';
import type { RuleFacts } from './predicates';

/** One fixed type: "success" and "error" would mean something to the engine. */
const EVENT = { type: 'evidence' } as const;

type Known = string | number;

const isKnown = (found: unknown): found is Known => typeof found === 'string' || typeof found === 'number';
const isNumber = (found: unknown): found is number => typeof found === 'number';

/**
 * The operators of a rulebook. The engine's own take an unanswered check for a value (`undefined` is not equal to
 * anything, so `notEqual` and `notIn` would fire) and read numbers from text ("12abc"); these never do.
 */
const OPERATORS = [
  new Operator<Known, Known>('equal', (found, value) => found === value, isKnown),
  new Operator<Known, Known>('notEqual', (found, value) => found !== value, isKnown),
  new Operator<Known, Known[]>('in', (found, values) => values.includes(found), isKnown),
  new Operator<Known, Known[]>('notIn', (found, values) => !values.includes(found), isKnown),
  new Operator<number, number>('lessThan', (found, edge) => found < edge, isNumber),
  new Operator<number, number>('greaterThanInclusive', (found, edge) => found >= edge, isNumber),
];

/**
 * The engine's own form of each rule, made once: to build it takes as long as to run it. It is safe to share between
 * engines, overlapping ones too: an evaluation works on a copy of the conditions and takes from the rule only its
 * engine's operators, which are the same in all of ours. (What must not be shared is an engine: its status is.)
 */
const engineRules = new WeakMap<CompiledRule, EngineRule>();

function engineRuleOf(rule: CompiledRule): EngineRule {
  let made = engineRules.get(rule);
  if (!made) {
    // The constructor writes into what it is given.
    const conditions = structuredClone(rule.rule.conditions);
    made = new EngineRule({ name: rule.name, conditions, event: { ...EVENT } });
    engineRules.set(rule, made);
  }
  return made;
}

/**
 * Runs rules over facts in an engine of their own and tells which fired. Weights never enter the engine: results
 * carry deep copies of events, so a rule's name leads back to it.
 *
 * @param rules rules to run
 * @param facts state of each answered check, or a number inside its band
 * @returns the rules that fired, sorted by name (the engine gives them in the order in which they finished)
 */
export async function fireRules(rules: Iterable<CompiledRule>, facts: RuleFacts): Promise<CompiledRule[]> {
  const engine = new Engine([], { allowUndefinedFacts: true });
  for (const operator of OPERATORS) engine.addOperator(operator);
  const byName = new Map<string, CompiledRule>();
  for (const rule of rules) {
    byName.set(rule.name, rule);
    engine.addRule(engineRuleOf(rule));
  }
  const { results } = await engine.run(Object.fromEntries(facts));
  return results.flatMap(({ name }) => byName.get(name) ?? []).sort((a, b) => byCodeUnits(a.name, b.name));
}
