import type { WatchLinkRow } from '@/db/queries/watch';
import { signWatchToken } from '@/lib/auth/watch-token';

/** Where a link leads: made again it is the same. */
export const linkPath = (secret: string, { organisationId, id, caseId, expiresAt }: Pick<WatchLinkRow, 'organisationId' | 'id' | 'caseId' | 'expiresAt'>): string =>
  `/watch/${signWatchToken(secret, { organisationId, linkId: id, caseId, expiresAt: expiresAt.getTime() })}`;
