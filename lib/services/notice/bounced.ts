import type { Transaction } from '@/db/connect';
import type { MailAtHand } from '@/db/queries/mail';
import { listMembers } from '@/db/queries/membership';
import { jobs } from '@/lib/jobs';
import { notify } from './notify';

const OF_NOTICES = ['notice', 'daily-notices'];

/**
 * Tells that a mail was given up: whoever brought it about, else the administrators. Of a mail that itself told notices its
 * reader hears in the app alone, so that no mail chases another.
 */
export async function tellOfBounced(tx: Transaction, now: () => Date, { id, organisationId, kind, to, subject, entityId, postedBy }: MailAtHand): Promise<void> {
  const ofNotices = OF_NOTICES.includes(kind);
  const people = ofNotices ? [entityId] : postedBy === null ? await administrators(tx, organisationId) : [postedBy];
  for (const personId of people) {
    await notify(tx, { jobs, now }, { organisationId, personId, kind: 'mail-bounced', caseId: null, key: id, about: { what: subject }, notTo: to ?? undefined, isInAppOnly: ofNotices });
  }
}

const administrators = async (tx: Transaction, organisationId: string): Promise<string[]> =>
  (await listMembers(tx, { organisationId })).filter(({ endedAt, roles }) => !endedAt && roles.includes('administrator')).map(({ personId }) => personId);
