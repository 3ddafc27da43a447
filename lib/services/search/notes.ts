import { selectFoundCalls, selectFoundEvents, selectFoundFits, selectFoundNotes, type EntryKind } from '@/db/queries/search';
import { siteDay } from '@/lib/case/site-day';
import { dayText } from '@/lib/schemas/day-text';
import type { SearchGroup, SearchHit } from '@/lib/schemas/search-result';
import { excerpt } from '@/lib/search/mark';
import { compiledEdition } from '../edition/compiled';
import { entriesOf, inOrder, type Search } from './search';

/** What people wrote: beside findings, at calls, at reopenings and, for whoever sees units, at fits. */
export async function searchNotes(search: Search): Promise<SearchGroup> {
  const { seesCases, limit } = search;
  const entries = await entriesOf(search, 'fit', ...(seesCases ? (['note', 'call', 'event'] as const) : []));
  const totals = new Map(entries.map(({ kind, total }) => [kind, total]));
  const shown = entries.slice(0, limit);
  const idsOf = (kind: EntryKind) => shown.filter((entry) => entry.kind === kind).map(({ id }) => id);
  const hits = [
    ...(await notesOf(search, idsOf('note'))),
    ...(await callsOf(search, idsOf('call'))),
    ...(await eventsOf(search, idsOf('event'))),
    ...(await fitsOf(search, idsOf('fit'))),
  ];
  return { kind: 'notes', hits: inOrder(shown.map(({ id }) => id), hits, ({ id }) => id), total: [...totals.values()].reduce((sum, total) => sum + total, 0) };
}

interface InCase {
  id: string;
  caseId: string;
  number: number;
  fleetNumber: string;
  timeZone: string;
  at: Date | null;
}

const hitInCase = ({ asked }: Search, { id, caseId, number, fleetNumber, timeZone, at }: InCase, title: string, words: string): SearchHit => ({
  kind: 'note',
  id,
  href: `/cases/${caseId}`,
  title: [{ text: title, hit: false }],
  about: [`Case ${number}`, fleetNumber, ...(at ? [dayText(siteDay(at, timeZone))] : [])].join(', '),
  words: excerpt(words, asked.words),
  nearly: false,
});

async function notesOf(search: Search, ids: string[]): Promise<SearchHit[]> {
  const { tx, organisationId } = search;
  const rows = await selectFoundNotes(tx, { organisationId, ids });
  return Promise.all(
    rows.map(async (row) => {
      const { checks } = await compiledEdition(tx, { organisationId, editionId: row.editionId });
      return hitInCase(search, row, checks.get(row.checkId)?.check.name ?? row.checkId, row.words);
    }),
  );
}

async function callsOf(search: Search, ids: string[]): Promise<SearchHit[]> {
  const rows = await selectFoundCalls(search.tx, { organisationId: search.organisationId, ids });
  return rows.map(({ unlistedCause, whyNotLeading, ...row }) => hitInCase(search, row, 'Words of a call', [unlistedCause, whyNotLeading].filter(Boolean).join('. ')));
}

async function eventsOf(search: Search, ids: string[]): Promise<SearchHit[]> {
  const rows = await selectFoundEvents(search.tx, { organisationId: search.organisationId, ids });
  return rows.map((row) => hitInCase(search, row, 'Why it was reopened', row.words ?? ''));
}

async function fitsOf({ tx, organisationId, asked }: Search, ids: string[]): Promise<SearchHit[]> {
  const rows = await selectFoundFits(tx, { organisationId, ids });
  return rows.map(({ id, unitId, words, installedOn, fleetNumber }) => ({
    kind: 'note',
    id,
    href: `/units/${unitId}/fits/${id}`,
    title: [{ text: 'Fit of a compressor', hit: false }],
    about: `${fleetNumber}, fitted on ${dayText(installedOn)}`,
    words: excerpt(words ?? '', asked.words),
    nearly: false,
  }));
}
