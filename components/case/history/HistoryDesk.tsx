'use client';

import { useState, type ComponentProps } from 'react';
import { LiveRegion } from '@/components/ui/LiveRegion';
import { Notice } from '@/components/ui/Notice';
import { SelectField } from '@/components/ui/SelectField';
import { percent } from '@/components/ui/SightGlass';
import { stepAt, type Step } from '@/lib/case/steps';
import type { CaseView } from '@/lib/schemas/case-view';
import { CaseDesk } from '../CaseDesk';
import { timeText } from '../words';
import { Comparison } from './Comparison';
import { MomentSlider } from './MomentSlider';
import { useMoments, type Moment } from './use-moment';

interface Props extends Omit<ComponentProps<typeof CaseDesk>, 'view'> {
  view: CaseView;
  steps: readonly Step[];
  /** What the server rendered, by instant. */
  known: Readonly<Record<string, Moment>>;
  at: string | null;
  /** The moment to compare with. */
  withAt: string | null;
}

/** A case at any of its moments, and two of them beside each other. The address follows, so that both can be sent. */
export function HistoryDesk({ view, steps, known, at, withAt, ...desk }: Props) {
  const [index, setIndex] = useState(stepAt(steps, at));
  const [other, setOther] = useState(withAt === null ? null : stepAt(steps, withAt));
  const { head, rulebook } = view;
  const step = steps[index];
  const otherStep = other === null ? undefined : steps[other];
  const instants = [step, otherStep].flatMap((one) => one?.at ?? []);
  const near = [steps[index - 1], steps[index + 1]].flatMap((one) => one?.at ?? []);
  const [shown, compared] = useMoments(head.id, instants, near, known);

  const go = (nextIndex: number, nextOther: number | null) => {
    setIndex(nextIndex);
    setOther(nextOther);
    const query = new URLSearchParams();
    const [to, from] = [steps[nextIndex], nextOther === null ? undefined : steps[nextOther]];
    if (to) query.set('at', to.at);
    if (from) query.set('with', from.at);
    history.replaceState(null, '', `?${query}`);
  };

  // While the next moment is on its way the last one stays, so that nothing jumps.
  const [last, setLast] = useState<Moment | undefined>(step && known[step.at]);
  if (shown?.data && shown.data !== last) setLast(shown.data);
  const moment = shown?.data ?? last;
  const leader = moment?.state.causes[0];

  return (
    <div className="grid grid-cols-1 gap-8">
      <section aria-labelledby="moments" className="grid grid-cols-1 gap-3 border-b border-rule pb-6">
        <h2 id="moments" className="sr-only">Moments</h2>
        <MomentSlider steps={steps} index={index} timeZone={head.timeZone} onChange={(next) => go(next, other)} />
        {step && (
          <p className="min-h-[3lh]">
            <strong>{timeText(step.at, head.timeZone)}</strong>: {step.what}
            {shown?.isFetching && <span className="appear-late text-ink-soft"> Fetching…</span>}
          </p>
        )}
        <SelectField
          label="Compare with"
          name="with"
          className="max-w-prose print:hidden"
          placeholder="No other moment"
          value={other === null ? '' : String(other)}
          onChange={(event) => go(index, event.target.value === '' ? null : Number(event.target.value))}
          options={steps.map((one, place) => ({ value: String(place), label: `${timeText(one.at, head.timeZone)} · ${one.what}`, disabled: place === index }))}
        />
      </section>
      {(shown?.error ?? compared?.error) && (
        <Notice title="This moment could not be fetched">{(shown?.error ?? compared?.error)?.message} Nothing of the case was changed. Step on, or come back to it.</Notice>
      )}
      {step && otherStep && shown?.data && compared?.data && other !== index && (
        <section aria-labelledby="compared" className="grid grid-cols-1 gap-4">
          <h2 id="compared">Two moments beside each other</h2>
          <Comparison
            {...inOrder({ step: otherStep, state: compared.data.state }, { step, state: shown.data.state })}
            rulebook={rulebook}
            timeZone={head.timeZone}
          />
        </section>
      )}
      {moment && (
        <section aria-labelledby="as-it-was">
          <h2 id="as-it-was" className="mb-4">The case as it was</h2>
          <CaseDesk view={{ ...view, ...moment }} {...desk} />
        </section>
      )}
      <LiveRegion>{leader && shown?.data ? `${rulebook.causes[leader.causeId]?.name ?? leader.causeId} led with ${percent(leader.p)}.` : ''}</LiveRegion>
    </div>
  );
}

/** The earlier one first, whichever was picked first. */
function inOrder<One extends { step: Step }>(a: One, b: One): { before: One; after: One } {
  return a.step.at < b.step.at ? { before: a, after: b } : { before: b, after: a };
}
