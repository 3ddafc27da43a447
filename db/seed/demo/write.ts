import { getTableColumns, getTableName, sql } from 'drizzle-orm';
import { toSnakeCase } from 'drizzle-orm/casing';
import type { Executor } from '@/db/connect';
import { TABLES, type DemoRows, type TableName } from './rows';

/** Rows in one statement: a run of record is several kilobytes. */
const AT_A_TIME = 400;

/**
 * Inserts thousands of rows in seconds: each batch travels as one JSON text, which PostgreSQL takes apart by the table's
 * own column types. A parameter for each value would take Drizzle longer than the whole simulation.
 */
export async function writeRows(db: Executor, rows: DemoRows): Promise<void> {
  for (const name of Object.keys(TABLES) as TableName[]) {
    const table = TABLES[name];
    const columns = Object.keys(getTableColumns(table));
    // Named as `drizzle(pool, { casing: 'snake_case' })` names them.
    const list = sql.join(columns.map((column) => sql.identifier(toSnakeCase(column))), sql`, `);
    const into = sql.identifier(getTableName(table));
    const all: Record<string, unknown>[] = rows[name];
    for (let from = 0; from < all.length; from += AT_A_TIME) {
      const batch = all.slice(from, from + AT_A_TIME).map((row) => Object.fromEntries(columns.map((column) => [toSnakeCase(column), row[column] ?? DEFAULTS[column] ?? null])));
      await db.execute(sql`insert into ${into} (${list}) select ${list} from jsonb_populate_recordset(null::${into}, ${JSON.stringify(batch)}::jsonb)`);
    }
  }
}

/** A column that is left out of a row is null here, and would miss its default. */
const DEFAULTS: Record<string, unknown> = { late: false, below: false, asTyped: {}, odometerReplaced: false, engineHoursReplaced: false };
