'use client';

import Link from 'next/link';
import { Button } from '@/components/ui/Button';
import { percent } from '@/components/ui/SightGlass';
import type { CaseState, RulebookView, SettleView } from '@/lib/schemas/case-view';
import type { Picked } from './at-hand';
import { Minutes } from './Minutes';

interface Props {
  state: CaseState;
  settle: SettleView[];
  rulebook: RulebookView;
  readOnly: boolean;
  onPick: (picked: Picked) => void;
}

/** A plan longer than this says that too little is known, not what to do. */
const MOST_REPAIRS = 4;

/** Other checks worth their time, what would settle it, and what would be repaired first as things stand. */
export function WhatNext({ state, settle, rulebook, readOnly, onPick }: Props) {
  const { suggestions, spoiled } = state.next;
  const name = (id: string) => rulebook.checks[id]?.name ?? id;
  return (
    <div className="grid gap-6">
      {suggestions.length > 0 && (
        <section aria-labelledby="next-checks" className="print:hidden">
          <h2 id="next-checks">Checks that tell most for their time</h2>
          <ol className="mt-2 border-t border-ink">
            {suggestions.map(({ checkIds, panelId, word, minutes, because }) => {
              const [checkId] = checkIds;
              const title = panelId ? (rulebook.panels.find(({ id }) => id === panelId)?.title ?? panelId) : checkIds.map(name).join(' and ');
              return (
                <li key={checkIds.join()} className="border-b border-rule py-1">
                  <Button
                    variant="quiet"
                    className="w-full justify-between! border-transparent! px-2! text-left!"
                    aria-disabled={readOnly || undefined}
                    onClick={() => !readOnly && checkId && onPick(panelId ? { kind: 'panel', panelId } : { kind: 'check', checkId })}
                  >
                    <span>{title}</span>
                    <span className="max-w-[55%] shrink-0 text-right font-normal text-ink-soft">{word}, <Minutes of={minutes} /></span>
                  </Button>
                  {because && <p className="px-2 pb-2 text-[0.9375rem]">{because}</p>}
                </li>
              );
            })}
          </ol>
          {spoiled.length > 0 && (
            <p className="mt-2 text-[0.9375rem] text-ink-soft">
              Can’t tell any more: {spoiled.map(({ checkId, by }) => `${name(checkId)} (spoiled by: ${name(by)})`).join(' · ')}
            </p>
          )}
        </section>
      )}
      {settle.length > 0 && (
        <section aria-labelledby="settle">
          <h2 id="settle">What would settle it</h2>
          <ul className="mt-2 grid gap-1">
            {settle.map(({ checkId, answer, causeId, from, to }) => (
              <li key={causeId}>
                {name(checkId)}: <strong>{answer}</strong> would take {rulebook.causes[causeId]?.name ?? causeId} from{' '}
                <span className="figure">{percent(from)}</span> to <span className="figure">{percent(to)}</span>.
              </li>
            ))}
          </ul>
        </section>
      )}
      {state.repairs.length > 0 && (
        <section aria-labelledby="repairs">
          <h2 id="repairs">If you repaired now, in this order</h2>
          <ol className="mt-2 ml-5 grid list-decimal gap-1">
            {state.repairs.slice(0, MOST_REPAIRS).map(({ remedyId, name: remedy, p, lookMinutes, fixMinutes }) => (
              <li key={remedyId}>
                {remedy}: <span className="figure">{percent(p)}</span> likely, <Minutes of={lookMinutes} /> to look
                {fixMinutes > 0 && <>, <Minutes of={fixMinutes} /> to put right</>}
              </li>
            ))}
          </ol>
          {state.repairs.length > MOST_REPAIRS && (
            <p className="mt-1 text-[0.9375rem] text-ink-soft">Then {state.repairs.length - MOST_REPAIRS} more, each less likely for its cost. Another check may spare most of them.</p>
          )}
          <p><Link className="inline-flex min-h-touch items-center underline underline-offset-4 print:hidden" href={`/cases/${state.caseId}/repair`}>What each takes, and its steps</Link></p>
        </section>
      )}
    </div>
  );
}
