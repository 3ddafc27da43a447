'use client';

import { useState } from 'react';
import { Notice } from '@/components/ui/Notice';
import { SightGlass, percent } from '@/components/ui/SightGlass';
import { Tag } from '@/components/ui/Tag';
import type { CaseReasons, CaseState, CauseView, ReasonView, RulebookView } from '@/lib/schemas/case-view';
import { Reasons } from './Reasons';
import { useCalmOrder } from './use-calm-order';
import { changeText } from './words';

/** Causes under this are in the list, not in the way. */
const SHOWN = 6;

interface Props {
  state: CaseState;
  reasons: CaseReasons;
  rulebook: RulebookView;
  /** Worked out on this device; the server's word is still to come. */
  provisional: boolean;
}

/** The ranked causes, each with its level, how it moved, and its reasons when it is opened. */
export function Causes({ state, reasons, rulebook, provisional }: Props) {
  const [decibans, setDecibans] = useState(false);
  const list = useCalmOrder(state.causes.map(({ causeId }) => causeId).join());
  const leading = state.causes.slice(0, SHOWN);
  const rest = state.causes.slice(SHOWN);
  const row = (cause: CauseView) => <Cause key={cause.causeId} cause={cause} reasons={reasons.causes[cause.causeId] ?? []} rulebook={rulebook} decibans={decibans} />;
  return (
    <section aria-labelledby="causes" className="grid gap-3 border-t-2 border-ink pt-3">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <div className="flex flex-wrap items-center gap-x-3">
          <h2 id="causes">What is behind it</h2>
          {provisional && <Tag>Provisional</Tag>}
        </div>
        <label className="no-print flex min-h-touch cursor-pointer items-center gap-2">
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
      <p className="min-h-[2.6em] text-[0.9375rem] leading-[1.3]">
        {state.because ? <>Moved last by <strong>{state.because}</strong></> : <span className="text-ink-soft">As in all cases: nothing has moved it yet.</span>}
      </p>
      <ol ref={list} className="border-t border-ink">{leading.map(row)}</ol>
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
  const [left, setLeft] = useState<ReasonView | null>(null);
  const change = changeText(cause.change);
  const rose = (cause.change ?? 0) > 0;
  // The reasons may have changed under the one that was left out.
  const without = left && reasons.find(({ findingIds }) => findingIds.join() === left.findingIds.join());
  return (
    <li data-cause={cause.causeId} data-p={cause.p} className="border-b border-rule">
      <details className="disclosure" name={undefined}>
        <summary className="flex min-h-18 items-center gap-3 py-2">
          <SightGlass
            label={name}
            value={without ? without.without : cause.p}
            previous={without ? cause.p : cause.change === null ? undefined : cause.p - cause.change}
            className="w-26 shrink-0"
          />
          <span className="min-w-0">
            <span className="block leading-tight font-bold">{name}</span>
            {/* Always a line, so that a level that moves moves nothing else. */}
            <span className="block min-h-[1.3em] text-[0.875rem] leading-[1.3] text-ink-soft">
              {without ? 'without that answer' : change && <><Moved rose={rose} /> <span className="figure">{change}</span></>}
            </span>
          </span>
        </summary>
        <div className="grid gap-3 pt-2 pb-4 pl-2">
          <p>{sentence}</p>
          <Reasons reasons={reasons} prior={cause.prior} decibans={decibans} left={without ?? null} onLeave={setLeft} />
        </div>
      </details>
    </li>
  );
}

/** An arrow beside the word that says the same. */
function Moved({ rose }: { rose: boolean }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 10 10" className="inline size-2.5 fill-ink">
      <path d={rose ? 'M5 0 10 9H0Z' : 'M5 10 0 1H10Z'} />
    </svg>
  );
}
