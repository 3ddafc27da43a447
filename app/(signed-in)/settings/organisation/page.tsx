import type { Metadata } from 'next';
import { OrganisationForm } from '@/components/settings/OrganisationForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { viewOrganisation } from '@/lib/services/organisation/view';
import { saveOrganisation } from './actions';

export const metadata: Metadata = { title: 'Organisation' };

export default async function OrganisationPage() {
  const ctx = await pageContext(PERMITTED['organisation.manage']);
  const organisation = await viewOrganisation({ ctx, input: {} });
  return (
    <>
      <PageHeader title="Organisation" />
      <OrganisationForm action={saveOrganisation} organisation={organisation} />
    </>
  );
}
