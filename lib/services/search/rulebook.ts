import { selectPublishedEdition } from '@/db/queries/edition';
import type { CompiledRulebook } from '@/lib/diagnose';
import { STATIONS, type StationId } from '@/lib/diagnose/stations';
import { searchHref, type EntryKind } from '@/lib/schemas/search';
import type { SearchGroup, SearchHit } from '@/lib/schemas/search-result';
import { wordsOf } from '@/lib/search/fold';
import { excerpt, markWords } from '@/lib/search/mark';
import { compiledEdition } from '../edition/compiled';
import type { Search } from './search';

interface Entry {
  kind: EntryKind;
  id: string;
  name: string;
  station: StationId | null;
  /** What else is said of it. */
  text: string;
  inName: string[];
  inAll: string[];
}

const KIND_WORDS = { remedy: 'Remedy', check: 'Check', cause: 'Cause' } as const satisfies Record<EntryKind, string>;

export const stationName = (station: StationId | null): string | null => STATIONS.find(({ id }) => id === station)?.name ?? null;

/** Remedies, checks and causes of the edition in force, by their names first. It is at hand compiled, so that no table holds its words. */
export async function searchRulebook({ tx, organisationId, q, asked: { words }, limit }: Search): Promise<SearchGroup> {
  const edition = words.length > 0 ? await selectPublishedEdition(tx, organisationId) : undefined;
  const entries = edition ? entriesOfRulebook(await compiledEdition(tx, { organisationId, editionId: edition.id })) : [];
  const inName = entries.filter((entry) => hasAll(entry.inName, words));
  const found = [...inName, ...entries.filter((entry) => !inName.includes(entry) && hasAll(entry.inAll, words))];
  const hits = found.slice(0, limit).map(({ kind, id, name, station, text }): SearchHit => {
    const said = excerpt(text, words);
    return {
      kind,
      id,
      href: searchHref(q, { kind, id }),
      title: markWords(name, words),
      about: [KIND_WORDS[kind], stationName(station)].filter(Boolean).join(', '),
      words: said.some(({ hit }) => hit) ? said : null,
      nearly: false,
    };
  });
  return { kind: 'rulebook', hits, total: found.length };
}

const hasAll = (held: readonly string[], words: readonly string[]) => words.every((word) => held.some((one) => one.startsWith(word)));

/** An edition never changes, and one asks with every letter typed. */
const kept = new WeakMap<CompiledRulebook, Entry[]>();

function entriesOfRulebook(compiled: CompiledRulebook): Entry[] {
  const held = kept.get(compiled);
  if (held) return held;
  const { remedies, checks, causes } = compiled.rulebook;
  const names = new Map(causes.map(({ id, name }) => [id, name]));
  const entry = (kind: EntryKind, { id, name, station }: Pick<Entry, 'id' | 'name' | 'station'>, text: string): Entry => ({
    kind, id, name, station, text, inName: wordsOf(name), inAll: wordsOf([name, text, stationName(station)].join(' ')),
  });
  const entries = [
    ...remedies.map((remedy) => entry('remedy', remedy, `Removes: ${remedy.causes.map((id) => names.get(id) ?? id).join('; ')}`)),
    ...checks.map((check) => entry('check', check, `${check.prompt} ${check.why}`)),
    ...causes.map((cause) => entry('cause', cause, cause.sentence)),
  ];
  kept.set(compiled, entries);
  return entries;
}
