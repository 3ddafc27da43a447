import type { Metadata } from 'next';
import { SiteForm } from '@/components/settings/SiteForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { viewSite } from '@/lib/services/site/view';
import { changeSite } from '../actions';

export const metadata: Metadata = { title: 'Site' };

export default async function SitePage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['site.manage']);
  const { id } = await params;
  const site = await orNotFound(viewSite({ ctx, input: { siteId: id } }));
  return (
    <>
      <PageHeader title={site.name} breadcrumbs={[{ label: 'Sites', href: '/settings/sites' }]} />
      <SiteForm action={changeSite} site={site} timeZones={Intl.supportedValuesOf('timeZone')} />
    </>
  );
}
