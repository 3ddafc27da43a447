import type { Metadata } from 'next';
import Link from 'next/link';
import { CaseNav } from '@/components/case/CaseNav';
import { ReadCautionsForm } from '@/components/case/ReadCautionsForm';
import { WorkCautions } from '@/components/case/WorkCautions';
import { StartFittingForm } from '@/components/fitting/FittingForms';
import { InstallRecord } from '@/components/fitting/InstallRecord';
import { PhotosOfCase } from '@/components/photos/PhotosOfCase';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { QueryProvider } from '@/lib/query/provider';
import { readCase } from '@/lib/services/case/read';
import { readNewFitForm } from '@/lib/services/fit/read';
import { listFittings } from '@/lib/services/fitting/list';
import { listPhotos } from '@/lib/services/photo/list';
import { begin, finish, readCautions, sayOfPoint } from './actions';

export const metadata: Metadata = { title: 'Fitting' };

/** A compressor that is fitted in a case: which, and point by point how. */
export default async function FittingPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id } = await params;
  const view = await orNotFound(readCase({ ctx, input: { caseId: id } }));
  const { head, state } = view;
  const caseId = head.id;
  const { fittings, cautions, toRead, unitId } = await listFittings({ ctx, input: { caseId } });
  const works = may(ctx.roles, 'case.work') && state.status !== 'closed';
  const ready = works && toRead.length === 0;
  const underWay = fittings.some(({ finishedAt }) => finishedAt === null);
  const form = works && !underWay ? await readNewFitForm({ ctx, input: { unitId } }) : null;
  return (
    <QueryProvider>
      <PageHeader
        title="Fitting"
        breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${head.number}: ${head.unit.fleetNumber}`, href: `/cases/${caseId}` }]}
        lead="A new compressor floods, cooks or wears like the last where one of these points was left out. What you answer is its record for good."
      />
      <CaseNav caseId={caseId} here="/fitting" />
      <PhotosOfCase view={view} initial={await listPhotos({ ctx, input: { caseId } })}>
        <div className="grid max-w-4xl gap-8">
          <h2 className="sr-only">Before you begin</h2>
          {(works || fittings.length === 0) && (
            <WorkCautions
              {...{ cautions, toRead }}
              behind="The fitting"
              read={works ? <ReadCautionsForm action={readCautions} of={{ caseId, work: 'fitting' }} about="the fitting" cautionIds={toRead} /> : null}
            />
          )}
          {fittings.map((fitting) => (
            <InstallRecord key={fitting.id} {...{ fitting, caseId, ready }} timeZone={head.timeZone} newIds={fitting.points.map(() => newId())} actions={{ sayOfPoint, finish }} />
          ))}
          {fittings.length > 0 && !underWay && <p><Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/cases/${caseId}/break-in`}>Next: the break-in run</Link></p>}
          {form && (
            <section aria-labelledby="begin" className="grid gap-4">
              <h2 id="begin">{fittings.length > 0 ? 'Fit another' : 'Fit a compressor'}</h2>
              <p className="max-w-prose">Find the cause first: a new compressor on the old cause goes the same way. It is on the unit’s record from the moment you begin.</p>
              {ready ? (
                <StartFittingForm action={begin} caseId={caseId} newIds={{ fitting: newId(), fit: newId() }} models={form.models} standing={form.standing} units={ctx.person.units} today={form.today} />
              ) : (
                <p className="text-ink-soft">The form opens when the cautions above are read.</p>
              )}
            </section>
          )}
        </div>
      </PhotosOfCase>
    </QueryProvider>
  );
}
