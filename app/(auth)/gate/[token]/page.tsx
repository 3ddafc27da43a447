import type { Metadata } from 'next';
import { AnswerForm, EnterForm, FinishForm } from '@/components/gate/GateForms';
import { GateVerdict } from '@/components/gate/GateVerdict';
import { DeadLink } from '@/components/sign-in/DeadLink';
import { Doorway } from '@/components/sign-in/Doorway';
import { Notice } from '@/components/ui/Notice';
import { unlessDead } from '@/lib/auth/page';
import { getVisitor } from '@/lib/auth/visitor';
import { newId } from '@/lib/ids';
import { viewGatePage } from '@/lib/services/gate/view';
import { answer, enter, finish } from './actions';

export const metadata: Metadata = { title: 'Before a compressor is ordered', robots: { index: false }, referrer: 'no-referrer' };

interface Props {
  params: Promise<{ token: string }>;
  searchParams: Promise<{ passage?: string | string[] }>;
}

/** Whether a unit is to get another compressor: a step a page, by somebody without a sign-in. */
export default async function GatePage({ params, searchParams }: Props) {
  const [{ token }, { passage }] = [await params, await searchParams];
  const opened = await unlessDead(viewGatePage({ visitor: await getVisitor(), input: { token, passageId: typeof passage === 'string' ? passage : undefined } }));
  if (!opened.ok) return <DeadLink action={null}>{opened.message}</DeadLink>;
  const page = opened.result;
  if (page.step === 'enter') {
    return (
      <Doorway>
        <div className="grid gap-2">
          <h1>Before a compressor is ordered</h1>
          <p className="text-ink-soft">{page.organisationName}, {page.siteName}. Five checks at most, about seven minutes: then it says “fit” or “not yet, because”.</p>
        </div>
        <EnterForm action={enter} token={token} newId={newId()} complaints={page.complaints} />
        <p className="text-ink-soft">A unit that isn’t known here: ask {page.askWhom}.</p>
      </Doorway>
    );
  }
  if (page.step === 'verdict') return <Doorway><GateVerdict page={page} again={`/gate/${token}`} /></Doorway>;
  if (page.step === 'end') {
    return (
      <Doorway>
        <h1>Unit {page.fleetNumber}</h1>
        <p>Nothing is left to ask.</p>
        <FinishForm action={finish} token={token} passageId={page.passageId} />
      </Doorway>
    );
  }
  const { check } = page;
  return (
    <Doorway>
      <div className="grid gap-2">
        <p className="label">Unit {page.fleetNumber}: check {page.place} of {page.most} at most</p>
        <h1>{check.name}</h1>
      </div>
      {check.cautions.length > 0 && (
        <Notice kind="caution" title="Read this first">
          <ul className="ml-5 grid list-disc gap-1">{check.cautions.map((caution) => <li key={caution}>{caution}</li>)}</ul>
          <p className="mt-2 text-[0.9375rem]">The vehicle maker’s information, local rules and a qualified person’s judgement come first.</p>
        </Notice>
      )}
      {check.steps.length > 0 && <ol className="ml-5 grid list-decimal gap-1">{check.steps.map((step) => <li key={step}>{step}</li>)}</ol>}
      <AnswerForm key={check.id} action={answer} token={token} passageId={page.passageId} newId={newId()} check={check} />
    </Doorway>
  );
}
