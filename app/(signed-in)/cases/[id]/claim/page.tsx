import type { Metadata } from 'next';
import { FileClaimForm, SendCoreForm } from '@/components/claim/ClaimForms';
import { Claims, Cores } from '@/components/claim/Claims';
import { ButtonLink } from '@/components/ui/Button';
import { Disclosure } from '@/components/ui/Disclosure';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { readCase } from '@/lib/services/case/read';
import { listClaims } from '@/lib/services/claim/list';
import { endClaim, endCore, keepClaim, keepCore } from './actions';

export const metadata: Metadata = { title: 'Claim and core' };

/** What was claimed for a case and what came of it; and the old compressor that went back for its core. */
export default async function ClaimPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id } = await params;
  const { head } = await orNotFound(readCase({ ctx, input: { caseId: id } }));
  const { claims, cores, fits, currency } = await listClaims({ ctx, input: { caseId: id } });
  const works = may(ctx.roles, 'case.work');
  const of = { caseId: head.id, currency };
  return (
    <>
      <PageHeader
        title="Claim and core"
        breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${head.number}: ${head.unit.fleetNumber}`, href: `/cases/${head.id}` }]}
        lead="What was asked of a supplier or warranty desk, and what they said."
        actions={<ButtonLink variant="quiet" href={`/cases/${head.id}/dossier`}>Dossier</ButtonLink>}
      />
      <div className="grid max-w-4xl gap-10">
        <section aria-labelledby="claims" className="grid gap-4">
          <h2 id="claims">Claims</h2>
          {claims.length === 0 ? <EmptyState title="Nothing was claimed for this case" /> : <Claims claims={claims} settle={works ? endClaim : null} {...of} />}
          {works && (
            <Disclosure summary="Keep a claim that was sent">
              <FileClaimForm action={keepClaim} newId={newId()} {...of} />
            </Disclosure>
          )}
        </section>
        <section aria-labelledby="cores" className="grid gap-4">
          <h2 id="cores">Cores</h2>
          {cores.length === 0 ? <EmptyState title="No core went back" /> : <Cores cores={cores} settle={works ? endCore : null} {...of} />}
          {works && (
            <Disclosure summary="Keep a core that was sent">
              <SendCoreForm action={keepCore} newId={newId()} fits={fits.map(({ id: value, name: label }) => ({ value, label }))} {...of} />
            </Disclosure>
          )}
        </section>
      </div>
    </>
  );
}
