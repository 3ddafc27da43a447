import type { Metadata } from 'next';
import Link from 'next/link';
import { ButtonLink } from '@/components/ui/Button';
import { DataTable, type Column } from '@/components/ui/DataTable';
import { EmptyState } from '@/components/ui/EmptyState';
import { FilterBar } from '@/components/ui/FilterBar';
import { PageHeader } from '@/components/ui/PageHeader';
import { Pager } from '@/components/ui/Pager';
import { SelectField } from '@/components/ui/SelectField';
import { percent } from '@/components/ui/SightGlass';
import { Tag } from '@/components/ui/Tag';
import { TextField } from '@/components/ui/TextField';
import { pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { listCasesInput } from '@/lib/schemas/case';
import { firstOfEach, listHref } from '@/lib/schemas/list';
import { listCases } from '@/lib/services/case/list';
import { listSites } from '@/lib/services/site/list';

export const metadata: Metadata = { title: 'Cases' };

type Query = Record<string, string | string[] | undefined>;
type Row = Awaited<ReturnType<typeof listCases>>['cases'][number];

const STATUS = { open: 'Open', called: 'Called', closed: 'Closed' } as const;
const dayText = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium' });

const COLUMNS: readonly Column<Row>[] = [
  { key: 'number', header: 'Case', sortable: true, rowHeader: true, cell: (row) => <Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/cases/${row.id}`}>{row.number}</Link> },
  { key: 'unit', header: 'Unit', sortable: true, cell: (row) => <Link className="inline-flex min-h-touch items-center whitespace-nowrap underline underline-offset-4" href={`/units/${row.unitId}`}>{row.fleetNumber}</Link> },
  { key: 'complaints', header: 'Complaint', cell: (row) => row.complaints.join(', ') },
  { key: 'leader', header: 'Leads', cell: (row) => row.leader && <>{row.leader.name} <span className="figure">{percent(row.leader.p)}</span></> },
  { key: 'site', header: 'Site', cell: (row) => row.siteName },
  { key: 'assigned', header: 'With', cell: (row) => row.assignedTo ?? 'nobody' },
  { key: 'opened', header: 'Opened', sortable: true, cell: (row) => dayText.format(new Date(row.openedAt)) },
  { key: 'status', header: 'State', cell: (row) => <Tag>{STATUS[row.status as keyof typeof STATUS] ?? row.status}</Tag> },
];

export default async function CasesPage({ searchParams }: { searchParams: Promise<Query> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const filter = listCasesInput.parse(firstOfEach(await searchParams));
  const [{ cases, total, page, pages }, sites] = await Promise.all([
    listCases({ ctx, input: filter }),
    listSites({ ctx, input: {} }),
  ]);
  const isFiltered = Boolean(filter.q || filter.site || filter.mine || filter.status !== 'open');

  return (
    <>
      <PageHeader
        title="Cases"
        lead="One complaint on one unit, from opening to a repair that held."
        actions={may(ctx.roles, 'case.work') && <ButtonLink href="/cases/new">Open a case</ButtonLink>}
      />
      <FilterBar action="/cases" label="Filter cases" resetHref={isFiltered ? '/cases' : undefined}>
        <TextField label="Unit or case number" name="q" defaultValue={filter.q} />
        <SelectField label="State" name="status" defaultValue={filter.status} options={[{ value: 'open', label: 'Open' }, { value: 'called', label: 'Called' }, { value: 'closed', label: 'Closed' }, { value: 'all', label: 'All' }]} />
        <SelectField label="Site" name="site" placeholder="Any site" defaultValue={filter.site} options={sites.map(({ id, name }) => ({ value: id, label: name }))} />
        <SelectField label="With" name="mine" placeholder="Anybody" defaultValue={filter.mine} options={[{ value: 'yes', label: 'Me' }]} />
      </FilterBar>
      <div className="mt-6 grid gap-6">
        <DataTable
          caption="Cases"
          captionHidden
          columns={COLUMNS}
          rows={cases}
          rowKey={(row) => row.id}
          sort={{ key: filter.sort, direction: filter.direction }}
          sortHref={({ key, direction }) => listHref('/cases', filter, { sort: key, direction, page: 1 })}
          empty={
            <EmptyState title={isFiltered ? 'No case matches' : 'No open case'} action={<ButtonLink href={isFiltered ? '/cases' : '/cases/new'}>{isFiltered ? 'Clear the filter' : 'Open a case'}</ButtonLink>}>
              {isFiltered ? 'Take a filter away, or look for part of the unit’s number.' : 'Open one when a vehicle comes in with oil in its air, slow air or a noise.'}
            </EmptyState>
          }
        />
        <Pager label="Pages of cases" page={page} pageCount={pages} total={total} hrefFor={(to) => listHref('/cases', filter, { page: to })} />
      </div>
    </>
  );
}
