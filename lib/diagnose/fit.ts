import { SOMETHING_ELSE, type RankedCause, type Ranking } from './types';

/**
 * Whether any listed cause fits. None does when "something else" leads, or when what was found speaks, all in all,
 * against the leading cause, which then leads only because it was the commonest to begin with.
 *
 * @param causes ranked, highest first
 * @example fitOf(ranking.causes) // { fits: true }
 */
export function fitOf(causes: readonly RankedCause[]): Ranking['fit'] {
  const [leader] = causes;
  if (!leader) return { fits: true };
  if (leader.causeId === SOMETHING_ELSE) return { fits: false, reason: 'something-else-leads' };
  const evidence = leader.terms.reduce((sum, term) => sum + term.countedNats, 0);
  return evidence < 0 ? { fits: false, reason: 'evidence-against-the-leader' } : { fits: true };
}
