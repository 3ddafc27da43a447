import type { Metadata } from 'next';
import { DeadLink } from '@/components/sign-in/DeadLink';
import { Doorway } from '@/components/sign-in/Doorway';
import { Notice } from '@/components/ui/Notice';
import { LinkReadingForm } from '@/components/watch/LinkReadingForm';
import { unlessDead } from '@/lib/auth/page';
import { getVisitor } from '@/lib/auth/visitor';
import { newId } from '@/lib/ids';
import { viewWatchLink } from '@/lib/services/watch/by-link';
import { saveReading } from './actions';

export const metadata: Metadata = { title: 'A reading', robots: { index: false }, referrer: 'no-referrer' };

/** One reading, by somebody without a sign-in. */
export default async function WatchLinkPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const opened = await unlessDead(viewWatchLink({ visitor: await getVisitor(), input: { token } }));
  if (!opened.ok) return <DeadLink action={null}>{opened.message}</DeadLink>;
  const { organisationName, fleetNumber, name, steps, cautions, ...fields } = opened.result;
  return (
    <Doorway>
      <div className="grid gap-2">
        <h1>Unit {fleetNumber}: {name}</h1>
        <p className="text-ink-soft">{organisationName} watches a repair and asks you for this one reading.</p>
      </div>
      <h2 className="sr-only">Before you begin</h2>
      <Notice kind="caution" title="Read this first">
        <ul className="ml-5 grid list-disc gap-1">{cautions.map((caution) => <li key={caution}>{caution}</li>)}</ul>
        <p className="mt-2 text-[0.9375rem]">The vehicle maker’s information, local rules and a qualified person’s judgement come first.</p>
      </Notice>
      <section className="grid gap-4" aria-labelledby="reading">
        <h2 id="reading">What to read</h2>
        <ol className="ml-5 grid list-decimal gap-1">{steps.map((step) => <li key={step}>{step}</li>)}</ol>
        <LinkReadingForm action={saveReading} token={token} newId={newId()} {...fields} />
      </section>
    </Doorway>
  );
}
