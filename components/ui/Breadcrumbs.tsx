import Link from 'next/link';

export interface Crumb {
  label: string;
  href: string;
}

/**
 * The way back up. The page itself is not in it: its heading follows at once.
 * @example <Breadcrumbs items={[{ label: 'Units', href: '/units' }]} />
 */
export function Breadcrumbs({ items }: { items: readonly Crumb[] }) {
  return (
    <nav aria-label="Where this page belongs">
      <ol className="flex flex-wrap gap-x-2">
        {items.map(({ href, label }) => (
          <li key={href} className="label flex items-center gap-2">
            <Link href={href} className="inline-flex min-h-8 items-center underline decoration-edge underline-offset-4 hover:decoration-ink">{label}</Link>
            <span aria-hidden="true" className="text-ink-soft">/</span>
          </li>
        ))}
      </ol>
    </nav>
  );
}
