import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/PageHeader';
import { UnitForm } from '@/components/units/UnitForm';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { listSites } from '@/lib/services/site/list';
import { readUnitForm } from '@/lib/services/unit/read';
import { changeUnit } from '../../actions';

export const metadata: Metadata = { title: 'Edit a unit' };

export default async function EditUnitPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['unit.edit']);
  const { id } = await params;
  const { fleetNumber, values, version } = await orNotFound(readUnitForm({ ctx, input: { unitId: id } }));
  const sites = await listSites({ ctx, input: {} });
  return (
    <>
      <PageHeader title={`Edit unit ${fleetNumber}`} breadcrumbs={[{ label: 'Units', href: '/units' }, { label: fleetNumber, href: `/units/${id}` }]} />
      <UnitForm action={changeUnit} sites={sites} units={ctx.person.units} stored={values} unit={{ unitId: id, version }} />
    </>
  );
}
