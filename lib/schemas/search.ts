import { z } from 'zod';
import { rulebookId } from './case';

/** What is asked of the search, and what it answers. */

const LONGEST = 200;

/** Tabs and the like, which come along when something is pasted, only part words. */
const query = z
  .string()
  .max(LONGEST, `Keep it under ${LONGEST} characters.`)
  .transform((text) => text.replaceAll(/[\p{Cc}\p{Surrogate}]/gu, ' ').trim());

export const searchInput = z.strictObject({
  q: query.default('').meta({ description: 'Words, of which each may be the beginning of one; a fleet number, also one that is nearly right; or a case number.' }),
  limit: z.coerce.number<unknown>().int().min(1).max(25).default(5).meta({ description: 'Hits of each kind.' }),
});

/** Kinds of what a rulebook holds that can be found in it. */
export const ENTRY_KINDS = ['remedy', 'check', 'cause'] as const;
export type EntryKind = (typeof ENTRY_KINDS)[number];

export const readEntryInput = z.strictObject({ kind: z.enum(ENTRY_KINDS), id: rulebookId });

/** The address of the page: what it holds that makes no sense is as if it weren't there. */
export const searchPageInput = z.object({
  q: query.catch('').default(''),
  /** "remedy.clean-the-drain": the entry of the rulebook that is to be read. */
  read: z
    .string()
    .optional()
    .transform((text) => {
      const [kind, id] = (text ?? '').split('.');
      return readEntryInput.safeParse({ kind, id }).data ?? null;
    })
    .catch(null),
});

/** The page with everything that is found, and one entry of the rulebook open. */
export function searchHref(q: string, read?: { kind: EntryKind; id: string }): string {
  const params = new URLSearchParams({ q, ...(read && { read: `${read.kind}.${read.id}` }) });
  return `/search?${params}${read ? '#entry' : ''}`;
}
