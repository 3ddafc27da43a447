import { STATIONS, type StationId } from '@/lib/diagnose/stations';
import type { CaseState, RulebookView } from '@/lib/schemas/case-view';

/** How many checks of each station are still open. */
export function openChecks({ findings }: CaseState, { checks }: RulebookView): Record<StationId, number> {
  const answered = new Set(findings.filter(({ current }) => current).map(({ checkId }) => checkId));
  const open = Object.fromEntries(STATIONS.map(({ id }) => [id, 0])) as Record<StationId, number>;
  for (const { id, station } of Object.values(checks)) if (!answered.has(id)) open[station] += 1;
  return open;
}
