import type { ReactNode } from 'react';
import { Button, ButtonLink } from './Button';

interface Props {
  /** The list's own address; the fields become its query. */
  action: string;
  label: string;
  children: ReactNode;
  /** Given when a filter is on: the address without filters. */
  resetHref?: string;
}

/**
 * Filters of a list, sent as the query of its address (no script needed). Put fields inside.
 * @example <FilterBar action="/units" label="Filter units" resetHref={filtered ? '/units' : undefined}><TextField label="Number" name="q" defaultValue={q} /></FilterBar>
 */
export function FilterBar({ action, label, children, resetHref }: Props) {
  return (
    <form method="get" action={action} role="search" aria-label={label} className="filters flex flex-wrap items-end gap-4 border-b border-rule pb-5">
      {children}
      <Button type="submit" variant="quiet">Show</Button>
      {resetHref && <ButtonLink variant="quiet" className="border-transparent" href={resetHref}>Clear</ButtonLink>}
    </form>
  );
}
