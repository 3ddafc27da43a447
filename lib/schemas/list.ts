import { z } from 'zod';
import { pageNumber } from './common';

/** Pieces of lists whose filter, order and page stand in their address. Nonsense there is as if it weren't. */

export const ROWS_A_PAGE = 50;

/** Part of a name or number that is looked for. No database holds a control character in one, and PostgreSQL refuses to compare with NUL. */
export const searchText = z.string().trim().max(60, 'That is longer than anything here is called.').regex(/^\P{Cc}*$/u, 'There is a character in it that can’t be typed.');

export const filterText = searchText.optional().catch(undefined);

export const filterId = z.uuid().optional().catch(undefined);

/** One of these, or no filter. */
export const filterOf = <Key extends string>(keys: readonly [Key, ...Key[]]) => z.enum(keys).optional().catch(undefined);

/** Order and page; the first key is the order when none is asked for. */
export const ordered = <Key extends string>(keys: readonly [Key, ...Key[]]) => ({
  sort: z.enum(keys).catch(keys[0]).default(keys[0]),
  direction: z.enum(['asc', 'desc']).catch('asc').default('asc'),
  page: pageNumber.default(1),
});

type Query = Record<string, string | number | undefined>;

/**
 * The address of a list with some of its query changed. What is empty is left out, and so is the first page.
 * @example listHref('/units', { q: 'K-1', page: 3 }, { page: 1 }) // '/units?q=K-1'
 */
export function listHref(path: string, query: Query, change: Query = {}): string {
  const params = new URLSearchParams();
  for (const [name, value] of Object.entries({ ...query, ...change })) {
    if (value !== undefined && value !== '' && !(name === 'page' && value === 1)) params.set(name, String(value));
  }
  const text = params.toString();
  return text === '' ? path : `${path}?${text}`;
}

/** What an address holds, as the schema of a list takes it: of a name given twice, the first. */
export const firstOfEach = (query: Record<string, string | string[] | undefined>): Record<string, string | undefined> =>
  Object.fromEntries(Object.entries(query).map(([name, value]) => [name, Array.isArray(value) ? value[0] : value]));
