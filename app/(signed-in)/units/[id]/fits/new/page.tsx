import type { Metadata } from 'next';
import { FitForm } from '@/components/fits/FitForm';
import { ButtonLink } from '@/components/ui/Button';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { readNewFitForm } from '@/lib/services/fit/read';
import { addFit } from '../../../actions';

export const metadata: Metadata = { title: 'Record a fit' };

export default async function NewFitPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['unit.edit']);
  const { id } = await params;
  const { fleetNumber, today, standing, models } = await orNotFound(readNewFitForm({ ctx, input: { unitId: id } }));
  return (
    <>
      <PageHeader
        title="Record a fit"
        lead={`One compressor on unit ${fleetNumber}, with how it was fitted.`}
        breadcrumbs={[{ label: 'Units', href: '/units' }, { label: fleetNumber, href: `/units/${id}` }]}
      />
      {models.length === 0 ? (
        <EmptyState title="No compressor model yet" action={may(ctx.roles, 'model.edit') && <ButtonLink href="/models/new">Add a model</ButtonLink>}>
          A fit names its model. An engineer or a manager adds one first.
        </EmptyState>
      ) : (
        <FitForm action={addFit} models={models} units={ctx.person.units} today={today} stored={{ condition: 'new', installedOn: today }} fit={{ newId: newId(), unitId: id, standing }} />
      )}
    </>
  );
}
