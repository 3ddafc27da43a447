import { z } from 'zod';
import { listCasesInput } from './case';
import { line, rowId } from './common';
import { listHref } from './list';

/** Lists whose filters can be kept. */
export const LISTS_WITH_VIEWS = ['cases'] as const;

const name = line('a name for this view', 60);

export const listSavedViewsInput = z.strictObject({ list: z.enum(LISTS_WITH_VIEWS) });

export const saveViewInput = z.strictObject({
  id: rowId,
  list: z.enum(LISTS_WITH_VIEWS),
  name,
  /** The list's filters as they stand in its address. */
  query: z.string().max(1000, 'That is more than any filter of this list.'),
});

export const renameViewInput = z.strictObject({ id: rowId, name });

export const removeViewInput = z.strictObject({ id: rowId });

/** "status=closed&site=…", in one spelling and on no particular page, so that the view in use can be told. */
export function filtersOf(query: string): string {
  const filter = listCasesInput.parse(Object.fromEntries(new URLSearchParams(query)));
  return listHref('', { ...filter, page: 1 }).replace(/^\?/, '');
}
