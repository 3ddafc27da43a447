import type { Metadata } from 'next';
import Link from 'next/link';
import { DataTable } from '@/components/ui/DataTable';
import { Disclosure } from '@/components/ui/Disclosure';
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
import { factsOf, type Reader } from './facts';
import { actionWords, entityWords, subjectOf } from './words';

export const metadata: Metadata = { title: 'Audit' };

interface Props {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

const instant = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'medium', timeZone: 'UTC' });

export default async function AuditPage({ searchParams }: Props) {
  const ctx = await pageContext(PERMITTED['audit.see']);
  const query = await searchParams;
  const asked = { ...query, page: query.page };
  const { page: _page, ...filter } = auditQuery.parse(asked);
  const { rows, total, page, pageCount, people, entities } = await orNotFound(listAudit({ ctx, input: asked }));
  const set = Object.entries(filter).filter((entry): entry is [string, string] => entry[1] !== null);
  const hrefFor = (to: number) => `/settings/audit?${new URLSearchParams([...set, ['page', String(to)]])}`;
  const reader = { units: ctx.person.units, people: new Map(people.map(({ id, name }) => [id, name])) };
  return (
    <>
      <PageHeader title="Audit" lead="Every write, with who and when. Rows are added and never changed. Times are universal time." />
      <div className="grid gap-6">
        <FilterBar action="/settings/audit" label="Filter the audit" resetHref={set.length > 0 ? '/settings/audit' : undefined}>
          <SelectField label="Who" name="person" placeholder="Anybody" options={people.map(({ id, name }) => ({ value: id, label: name }))} defaultValue={filter.person ?? ''} />
          <SelectField label="What" name="entity" placeholder="Anything" options={entities.map((entity) => ({ value: entity, label: entityWords(entity) }))} defaultValue={filter.entity ?? ''} />
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
            { key: 'action', header: 'Did', cell: ({ action }) => actionWords(action), rowHeader: true },
            { key: 'who', header: 'Who', cell: ({ personName }) => personName ?? 'Carryover itself' },
            { key: 'at', header: 'When', cell: ({ at }) => <time dateTime={at.toISOString()} className="figure whitespace-nowrap">{instant.format(at)}</time> },
            { key: 'changed', header: 'What was written', cell: (row) => <Written row={row} reader={reader} /> },
          ]}
        />
        <Pager label="Pages of the audit" page={page} pageCount={pageCount} total={total} hrefFor={hrefFor} />
      </div>
    </>
  );
}

type Row = Awaited<ReturnType<typeof listAudit>>['rows'][number];

/** What it says in words, and the record as it was kept, ids and all, for whoever has to have it to the letter. */
function Written({ row, reader }: { row: Row; reader: Reader }) {
  const facts = factsOf(row.changed, reader);
  const subject = subjectOf(row);
  return (
    <div className="min-w-0 text-[0.9375rem] wrap-anywhere">
      {facts.length > 0 && (
        <ul>
          {facts.map(({ label, value }) => <li key={label}><span className="text-ink-soft">{label}:</span> {value}</li>)}
        </ul>
      )}
      <div className="flex flex-wrap items-start gap-x-6">
        {subject && <Link href={subject.href} className="inline-flex min-h-touch items-center underline underline-offset-4">{subject.label}</Link>}
        <Disclosure summary="As it was kept" className="min-w-0 [&>summary]:font-normal!">
          <p>{row.action}, {row.entity} {row.entityId}</p>
          <pre className="figure mt-1 text-sm whitespace-pre-wrap">{JSON.stringify(row.changed, null, 1)}</pre>
        </Disclosure>
      </div>
    </div>
  );
}
