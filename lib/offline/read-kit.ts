import type { Rulebook } from '@/lib/diagnose/types';
import type { CaseKit } from '@/lib/schemas/case-kit';
import { offlineDatabase } from './database';

/** What a device has of a case, for the ranker; undefined when it has not got everything. */
export async function readKit(caseId: string): Promise<{ kit: CaseKit; rulebook: Rulebook } | undefined> {
  const db = await offlineDatabase();
  const kit = await db.get('kit', caseId);
  const edition = kit && (await db.get('edition', kit.editionId));
  return kit && edition && { kit, rulebook: edition.rulebook };
}
