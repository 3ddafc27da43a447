import type { Metadata } from 'next';
import { DataTable } from '@/components/ui/DataTable';
import { EmptyState } from '@/components/ui/EmptyState';
import { FilterBar } from '@/components/ui/FilterBar';
import { PageHeader } from '@/components/ui/PageHeader';
import { Pager } from '@/components/ui/Pager';
import { SelectField } from '@/components/ui/SelectField';
import { TextField } from '@/components/ui/TextField';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { auditQuery } from '@/lib/schemas/person';
import { listAudit } from '@/lib/services/audit/list';

export const metadata: Metadata = { title: 'Audit' };

interface Props {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

const instant = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'medium', timeZone: 'UTC' });

function inWords(value: unknown): string {
  if (Array.isArray(value)) return value.map(inWords).join(', ');
  if (typeof value === 'object' && value !== null) return Object.entries(value).map(([name, inner]) => `${name} ${inWords(inner)}`).join(', ');
  return value === null ? 'none' : String(value);
}

/** "roles: technician, engineer; siteId: …": what a row was changed to. */
const changesInWords = (changed: Record<string, unknown>) =>
  Object.entries(changed)
    .map(([field, value]) => `${field}: ${inWords(value)}`)
    .join('; ');

export default async function AuditPage({ searchParams }: Props) {
  const ctx = await pageContext(PERMITTED['audit.see']);
  const query = await searchParams;
  const asked = { ...query, page: query.page };
  const { page: _page, ...filter } = auditQuery.parse(asked);
  const { rows, total, page, pageCount, people, entities } = await orNotFound(listAudit({ ctx, input: asked }));
  const set = Object.entries(filter).filter((entry): entry is [string, string] => entry[1] !== null);
  const hrefFor = (to: number) => `/settings/audit?${new URLSearchParams([...set, ['page', String(to)]])}`;
  return (
    <>
      <PageHeader title="Audit" lead="Every write, with who and when. Rows are added and never changed. Times are universal time." />
      <div className="grid gap-6">
        <FilterBar action="/settings/audit" label="Filter the audit" resetHref={set.length > 0 ? '/settings/audit' : undefined}>
          <SelectField label="Who" name="person" placeholder="Anybody" options={people.map(({ id, name }) => ({ value: id, label: name }))} defaultValue={filter.person ?? ''} />
          <SelectField label="What" name="entity" placeholder="Anything" options={entities.map((entity) => ({ value: entity, label: entity }))} defaultValue={filter.entity ?? ''} />
          <TextField label="From" name="from" type="date" defaultValue={filter.from ?? ''} />
          <TextField label="Until" name="until" type="date" defaultValue={filter.until ?? ''} />
        </FilterBar>
        <DataTable
          caption="What was written"
          captionHidden
          rows={rows}
          rowKey={({ id }) => id}
          empty={<EmptyState title="Nothing was written">No row matches. Clear the filter to see all.</EmptyState>}
          columns={[
            { key: 'at', header: 'When', cell: ({ at }) => <time dateTime={at.toISOString()} className="figure whitespace-nowrap">{instant.format(at)}</time> },
            { key: 'who', header: 'Who', cell: ({ personName }) => personName ?? 'Carryover itself' },
            { key: 'action', header: 'Did', cell: ({ action }) => action, rowHeader: true },
            { key: 'what', header: 'To what', cell: ({ entity, entityId }) => <>{entity} <span className="figure text-sm text-ink-soft">{entityId}</span></> },
            { key: 'changed', header: 'Changed', cell: ({ changed }) => <span className="text-[0.9375rem] wrap-anywhere">{changesInWords(changed)}</span> },
          ]}
        />
        <Pager label="Pages of the audit" page={page} pageCount={pageCount} total={total} hrefFor={hrefFor} />
      </div>
    </>
  );
}
