/** In which order candidates are offered: the best first, but none before what it would spoil. */

export interface Candidate {
  checkIds: readonly string[];
  /** (1 - u) I / minutes. */
  bitsPerMinute: number;
  /** Open checks whose evidence it destroys. */
  spoils: readonly string[];
}

/** A candidate at its place, with the valuable checks that stand before it because it would spoil them. */
export interface Placed<T extends Candidate> {
  candidate: T;
  waitsFor: string[];
}

const byWorth = (a: Candidate, b: Candidate): number =>
  b.bitsPerMinute - a.bitsPerMinute || (a.checkIds.join() < b.checkIds.join() ? -1 : 1);

/**
 * Orders candidates by bits per minute, each after every valuable check that it spoils. Where checks spoil each
 * other in a ring, the best of the ring goes first and the others wait for it no longer.
 *
 * @param candidates single checks and pairs
 * @param valuable ids of checks whose evidence is worth waiting for; each should be a candidate too
 * @returns all candidates, each with what it waits for
 * @example placeCandidates(candidates, new Set(['oil-caught']))[0]?.candidate.checkIds
 */
export function placeCandidates<T extends Candidate>(candidates: readonly T[], valuable: ReadonlySet<string>): Placed<T>[] {
  const left = [...candidates].sort(byWorth);
  const offered = new Set(candidates.flatMap(({ checkIds }) => checkIds));
  const done = new Set<string>();
  const placed: Placed<T>[] = [];
  const worthKeeping = ({ checkIds, spoils }: Candidate): string[] =>
    spoils.filter((id) => valuable.has(id) && offered.has(id) && !checkIds.includes(id));
  while (left.length > 0) {
    const free = left.findIndex((candidate) => worthKeeping(candidate).every((id) => done.has(id)));
    const [candidate] = left.splice(Math.max(0, free), 1);
    if (!candidate) break;
    placed.push({ candidate, waitsFor: worthKeeping(candidate).filter((id) => done.has(id)) });
    for (const id of candidate.checkIds) done.add(id);
  }
  return placed;
}
