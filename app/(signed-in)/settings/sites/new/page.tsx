import type { Metadata } from 'next';
import { SiteForm } from '@/components/settings/SiteForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { addSite } from '../actions';

export const metadata: Metadata = { title: 'Add a site' };

export default async function NewSitePage() {
  await pageContext(PERMITTED['site.manage']);
  return (
    <>
      <PageHeader title="Add a site" breadcrumbs={[{ label: 'Sites', href: '/settings/sites' }]} />
      <SiteForm action={addSite} timeZones={Intl.supportedValuesOf('timeZone')} />
    </>
  );
}
