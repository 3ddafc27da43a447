import type { ReactNode } from 'react';
import { Button, ButtonLink } from './Button';
import { Disclosure } from './Disclosure';

interface Props {
  /** The list's own address; the fields become its query. */
  action: string;
  label: string;
  children: ReactNode;
  /** Given when a filter is on: the address without filters. */
  resetHref?: string;
  /** Fields that are needed now and then, folded away. */
  more?: ReactNode;
  /** One of those is on, so that they are shown. */
  moreOpen?: boolean;
}

/**
 * Filters of a list, sent as the query of its address (no script needed). Put fields inside.
 * @example <FilterBar action="/units" label="Filter units" resetHref={filtered ? '/units' : undefined}><TextField label="Number" name="q" defaultValue={q} /></FilterBar>
 */
export function FilterBar({ action, label, children, resetHref, more, moreOpen }: Props) {
  return (
    <form method="get" action={action} role="search" aria-label={label} className="filters flex flex-wrap items-end gap-4 border-b border-rule pb-5">
      {children}
      <Button type="submit" variant="quiet">Show</Button>
      {resetHref && <ButtonLink variant="quiet" className="border-transparent" href={resetHref}>Clear</ButtonLink>}
      {more && (
        <Disclosure summary="More filters" open={moreOpen} className="w-full">
          <div className="grid grid-cols-2 gap-4 lg:grid-cols-4">{more}</div>
        </Disclosure>
      )}
    </form>
  );
}
