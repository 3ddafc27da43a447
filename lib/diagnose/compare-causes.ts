import { byCodeUnits } from './order';
import type { EvidenceTerm, RankedCause, Ranking } from './types';

/** Why one cause stands above another: parts that add up to the logarithm of their ratio. */
export interface CauseComparison {
  causeA: string;
  causeB: string;
  /** ln(p_A / p_B), nats: above 0 when A leads. */
  logRatioNats: number;
  /** ln(prior_A / prior_B), nats. */
  priorNats: number;
  /** What each evidence group adds to the ratio, nats; largest first, equal ones by id. */
  groups: { group: string; nats: number; findingIds: string[] }[];
}

/**
 * Splits ln(p_A / p_B) into a prior term and one term for each evidence group. The split is exact: nothing else
 * went into either probability, since the common divisor cancels.
 *
 * @param ranking from `rank`
 * @param causeA,causeB ids of two ranked causes
 * @returns the parts, in nats
 * @throws RangeError for a cause that is not in the ranking
 * @example compareCauses(ranking, 'rings-worn', 'normal-carryover').groups[0] // what tells them apart most
 */
export function compareCauses(ranking: Ranking, causeA: string, causeB: string): CauseComparison {
  const a = find(ranking, causeA);
  const b = find(ranking, causeB);
  const groupIds = [...new Set([...a.terms, ...b.terms].map((term) => term.group))];
  const groups = groupIds.map((group) => ({
    group,
    nats: countedIn(a.terms, group) - countedIn(b.terms, group),
    findingIds: [...new Set([...a.terms, ...b.terms].filter((term) => term.group === group).flatMap((term) => term.findingIds))].sort(byCodeUnits),
  }));
  return {
    causeA,
    causeB,
    logRatioNats: a.scoreNats - b.scoreNats,
    priorNats: Math.log(a.prior) - Math.log(b.prior),
    groups: groups.sort((x, y) => Math.abs(y.nats) - Math.abs(x.nats) || byCodeUnits(x.group, y.group)),
  };
}

function find(ranking: Ranking, causeId: string): RankedCause {
  const found = ranking.causes.find((cause) => cause.causeId === causeId);
  if (!found) throw new RangeError(`the ranking has no cause "${causeId}"`);
  return found;
}

function countedIn(terms: readonly EvidenceTerm[], group: string): number {
  return terms.filter((term) => term.group === group).reduce((sum, term) => sum + term.countedNats, 0);
}
