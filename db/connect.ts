import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import { sql } from 'drizzle-orm';
import pg from 'pg';
import * as schema from './schema';

export type Database = NodePgDatabase<typeof schema>;
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];
/** What queries take: a connection or a transaction, so that a test can hand in either. */
export type Executor = Database | Transaction;

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
