import type { Transaction } from '@/db/connect';
import { selectReleaseHolds } from '@/db/queries/case-of-unit';
import type { OtherHoldView } from '@/lib/schemas/case-view';
import { compiledEdition } from '../edition/compiled';

/** Cases of a unit, not closed, that forbid its release, with the names of the checks by each case's own rulebook. */
export async function holdsOfUnit(tx: Transaction, { organisationId, unitId }: { organisationId: string; unitId: string }): Promise<OtherHoldView[]> {
  const rows = await selectReleaseHolds(tx, { organisationId, unitIds: [unitId] });
  return Promise.all(
    rows.map(async ({ caseId, number, editionId, releaseHolds }) => {
      const { checks } = await compiledEdition(tx, { organisationId, editionId });
      return { caseId, number, checks: releaseHolds.map((id) => checks.get(id)?.check.name ?? id) };
    }),
  );
}

/** What forbids the release of each unit, in words, each once. */
export async function holdsByUnit(tx: Transaction, of: { organisationId: string; unitIds: string[] }): Promise<Map<string, string[]>> {
  const held = new Map<string, string[]>();
  for (const { unitId, editionId, releaseHolds } of await selectReleaseHolds(tx, of)) {
    const { checks } = await compiledEdition(tx, { organisationId: of.organisationId, editionId });
    const names = releaseHolds.map((id) => checks.get(id)?.check.name ?? id);
    held.set(unitId, [...new Set([...(held.get(unitId) ?? []), ...names])]);
  }
  return held;
}
