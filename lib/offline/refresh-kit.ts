import { api } from '@/lib/query/problem';
import type { Rulebook } from '@/lib/diagnose/types';
import type { CaseKit } from '@/lib/schemas/case-kit';
import { tell } from './bus';
import { offlineDatabase } from './database';
import { keepForOwner } from './owner';
import { forgetSent, waitingOf } from './waiting';

/** Brings a case's kit up to date, and its edition if it isn't here yet. */
export async function refreshKit(caseId: string): Promise<CaseKit> {
  const askedAt = Date.now();
  const kit = await api<CaseKit>(`/api/v1/cases/${caseId}/kit`);
  const db = await offlineDatabase();
  if ((await db.getKey('edition', kit.editionId)) === undefined) {
    await keepForOwner('edition', await api<{ id: string; rulebook: Rulebook }>(`/api/v1/editions/${kit.editionId}`));
  }
  const held = await db.get('kit', caseId);
  // Two requests may come back in the other order.
  if (!held || held.personId !== kit.personId || held.version <= kit.version) await keepForOwner('kit', kit);
  await forgetSent(await waitingOf(kit), askedAt);
  tell({ kind: 'kit-changed', caseId });
  return kit;
}
