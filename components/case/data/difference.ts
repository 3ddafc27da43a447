import type { CaseState } from '@/lib/schemas/case-view';

export interface Difference {
  version: number;
  /** The cause whose level differs most, by how much of 1. */
  causeId: string;
  was: number;
  is: number;
  /** Names of those whose answers the device didn't know. */
  others: string[];
}

/** What two machines of the same arithmetic may differ by. */
const SAME_WITHIN = 1e-9;

/** Where the server's ranking differs from the one that the device had shown; null where it doesn't. */
export function differenceOf(shown: CaseState, fresh: CaseState): Difference | null {
  const was = new Map(shown.causes.map(({ causeId, p }) => [causeId, p]));
  const known = new Set(shown.findings.map(({ id }) => id));
  const [most] = fresh.causes
    .map(({ causeId, p }) => ({ causeId, was: was.get(causeId) ?? 0, is: p }))
    .sort((a, b) => Math.abs(b.is - b.was) - Math.abs(a.is - a.was));
  if (!most || Math.abs(most.is - most.was) <= SAME_WITHIN) return null;
  const others = fresh.findings.filter((finding) => !known.has(finding.id)).map(({ person }) => person);
  return { version: fresh.version, ...most, others: [...new Set(others)] };
}
