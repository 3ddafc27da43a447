import { z } from 'zod';
import { rowId } from './common';
import { searchText } from './list';

/** Pieces of lists for scripts, which are read one page after another. Nonsense in their address is refused. */

const MOST_A_PAGE = 100;

const encode = (keys: readonly (string | number)[]) => Buffer.from(JSON.stringify(keys)).toString('base64url');

/** What a list goes on after: the keys of a row, opaque to whoever passes them back. */
export const cursorOf = <Keys extends [z.ZodType, ...z.ZodType[]]>(keys: Keys) =>
  z
    .string()
    .max(1000)
    .optional()
    .transform((text, context) => {
      if (text === undefined) return undefined;
      const parsed = z.tuple(keys).safeParse(decode(text));
      if (parsed.success) return parsed.data;
      context.addIssue({ code: 'custom', message: 'This is not a cursor that this list gave.' });
      return z.NEVER;
    })
    .meta({ description: 'From `next` of the page before.' });

function decode(text: string): unknown {
  try {
    return JSON.parse(Buffer.from(text, 'base64url').toString());
  } catch {
    return undefined;
  }
}

const limit = z.coerce.number<unknown>().int().min(1).max(MOST_A_PAGE).default(50).meta({ description: 'Rows of a page.' });
const flag = z.enum(['yes', 'no']).default('no').transform((text) => text === 'yes');
const text = z.string();

export const browseCasesInput = z.strictObject({
  status: z.enum(['open', 'called', 'closed', 'all']).default('all'),
  unit: rowId.optional(),
  site: rowId.optional(),
  mine: flag.meta({ description: 'Those given to you alone.' }),
  limit,
  cursor: cursorOf([z.int().min(0).max(2_147_483_647)]),
});

export const browseUnitsInput = z.strictObject({
  q: searchText.default('').meta({ description: 'Part of a fleet number; the exact number comes first.' }),
  site: rowId.optional(),
  hidden: flag.meta({ description: 'Those taken out of the lists instead.' }),
  limit,
  cursor: cursorOf([z.int().min(0).max(2), text, rowId]),
});

export const browseModelsInput = z.strictObject({
  q: searchText.default('').meta({ description: 'Part of a name.' }),
  hidden: flag.meta({ description: 'Those taken out of the lists instead.' }),
  limit,
  cursor: cursorOf([text, rowId]),
});

/** Short lists, in an order of two keys. */
const page = { limit, cursor: cursorOf([text, text]) };
export const browseInput = z.strictObject(page);
export const browseOfUnitInput = z.strictObject({ unitId: rowId, ...page });

/** A page of rows that were asked for one too many: whether there is more shows in that. */
export function cutPage<Row>(rows: readonly Row[], { limit: most, keysOf }: { limit: number; keysOf: (row: Row) => readonly (string | number)[] }): { rows: Row[]; next: string | null } {
  const shown = rows.slice(0, most);
  const last = shown.at(-1);
  return { rows: shown, next: rows.length > most && last !== undefined ? encode(keysOf(last)) : null };
}

/** A page of a list that is short enough to be at hand whole. */
export function pageOf<Row>(
  rows: readonly Row[],
  { limit: most, cursor, keysOf }: { limit: number; cursor: readonly [unknown, unknown] | undefined; keysOf: (row: Row) => readonly [string, string] },
): { rows: Row[]; next: string | null } {
  const isAfter = ([a, b]: readonly [string, string]) => cursor === undefined || a > String(cursor[0]) || (a === cursor[0] && b > String(cursor[1]));
  const byKeys = (a: Row, b: Row) => {
    const [keys, others] = [keysOf(a), keysOf(b)];
    return keys[0] < others[0] || (keys[0] === others[0] && keys[1] < others[1]) ? -1 : 1;
  };
  return cutPage(rows.filter((row) => isAfter(keysOf(row))).toSorted(byKeys), { limit: most, keysOf });
}
