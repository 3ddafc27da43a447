import type { Metadata } from 'next';
import { ModelForm } from '@/components/models/ModelForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { readModelForm } from '@/lib/services/compressor-model/read';
import { changeModel } from '../../actions';

export const metadata: Metadata = { title: 'Edit a model' };

export default async function EditModelPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['model.edit']);
  const { id } = await params;
  const { name, values, version } = await orNotFound(readModelForm({ ctx, input: { modelId: id } }));
  return (
    <>
      <PageHeader title={`Edit ${name}`} breadcrumbs={[{ label: 'Compressor models', href: '/models' }, { label: name, href: `/models/${id}` }]} />
      <ModelForm action={changeModel} units={ctx.person.units} stored={values} model={{ modelId: id, version }} />
    </>
  );
}
