import type { Metadata } from 'next';
import { cookies } from 'next/headers';
import Link from 'next/link';
import { AssignForm } from '@/components/case/AssignForm';
import { CallForm } from '@/components/case/CallForm';
import { Calls } from '@/components/case/Calls';
import { CaseDesk } from '@/components/case/CaseDesk';
import { CaseNav } from '@/components/case/CaseNav';
import { Catching } from '@/components/case/Catching';
import { Watching } from '@/components/case/Watching';
import { HAND_COOKIE, handFrom } from '@/components/case/hand';
import { ReopenForm } from '@/components/case/ReopenForm';
import { PhotosOfCase } from '@/components/photos/PhotosOfCase';
import { timeText } from '@/components/case/words';
import { ButtonLink } from '@/components/ui/Button';
import { OilPathCompositions } from '@/components/oil-path/compositions';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/PageHeader';
import { Tag } from '@/components/ui/Tag';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { QueryProvider } from '@/lib/query/provider';
import type { CaseView } from '@/lib/schemas/case-view';
import { dayText } from '@/lib/schemas/day-text';
import { listAssignable } from '@/lib/services/case/assignable';
import { readCase } from '@/lib/services/case/read';
import { decimalMarkOf } from '@/lib/services/units-of-measure';
import { listPhotos } from '@/lib/services/photo/list';
import { assignFromForm, callFromForm, reopenFromForm } from './actions';

export const metadata: Metadata = { title: 'Case' };

interface Props {
  params: Promise<{ id: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

const STATUS = { open: 'Open', called: 'Called', closed: 'Closed' } as const;

export default async function CasePage({ params, searchParams }: Props) {
  const { id } = await params;
  const { at } = await searchParams;
  const ctx = await pageContext(PERMITTED['case.see']);
  const view = await orNotFound(readCase({ ctx, input: { caseId: id, at: typeof at === 'string' ? at : undefined } }));
  const people = await listAssignable({ ctx, input: {} });
  const photos = await listPhotos({ ctx, input: { caseId: view.head.id } });
  const { head, state, rulebook } = view;
  const works = may(ctx.roles, 'case.work') && state.at === null;

  return (
    <QueryProvider>
      <PageHeader
        title={`Case ${head.number}: ${head.unit.fleetNumber}`}
        breadcrumbs={[{ label: 'Cases', href: '/cases' }]}
        tags={<Tag>{STATUS[state.status]}</Tag>}
        lead={<Lead view={view} />}
      />
      {state.at && (
        <div className="mb-6">
          <Notice>
            <strong>As it was on {timeText(state.at, head.timeZone)}.</strong> Nothing can be answered here. <Link className="underline" href={`/cases/${head.id}`}>Go back to now.</Link>
          </Notice>
        </div>
      )}
      <Catching view={view} />
      <Watching view={view} />
      <PhotosOfCase view={view} initial={photos}>
      <CaseDesk
        key={`${state.at}/${state.status}`}
        view={view}
        drawing={<OilPathCompositions />}
        hand={handFrom((await cookies()).get(HAND_COOKIE)?.value)}
        decimalMark={decimalMarkOf(ctx.organisation.country) ?? ','}
      />
      </PhotosOfCase>
      <section aria-labelledby="call" className="mt-12 grid gap-4 border-t-2 border-ink pt-6">
        <h2 id="call">The call</h2>
        {view.calls.length > 0 && <Calls calls={view.calls} rulebook={rulebook} timeZone={head.timeZone} />}
        {state.at === null && state.status !== 'open' && <CaseNav caseId={head.id} here="" />}
        {works && state.status === 'open' && <div className="no-print"><CallForm action={callFromForm} callId={newId()} initial={state} rulebook={rulebook} /></div>}
        {works && state.status !== 'open' && <div className="no-print"><ReopenForm action={reopenFromForm} eventId={newId()} caseId={head.id} /></div>}
        {view.calls.length === 0 && <p className={works ? 'hidden print:block' : undefined}>Not called.</p>}
      </section>
      <section aria-labelledby="history" className="mt-12 grid gap-4 border-t-2 border-ink pt-6">
        <h2 id="history">History</h2>
        <p><ButtonLink variant="quiet" href={`/cases/${head.id}/history`}>Slide back through this case</ButtonLink></p>
        {works && <div className="no-print"><AssignForm action={assignFromForm} caseId={head.id} people={people} assignedTo={view.assignedTo} /></div>}
        <ul className="grid gap-1 text-ink-soft">
          {view.events.map((event) => (
            <li key={event.id}>{timeText(event.at, head.timeZone)}: {event.kind} by {event.person}{event.reason ? `, “${event.reason}”` : ''}</li>
          ))}
        </ul>
      </section>
    </QueryProvider>
  );
}

function Lead({ view: { head } }: { view: CaseView }) {
  return (
    <>
      <Link className="underline underline-offset-4" href={`/units/${head.unit.id}`}>{head.unit.fleetNumber}</Link>, {head.siteName}.{' '}
      {head.fit ? <>{head.fit.modelName}, fitted {dayText(head.fit.installedOn)}. </> : <>No fit on record. </>}
      {head.odometer && <><span className="figure whitespace-nowrap">{head.odometer}</span>. </>}
      Opened by {head.openedBy}, {timeText(head.openedAt, head.timeZone)}. Rulebook edition <span className="figure">{head.editionNumber}</span>.
      {head.complaintWords && <> “{head.complaintWords}”</>}
    </>
  );
}
