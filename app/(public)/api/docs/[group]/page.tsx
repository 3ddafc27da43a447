import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { OperationArticle } from '@/components/api-docs/OperationArticle';
import { SchemaArticle } from '@/components/api-docs/SchemaArticle';
import { PageHeader } from '@/components/ui/PageHeader';
import { readableApi } from '../readable-api';

interface Props {
  params: Promise<{ group: string }>;
}

const groupOf = async ({ params }: Props) => {
  const { group } = await params;
  return readableApi().groups.find(({ id }) => id === group);
};

export async function generateMetadata(props: Props): Promise<Metadata> {
  return { title: `${(await groupOf(props))?.title ?? 'Not found'} – API` };
}

/** What can be asked about one kind of thing, and what comes back. */
export default async function ApiGroupPage(props: Props) {
  const group = await groupOf(props);
  if (!group) notFound();
  const { title, operations, schemas } = group;
  return (
    <div className="py-8">
      <PageHeader title={title} breadcrumbs={[{ label: 'API', href: '/api/docs' }]} />
      <div className="grid gap-12">
        <section aria-labelledby="asked" className="grid gap-10">
          <h2 id="asked">What can be asked</h2>
          {operations.map((operation) => <OperationArticle key={operation.operationId} operation={operation} />)}
        </section>
        {schemas.length > 0 && (
          <section aria-labelledby="answers" className="grid gap-8">
            <h2 id="answers">What answers hold</h2>
            {schemas.map((schema) => <SchemaArticle key={schema.name} schema={schema} />)}
          </section>
        )}
      </div>
    </div>
  );
}
