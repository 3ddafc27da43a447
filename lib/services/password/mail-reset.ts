import type { Database } from '@/db/connect';
import { startPasswordReset } from '@/db/queries/sign-in';
import { hashToken, newToken } from '@/lib/auth/token';
import { newId } from '@/lib/ids';
import type { JobData } from '@/lib/jobs';
import type { Mailer } from '@/lib/mail';

const AN_HOUR_MS = 3_600_000;

/** What a job that sends a link needs. */
export interface Post {
  db: Database;
  mailer: Mailer;
  now: () => Date;
  /** Where the application is reached. */
  baseUrl: string;
}

/** Makes a link and mails it, if the address has a sign-in; otherwise nothing happens, and nobody learns of it. */
export async function mailPasswordReset({ db, mailer, now, baseUrl }: Post, { email }: JobData['mail-password-reset']): Promise<void> {
  const token = newToken();
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
    to: email,
    subject: 'A new password for Carryover',
    text: `Hello ${begun.name},

somebody, you we hope, asked for a new password for this address. Set it here within an hour:

${new URL(`/reset-password/${token}`, baseUrl).href}

The link works once. If you did not ask for it, do nothing: your password stays as it is.
`,
  });
}
