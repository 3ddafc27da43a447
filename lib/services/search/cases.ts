import { selectFoundCases, selectMeantCases } from '@/db/queries/search';
import { siteDay } from '@/lib/case/site-day';
import { dayText } from '@/lib/schemas/day-text';
import type { SearchGroup, SearchHit } from '@/lib/schemas/search-result';
import { excerpt } from '@/lib/search/mark';
import { compiledEdition } from '../edition/compiled';
import { entriesOf, inOrder, MOST_FOUND, totalOf, type Search } from './search';

/** The case with the number, then those of the unit that is meant, then those whose complaint was put in such words. */
export async function searchCases(search: Search, meantUnits: readonly string[]): Promise<SearchGroup> {
  const { tx, organisationId, asked, limit } = search;
  const meant = await selectMeantCases(tx, { organisationId, number: asked.caseNumber, unitIds: meantUnits, most: MOST_FOUND });
  const entries = await entriesOf(search, 'case');
  const ids = [...new Set([...meant, ...entries].map(({ id }) => id))];
  const shown = ids.slice(0, limit);
  const rows = inOrder(shown, await selectFoundCases(tx, { organisationId, ids: shown }), ({ caseId }) => caseId);

  const hits = await Promise.all(
    rows.map(async ({ caseId, number, status, fleetNumber, siteName, timeZone, openedAt, editionId, complaints, words }): Promise<SearchHit> => {
      const { checks } = await compiledEdition(tx, { organisationId, editionId });
      const names = complaints.map((id) => checks.get(id)?.check.name ?? id).join(', ');
      const said = excerpt(words ?? '', asked.words);
      return {
        kind: 'case',
        id: caseId,
        href: `/cases/${caseId}`,
        title: [{ text: 'Case ', hit: false }, { text: String(number), hit: number === asked.caseNumber }],
        about: `${fleetNumber}, ${siteName}: ${names}. ${status === 'open' ? 'Open since' : `${status === 'called' ? 'Called' : 'Closed'}, opened on`} ${dayText(siteDay(openedAt, timeZone))}`,
        words: said.some(({ hit }) => hit) ? said : null,
        nearly: false,
      };
    }),
  );
  return { kind: 'cases', hits, total: totalOf(ids.length, { fetched: entries.length, total: entries[0]?.total ?? 0 }) };
}
