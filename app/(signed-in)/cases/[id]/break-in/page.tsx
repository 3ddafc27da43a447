import type { Metadata } from 'next';
import Link from 'next/link';
import { EndRunForms, HotCheckForm, StartForm } from '@/components/break-in/BreakInForms';
import { EndedRun } from '@/components/break-in/EndedRun';
import { HowToRun } from '@/components/break-in/HowToRun';
import { RunUnderWay } from '@/components/break-in/RunUnderWay';
import { CaseNav } from '@/components/case/CaseNav';
import { ReadCautionsForm } from '@/components/case/ReadCautionsForm';
import { WorkCautions } from '@/components/case/WorkCautions';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { QueryProvider } from '@/lib/query/provider';
import { measureUnit } from '@/lib/schemas/measures';
import { readBreakIn } from '@/lib/services/break-in/read';
import { readCase } from '@/lib/services/case/read';
import { toSi, unitDefinition, type UnitOf } from '@/lib/units';
import { begin, end, readCautions, saveHotCheck } from './actions';

export const metadata: Metadata = { title: 'Break-in run' };

/** The first run of a fitted compressor: the time under load, the pressure held, then the hot check. */
export default async function BreakInPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id } = await params;
  const { head, state, reader } = await orNotFound(readCase({ ctx, input: { caseId: id } }));
  const caseId = head.id;
  const { cautions, toRead, figures, modelName, bleed, runs } = await readBreakIn({ ctx, input: { caseId } });
  const works = may(ctx.roles, 'case.work') && state.status !== 'closed';
  const ready = works && toRead.length === 0;
  const underWay = runs.find(({ endedAt }) => endedAt === null);
  const ended = runs.filter(({ endedAt }) => endedAt !== null);
  const pressureUnit = measureUnit(ctx.person.units, { quantity: 'pressure' }) as UnitOf<'pressure'>;
  const unit = { symbol: unitDefinition('pressure', pressureUnit).symbol, pascals: toSi(1, 'pressure', pressureUnit) };
  const of = { unit, timeZone: head.timeZone };
  return (
    <QueryProvider>
      <PageHeader
        title="Break-in run"
        breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${head.number}: ${head.unit.fleetNumber}`, href: `/cases/${caseId}` }]}
        lead="Rings seat under a steady load in the first half hour, or never."
      />
      <CaseNav caseId={caseId} here="/break-in" />
      <div className="grid max-w-4xl gap-8">
        <h2 className="sr-only">Before you begin</h2>
        {works && <WorkCautions {...{ cautions, toRead }} behind="The run" read={<ReadCautionsForm action={readCautions} of={{ caseId, work: 'break-in' }} about="the break-in run" cautionIds={toRead} />} />}
        {!figures && <Notice title="This edition gives no figures for a break-in run">Go by the maker’s information.</Notice>}
        {figures && !modelName && <Notice title="No compressor is on this unit’s record">Record it on the unit’s page, or <Link className="underline" href={`/cases/${caseId}/fitting`}>fit one here</Link>.</Notice>}
        {underWay && (
          <section aria-labelledby="under-way" className="grid gap-6">
            <h2 id="under-way">Under way</h2>
            <HowToRun figures={underWay.figures} bleed={bleed} unit={unit} modelName={modelName} />
            <RunUnderWay {...of} {...{ caseId, reader, works }} run={underWay} now={ctx.now().getTime()} />
            {works && <EndRunForms action={end} caseId={caseId} runId={underWay.id} />}
          </section>
        )}
        {ended.map((run, i) => (
          <section key={run.id} aria-labelledby={`run-${run.id}`} className="grid gap-4 border-t-2 border-ink pt-4">
            <h2 id={`run-${run.id}`}>{run.outcome === 'done' ? 'Run in' : 'Stopped before its time'}</h2>
            <EndedRun run={run} {...of} />
            {works && i === ended.length - 1 && (
              <section aria-labelledby="hot" className="grid gap-4">
                <h3 id="hot" className="text-xl">While it is hot</h3>
                <p className="max-w-prose">Stop the engine before you touch anything. Look at flange, feed, return, head and lines.</p>
                <HotCheckForm key={JSON.stringify(run.hotCheck)} action={saveHotCheck} caseId={caseId} runId={run.id} seen={run.hotCheck} />
              </section>
            )}
          </section>
        ))}
        {!underWay && figures && modelName && works && (
          <section aria-labelledby="begin" className="grid gap-4">
            <h2 id="begin">{ended.length > 0 ? 'Run it in again' : 'Run it in'}</h2>
            <HowToRun figures={figures} bleed={bleed} unit={unit} modelName={modelName} />
            {ready ? <StartForm action={begin} caseId={caseId} newId={newId()} /> : <p className="text-ink-soft">The run can begin when the cautions above are read.</p>}
          </section>
        )}
        {ended.length > 0 && !underWay && <p><Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/cases/${caseId}/release`}>Next: measure for the release</Link></p>}
      </div>
    </QueryProvider>
  );
}
