import { asTenant } from '@/db/connect';
import { selectCaseHead } from '@/db/queries/case';
import type { MailAtHand } from '@/db/queries/mail';
import { findOrganisation } from '@/db/queries/organisation';
import { lockWatch, lockWatchLink } from '@/db/queries/watch';
import { siteDay } from '@/lib/case/site-day';
import { dayText } from '@/lib/schemas/day-text';
import type { Post } from '../mail/send';
import { linkPath } from './link-token';

/** The text of a mailed link; nothing when it was used, revoked or has run out meanwhile, or the watch has ended. */
export const watchLinkText = ({ db, now, baseUrl, secret }: Post, { organisationId, entityId: linkId }: MailAtHand): Promise<string | undefined> =>
  asTenant(db, { organisationId }, async (tx) => {
    const link = await lockWatchLink(tx, { organisationId, linkId });
    if (!link || link.usedAt || link.revokedAt || link.expiresAt <= now()) return undefined;
    const watch = await lockWatch(tx, { organisationId, watchId: link.watchId });
    const head = await selectCaseHead(tx, link);
    const organisation = await findOrganisation(tx, { organisationId });
    if (!watch || watch.endedAt || !head || !organisation) return undefined;
    return `Hello ${link.forWhom},

${organisation.name} watches a repair of unit ${head.fleetNumber} and asks you for one reading. What to read, and how, stands here:

${new URL(linkPath(secret, link), baseUrl).href}

The link works once, until ${dayText(siteDay(link.expiresAt, head.timeZone))}, and needs no sign-in.
`;
  });
