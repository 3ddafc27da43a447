import { useState } from 'react';
import type { CaseState } from '@/lib/schemas/case-view';

/**
 * Checks that held the release while this page was open and have passed since: the unit stays held by them until somebody
 * lifts it. One whose answer was taken back has not passed, and holds nothing.
 *
 * @returns ids of checks
 */
export function usePassedHolds({ releaseHolds, findings }: Pick<CaseState, 'releaseHolds' | 'findings'>): string[] {
  const [held, setHeld] = useState(releaseHolds);
  const more = releaseHolds.filter((id) => !held.includes(id));
  if (more.length > 0) setHeld([...held, ...more]);
  return held.filter((id) => !releaseHolds.includes(id) && findings.some(({ checkId, current, shares }) => checkId === id && current && shares.length > 0));
}
