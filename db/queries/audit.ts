import type { Executor } from '@/db/connect';
import { audit } from '@/db/schema';
import { newId } from '@/lib/ids';

type AuditRow = Omit<typeof audit.$inferInsert, 'id'>;

export async function insertAudit(db: Executor, rows: AuditRow[]): Promise<void> {
  if (rows.length > 0) await db.insert(audit).values(rows.map((row) => ({ ...row, id: newId() })));
}
