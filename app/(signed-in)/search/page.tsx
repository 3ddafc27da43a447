import type { Metadata } from 'next';
import { FoundList } from '@/components/search/FoundList';
import { RulebookEntry } from '@/components/search/RulebookEntry';
import { foundText, SEARCHED } from '@/components/search/words';
import { Button } from '@/components/ui/Button';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';
import { TextField } from '@/components/ui/TextField';
import { pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import { firstOfEach } from '@/lib/schemas/list';
import { searchHref, searchPageInput, type EntryKind } from '@/lib/schemas/search';
import type { Ctx } from '@/lib/services/context';
import { searchEverywhere } from '@/lib/services/search/everywhere';
import { readRulebookEntry } from '@/lib/services/search/read-entry';

export const metadata: Metadata = { title: 'Search' };

/** Hits of each kind: what a person looks through before adding a word. */
const MOST = 25;

export default async function SearchPage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  const ctx = await pageContext(PERMITTED['unit.see']);
  const { q, read } = searchPageInput.parse(firstOfEach(await searchParams));
  const { groups } = await searchEverywhere({ ctx, input: { q, limit: MOST } });
  const entry = read && may(ctx.roles, 'case.see') ? await entryOrNull(ctx, read) : null;
  const found = groups.filter(({ hits }) => hits.length > 0);

  return (
    <>
      <PageHeader title="Search" lead={q === '' ? 'A fleet number, also one that is nearly right; a case number; or words, of which the beginning is enough.' : `${foundText(groups)}.`} />
      <form method="get" action="/search" role="search" aria-label="Search everything" className="mb-8 flex flex-wrap items-end gap-4">
        <TextField label={SEARCHED} name="q" defaultValue={q} maxLength={200} autoComplete="off" autoCapitalize="off" className="w-full sm:w-96" />
        <Button type="submit">Search</Button>
      </form>
      <div className="grid gap-10">
        {entry && <RulebookEntry entry={entry} closeHref={searchHref(q)} />}
        {q !== '' && found.length === 0 && <EmptyState title="Nothing is found">Try the beginning of a word, fewer words, or the number alone.</EmptyState>}
        {found.length > 0 && <div className="grid gap-x-12 gap-y-10 lg:grid-cols-2">{found.map((group) => <FoundList key={group.kind} group={group} />)}</div>}
      </div>
    </>
  );
}

/** An entry that the edition in force doesn't have any more is as if it weren't asked for. */
async function entryOrNull(ctx: Ctx, input: { kind: EntryKind; id: string }) {
  try {
    return await readRulebookEntry({ ctx, input });
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') return null;
    throw error;
  }
}
