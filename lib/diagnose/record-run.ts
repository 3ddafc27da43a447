/** The run of record: the one file that touches json-rules-engine. Kept off `index.ts`, so that no browser loads it. */
import { Engine, Operator, Rule as EngineRule } from 'json-rules-engine';
import type { CompiledRule, CompiledRulebook } from './compiled';
import { firedByPredicates, firedNames, type Fired } from './evidence';
import { byCodeUnits } from './order';
import type { RuleFacts } from './predicates';
import { rankingOf, type RankOptions } from './rank';
import type { Finding, Ranking } from './types';
import { factsOf, usedFindings, type UsedFinding } from './used-findings';

/** A run of record: what is stored, shown and answered for. */
export interface RecordRun {
  /** Built from what the engine fired. */
  ranking: Ranking;
  /** Names of the rules that the engine fired, sorted. */
  engineFired: string[];
  /** Whether the compiled predicates fired the same rules for the same findings. */
  agreed: boolean;
  /** Where they did not: to be reported as an error. The ranking follows the engine. */
  difference?: { engineOnly: string[]; compiledOnly: string[] };
}

/**
 * Ranks by json-rules-engine, and compares with the compiled predicates what fired.
 *
 * Only rules that look at an answered check go into the engine. That is exact: no condition holds on a check that is
 * not answered, there is no negation, and no list of conditions is empty, so the others can't fire.
 *
 * A finding split over bands is seen by the run in the band with the largest share; each other band gets a run of its
 * own over the table rules of that check, since compound rules look at the largest share alone.
 *
 * @param compiled from `compileRulebook`
 * @param findings as for `rank`
 * @param options as for `rank`
 * @returns the ranking of record, and whether both ways agreed
 * @throws FindingError as `rank` does
 * @example (await runOfRecord(compiled, findings)).ranking.causes[0]
 */
export async function runOfRecord(
  compiled: CompiledRulebook,
  findings: readonly Finding[],
  options: RankOptions = {},
): Promise<RecordRun> {
  const used = usedFindings(compiled, findings, options.stages);
  const fired = await firedByEngine(used);
  const difference = differenceOf(fired, firedByPredicates(compiled, used));
  return {
    ranking: rankingOf(compiled, used, fired, options.facts),
    engineFired: firedNames(fired),
    agreed: difference === undefined,
    ...(difference && { difference }),
  };
}

async function firedByEngine(used: readonly UsedFinding[]): Promise<Fired> {
  const rules = new Set(used.flatMap(({ check }) => [...check.tableRules, ...check.compoundRules]));
  const main = await fireRules(rules, factsOf(used));
  const tables = await Promise.all(
    used.map(({ check, states, dominant }) =>
      Promise.all(
        states.map(({ index }) => {
          if (index === dominant) return main.filter((rule) => rule.kind === 'table' && rule.checkIds[0] === check.id);
          return fireRules(check.tableRules, new Map([[check.id, check.facts[index] ?? '']]));
        }),
      ),
    ),
  );
  return { tables, compounds: main.filter((rule) => rule.kind === 'compound') };
}

/** Compared state by state: the same names for different states of one finding would still be a difference. */
function differenceOf(engine: Fired, compiled: Fired): RecordRun['difference'] {
  const inEngine = placed(engine);
  const inCompiled = placed(compiled);
  const only = (these: ReadonlyMap<string, CompiledRule>, those: ReadonlyMap<string, CompiledRule>) =>
    [...new Set([...these].filter(([place]) => !those.has(place)).map(([, rule]) => rule.name))].sort();
  const engineOnly = only(inEngine, inCompiled);
  const compiledOnly = only(inCompiled, inEngine);
  return engineOnly.length + compiledOnly.length > 0 ? { engineOnly, compiledOnly } : undefined;
}

function placed(fired: Fired): Map<string, CompiledRule> {
  const places = fired.tables.flatMap((states, finding) =>
    states.flatMap((rules, state) => rules.map((rule): [string, CompiledRule] => [`${finding}/${state}/${rule.name}`, rule])),
  );
  return new Map([...places, ...fired.compounds.map((rule): [string, CompiledRule] => [`compound/${rule.name}`, rule])]);
}

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
