import { sql, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';

/**
 * The job tables belong to pg-boss: no policy guards them, and a job is an organisation's by what it was given. So each
 * read and write here names the organisation and the kinds that it may see.
 */
interface Seen {
  organisationId: string;
  /** Kinds of which an organisation sees its own. */
  own: readonly string[];
  /** Kinds that belong to nobody, seen by all. */
  shared: readonly string[];
}

const texts = (values: readonly string[]) => sql`${sql.param([...values])}::text[]`;

const seen = ({ organisationId, own, shared }: Seen): SQL =>
  sql`(data->>'organisationId' = ${organisationId} and name = any(${texts(own)}) or name = any(${texts(shared)}) and data->>'organisationId' is null) and state <> 'cancelled'`;

/** In universal time, to the microsecond that it is sorted by. */
const instant = (column: string) => sql`to_char(${sql.raw(column)} at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.US"Z"')`;

const STATE = sql`case state when 'created' then 'waiting' when 'retry' then 'waiting' when 'active' then 'running' when 'completed' then 'done' else 'failed' end`;

/** Those at hand and, for a day, those put away. What was put away without having run won't. */
const all = (which: Seen): SQL => sql`
  select id, name, data, ${STATE} as state, retry_count, started_on, created_on, completed_on, start_after, output, true as at_hand from pgboss.job where ${seen(which)}
  union all
  select id, name, data, case state when 'completed' then 'done' else 'failed' end, retry_count, started_on, created_on, completed_on, start_after, output, false from pgboss.archive where ${seen(which)}`;

export interface JobRow {
  id: string;
  kind: string;
  state: string;
  /** Begun. */
  attempts: number;
  createdAt: string;
  startedAt: string | null;
  finishedAt: string | null;
  /** When it is tried next, of one that waits. */
  nextTryAt: string | null;
  output: unknown;
  /** Not put away yet, so that it can be tried again. */
  atHand: boolean;
  mailTo: string | null;
  mailSubject: string | null;
  mailState: string | null;
  mailAttempts: number | null;
  mailError: string | null;
  mailSentAt: string | null;
}

interface Filter extends Seen {
  state?: string;
}

/** The newest first, with the mail that a job sends. */
export async function selectJobs(db: Executor, { state, limit, offset = 0, after, ...which }: Filter & { limit: number; offset?: number; after?: readonly [createdAt: string, id: string] }): Promise<JobRow[]> {
  const { rows } = await db.execute(sql`
    select j.id, j.name as "kind", j.state, j.retry_count + case when j.started_on is null then 0 else 1 end as "attempts",
           ${instant('j.created_on')} as "createdAt", ${instant('j.started_on')} as "startedAt", ${instant('j.completed_on')} as "finishedAt",
           case when j.state = 'waiting' then ${instant('j.start_after')} end as "nextTryAt", j.output, j.at_hand as "atHand",
           m.to_address as "mailTo", m.subject as "mailSubject", m.state as "mailState", m.attempts as "mailAttempts", m.last_error as "mailError", ${instant('m.sent_at')} as "mailSentAt"
    from (${all(which)}) j
    left join mail m on m.organisation_id = ${which.organisationId} and j.name = 'send-mail' and m.id = (j.data->>'mailId')::uuid
    where true ${state ? sql`and j.state = ${state}` : sql``} ${after ? sql`and (j.created_on, j.id) < (${after[0]}::timestamptz, ${after[1]}::uuid)` : sql``}
    order by j.created_on desc, j.id desc limit ${limit} offset ${offset}`);
  return rows as unknown as JobRow[];
}

export async function countJobs(db: Executor, { state, ...which }: Filter): Promise<number> {
  const { rows } = await db.execute<{ count: number }>(sql`select count(*)::int as count from (${all(which)}) j where true ${state ? sql`and j.state = ${state}` : sql``}`);
  return rows[0]?.count ?? 0;
}

/** Keeps a job from being tried again by two at once. */
export async function lockJob(db: Executor, { jobId, ...which }: Seen & { jobId: string }): Promise<{ kind: string; state: string; mailId: string | null } | undefined> {
  const { rows } = await db.execute<{ kind: string; state: string; mailId: string | null }>(
    sql`select name as "kind", ${STATE} as state, data->>'mailId' as "mailId" from pgboss.job where id = ${jobId} and ${seen(which)} for update`,
  );
  return rows[0];
}

/** Gives a job that failed another whole round, from now on. */
export async function retryFailedJob(db: Executor, { jobId, ...which }: Seen & { jobId: string }): Promise<void> {
  await db.execute(sql`
    update pgboss.job set state = 'retry', retry_count = 0, started_on = null, completed_on = null, start_after = now(), keep_until = now() + interval '14 days',
      retry_limit = coalesce((select q.retry_limit from pgboss.queue q where q.name = job.name), retry_limit)
    where id = ${jobId} and state = 'failed' and ${seen(which)}`);
}

/** Takes away what failed for good before an instant, of a kind of job that nobody looks at. */
export async function sweepFailedJobs(db: Executor, { name, before }: { name: string; before: Date }): Promise<void> {
  await db.execute(sql`delete from pgboss.job where name = ${name} and state = 'failed' and completed_on < ${before.toISOString()}`);
}
