import type { Metadata } from 'next';
import { ReadCautionsForm } from '@/components/case/ReadCautionsForm';
import { StartForm } from '@/components/oil-catch/CatchForms';
import { OilCatch } from '@/components/oil-catch/OilCatch';
import { UnderWay } from '@/components/oil-catch/UnderWay';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { cautionsToRead } from '@/lib/diagnose/cautions';
import { newId } from '@/lib/ids';
import { readCase } from '@/lib/services/case/read';
import { listCatches } from '@/lib/services/oil-catch/list';
import { begin, changeReminder, readCautions, saveWeighing, takeBack, takeDown } from './actions';

export const metadata: Metadata = { title: 'Catch and weigh' };

/** Oil caught over days: from a clean start until the bottle is down, weighed as often as somebody passes. */
export default async function CatchPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id } = await params;
  const { head, state, rulebook } = await orNotFound(readCase({ ctx, input: { caseId: id } }));
  const { checks, catches } = await listCatches({ ctx, input: { caseId: id } });
  const { units } = ctx.person;
  const underWay = catches.find(({ endedAt }) => endedAt === null);
  const check = rulebook.checks[underWay?.checkId ?? checks[0]?.id ?? ''];
  const works = may(ctx.roles, 'case.work') && state.status === 'open';
  const toRead = check && works ? cautionsToRead(check, (caution) => rulebook.cautions[caution]?.worseWhen ?? [], state.acknowledged) : [];
  const ready = works && toRead.length === 0;
  const of = { caseId: head.id, units, timeZone: head.timeZone };

  return (
    <>
      <PageHeader
        title="Catch and weigh"
        breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${head.number}: ${head.unit.fleetNumber}`, href: `/cases/${head.id}` }]}
        lead={check?.why}
      />
      <div className="grid max-w-4xl gap-8">
        <h2 className="sr-only">Before you begin</h2>
        {state.status !== 'open' && <Notice title="The case has been called">Nothing can be weighed into it. Reopen it to go on.</Notice>}
        {!check && <Notice title="No check of this rulebook is answered by oil that is caught">Its edition may be older than this page.</Notice>}
        {check && works && (
          <Notice kind="caution" title={toRead.length > 0 ? 'Read this first' : 'Read today'}>
            <ul className="ml-5 grid list-disc gap-1">{check.cautions.map((caution) => <li key={caution}>{rulebook.cautions[caution]?.text ?? caution}</li>)}</ul>
            <p className="mt-2 text-[0.9375rem]">The vehicle maker’s information, local rules and a qualified person’s judgement come first.</p>
            {toRead.length > 0 && <div className="mt-3"><ReadCautionsForm action={readCautions} of={{ caseId: head.id, checkId: check.id }} about={check.name} cautionIds={toRead} /></div>}
          </Notice>
        )}
        {underWay && <UnderWay {...of} underWay={underWay} works={works} ready={ready} newId={newId()} actions={{ saveWeighing, changeReminder, takeBack, takeDown }} />}
        {!underWay && check && works && (
          <section aria-labelledby="begin" className="grid gap-4">
            <h2 id="begin">Begin from a clean start</h2>
            <ol className="ml-5 grid max-w-prose list-decimal gap-1">{check.steps.map((step) => <li key={step}>{step}</li>)}</ol>
            {ready ? <StartForm action={begin} caseId={head.id} checkId={check.id} newId={newId()} units={units} /> : <p className="text-ink-soft">The form opens when the cautions above are read.</p>}
          </section>
        )}
        {catches.filter(({ endedAt }) => endedAt !== null).map((ended) => <OilCatch key={ended.id} {...of} oilCatch={ended} />)}
      </div>
    </>
  );
}
