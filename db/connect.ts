import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import { sql } from 'drizzle-orm';
import pg from 'pg';
import * as schema from './schema';

/** A connection that somebody holds, or any of a pool's. */
type Session = NodePgDatabase<typeof schema>;
export type Database = Session & { $client: pg.Pool };
export type Transaction = Parameters<Parameters<Session['transaction']>[0]>[0];
/** What queries take: a connection or a transaction, so that a test can hand in either. */
export type Executor = Session | Transaction;

export interface Connection {
  db: Database;
  close(): Promise<void>;
}

/** A pool of its own to `url`. The application has one (`db/index.ts`); scripts and tests open theirs. */
export function connect(url: string, { max = 10 }: { max?: number } = {}): Connection {
  const pool = new pg.Pool({ connectionString: url, max });
  // An idle client that the server drops must not take the process with it: the next query gets another client.
  pool.on('error', () => undefined);
  return { db: drizzle(pool, { schema, casing: 'snake_case' }), close: () => pool.end() };
}

/**
 * Runs `work` while nobody else holds the lock of this name, on a connection of its own, which the lock belongs to: when
 * the process is killed the database lets go of both, and no time has to pass first.
 *
 * @returns false, without running it, when somebody holds it
 */
export async function whileLocked(db: Database, name: string, work: (own: Executor) => Promise<void>): Promise<boolean> {
  const client = await db.$client.connect();
  // Nothing is asked of it for long, so that a database that goes away would be an error that nobody awaits.
  const ignore = () => undefined;
  client.on('error', ignore);
  let isSound = false;
  try {
    const own = drizzle(client, { schema, casing: 'snake_case' });
    // A machine that lost its power closes no connection: the database has to ask whether it is still there.
    const { rows } = await own.execute<{ held: boolean }>(sql`
      select set_config('tcp_keepalives_idle', '10', false), set_config('tcp_keepalives_interval', '5', false), set_config('tcp_keepalives_count', '3', false),
             pg_try_advisory_lock(hashtextextended(${name}, 0)) as held`);
    if (rows[0]?.held === true) {
      await work(own).finally(() => own.execute(sql`select pg_advisory_unlock_all()`).then(() => (isSound = true), () => undefined));
      return true;
    }
    isSound = true;
    return false;
  } finally {
    // One that may still hold a lock is not for anybody else.
    client.off('error', ignore);
    client.release(!isSound);
  }
}

/**
 * Runs `work` in a transaction that can see one organisation's rows and, where a policy says so, one person's.
 * The setting is local to the transaction, so that a pooled connection never carries it to the next request.
 */
export function asTenant<T>(
  db: Executor,
  { organisationId, personId }: { organisationId: string; personId?: string },
  work: (tx: Transaction) => Promise<T>,
): Promise<T> {
  return db.transaction(async (tx) => {
    await tx.execute(
      sql`select set_config('app.organisation_id', ${organisationId}, true), set_config('app.person_id', ${personId ?? ''}, true)`,
    );
    return work(tx);
  });
}
