import type { Metadata } from 'next';
import Link from 'next/link';
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
import { listModelsInput } from '@/lib/schemas/compressor-model';
import { firstOfEach, listHref } from '@/lib/schemas/list';
import { termLabel, termOptions } from '@/lib/schemas/terms';
import { listModels, type ModelList } from '@/lib/services/compressor-model/list';
import type { UnitPreferences } from '@/lib/units';

export const metadata: Metadata = { title: 'Compressor models' };

type Row = ModelList['models'][number];

const columnsFor = (units: UnitPreferences): Column<Row>[] => [
  { key: 'name', header: 'Name', sortable: true, rowHeader: true, cell: (row) => <Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/models/${row.id}`}>{row.name}</Link> },
  { key: 'displacement', header: 'Displacement', sortable: true, numeric: true, cell: (row) => measureText(row.displacementM3, { quantity: 'displacement' }, units) },
  { key: 'drain', header: 'Oil drain', cell: (row) => termLabel('drainOpening', row.drainOpening) },
  { key: 'intake', header: 'Breathes from', cell: (row) => termLabel('intakeType', row.intakeType) },
  { key: 'cooling', header: 'Head cooled by', cell: (row) => termLabel('cooling', row.cooling) },
  { key: 'on-units', header: 'On units now', sortable: true, numeric: true, cell: (row) => row.onUnits },
];

export default async function ModelsPage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  const ctx = await pageContext(PERMITTED['model.see']);
  const input = listModelsInput.parse(firstOfEach(await searchParams));
  const { models, query, total, pages } = await listModels({ ctx, input });
  const isFiltered = Boolean(query.q || query.drain || query.hidden);
  const addLink = may(ctx.roles, 'model.edit') && <ButtonLink href="/models/new">Add a model</ButtonLink>;

  return (
    <>
      <PageHeader title="Compressor models" lead="Your own record of each kind of compressor: what a case need not ask." actions={addLink} />
      <FilterBar action="/models" label="Filter models" resetHref={isFiltered ? '/models' : undefined}>
        <TextField label="Name" name="q" defaultValue={query.q} autoComplete="off" className="w-56" />
        <SelectField label="Oil drain" name="drain" placeholder="Any drain" defaultValue={query.drain} options={termOptions('drainOpening')} className="w-48" />
        <SelectField label="List" name="hidden" placeholder="In use" defaultValue={query.hidden} options={[{ value: 'yes', label: 'Hidden' }]} className="w-36" />
      </FilterBar>
      <div className="mt-6 grid gap-6">
        <DataTable
          caption="Compressor models"
          captionHidden
          columns={columnsFor(ctx.person.units)}
          rows={models}
          rowKey={(row) => row.id}
          sort={{ key: query.sort, direction: query.direction }}
          sortHref={({ key, direction }) => listHref('/models', query, { sort: key, direction, page: 1 })}
          empty={
            isFiltered ? (
              <EmptyState title="No model matches" action={<ButtonLink href="/models" variant="quiet">Clear the filter</ButtonLink>}>Take a filter away, or look for part of the name.</EmptyState>
            ) : (
              <EmptyState title="No compressor model yet" action={addLink}>Add the kinds that your units carry. Every fit names one.</EmptyState>
            )
          }
        />
        <Pager label="Pages of models" page={query.page} pageCount={pages} total={total} hrefFor={(page) => listHref('/models', query, { page })} />
      </div>
    </>
  );
}
