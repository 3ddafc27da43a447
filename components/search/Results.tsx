import Link from 'next/link';
import type { ReactNode } from 'react';
import { classes } from '@/components/ui/classes';
import type { SearchGroup } from '@/lib/schemas/search-result';
import { searchHref } from '@/lib/schemas/search';
import { Hit } from './Hit';
import { GROUP_NAMES } from './words';

interface Props {
  /** None of them empty. */
  groups: readonly SearchGroup[];
  q: string;
  listId: string;
  optionId: (name: string) => string;
  active: string | null;
  onGo: () => void;
}

/** What is found, as the options of the box, by kind; the last one leads to all of it. */
export function Results({ groups, q, listId, optionId, active, onGo }: Props) {
  const option = (name: string, href: string, children: ReactNode) => {
    const id = optionId(name);
    return (
      // A link, so that it can be opened beside this page; the keys go through the box.
      <Link
        key={name}
        id={id}
        role="option"
        aria-selected={active === id}
        tabIndex={-1}
        prefetch={false}
        href={href}
        onClick={(event) => !event.ctrlKey && !event.metaKey && !event.shiftKey && onGo()}
        className={classes('block min-h-touch border-b border-rule px-4 py-2 no-underline', active === id ? 'bg-ink text-paper' : 'hover:bg-sunk')}
      >
        {children}
      </Link>
    );
  };
  return (
    <div id={listId} role="listbox" aria-label="What is found">
      {groups.map(({ kind, hits, total }) => (
        <div key={kind} role="group" aria-labelledby={optionId(kind)}>
          <p id={optionId(kind)} className="label flex justify-between gap-4 border-b border-ink bg-sunk px-4 py-1">
            {GROUP_NAMES[kind]}
            {total > hits.length && <span className="tracking-normal normal-case">{hits.length} of {total}</span>}
          </p>
          {hits.map((hit) => option(`${hit.kind}-${hit.id}`, hit.href, <Hit hit={hit} />))}
        </div>
      ))}
      {option('all', searchHref(q), <span className="flex min-h-8 items-center font-bold">Show all that is found</span>)}
    </div>
  );
}
