import type { Transaction } from '@/db/connect';
import { selectCaseHead } from '@/db/queries/case';
import { findMember } from '@/db/queries/membership';
import { insertNotice, noteNoticeMail, selectNoticeChoices, timeZoneOf } from '@/db/queries/notice';
import { PERMITTED } from '@/lib/auth/permissions';
import { hasAnyRole, isRole } from '@/lib/auth/roles';
import { newId } from '@/lib/ids';
import type { JobQueue } from '@/lib/jobs';
import { USUAL_BY_MAIL, type NoticeAbout, type NoticeByMail, type NoticeKind } from '@/lib/schemas/notice';
import { postMail } from '../mail/post';
import { nextMorning } from './morning';
import { subjectOf } from './sentence';

interface Happened {
  organisationId: string;
  /** Whom to tell; nobody is fine. */
  personId: string | null;
  kind: NoticeKind;
  caseId: string | null;
  /** What happened, so that it is told once however often it is said. */
  key: string;
  about: NoticeAbout;
  /** An address that a mail of ours did not reach: no notice goes there by mail. */
  notTo?: string;
  isInAppOnly?: boolean;
}

/**
 * Tells somebody, in the transaction in which it happened: in the app, and by mail at once, with the day's, or not, as he or
 * she has set. Nobody is told of what he or she did, nor who left or may not see cases. The mails' texts are made when they
 * are sent.
 *
 * @param tx with the organisation set
 * @param with the queue and the clock of whoever works
 */
export async function notify(tx: Transaction, { jobs, now }: { jobs: JobQueue; now: () => Date }, { organisationId, personId, kind, caseId, key, about, notTo, isInAppOnly = false }: Happened): Promise<void> {
  if (personId === null || about.by === personId) return;
  const owner = { organisationId, personId };
  const member = await findMember(tx, owner);
  if (!member || member.endedAt) return;
  if (caseId !== null && !hasAnyRole(member.roles.filter(isRole), PERMITTED['case.see'])) return;

  const at = now();
  const noticeId = newId(at.getTime());
  const byMail: NoticeByMail = isInAppOnly || member.email === notTo ? 'never' : ((await selectNoticeChoices(tx, owner))[kind] ?? USUAL_BY_MAIL[kind]);
  const isNew = await insertNotice(tx, { ...owner, id: noticeId, kind, key, caseId, about, byMail, createdAt: at });
  if (!isNew || byMail === 'never') return;
  if (byMail === 'daily') {
    const due = nextMorning(at, await timeZoneOf(tx, owner));
    return jobs.send(tx, 'mail-daily-notices', owner, { startAfter: due });
  }
  const head = caseId === null ? undefined : await selectCaseHead(tx, { organisationId, caseId });
  const subject = subjectOf({ kind, caseNumber: head?.number ?? null, fleetNumber: head?.fleetNumber ?? null });
  const mailId = await postMail(tx, jobs, { organisationId, kind: 'notice', to: member.email, subject, entity: 'person', entityId: personId, at });
  await noteNoticeMail(tx, { organisationId, noticeId, mailId });
}
