import type { Metadata } from 'next';
import { Gates } from '@/components/gate/Gates';
import { SiteForm } from '@/components/settings/SiteForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { newId } from '@/lib/ids';
import { dayText } from '@/lib/schemas/day-text';
import { listGates } from '@/lib/services/gate/list';
import { viewSite } from '@/lib/services/site/view';
import { changeSite, makeGate, revokeGate } from '../actions';

export const metadata: Metadata = { title: 'Site' };

export default async function SitePage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['site.manage']);
  const { id } = await params;
  const site = await orNotFound(viewSite({ ctx, input: { siteId: id } }));
  const { gates } = await listGates({ ctx, input: { siteId: site.id } });
  const untilText = (at: string) => dayText(siteDay(new Date(at), site.timeZone));
  return (
    <>
      <PageHeader title={site.name} breadcrumbs={[{ label: 'Sites', href: '/settings/sites' }]} />
      <SiteForm action={changeSite} site={site} timeZones={Intl.supportedValuesOf('timeZone')} />
      <section aria-labelledby="gates" className="mt-12 grid max-w-prose gap-4">
        <h2 id="gates">The gate</h2>
        <p>Before a compressor is ordered, whoever has the link enters a unit’s number and answers five checks in about seven minutes. It says “fit” or “not yet, because”, and the case has it all.</p>
        <Gates siteId={site.id} newId={newId()} gates={gates.map(({ expiresAt, ...gate }) => ({ ...gate, until: untilText(expiresAt) }))} make={makeGate} revoke={revokeGate} />
      </section>
    </>
  );
}
