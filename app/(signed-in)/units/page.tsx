import type { Metadata } from 'next';
import Link from 'next/link';
import { HoldMark } from '@/components/cases/HoldMark';
import { measureText } from '@/components/units/MeasureField';
import { ButtonLink } from '@/components/ui/Button';
import { DataTable, type Column } from '@/components/ui/DataTable';
import { EmptyState } from '@/components/ui/EmptyState';
import { FilterBar } from '@/components/ui/FilterBar';
import { PageHeader } from '@/components/ui/PageHeader';
import { Pager } from '@/components/ui/Pager';
import { SelectField } from '@/components/ui/SelectField';
import { TextField } from '@/components/ui/TextField';
import { pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { dayText } from '@/lib/schemas/day-text';
import { firstOfEach, listHref } from '@/lib/schemas/list';
import { termLabel, termOptions } from '@/lib/schemas/terms';
import { listUnitsInput } from '@/lib/schemas/unit';
import { listSites } from '@/lib/services/site/list';
import { listUnits, type UnitList } from '@/lib/services/unit/list';
import type { UnitPreferences } from '@/lib/units';

export const metadata: Metadata = { title: 'Units' };

type Row = UnitList['units'][number];

const columnsFor = (units: UnitPreferences): Column<Row>[] => [
  { key: 'number', header: 'Number', sortable: true, rowHeader: true, cell: (row) => <><Link className="inline-flex min-h-touch items-center whitespace-nowrap underline underline-offset-4" href={`/units/${row.id}`}>{row.fleetNumber}</Link><HoldMark checks={row.holds} /></> },
  { key: 'kind', header: 'Kind', sortable: true, spare: true, cell: (row) => termLabel('vehicleKind', row.vehicleKind) },
  { key: 'vocation', header: 'Work', sortable: true, spare: true, cell: (row) => termLabel('vocation', row.vocation) },
  { key: 'site', header: 'Site', sortable: true, cell: (row) => row.siteName },
  { key: 'model', header: 'Compressor', cell: (row) => row.modelName },
  { key: 'since', header: 'Fitted', spare: true, cell: (row) => row.installedOn && <span className="whitespace-nowrap">{dayText(row.installedOn)}</span> },
  { key: 'odometer', header: 'Odometer', numeric: true, cell: (row) => measureText(row.odometerM, { quantity: 'distance' }, units) },
  { key: 'read', header: 'Read on', cell: (row) => row.readOn && <span className="whitespace-nowrap">{dayText(row.readOn)}</span> },
  { key: 'built', header: 'Built', sortable: true, spare: true, numeric: true, cell: (row) => row.builtOn?.slice(0, 4) },
];

export default async function UnitsPage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  const ctx = await pageContext(PERMITTED['unit.see']);
  const input = listUnitsInput.parse(firstOfEach(await searchParams));
  const [{ units, query, total, pages }, sites] = await Promise.all([listUnits({ ctx, input }), listSites({ ctx, input: {} })]);
  const { q, site, vocation, kind, hidden } = query;
  const isFiltered = Boolean(q || site || vocation || kind || hidden);
  const addLink = may(ctx.roles, 'unit.edit') && <ButtonLink href="/units/new">Add a unit</ButtonLink>;

  return (
    <>
      <PageHeader title="Units" lead="Every vehicle, and what was fitted to it." actions={addLink} />
      <FilterBar
        action="/units"
        label="Filter units"
        resetHref={isFiltered ? '/units' : undefined}
        moreOpen={Boolean(vocation || kind || hidden)}
        more={
          <>
            <SelectField label="Work" name="vocation" placeholder="Any work" defaultValue={vocation} options={termOptions('vocation')} />
            <SelectField label="Kind" name="kind" placeholder="Any kind" defaultValue={kind} options={termOptions('vehicleKind')} />
            <SelectField label="List" name="hidden" placeholder="In use" defaultValue={hidden} options={[{ value: 'yes', label: 'Hidden' }]} />
          </>
        }
      >
        <TextField label="Number" name="q" defaultValue={q} autoComplete="off" className="w-52 max-sm:w-full" />
        <SelectField label="Site" name="site" placeholder="Any site" defaultValue={site} options={sites.map(({ id, name }) => ({ value: id, label: name }))} className="w-52 max-sm:min-w-0 max-sm:flex-1" />
      </FilterBar>
      <div className="mt-6 grid gap-6">
        <DataTable
          caption="Units"
          captionHidden
          columns={columnsFor(ctx.person.units)}
          rows={units}
          rowKey={(row) => row.id}
          sort={{ key: query.sort, direction: query.direction }}
          sortHref={({ key, direction }) => listHref('/units', query, { sort: key, direction, page: 1 })}
          empty={
            isFiltered ? (
              <EmptyState title="No unit matches" action={<ButtonLink href="/units" variant="quiet">Clear the filter</ButtonLink>}>Take a filter away, or look for part of the number.</EmptyState>
            ) : (
              <EmptyState title="No unit yet" action={addLink}>A unit can also be added while a case is opened on it.</EmptyState>
            )
          }
        />
        <Pager label="Pages of units" page={query.page} pageCount={pages} total={total} hrefFor={(page) => listHref('/units', query, { page })} />
      </div>
    </>
  );
}
