import type { JobData, JobName } from '@/lib/jobs';
import { mailInvitation } from '@/lib/services/invitation/mail';
import { mailPasswordReset, type Post } from '@/lib/services/password/mail-reset';
import { remindOfWeighing } from '@/lib/services/oil-catch/remind';
import { makeThumbnail } from '@/lib/services/photo/make-thumbnail';
import { sweep } from '@/lib/services/session/sweep';
import type { Storage } from '@/lib/storage';

export type Handlers = { [Name in JobName]: (data: JobData[Name]) => Promise<void> };

/** What each job does: a service of its own. */
export const handlers = (post: Post & { storage: Storage }): Handlers => ({
  'mail-invitation': (data) => mailInvitation(post, data),
  'mail-password-reset': (data) => mailPasswordReset(post, data),
  'make-thumbnail': (data) => makeThumbnail(post, data),
  'remind-weighing': (data) => remindOfWeighing(post, data),
  sweep: () => sweep(post),
});
