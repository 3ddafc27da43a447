import PgBoss from 'pg-boss';
import { sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';

/** Every kind of job with what it is given: ids, because the rest may have changed by the time it runs. */
export interface JobData {
  'send-mail': { organisationId: string; mailId: string };
  /** The address as typed: whether anybody has it is looked up where nobody can time the answer. */
  'mail-password-reset': { email: string };
  'make-thumbnail': { organisationId: string; photoId: string };
  /** Due at the time that the catch has for it, or no more. */
  'remind-weighing': { organisationId: string; catchId: string; due: string };
  /** Due at the time that the watch has for it, or no more. */
  'remind-watch': { organisationId: string; watchId: string; due: string };
  /** The PDF of what the dossier says. */
  'make-dossier': { organisationId: string; dossierId: string };
  /** Those that wait when it comes up, which may be none any more. */
  'mail-daily-notices': { organisationId: string; personId: string };
  sweep: Record<string, never>;
}
export type JobName = keyof JobData;

export interface JobQueue {
  /** Adds a job with the transaction that makes it necessary: both are there, or neither. */
  send<Name extends JobName>(tx: Executor, name: Name, data: JobData[Name], when?: { startAfter?: Date }): Promise<void>;
}

export const JOB_SCHEMA = 'pgboss';

/** pg-boss writes its statement and we run it, in whatever transaction the caller is. */
const statementsOnly = new PgBoss({
  schema: JOB_SCHEMA,
  db: { executeSql: () => Promise.reject(new Error('A job is sent within a transaction.')) },
});

/** pg-boss numbers its parameters ($1, $2); drizzle wants them in place. */
const placed = (text: string, values: unknown[]) =>
  sql.join(text.split(/\$(\d+)/).map((part, i) => (i % 2 === 0 ? sql.raw(part) : sql`${sql.param(values[Number(part) - 1])}`)));

export const jobs: JobQueue = {
  async send(tx, name, data, when = {}) {
    const db = {
      executeSql: async (text: string, values: unknown[]) => ({ rows: (await tx.execute(placed(text, values))).rows }),
    };
    const id = await statementsOnly.send(name, data, { ...when, db });
    // A queue that doesn't exist swallows its jobs silently.
    if (id === null) throw new Error(`No job queue is called ${name}`);
  },
};
