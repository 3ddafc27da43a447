import { newId } from '@/lib/ids';
import { ORGANISATION } from './organisation';
import type { Random } from './random';
import type { Row } from './rows';

export interface AuditEntry {
  action: string;
  entity: string;
  entityId: string;
  changed: Record<string, unknown>;
}

/** The row that `defineWrite` puts beside a write. */
export const audited = (random: Random, at: Date, personId: string, entry: AuditEntry): Row<'audit'> => ({
  organisationId: ORGANISATION.id,
  id: newId(at.getTime(), random.bytes(16)),
  at,
  personId,
  ...entry,
});
