import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { EndMembershipForm, MemberForm } from '@/components/settings/MemberForms';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { viewMember } from '@/lib/services/membership/view';
import { listSites } from '@/lib/services/site/list';
import { letGo, saveMember } from '../actions';

export const metadata: Metadata = { title: 'Person' };

export default async function PersonPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['people.manage']);
  const { id } = await params;
  const member = await orNotFound(viewMember({ ctx, input: { personId: id } }));
  if (member.endedAt) notFound();
  const sites = await listSites({ ctx, input: {} });
  return (
    <>
      <PageHeader title={member.name} lead={member.email} breadcrumbs={[{ label: 'People', href: '/settings/people' }]} />
      <div className="grid gap-12">
        <MemberForm action={saveMember} member={member} sites={sites.map((site) => ({ value: site.id, label: site.name }))} />
        <section className="grid gap-4">
          <h2>Leaving</h2>
          <EndMembershipForm action={letGo} personId={id} name={member.name} />
        </section>
      </div>
    </>
  );
}
