import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/PageHeader';
import { BaselineForm } from '@/components/units/BaselineForm';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { readUnit } from '@/lib/services/unit/read';
import { recordBaseline } from '../../actions';

export const metadata: Metadata = { title: 'Healthy baseline' };

export default async function BaselinePage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.work']);
  const { id } = await params;
  const { unit, today } = await orNotFound(readUnit({ ctx, input: { unitId: id } }));
  return (
    <>
      <PageHeader
        title="Healthy baseline"
        lead={`Ten minutes while unit ${unit.fleetNumber} is in good order: later cases compare it with itself. Leave out what you can’t measure today.`}
        breadcrumbs={[{ label: 'Units', href: '/units' }, { label: unit.fleetNumber, href: `/units/${id}` }]}
      />
      <BaselineForm action={recordBaseline} newId={newId()} unitId={id} units={ctx.person.units} today={today} />
    </>
  );
}
