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
