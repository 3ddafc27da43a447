import { z } from 'zod';
import type { SearchGroup, SearchHit, SearchResult } from '@/lib/schemas/search-result';
import { count } from './common';

const segment = z.object({ text: z.string(), hit: z.boolean() }).meta({ id: 'Segment', description: 'A piece of a text, and whether it is what was looked for.' });

const hit = z
  .object({
    kind: z.enum(['unit', 'case', 'note', 'remedy', 'check', 'cause']),
    id: z.string().meta({ description: 'Of a unit, case or note its uuid, of the rest the name in the rulebook.' }),
    href: z.string().meta({ description: 'The page where it is read.' }),
    title: z.array(segment),
    about: z.string(),
    words: z.array(segment).nullable().meta({ description: 'The part of its words around what was found.' }),
    nearly: z.boolean().meta({ description: 'Its fleet number is not the one typed and nearly is.' }),
  })
  .meta({ id: 'SearchHit' }) satisfies z.ZodType<SearchHit>;

const group = z
  .object({
    kind: z.enum(['units', 'cases', 'notes', 'rulebook']),
    hits: z.array(hit),
    total: count.meta({ description: 'How many were found, the hits included.' }),
  })
  .meta({ id: 'SearchGroup' }) satisfies z.ZodType<SearchGroup>;

export const searchResult = z.object({ q: z.string(), groups: z.array(group) }).meta({ id: 'SearchResult' }) satisfies z.ZodType<SearchResult>;
