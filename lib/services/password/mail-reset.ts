import { startPasswordReset } from '@/db/queries/sign-in';
import { hashToken, mailedToken } from '@/lib/auth/token';
import { newId } from '@/lib/ids';
import type { JobData } from '@/lib/jobs';
import type { Attempt } from '@/lib/jobs/attempt';
import type { Post } from '../mail/send';

const AN_HOUR_MS = 3_600_000;

/**
 * Makes a link and mails it, if the address has a sign-in; otherwise nothing happens, and nobody learns of it. Tried
 * again, it is the same mail with the same link, unless that was used or replaced meanwhile.
 */
export async function mailPasswordReset({ db, mailer, now, baseUrl, secret }: Omit<Post, 'storage'>, { email }: JobData['mail-password-reset'], { jobId }: Pick<Attempt, 'jobId'>): Promise<void> {
  const token = mailedToken(secret, 'password reset', jobId);
  const at = now();
  const begun = await startPasswordReset(db, {
    id: newId(),
    email,
    tokenHash: hashToken(token),
    now: at,
    expiresAt: new Date(at.getTime() + AN_HOUR_MS),
  });
  if (!begun) return;
  await mailer.send({
    id: jobId,
    to: email,
    subject: 'A new password for Carryover',
    text: `Hello ${begun.name},

somebody, you we hope, asked for a new password for this address. Set it here within an hour:

${new URL(`/reset-password/${token}`, baseUrl).href}

The link works once. If you did not ask for it, do nothing: your password stays as it is.
`,
  });
}
