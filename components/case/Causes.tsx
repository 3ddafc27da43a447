'use client';

import { useState } from 'react';
import { Notice } from '@/components/ui/Notice';
import { SightGlass, percent } from '@/components/ui/SightGlass';
import type { CaseReasons, CaseState, CauseView, ReasonView, RulebookView } from '@/lib/schemas/case-view';
import { Reasons } from './Reasons';
import { changeText } from './words';

/** Causes under this are in the list, not in the way. */
const SHOWN = 6;

/** The ranked causes, each with its level, how it moved, and its reasons when it is opened. */
export function Causes({ state, reasons, rulebook }: { state: CaseState; reasons: CaseReasons; rulebook: RulebookView }) {
  const [decibans, setDecibans] = useState(false);
  const leading = state.causes.slice(0, SHOWN);
  const rest = state.causes.slice(SHOWN);
  const row = (cause: CauseView) => <Cause key={cause.causeId} cause={cause} reasons={reasons.causes[cause.causeId] ?? []} rulebook={rulebook} decibans={decibans} />;
  return (
    <section aria-labelledby="causes" className="grid gap-3">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <h2 id="causes">What is behind it</h2>
        <label className="flex min-h-touch cursor-pointer items-center gap-2">
          <input type="checkbox" className="size-5" checked={decibans} onChange={(event) => setDecibans(event.target.checked)} />
          Show decibans
        </label>
      </div>
      {!state.fit.fits && (
        <Notice title="This doesn’t fit well">
          {state.fit.reason === 'something-else-leads'
            ? 'None of the listed causes explains what was found.'
            : 'What was found counts against even the cause that leads.'}{' '}
          If you find something that isn’t listed, call “something else” and write down what it was.
        </Notice>
      )}
      <ol className="border-t border-ink">{leading.map(row)}</ol>
      {rest.length > 0 && (
        <details className="disclosure">
          <summary className="min-h-touch py-2 font-bold">
            {rest.length} more, together {percent(rest.reduce((sum, { p }) => sum + p, 0))}
          </summary>
          <ol className="border-t border-rule" start={SHOWN + 1}>{rest.map(row)}</ol>
        </details>
      )}
      {reasons.pair && (
        <p className="max-w-prose">
          <strong>Two causes at once</strong> would explain this better than any one:{' '}
          {reasons.pair.causeIds.map((id) => rulebook.causes[id]?.name ?? id).join(' with ')}
          {decibans && <> (<span className="figure">{reasons.pair.leadDecibans.toFixed(1)} dB</span> ahead)</>}.
        </p>
      )}
      <p className="text-[0.9375rem] text-ink-soft">
        This ranking is advice from what was answered. The maker’s information and a qualified person’s judgement come first.
        {state.differs && ' The run that was kept and the one made again differ; this has been noted.'}
      </p>
    </section>
  );
}

function Cause({ cause, reasons, rulebook, decibans }: { cause: CauseView; reasons: ReasonView[]; rulebook: RulebookView; decibans: boolean }) {
  const { name, sentence } = rulebook.causes[cause.causeId] ?? { name: cause.causeId, sentence: '' };
  const change = changeText(cause.change);
  return (
    <li className="border-b border-rule">
      <details className="disclosure" name={undefined}>
        <summary className="flex min-h-16 items-center gap-3 py-2">
          <SightGlass label={name} value={cause.p} previous={cause.change === null ? undefined : cause.p - cause.change} />
          <span className="min-w-0">
            <span className="block font-bold">{name}</span>
            {change && <span className="figure block text-[0.875rem]">{change} with the last answer</span>}
          </span>
        </summary>
        <div className="grid gap-3 pt-2 pb-4 pl-2">
          <p>{sentence}</p>
          <Reasons reasons={reasons} prior={cause.prior} decibans={decibans} />
        </div>
      </details>
    </li>
  );
}
