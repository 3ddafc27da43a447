'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { classes } from '@/components/ui/classes';

export interface NavItem {
  href: string;
  label: string;
}

/** The places this person can go; the current one is underlined and told to screen readers. */
export function NavLinks({ items, look }: { items: readonly NavItem[]; look: 'row' | 'column' }) {
  const pathname = usePathname();
  return (
    <ul className={look === 'row' ? 'flex flex-wrap' : 'border-t border-rule'}>
      {items.map(({ href, label }) => {
        const inside = pathname === href || pathname.startsWith(`${href}/`);
        return (
          <li key={href} className={look === 'column' ? 'border-b border-rule' : undefined}>
            <Link
              href={href}
              aria-current={pathname === href ? 'page' : inside ? 'true' : undefined}
              className={classes(
                'label flex min-h-touch items-center hover:bg-sunk',
                look === 'row' ? 'border-y-4 border-transparent px-3' : 'border-l-4 border-transparent px-3 text-lg',
                inside && (look === 'row' ? 'border-b-ink!' : 'border-l-ink!'),
              )}
            >
              {label}
            </Link>
          </li>
        );
      })}
    </ul>
  );
}
