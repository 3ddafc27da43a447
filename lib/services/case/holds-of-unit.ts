import type { Transaction } from '@/db/connect';
import { selectStandingHolds } from '@/db/queries/unit-hold';
import type { OtherHoldView } from '@/lib/schemas/case-view';
import { compiledEdition } from '../edition/compiled';

export interface StandingHold {
  id: string;
  caseId: string;
  number: number;
  checkId: string;
  /** The check's name by its case's own rulebook. */
  check: string;
  placedAt: Date;
  /** When an answer passed; it still has to be lifted. */
  passedAt: Date | null;
}

/** What stands against a unit's release. */
export async function standingHolds(tx: Transaction, { organisationId, unitId }: { organisationId: string; unitId: string }): Promise<StandingHold[]> {
  const rows = await selectStandingHolds(tx, { organisationId, unitIds: [unitId] });
  return Promise.all(rows.map(async ({ editionId, unitId: _, ...row }) => ({ ...row, check: await nameOf(tx, { organisationId, editionId, checkId: row.checkId }) })));
}

/** The same by case, for its page. */
export async function holdsOfUnit(tx: Transaction, of: { organisationId: string; unitId: string }): Promise<OtherHoldView[]> {
  const byCase = new Map<string, OtherHoldView>();
  for (const { caseId, number, check, passedAt } of await standingHolds(tx, of)) {
    const held = byCase.get(caseId) ?? { caseId, number, checks: [], passed: [] };
    (passedAt ? held.passed : held.checks).push(check);
    byCase.set(caseId, held);
  }
  return [...byCase.values()];
}

/** What forbids the release of each unit, in words, each once. */
export async function holdsByUnit(tx: Transaction, of: { organisationId: string; unitIds: string[] }): Promise<Map<string, string[]>> {
  const held = new Map<string, string[]>();
  for (const { unitId, editionId, checkId } of await selectStandingHolds(tx, of)) {
    const name = await nameOf(tx, { organisationId: of.organisationId, editionId, checkId });
    held.set(unitId, [...new Set([...(held.get(unitId) ?? []), name])]);
  }
  return held;
}

async function nameOf(tx: Transaction, { organisationId, editionId, checkId }: { organisationId: string; editionId: string; checkId: string }): Promise<string> {
  const { checks } = await compiledEdition(tx, { organisationId, editionId });
  return checks.get(checkId)?.check.name ?? checkId;
}
