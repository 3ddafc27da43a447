import type { DossierBlock } from '@/lib/schemas/dossier-content';

/** Short ways to write the blocks of a section. Each gives nothing for nothing, so that no section shows an empty frame. */

export const text = (words: string | null | undefined, { quiet = false } = {}): DossierBlock[] => (words ? [{ kind: 'text', text: words, quiet }] : []);

export const heading = (words: string): DossierBlock[] => [{ kind: 'heading', text: words }];

/** @param pairs those without a value are left out: what nobody knows is no fact */
export function facts(...pairs: readonly (readonly [term: string, value: string | null | undefined])[]): DossierBlock[] {
  const known = pairs.flatMap(([term, value]) => (value ? [{ term, value }] : []));
  return known.length > 0 ? [{ kind: 'facts', facts: known }] : [];
}

interface Column {
  title: string;
  share: number;
  figure?: boolean;
}

interface Row {
  cells: string[];
  note?: string | null;
  strong?: boolean;
}

export function table(columns: readonly Column[], rows: readonly Row[]): DossierBlock[] {
  if (rows.length === 0) return [];
  return [
    {
      kind: 'table',
      columns: columns.map(({ figure = false, ...column }) => ({ ...column, figure })),
      rows: rows.map(({ cells, note = null, strong = false }) => ({ cells, note, strong })),
    },
  ];
}
