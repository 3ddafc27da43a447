import type { JobData, JobName } from '@/lib/jobs';
import { mailInvitation } from '@/lib/services/invitation/mail';
import { mailPasswordReset, type Post } from '@/lib/services/password/mail-reset';
import { sweep } from '@/lib/services/session/sweep';

export type Handlers = { [Name in JobName]: (data: JobData[Name]) => Promise<void> };

/** What each job does: a service of its own. */
export const handlers = (post: Post): Handlers => ({
  'mail-invitation': (data) => mailInvitation(post, data),
  'mail-password-reset': (data) => mailPasswordReset(post, data),
  sweep: () => sweep(post),
});
