import type { Metadata } from 'next';
import { timeText } from '@/components/case/words';
import { MadeDossier } from '@/components/dossier/MadeDossier';
import { MakeForm } from '@/components/dossier/MakeForm';
import { WhileWaiting } from '@/components/dossier/WhileWaiting';
import { ButtonLink } from '@/components/ui/Button';
import { EmptyState } from '@/components/ui/EmptyState';
import { CaseNav } from '@/components/case/CaseNav';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { readCase } from '@/lib/services/case/read';
import { listDossiers } from '@/lib/services/dossier/read';
import { listPhotos } from '@/lib/services/photo/list';
import { make, makeAgain, send, sendAgain } from './actions';

export const metadata: Metadata = { title: 'Dossier' };

/** Countries that print on letter. */
const LETTER = ['US', 'CA', 'MX', 'PH', 'CL', 'CO'];

/** One document of a case, for a supplier, a warranty desk or the owner: made, downloaded, sent. */
export default async function DossierPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id } = await params;
  const { head, rulebook } = await orNotFound(readCase({ ctx, input: { caseId: id } }));
  const { dossiers } = await listDossiers({ ctx, input: { caseId: id } });
  const photos = (await listPhotos({ ctx, input: { caseId: id } })).photos.filter(({ hidden }) => hidden === null);
  const works = may(ctx.roles, 'case.work');
  const isWaiting = dossiers.some(({ state, sendings }) => state === 'waiting' || sendings.some((sending) => sending.state === 'waiting'));
  const nameOf = ({ description, checkId, takenAt }: (typeof photos)[number]) => `${description || (checkId && rulebook.checks[checkId]?.name) || 'Photo'}, ${timeText(takenAt, head.timeZone)}`;
  return (
    <>
      <PageHeader
        title="Dossier"
        breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${head.number}: ${head.unit.fleetNumber}`, href: `/cases/${head.id}` }]}
        lead="One document of the case as it stands now. What it says is kept as it is, whatever is found afterwards."
        actions={<ButtonLink variant="quiet" href={`/cases/${head.id}/claim`}>Claim and core</ButtonLink>}
      />
      <CaseNav caseId={id} here="/dossier" />
      {isWaiting && <WhileWaiting />}
      <div className="grid max-w-4xl gap-10">
        {works && (
          <section aria-labelledby="make" className="grid gap-4">
            <h2 id="make">Make one</h2>
            <p className="max-w-prose">It holds the unit and its compressors, the complaint, every measurement with its limit and where that comes from, what was found, photos, the ranking and its reasons when the cause was called, the call, and what was done.</p>
            <MakeForm action={make} caseId={head.id} newId={newId()} photos={photos.map((photo) => ({ id: photo.id, name: nameOf(photo) }))} paper={LETTER.includes(ctx.organisation.country) ? 'letter' : 'a4'} />
          </section>
        )}
        <section aria-labelledby="made" className="grid gap-4">
          <h2 id="made">Made so far</h2>
          {dossiers.length === 0 ? (
            <EmptyState title="No dossier of this case yet">One that is made stands here, with to whom it was sent.</EmptyState>
          ) : (
            <ul className="grid gap-6">
              {dossiers.map((dossier) => (
                <MadeDossier key={dossier.id} dossier={dossier} timeZone={head.timeZone} newId={newId()} works={works} actions={{ send, sendAgain, makeAgain }} />
              ))}
            </ul>
          )}
        </section>
      </div>
    </>
  );
}
