import type { Metadata } from 'next';
import { PageHeader } from '@/components/ui/PageHeader';
import { ReadingForm } from '@/components/units/ReadingForm';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { readUnit } from '@/lib/services/unit/read';
import { addReading } from '../../../actions';

export const metadata: Metadata = { title: 'Enter a reading' };

export default async function NewReadingPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['unit.edit']);
  const { id } = await params;
  const { unit, today } = await orNotFound(readUnit({ ctx, input: { unitId: id } }));
  return (
    <>
      <PageHeader
        title="Enter a reading"
        lead={`Odometer and engine hours of unit ${unit.fleetNumber}.`}
        breadcrumbs={[{ label: 'Units', href: '/units' }, { label: unit.fleetNumber, href: `/units/${id}` }]}
      />
      <ReadingForm action={addReading} unitId={id} units={ctx.person.units} today={today} />
    </>
  );
}
