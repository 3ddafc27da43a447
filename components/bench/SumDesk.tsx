'use client';

import { useCallback, useDeferredValue, useMemo } from 'react';
import { LiveRegion } from '@/components/ui/LiveRegion';
import { sumOf } from '@/lib/air-and-oil/sums';
import type { Sum } from '@/lib/air-and-oil/sums/sum';
import type { InputText, Writing } from '@/lib/bench/read-texts';
import { shown, shownValue } from '@/lib/bench/show';
import { textsOfSearch } from '@/lib/bench/texts-in-url';
import { siOf, workOut } from '@/lib/bench/work-out';
import { BeforeYouMeasure } from './BeforeYouMeasure';
import { CoverageNote } from './CoverageNote';
import { Foot } from './Foot';
import { Formula } from './Formula';
import { SumFields } from './SumFields';
import { SumPlot } from './SumPlot';
import { SumAtFoot, SumResult } from './SumResult';
import { SumTimer } from './SumTimer';
import { IntoCase, type CaseTarget } from './IntoCase';
import { useKeypad } from './use-keypad';
import { useTexts } from './use-texts';

interface Props {
  sumId: string;
  /** The address's query as the server saw it. */
  search: Readonly<Record<string, string>>;
  /** From the records of the case that the sum is for: values to begin with, in SI, and where each comes from. */
  known: Readonly<Record<string, { si: number; from: string }>>;
  writing: Writing;
  target: CaseTarget | null;
}

/** A sum of the bench: what goes in, and at once what comes out, with its doubt. */
export function SumDesk({ sumId, search, known, writing, target }: Props) {
  const sum = sumOf(sumId);
  return sum ? <Desk {...{ sum, search, known, writing, target }} /> : null;
}

type DeskProps = Omit<Props, 'sumId'> & { sum: Sum };

function Desk({ sum, search, known, writing, target }: DeskProps) {
  const begin = useCallback((from: Readonly<Record<string, string>>) => ({ ...usualTexts(sum, known, writing, target === null), ...textsOfSearch(sum, from, writing) }), [sum, known, writing, target]);
  const [texts, onText] = useTexts({ fields: sum, search, writing, begin });
  const keypad = useKeypad();

  const worked = useMemo(() => workOut(sum, texts, writing), [sum, texts, writing]);
  // Typing comes first: the plot follows when there is time.
  const later = useDeferredValue(worked);
  const given = worked.kind === 'refused' ? null : siOf(worked.inputs);
  const values = worked.kind === 'values' ? { ...given, ...worked.values } : undefined;
  const main = sum.outputs.find(({ id }) => id === sum.main);
  const value = worked.kind === 'values' ? worked.values[sum.main] : undefined;

  return (
    <div className="grid gap-x-14 gap-y-10 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)]">
      <div className="grid min-w-0 content-start gap-6">
        <h2 className="sr-only">Readings</h2>
        <BeforeYouMeasure cautions={sum.cautions} />
        <SumTimer sum={sum} writing={writing} name={target ? `${target.caseId}/${sum.id}` : sum.id} onSeconds={(id, seconds) => onText(id, { ...texts[id], value: `${seconds.toFixed(1)} s` })} />
        <form onSubmit={(event) => event.preventDefault()} onFocus={keypad.onFocus} aria-label="Readings" className="grid gap-5">
          <SumFields {...{ sum, texts, writing, onText }} inputMode={keypad.inputMode} errors={worked.kind === 'refused' ? worked.errors : {}} known={fromWhere(known, texts, sum, writing)} />
        </form>
        <Foot keypad={keypad} decimalMark={writing.decimal ?? '.'}><SumAtFoot {...{ sum, worked, writing }} /></Foot>
      </div>
      <div className="grid min-w-0 content-start gap-8 lg:sticky lg:top-4 lg:self-start">
        <SumResult {...{ sum, worked, writing }} />
        {target && <IntoCase {...{ sum, worked, target, writing, texts }} />}
      </div>
      <div className="grid min-w-0 gap-10 lg:col-span-2 lg:grid-cols-2">
        {sum.plot && <SumPlot {...{ sum, writing }} given={later.kind === 'refused' ? null : siOf(later.inputs)} />}
        <section aria-labelledby="formula" className="grid min-w-0 content-start gap-3">
          <h2 id="formula">The formula</h2>
          <Formula {...{ sum, values, writing }} />
        </section>
        <section aria-labelledby="assumptions" className="grid content-start gap-3">
          <h2 id="assumptions">What it takes for granted</h2>
          <ul className="ml-5 grid max-w-prose list-disc gap-1">{sum.assumptions.map((line) => <li key={line}>{line}</li>)}</ul>
          <CoverageNote {...{ sum, writing }} />
        </section>
        <section aria-labelledby="cannot-tell" className="grid content-start gap-3">
          <h2 id="cannot-tell">What it can’t tell</h2>
          <ul className="ml-5 grid max-w-prose list-disc gap-1">{sum.cannotTell.map((line) => <li key={line}>{line}</li>)}</ul>
          <p className="max-w-prose text-[0.9375rem] text-ink-soft">Source: {sum.source}</p>
        </section>
      </div>
      <LiveRegion>{main && value !== undefined ? `${main.label}: ${shown(value, main, writing)}` : ''}</LiveRegion>
    </div>
  );
}

/** Needed inputs begin with something usual, so that a page shows at once what it does; for a case with what is known of it alone. */
function usualTexts(sum: Sum, known: Props['known'], writing: Writing, usual: boolean): Record<string, InputText> {
  return Object.fromEntries(
    sum.inputs.flatMap((input) => {
      const si = known[input.id]?.si ?? (usual && !input.optional ? input.byDefault : undefined);
      return si === undefined ? [] : [[input.id, { value: shownValue(si, input, writing) }]];
    }),
  );
}

/** Where a value comes from that still stands as it was filled in. */
function fromWhere(known: Props['known'], texts: Readonly<Record<string, InputText>>, { inputs }: Sum, writing: Writing): Record<string, string> {
  return Object.fromEntries(
    inputs.flatMap((input) => {
      const held = known[input.id];
      return held && texts[input.id]?.value === shownValue(held.si, input, writing) ? [[input.id, held.from]] : [];
    }),
  );
}
