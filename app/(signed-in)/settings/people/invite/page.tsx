import type { Metadata } from 'next';
import { InviteForm } from '@/components/settings/InviteForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { listSites } from '@/lib/services/site/list';
import { invitePerson } from '../actions';

export const metadata: Metadata = { title: 'Invite somebody' };

export default async function InvitePage() {
  const ctx = await pageContext(PERMITTED['people.manage']);
  const sites = await listSites({ ctx, input: {} });
  return (
    <>
      <PageHeader
        title="Invite somebody"
        lead="A mail with a link goes to the address. It works once and for seven days; name and password are set there."
        breadcrumbs={[{ label: 'People', href: '/settings/people' }]}
      />
      <InviteForm action={invitePerson} sites={sites.map(({ id, name }) => ({ value: id, label: name }))} />
    </>
  );
}
