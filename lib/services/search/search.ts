import type { Transaction } from '@/db/connect';
import { searchEntries, type EntryKind, type FoundEntry } from '@/db/queries/search';
import type { Asked } from '@/lib/search/asked';

/** One search, as each kind of thing is looked for by it. */
export interface Search {
  tx: Transaction;
  organisationId: string;
  q: string;
  asked: Asked;
  /** Hits of each kind. */
  limit: number;
  /** Whether the person may see cases and what was written in them. */
  seesCases: boolean;
}

/** More than are ever shown, so that what is found in two ways can be counted once. */
export const MOST_FOUND = 100;

/** What has all of the words; nothing where no word was typed. */
export async function entriesOf({ tx, organisationId, asked: { tsquery } }: Search, ...kinds: EntryKind[]): Promise<FoundEntry[]> {
  return tsquery === null ? [] : searchEntries(tx, { organisationId, kinds, tsquery, most: MOST_FOUND });
}

/** How many there are of what was found in ways that overlap; beyond those that were fetched none is taken for the same. */
export function totalOf(different: number, ...ways: { fetched: number; total: number }[]): number {
  return ways.reduce((sum, { fetched, total }) => sum + total - fetched, different);
}

/** The rows in the order of their ids; an id that has none any more is left out. */
export function inOrder<Row>(ids: readonly string[], rows: readonly Row[], idOf: (row: Row) => string): Row[] {
  const byId = new Map(rows.map((row) => [idOf(row), row]));
  return ids.flatMap((id) => byId.get(id) ?? []);
}
