import { attenuationFactors } from './attenuation';
import type { CompiledRulebook } from './compiled';
import { evidenceItems, firedByPredicates, firedNames, type EvidenceItem, type Fired } from './evidence';
import { fitOf } from './fit';
import { posteriorOf } from './log-sum-exp';
import { byCodeUnits } from './order';
import { priorsFor } from './priors';
import { RANKER_VERSION } from './ranker-version';
import { byStage, stageKey } from './stages';
import { suspicionByStation } from './suspicion';
import type { EvidenceTerm, Finding, RankedCause, Ranking, RecordFacts, Stage } from './types';
import { usedFindings, type UsedFinding } from './used-findings';

export interface RankOptions {
  /** What unit, model and fit know; picks among the rulebook's priors. It does not fill in findings. */
  facts?: RecordFacts;
  /** Stages whose findings count; by default diagnosis alone. */
  stages?: readonly Stage[];
}

/**
 * Ranks the causes of a case by compiled predicates: S_c = ln prior + beta * sum over groups of the attenuated
 * weights, p = softmax of S. The same findings give the same bits, in whatever order they or the rules come.
 *
 * @param compiled from `compileRulebook`
 * @param findings current findings, at most one for each check and stage; an empty `shares` adds nothing
 * @param options record facts and stages
 * @returns causes with p (they sum to 1), score, prior and every term that counted, in nats
 * @throws FindingError for a finding that does not fit the rulebook
 * @example rank(compileRulebook(defaultRulebook), []).causes[0].causeId // the cause with the largest prior
 */
export function rank(compiled: CompiledRulebook, findings: readonly Finding[], options: RankOptions = {}): Ranking {
  const used = usedFindings(compiled, findings, options.stages);
  return rankingOf(compiled, used, firedByPredicates(compiled, used), options.facts);
}

/** The arithmetic alone, given which rules fired: `rank` and the run of record share it. */
export function rankingOf(
  compiled: CompiledRulebook,
  used: readonly UsedFinding[],
  fired: Fired,
  facts: RecordFacts = {},
): Ranking {
  const priors = priorsFor(compiled, facts);
  const items = evidenceItems(compiled, used, fired);
  const terms = compiled.causeIds.map((_, cause) => termsOf(items, cause, compiled.settings.beta));
  const scores = Float64Array.from(terms, (list, cause) =>
    list.reduce((score, term) => score + term.countedNats, Math.log(priors[cause] ?? 0)),
  );
  const posterior = posteriorOf(scores);
  const causes = compiled.causeIds
    .map((causeId, cause): RankedCause => ({
      causeId,
      p: posterior[cause] ?? 0,
      scoreNats: scores[cause] ?? -Infinity,
      prior: priors[cause] ?? 0,
      terms: terms[cause] ?? [],
    }))
    .sort((a, b) => b.scoreNats - a.scoreNats || byCodeUnits(a.causeId, b.causeId));
  return {
    rankerVersion: RANKER_VERSION,
    beta: compiled.settings.beta,
    stages: stagesOf(used),
    causes,
    fired: firedNames(fired),
    fit: fitOf(causes),
    suspicion: suspicionByStation(compiled.rulebook.causes, causes),
  };
}

/** The terms of one cause: each item that says anything of it, with what is left of it in its group. */
function termsOf(items: readonly EvidenceItem[], cause: number, beta: number): EvidenceTerm[] {
  const telling = items.filter((item) => item.nats[cause] !== 0);
  const groups = new Map<string, EvidenceItem[]>();
  for (const item of telling) {
    const held = groups.get(item.group.id);
    if (held) held.push(item);
    else groups.set(item.group.id, [item]);
  }
  const factors = new Map<EvidenceItem, number>();
  for (const members of groups.values()) {
    const counted = attenuationFactors(members.map((item) => item.nats[cause] ?? 0), members[0]?.group.rho ?? 1);
    members.forEach((item, index) => factors.set(item, counted[index] ?? 1));
  }
  return telling.map((item) => {
    const weightNats = item.nats[cause] ?? 0;
    return {
      kind: item.kind,
      findingIds: item.findingIds,
      checkIds: item.checkIds,
      rules: item.rules.filter((rule) => rule.nats[cause] !== undefined).map((rule) => rule.name),
      group: item.group.id,
      weightNats,
      countedNats: beta * (factors.get(item) ?? 1) * weightNats,
    };
  });
}

function stagesOf(used: readonly UsedFinding[]): Stage[] {
  const stages = new Map(used.map(({ finding }) => [stageKey(finding.stage), finding.stage]));
  return [...stages.values()].sort(byStage);
}
