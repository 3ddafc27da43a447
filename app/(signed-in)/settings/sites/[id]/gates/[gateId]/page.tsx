import type { Metadata } from 'next';
import { QrCode } from '@/components/gate/QrCode';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { env } from '@/lib/env';
import { dayText } from '@/lib/schemas/day-text';
import { viewGate } from '@/lib/services/gate/list';

export const metadata: Metadata = { title: 'Gate', referrer: 'no-referrer' };

/** The link of a gate with its code, for a sheet of A4 or letter at the parts counter. */
export default async function GateSheetPage({ params }: { params: Promise<{ id: string; gateId: string }> }) {
  const ctx = await pageContext(PERMITTED['site.manage']);
  const { id, gateId } = await params;
  const { site, name, askWhom, expiresAt, path } = await orNotFound(viewGate({ ctx, input: { siteId: id, gateId } }));
  const address = new URL(path, env().NEXTAUTH_URL).href;
  return (
    <>
      <PageHeader title="Before a compressor is ordered" breadcrumbs={[{ label: 'Sites', href: '/settings/sites' }, { label: site.name, href: `/settings/sites/${id}` }]} lead={`${site.name}, ${name}`} />
      <div className="grid max-w-prose justify-items-start gap-6">
        <p className="text-xl">Point a phone’s camera here, enter the unit’s number, and answer five checks in about seven minutes. It says “fit” or “not yet, because”.</p>
        <QrCode text={address} label="QR code of the gate’s link" className="keep h-auto w-full max-w-[14cm]" />
        <p>A unit that it doesn’t know, or anything else: ask {askWhom}. Works until {dayText(siteDay(new Date(expiresAt), site.timeZone))}.</p>
        <p className="figure break-all text-[0.8125rem] print:hidden">{address}</p>
        <p className="text-ink-soft print:hidden">Print this page on A4 or letter: what stands in grey here isn’t printed. Whoever has the link can use it; revoke it on the site’s page when it is no longer to be used.</p>
      </div>
    </>
  );
}
