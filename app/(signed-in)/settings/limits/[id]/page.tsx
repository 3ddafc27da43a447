import type { Metadata } from 'next';
import { scopeText } from '@/components/limits/scope-text';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { PageHeader } from '@/components/ui/PageHeader';
import { HideForm } from '@/components/units/ReasonForms';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { dayText } from '@/lib/schemas/day-text';
import { viewLimit } from '@/lib/services/limit/list';
import { withdrawLimit } from '../actions';

export const metadata: Metadata = { title: 'Limit' };

export default async function LimitPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['limit.see']);
  const { id } = await params;
  const limit = await orNotFound(viewLimit({ ctx, input: { limitId: id } }));
  return (
    <>
      <PageHeader title={`${limit.checkName}: ${limit.text}`} breadcrumbs={[{ label: 'Limits', href: '/settings/limits' }]} />
      <DefinitionList
        items={[
          { term: 'For', value: scopeText(limit) },
          { term: 'Source', value: limit.source },
          { term: 'Adopted', value: `by ${limit.person}, ${dayText(limit.adoptedAt.slice(0, 10))}` },
        ]}
      />
      {may(ctx.roles, 'limit.adopt') && (
        <div className="mt-8">
          <HideForm action={withdrawLimit} id={{ name: 'limitId', value: id }} title="Withdraw this limit" explains="Values measured from now on are no longer judged by it. What it has judged still says so." />
        </div>
      )}
    </>
  );
}
