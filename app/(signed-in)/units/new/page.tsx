import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/PageHeader';
import { UnitForm } from '@/components/units/UnitForm';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { listSites } from '@/lib/services/site/list';
import { addUnit } from '../actions';

export const metadata: Metadata = { title: 'Add a unit' };

export default async function NewUnitPage() {
  const ctx = await pageContext(PERMITTED['unit.edit']);
  const sites = await listSites({ ctx, input: {} });
  return (
    <>
      <PageHeader title="Add a unit" breadcrumbs={[{ label: 'Units', href: '/units' }]} />
      <UnitForm action={addUnit} sites={sites} units={ctx.person.units} stored={{ siteId: ctx.person.siteId ?? '', vehicleKind: 'truck' }} unit={{ newId: newId() }} />
    </>
  );
}
