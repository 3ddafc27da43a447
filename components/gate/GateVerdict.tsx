import { ButtonLink } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import type { GatePage } from '@/lib/services/gate/view';

type Page = Extract<GatePage, { step: 'verdict' }>;

/** What the gate says of a unit, with its reasons. */
export function GateVerdict({ page, again }: { page: Page; again: string }) {
  const isFit = page.verdict === 'fit';
  return (
    <>
      <div className="grid gap-2">
        <p className="label">Unit {page.fleetNumber}</p>
        <h1 className="text-5xl">{isFit ? 'Fit' : 'Not yet, because'}</h1>
        {isFit && <p>The compressor itself is the likeliest. What ruined it must be in order before the new one goes on, or that goes the same way.</p>}
      </div>
      {page.forbids.length > 0 && (
        <Notice kind="danger" title="Do not release this unit">{page.forbids.join('; ')}: tell {page.askWhom} at once.</Notice>
      )}
      {page.reasons.map(({ cause, sentence, because }) => (
        <section key={cause} className="grid gap-1">
          <h2 className="text-xl">{cause}</h2>
          <p>{sentence}</p>
          <ul className="ml-5 list-disc">
            {because.map(({ check, answer, word }) => <li key={check}>{check}: {answer}. This speaks {word} for it.</li>)}
          </ul>
        </section>
      ))}
      {page.isMoreKnown && <p>{page.reasons.length > 0 ? 'More speaks in this than the answers here' : 'What was answered here doesn’t settle it'}: ask {page.askWhom}.</p>}
      {!isFit && !page.isMoreKnown && page.reasons.length === 0 && <p>Nothing stands out yet. The workshop has to look further before a compressor is ordered: ask {page.askWhom}.</p>}
      <section className="grid gap-1">
        <h2 className="text-xl">What was answered</h2>
        <ul className="ml-5 list-disc">{page.answers.map(({ check, answer }) => <li key={check}>{check}: {answer}</li>)}</ul>
      </section>
      <p>The workshop has all of it with the unit’s case. This is advice: a qualified person decides.</p>
      <div><ButtonLink href={again} variant="quiet" className="min-h-14!">Another unit</ButtonLink></div>
    </>
  );
}
