import type { CompiledRulebook } from './compiled';
import { decibansOf } from './decibans';
import { leaveOneOut } from './leave-one-out';
import { byCodeUnits } from './order';
import { rank, type RankOptions } from './rank';
import { strengthOf, type Strength } from './strength';
import type { Basis, EvidenceTerm, Finding, Ranking } from './types';
import { usedFindings } from './used-findings';

/** A rule that stands behind a reason. */
export interface ReasonRule {
  name: string;
  note: string;
  basis: Basis;
  source?: string;
}

/** What one finding (or several together, for a compound rule) says of one cause. */
export interface Reason {
  kind: EvidenceTerm['kind'];
  findingIds: string[];
  checkIds: string[];
  group: string;
  /** W before attenuation and beta, decibans. */
  weightDecibans: number;
  /** What counted, decibans. */
  countedDecibans: number;
  /** In the product's words. */
  strength: Strength | undefined;
  /** Empty where the weight was filled in: another answer would have told, this one tells the opposite. */
  rules: ReasonRule[];
}

export interface ExplainedCause {
  causeId: string;
  p: number;
  prior: number;
  /** Largest counted weight first, for or against. */
  reasons: Reason[];
  /** For each finding, p now less p without it; all the rest as it is. Largest first. */
  withoutFinding: { findingId: string; checkId: string; changeInP: number }[];
}

export interface Explanation {
  ranking: Ranking;
  /** In the order of the ranking. */
  causes: ExplainedCause[];
}

/**
 * Says why each cause stands where it stands. Nothing is told that did not count: the reasons are the terms of the
 * score, and leaving one out is a ranking without it.
 *
 * @param compiled the rulebook
 * @param findings as for `rank`
 * @param options as for `rank`
 * @returns the ranking, and the reasons of every cause
 * @throws FindingError as `rank` does
 * @example explain(compiled, findings).causes[0].reasons[0].strength // { direction: 'for', word: 'strongly' }
 */
export function explain(compiled: CompiledRulebook, findings: readonly Finding[], options: RankOptions = {}): Explanation {
  const ranking = rank(compiled, findings, options);
  const used = usedFindings(compiled, findings, options.stages);
  const without = leaveOneOut(compiled, used, options.facts);
  return {
    ranking,
    causes: ranking.causes.map(({ causeId, p, prior, terms }) => ({
      causeId,
      p,
      prior,
      reasons: terms
        .map((term) => reasonOf(compiled, term))
        .sort((a, b) => Math.abs(b.countedDecibans) - Math.abs(a.countedDecibans)),
      withoutFinding: used
        .map(({ finding }) => ({
          findingId: finding.id,
          checkId: finding.checkId,
          changeInP: p - (without.get(finding.id)?.[compiled.causeIndex.get(causeId) ?? -1] ?? 0),
        }))
        .sort((a, b) => Math.abs(b.changeInP) - Math.abs(a.changeInP) || byCodeUnits(a.checkId, b.checkId)),
    })),
  };
}

function reasonOf(compiled: CompiledRulebook, term: EvidenceTerm): Reason {
  return {
    kind: term.kind,
    findingIds: term.findingIds,
    checkIds: term.checkIds,
    group: term.group,
    weightDecibans: decibansOf(term.weightNats),
    countedDecibans: decibansOf(term.countedNats),
    strength: strengthOf(term.countedNats),
    rules: term.rules.flatMap((name) => {
      const rule = compiled.rules.get(name)?.rule;
      if (!rule) return [];
      return [{ name, note: rule.note, basis: rule.basis, ...(rule.source === undefined ? {} : { source: rule.source }) }];
    }),
  };
}
