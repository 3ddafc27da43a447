import type { Segment } from '@/lib/search/mark';
import type { EntryKind } from './search';

export interface SearchHit {
  kind: 'unit' | 'case' | 'note' | EntryKind;
  /** Of the row; of an entry of the rulebook its name there. */
  id: string;
  /** The page where it is read. */
  href: string;
  /** What it is called, with what was looked for marked. */
  title: Segment[];
  /** What it belongs to, in a line. */
  about: string;
  /** The part of its words around what was found; null when that stands in the title. */
  words: Segment[] | null;
  /** Its fleet number is not the one typed and nearly is. */
  nearly: boolean;
}

export interface SearchGroup {
  kind: 'units' | 'cases' | 'notes' | 'rulebook';
  hits: SearchHit[];
  /** How many were found, those that aren't among the hits included. */
  total: number;
}

export interface SearchResult {
  q: string;
  /** Those that the person's role may see, in this order; the empty ones too. */
  groups: SearchGroup[];
}
