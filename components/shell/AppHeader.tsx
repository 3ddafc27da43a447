import type { ReactNode } from 'react';
import { SearchBox } from '@/components/search/SearchBox';
import { classes } from '@/components/ui/classes';
import { Menu } from './Menu';
import { NavLinks, type NavItem } from './NavLinks';
import { NoticesLink, Unread } from './NoticesLink';
import type { Theme } from './theme';
import { ThemeSwitch } from './ThemeSwitch';
import { Wordmark } from './Wordmark';

export interface AppHeaderProps {
  person: { name: string; email: string };
  organisation: { name: string };
  /** Only what this person can use. */
  items: readonly NavItem[];
  /** Notices that were not read. */
  unread: number;
  theme: Theme;
  /** The form or button that signs out. */
  signOut: ReactNode;
}

/**
 * Head of every signed-in page. From a small laptop's width on the navigation is a row and the person has a
 * menu; on a phone or an upright tablet one menu holds both.
 */
export function AppHeader({ person, organisation, items, unread, theme, signOut }: AppHeaderProps) {
  const about = (
    <div className="grid gap-4">
      <p>
        <span className="block font-bold">{person.name}</span>
        <span className="block text-[0.9375rem] break-all text-ink-soft">{person.email}</span>
        <span className="block text-[0.9375rem] text-ink-soft">{organisation.name}</span>
      </p>
      <ThemeSwitch theme={theme} />
      {signOut}
    </div>
  );
  return (
    <header className="border-b-2 border-ink">
      <div className="relative mx-auto flex max-w-page items-center gap-1 px-4 sm:gap-4 sm:px-6">
        <Wordmark href={items[0]?.href ?? '/'} />
        <nav aria-label="Main" className="mr-auto -mb-0.5 ml-4 max-lg:hidden">
          <NavLinks items={items} look="row" />
        </nav>
        <NoticesLink unread={unread} className="max-lg:hidden" />
        <SearchBox className="max-lg:ml-auto" />
        <Menu
          className="max-lg:hidden"
          panelClassName="absolute right-6 top-full w-80"
          summary={<><span className="text-base tracking-normal normal-case">{person.name}</span><Chevron /></>}
        >
          {about}
        </Menu>
        <Menu className="lg:hidden" panelClassName="absolute inset-x-0 top-full border-x-0" summary={<>Menu<Unread count={unread} of=" notices" /><Chevron className={unread > 0 ? 'max-[23rem]:hidden' : undefined} /></>}>
          <nav aria-label="Main" className="mb-5">
            <NavLinks items={items} look="column" />
            <NoticesLink unread={unread} className="border-b border-rule text-lg" />
          </nav>
          {about}
        </Menu>
      </div>
    </header>
  );
}

/** @param className for where there is no room for it */
function Chevron({ className }: { className?: string }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 12 8" className={classes('h-2 w-3 group-open:rotate-180', className)} fill="none" stroke="currentColor" strokeWidth="2">
      <path d="M1 1 6 6.5 11 1" />
    </svg>
  );
}
