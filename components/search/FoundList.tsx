import Link from 'next/link';
import type { SearchGroup } from '@/lib/schemas/search-result';
import { Hit } from './Hit';
import { GROUP_NAMES } from './words';

/** What is found of one kind, on the page of the search. */
export function FoundList({ group: { kind, hits, total } }: { group: SearchGroup }) {
  return (
    <section aria-labelledby={`found-${kind}`} className="grid content-start gap-2">
      <h2 id={`found-${kind}`}>{GROUP_NAMES[kind]} <span className="figure text-base font-normal text-ink-soft">{total}</span></h2>
      <ul className="border-t-2 border-ink">
        {hits.map((hit) => (
          <li key={`${hit.kind}-${hit.id}`} className="border-b border-rule">
            <Link href={hit.href} prefetch={false} className="block min-h-touch py-3 no-underline hover:bg-sunk"><Hit hit={hit} /></Link>
          </li>
        ))}
      </ul>
      {total > hits.length && <p className="text-ink-soft">The first {hits.length} are shown. Add a word to find fewer.</p>}
    </section>
  );
}
