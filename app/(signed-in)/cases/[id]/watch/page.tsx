import type { Metadata } from 'next';
import { CheckCautions } from '@/components/case/CheckCautions';
import { timeText } from '@/components/case/words';
import { Notice } from '@/components/ui/Notice';
import { CaseNav } from '@/components/case/CaseNav';
import { PageHeader } from '@/components/ui/PageHeader';
import { EndForm, LinkForm, ReadForm, RevokeForm, StartForm, TakeBackForm } from '@/components/watch/WatchForms';
import { WatchRecord } from '@/components/watch/WatchRecord';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { cautionsHere } from '@/lib/case/cautions-here';
import { newId } from '@/lib/ids';
import { dayText } from '@/lib/schemas/day-text';
import { readCase } from '@/lib/services/case/read';
import { listWatches } from '@/lib/services/watch/list';
import { beginWatch, endIt, makeLink, readCautions, saveReading, takeBack, takeLinkBack } from './actions';

export const metadata: Metadata = { title: 'Watch' };

const DUE = { waits: 'not due before', due: 'due', overdue: 'overdue since' } as const;

/** A repair that is watched until somebody says that it held, came back or was lost sight of. */
export default async function WatchPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id: caseId } = await params;
  const view = await orNotFound(readCase({ ctx, input: { caseId } }));
  const { head, state, rulebook } = view;
  const { planned, watches } = await listWatches({ ctx, input: { caseId } });
  const { units } = ctx.person;
  const works = may(ctx.roles, 'case.work');
  const current = watches.find(({ endedAt }) => endedAt === null);
  const ids = { caseId, watchId: current?.id ?? '' };
  const last = current?.readings.filter(({ takenBack }) => takenBack === null).at(-1);
  const due = [...(current?.due ?? [])].sort((a, b) => (a.dueOn < b.dueOn ? -1 : 1));
  const of = { units, timeZone: head.timeZone };

  return (
    <>
      <PageHeader title="Watch" breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${head.number}: ${head.unit.fleetNumber}`, href: `/cases/${head.id}` }]} lead="A repair is proved by what is read in the weeks after it." />
      <CaseNav caseId={head.id} here="/watch" />
      <div className="grid max-w-4xl gap-8">
        {!current && !planned && <p>Nothing to watch yet: call the case first.</p>}
        {!current && planned && state.status === 'called' && (
          <section aria-labelledby="begin" className="grid gap-4">
            <h2 id="begin">Begin: {planned.name}</h2>
            <p className="max-w-prose">{planned.cause}. Watched for {planned.days} days. What is read:</p>
            <ul className="ml-5 grid list-disc gap-1">{planned.readings.map(({ checkId, check, everyDays }) => <li key={checkId}>{check}, every {everyDays} days</li>)}</ul>
            {state.releaseHolds.length > 0 && <Notice kind="caution" title="This unit is not to be released yet"><p>What forbids it stands in the case.</p></Notice>}
            {works && <StartForm action={beginWatch} ids={{ id: newId(), caseId }} begin={planned.begin} units={units} />}
          </section>
        )}
        {current && works && due.map(({ checkId, check: name, dueOn, state: when }, i) => {
          const check = rulebook.checks[checkId];
          if (!check) return null;
          const above = due.slice(0, i).flatMap((one) => rulebook.checks[one.checkId] ?? []);
          const cautions = cautionsHere(view, check, above);
          return (
            <section key={checkId} aria-labelledby={`due-${checkId}`} className="grid gap-4 print:hidden">
              <h2 id={`due-${checkId}`}>{name}: {DUE[when]} {dayText(dueOn)}</h2>
              <CheckCautions {...{ caseId, check, rulebook, cautions }} action={readCautions} />
              {cautions.toRead.length === 0 && <ReadForm key={current.readings.length} action={saveReading} ids={{ ...ids, id: newId() }} checkId={checkId} prompt={check.prompt} states={check.kind === 'measured' ? [] : check.answers} unit={check.unitSymbol} units={units} />}
            </section>
          );
        })}
        {watches.map((watch) => <WatchRecord key={watch.id} watch={watch} {...of} />)}
        {current && works && (
          <section aria-labelledby="more" className="grid gap-4 print:hidden">
            <h2 id="more">Links, and the end</h2>
            {current.links.map(({ id, check, forWhom, expiresAt, state: is, path }) => (
              <div key={id} className="grid gap-2">
                <p>{check}, for {forWhom}: {is === 'open' ? `until ${timeText(expiresAt, head.timeZone)}` : is}.</p>
                {path && <p className="break-all select-all">{path}</p>}
                {path && <RevokeForm action={takeLinkBack} ids={{ ...ids, linkId: id }} forWhom={forWhom} />}
              </div>
            ))}
            {current.notHeldYet.length > 0 && <p className="max-w-prose">It can’t be said yet that it held. {current.notHeldYet.join(' ')}</p>}
            <div>
              <LinkForm key={current.links.length} action={makeLink} ids={{ ...ids, id: newId() }} checks={current.due.map(({ checkId, check }) => ({ value: checkId, label: check }))} />
              {last && <TakeBackForm action={takeBack} ids={{ ...ids, readingId: last.id }} />}
              <div id="end"><EndForm action={endIt} ids={ids} openCases={current.mayGoOnIn.map(({ caseId: value, number, openedOn }) => ({ value, label: `Case ${number}, opened ${dayText(openedOn)}` }))} /></div>
            </div>
          </section>
        )}
      </div>
    </>
  );
}
