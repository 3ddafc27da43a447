import type { Metadata } from 'next';
import { ModelForm } from '@/components/models/ModelForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { addModel } from '../actions';

export const metadata: Metadata = { title: 'Add a model' };

export default async function NewModelPage() {
  const ctx = await pageContext(PERMITTED['model.edit']);
  return (
    <>
      <PageHeader title="Add a compressor model" breadcrumbs={[{ label: 'Compressor models', href: '/models' }]} />
      <ModelForm action={addModel} units={ctx.person.units} stored={{}} model={{ newId: newId() }} />
    </>
  );
}
