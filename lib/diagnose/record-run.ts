import type { CompiledRule, CompiledRulebook } from './compiled';
import { fireRules } from './engine';
import { firedByPredicates, firedNames, type Fired } from './evidence';
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
