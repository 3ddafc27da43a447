import type { JobData, JobName } from '@/lib/jobs';
import type { Attempt } from '@/lib/jobs/attempt';
import { makeDossierPdf } from '@/lib/services/dossier/make-pdf';
import { sendMail, type Post } from '@/lib/services/mail/send';
import { mailDailyNotices } from '@/lib/services/notice/mail-daily';
import { remindOfWeighing } from '@/lib/services/oil-catch/remind';
import { mailPasswordReset } from '@/lib/services/password/mail-reset';
import { makeThumbnail } from '@/lib/services/photo/make-thumbnail';
import { sweep } from '@/lib/services/session/sweep';
import { remindOfWatch } from '@/lib/services/watch/remind';

export type Handlers = { [Name in JobName]: (data: JobData[Name], attempt: Attempt) => Promise<void> };

/** What each job does: a service of its own. */
export const handlers = (post: Post): Handlers => ({
  'send-mail': (data, attempt) => sendMail(post, data, attempt),
  'mail-password-reset': (data, attempt) => mailPasswordReset(post, data, attempt),
  'make-thumbnail': (data) => makeThumbnail(post, data),
  'make-dossier': (data, attempt) => makeDossierPdf(post, data, attempt),
  'remind-weighing': (data) => remindOfWeighing(post, data),
  'remind-watch': (data) => remindOfWatch(post, data),
  'mail-daily-notices': (data) => mailDailyNotices(post, data),
  sweep: () => sweep(post),
});
