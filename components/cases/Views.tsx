import Link from 'next/link';
import { classes } from '@/components/ui/classes';

export interface View {
  name: string;
  query: string;
}

/** Ways of looking at a list, as links: those that everybody has, then one's own. The one in use is marked. */
export function Views({ path, views, current }: { path: string; views: readonly View[]; current: string }) {
  return (
    <nav aria-label="Views" className="mb-6 border-b border-rule">
      <ul className="flex flex-wrap gap-x-1">
        {views.map(({ name, query }) => (
          <li key={name}>
            <Link
              href={`${path}?${query}`}
              aria-current={query === current ? 'page' : undefined}
              className={classes('label -mb-px flex min-h-touch items-center border-b-4 px-2 hover:bg-sunk sm:px-3', query === current ? 'border-ink' : 'border-transparent')}
            >
              {name}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
