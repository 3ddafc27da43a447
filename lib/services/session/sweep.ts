import type { Database } from '@/db/connect';
import { sweepAttempts } from '@/db/queries/attempt';
import { sweepIdempotentAnswers } from '@/db/queries/idempotent-answer';
import { sweepFailedJobs } from '@/db/queries/job';
import { sweepPasswordResets } from '@/db/queries/sign-in';

const A_DAY_MS = 86_400_000;

/** Throws away what is of no use any more: counts of tries, password links, requests for one that failed and kept answers of days gone by. */
export async function sweep({ db, now }: { db: Database; now: () => Date }): Promise<void> {
  const yesterday = new Date(now().getTime() - A_DAY_MS);
  await sweepAttempts(db, yesterday);
  await sweepPasswordResets(db, yesterday);
  await sweepIdempotentAnswers(db, yesterday);
  // It holds an address that somebody typed, and nobody can try it again.
  await sweepFailedJobs(db, { name: 'mail-password-reset', before: yesterday });
}
