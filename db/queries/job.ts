import { sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';

/** Takes away what failed for good before an instant, of a kind of job that nobody looks at. */
export async function sweepFailedJobs(db: Executor, { name, before }: { name: string; before: Date }): Promise<void> {
  await db.execute(sql`delete from pgboss.job where name = ${name} and state = 'failed' and completed_on < ${before.toISOString()}`);
}
