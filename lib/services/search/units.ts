import { searchFleetNumbers, selectFoundUnits } from '@/db/queries/search';
import type { SearchGroup, SearchHit } from '@/lib/schemas/search-result';
import { termLabel } from '@/lib/schemas/terms';
import { excerpt, markFleetNumber, markWords } from '@/lib/search/mark';
import { entriesOf, inOrder, MOST_FOUND, totalOf, type Search } from './search';

/** Units by number, then by their words, then those whose number is nearly the one typed. */
export async function searchUnits(search: Search): Promise<{ group: SearchGroup; meant: string[] }> {
  const { tx, organisationId, asked, limit } = search;
  const numbers = asked.fleetKey === '' ? [] : await searchFleetNumbers(tx, { organisationId, key: asked.fleetKey, near: asked.maybeMistyped, most: MOST_FOUND });
  const entries = await entriesOf(search, 'unit');
  const nearly = new Set(numbers.filter(({ manner }) => manner === 3).map(({ id }) => id));
  const ids = [...new Set([...numbers.filter(({ manner }) => manner < 3), ...entries, ...numbers].map(({ id }) => id))];
  const shown = ids.slice(0, limit);
  const rows = inOrder(shown, await selectFoundUnits(tx, { organisationId, ids: shown }), ({ id }) => id);

  const hits = rows.map(({ id, fleetNumber, vehicleKind, siteName, engineFamily, note }): SearchHit => {
    const byKey = markFleetNumber(fleetNumber, asked.fleetKey);
    const words = excerpt([engineFamily, note].filter(Boolean).join('. '), asked.words);
    return {
      kind: 'unit',
      id,
      href: `/units/${id}`,
      title: byKey.some(({ hit }) => hit) ? byKey : markWords(fleetNumber, asked.words),
      about: [termLabel('vehicleKind', vehicleKind), siteName].join(', '),
      words: words.some(({ hit }) => hit) ? words : null,
      nearly: nearly.has(id) && !entries.some((entry) => entry.id === id),
    };
  });
  const total = totalOf(ids.length, { fetched: numbers.length, total: numbers[0]?.total ?? 0 }, { fetched: entries.length, total: entries[0]?.total ?? 0 });
  return { group: { kind: 'units', hits, total }, meant: numbers.filter(({ manner }) => manner === 0).map(({ id }) => id) };
}
