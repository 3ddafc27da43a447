import type { ReactNode } from 'react';
import { Breadcrumbs, type Crumb } from './Breadcrumbs';

interface Props {
  title: ReactNode;
  /** A line under the title: what the page is for, or the facts that name the thing. */
  lead?: ReactNode;
  breadcrumbs?: readonly Crumb[];
  /** Tags that belong to the title. */
  tags?: ReactNode;
  /** What can be done here; at most one primary. */
  actions?: ReactNode;
}

/**
 * The head of every page: way back, the one h1, what to do. Closed by a double rule.
 * @example <PageHeader title="Units" lead="Every vehicle, and what was fitted to it." actions={<ButtonLink href="/units/new">Add a unit</ButtonLink>} />
 */
export function PageHeader({ title, lead, breadcrumbs, tags, actions }: Props) {
  return (
    <header className="rule-double mb-6 pb-3">
      {breadcrumbs && <Breadcrumbs items={breadcrumbs} />}
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
        <div className="min-w-0">
          <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
            <h1>{title}</h1>
            {tags}
          </div>
          {lead != null && <p className="mt-1.5 max-w-prose text-ink-soft">{lead}</p>}
        </div>
        {actions && <div className="flex flex-wrap gap-3">{actions}</div>}
      </div>
    </header>
  );
}
