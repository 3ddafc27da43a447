import type { Metadata } from 'next';
import { CaseTable } from '@/components/cases/CaseTable';
import { ListKeys } from '@/components/cases/ListKeys';
import { ChangeViews, SaveView } from '@/components/cases/SavedViews';
import { Views } from '@/components/cases/Views';
import { ButtonLink } from '@/components/ui/Button';
import { EmptyState } from '@/components/ui/EmptyState';
import { FilterBar } from '@/components/ui/FilterBar';
import { PageHeader } from '@/components/ui/PageHeader';
import { Pager } from '@/components/ui/Pager';
import { SelectField } from '@/components/ui/SelectField';
import { TextField } from '@/components/ui/TextField';
import { measureText } from '@/components/units/MeasureField';
import { pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { listCasesInput } from '@/lib/schemas/case';
import { firstOfEach, listHref } from '@/lib/schemas/list';
import { filtersOf } from '@/lib/schemas/saved-view';
import { listAssignable } from '@/lib/services/case/assignable';
import { listComplaints } from '@/lib/services/case/list-complaints';
import { listCases, type CaseList } from '@/lib/services/case/list';
import { listSavedViews } from '@/lib/services/saved-view/list';
import { listSites } from '@/lib/services/site/list';
import { removeViewFromForm, renameViewFromForm, saveViewFromForm } from './actions';

export const metadata: Metadata = { title: 'Cases' };

const STATUSES = [
  { value: 'standing', label: 'Open or called' },
  { value: 'open', label: 'Open' },
  { value: 'called', label: 'Called' },
  { value: 'closed', label: 'Closed' },
  { value: 'all', label: 'All' },
];

/** The views that everybody has. */
const VIEWS = [
  { name: 'All that stands', query: filtersOf('') },
  { name: 'With me', query: filtersOf('whose=me') },
  { name: 'With nobody', query: filtersOf('whose=nobody') },
  { name: 'Do not release', query: filtersOf('held=yes') },
  { name: 'Longest first', query: filtersOf('sort=opened&direction=asc') },
];

export default async function CasesPage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const filter = listCasesInput.parse(firstOfEach(await searchParams));
  const [{ cases, total, pages }, sites, people, complaints, views] = await Promise.all([
    listCases({ ctx, input: filter }),
    listSites({ ctx, input: {} }),
    listAssignable({ ctx, input: {} }),
    listComplaints({ ctx, input: {} }),
    listSavedViews({ ctx, input: { list: 'cases' } }),
  ]);
  const current = filtersOf(listHref('', filter).slice(1));
  const isFiltered = Boolean(filter.q || filter.site || filter.whose || filter.complaint || filter.held || filter.status !== 'standing');
  const rows = cases.map(({ odometerM, ...row }) => ({ ...row, odometer: measureText(odometerM, { quantity: 'distance' }, ctx.person.units) ?? null }));

  return (
    <>
      <PageHeader
        title="Cases"
        lead="What stands where, whose it is, since when, and what leads."
        actions={may(ctx.roles, 'case.work') && <ButtonLink href="/cases/new">Open a case</ButtonLink>}
      />
      <Views path="/cases" views={[...VIEWS, ...views]} current={current} />
      <FilterBar action="/cases" label="Filter cases" resetHref={isFiltered ? '/cases' : undefined} more={<MoreFilters {...{ filter, people, complaints }} meId={ctx.person.id} />} moreOpen={Boolean(filter.whose || filter.complaint || filter.held || filter.status !== 'standing')}>
        <TextField label="Unit or case number" name="q" defaultValue={filter.q} autoComplete="off" className="w-52 max-sm:w-full" />
        <SelectField label="Site" name="site" placeholder="Any site" defaultValue={filter.site} options={sites.map(({ id, name }) => ({ value: id, label: name }))} className="w-52 max-sm:min-w-0 max-sm:flex-1" />
        <input type="hidden" name="sort" value={filter.sort} />
        <input type="hidden" name="direction" value={filter.direction} />
      </FilterBar>
      <div className="mt-6 grid gap-6">
        {rows.length > 0 ? (
          <CaseTable
            rows={rows}
            sort={{ key: filter.sort, direction: filter.direction }}
            sortHref={({ key, direction }) => listHref('/cases', filter, { sort: key, direction, page: 1 })}
            now={ctx.now()}
          />
        ) : (
          <EmptyState title={isFiltered ? 'No case matches' : 'Nothing stands'} action={isFiltered ? <ButtonLink href="/cases" variant="quiet">Clear the filter</ButtonLink> : <ButtonLink href="/cases/new">Open a case</ButtonLink>}>
            {isFiltered ? 'Take a filter away, or look for part of the unit’s number.' : 'Open a case when a vehicle comes in with oil in its air, slow air or a noise.'}
          </EmptyState>
        )}
        <Pager label="Pages of cases" page={filter.page} pageCount={pages} total={total} hrefFor={(to) => listHref('/cases', filter, { page: to })} />
        <div>
          <SaveView action={saveViewFromForm} list="cases" query={current} id={newId()} />
          <ChangeViews rename={renameViewFromForm} remove={removeViewFromForm} views={views} />
          <ListKeys searchId="q" />
        </div>
      </div>
    </>
  );
}

interface MoreProps {
  filter: CaseList['query'];
  people: readonly { id: string; name: string }[];
  complaints: readonly { id: string; name: string }[];
  meId: string;
}

/** What the views above cover for most people. */
function MoreFilters({ filter, people, complaints, meId }: MoreProps) {
  const others = people.filter(({ id }) => id !== meId).map(({ id, name }) => ({ value: id, label: name }));
  return (
    <>
      <SelectField label="State" name="status" defaultValue={filter.status} options={STATUSES} />
      <SelectField label="With" name="whose" placeholder="Anybody" defaultValue={filter.whose} options={[{ value: 'me', label: 'Me' }, { value: 'nobody', label: 'Nobody' }, ...others]} />
      <SelectField label="Complaint" name="complaint" placeholder="Any" defaultValue={filter.complaint} options={complaints.map(({ id, name }) => ({ value: id, label: name }))} />
      <SelectField label="Release" name="held" placeholder="Any" defaultValue={filter.held} options={[{ value: 'yes', label: 'Do not release' }]} />
    </>
  );
}
