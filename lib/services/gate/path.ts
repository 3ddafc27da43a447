import type { GateRow } from '@/db/queries/gate';
import { signGateToken } from '@/lib/auth/gate-token';

/** Where a gate's link leads: made again it is the same. */
export const gatePath = (secret: string, { organisationId, id, siteId, expiresAt }: Pick<GateRow, 'organisationId' | 'id' | 'siteId' | 'expiresAt'>): string =>
  `/gate/${signGateToken(secret, { organisationId, gateId: id, siteId, expiresAt: expiresAt.getTime() })}`;
