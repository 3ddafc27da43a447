import { searchFleetNumbers, selectFoundUnits } from '@/db/queries/search';
import type { SearchGroup, SearchHit } from '@/lib/schemas/search-result';
import { termLabel } from '@/lib/schemas/terms';
import { excerpt, markFleetNumber, markWords } from '@/lib/search/mark';
import { isNearly } from '@/lib/search/nearly';
import { entriesOf, inOrder, MOST_FOUND, totalOf, type Search } from './search';

/** Units by number, then by their words, then those whose number is nearly the one typed. */
export async function searchUnits(search: Search): Promise<{ group: SearchGroup; meant: string[] }> {
  const { tx, organisationId, asked, limit } = search;
  const numbers = asked.fleetKey === '' ? [] : await searchFleetNumbers(tx, { organisationId, key: asked.fleetKey, near: asked.maybeMistyped, most: MOST_FOUND });
  const meant = numbers.filter(({ manner }) => manner === 0).map(({ id }) => id);
  const sure = numbers.filter(({ manner }) => manner < 3);
  const alike = numbers.filter(({ manner, key }) => manner === 3 && isNearly(asked.fleetKey, key, { known: meant.length > 0 }));
  const entries = await entriesOf(search, 'unit');
  const found = new Set([...sure, ...entries].map(({ id }) => id));
  const ids = [...found, ...alike.map(({ id }) => id).filter((id) => !found.has(id))];
  const shown = ids.slice(0, limit);
  const rows = inOrder(shown, await selectFoundUnits(tx, { organisationId, ids: shown }), ({ id }) => id);

  const hits = rows.map(({ id, fleetNumber, vehicleKind, siteName, engineFamily, note }): SearchHit => {
    const byKey = markFleetNumber(fleetNumber, asked.fleetKey);
    const inNumber = byKey.some(({ hit }) => hit);
    const words = inNumber ? [] : excerpt([engineFamily, note].filter(Boolean).join('. '), asked.words);
    return {
      kind: 'unit',
      id,
      href: `/units/${id}`,
      title: inNumber ? byKey : markWords(fleetNumber, asked.words),
      about: [termLabel('vehicleKind', vehicleKind), siteName].join(', '),
      words: words.some(({ hit }) => hit) ? words : null,
      nearly: !found.has(id),
    };
  });
  const total = totalOf(ids.length, { fetched: sure.length, total: numbers[0]?.sure ?? 0 }, { fetched: entries.length, total: entries[0]?.total ?? 0 });
  return { group: { kind: 'units', hits, total }, meant };
}
