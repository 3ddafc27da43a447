'use client';

import { useDeferredValue, useMemo } from 'react';
import { LiveRegion } from '@/components/ui/LiveRegion';
import { survey, suddenText, SURVEY_FIELDS, surveyText } from '@/lib/bench/line-survey';
import type { Writing } from '@/lib/bench/read-texts';
import { textsOfSearch } from '@/lib/bench/texts-in-url';
import { BeforeYouMeasure } from './BeforeYouMeasure';
import { Foot } from './Foot';
import { SurveyFields } from './SurveyFields';
import { SurveyPlot } from './SurveyPlot';
import { useKeypad } from './use-keypad';
import { useTexts } from './use-texts';

interface Props {
  /** The address's query as the server saw it. */
  search: Readonly<Record<string, string>>;
  writing: Writing;
}

const CAUTIONS = [
  'The line burns skin, and stays hot long after the engine stops. Read it with a thermometer; touch nothing.',
  'The engine runs: level ground, chocks in, transmission in neutral, hands and clothes away from belts and fan, exhaust led outdoors.',
];

const HOW = [
  'Keep the compressor loaded, at one engine speed, until a reading at the port stands still.',
  'Read from the port to the dryer within a few minutes, each point with the same thermometer from the same side.',
  'Put points close to each other around elbows, fittings and the first 6 to 8 feet (2 to 2.5 m), where carbon sits.',
];

const CANNOT_TELL = [
  'A breeze, a fan or a cold bracket from a restriction: each cools a short stretch too.',
  'What an infrared thermometer makes of the surface: bright metal, fresh paint and a change of tube or hose read differently at one temperature. Read on matt tape or paint, or with a contact probe.',
  'How narrow the line is. Its bore can be measured only with the line off.',
];

const WAITING = 'Something above can’t be used; see beside its field.';

const begin = (writing: Writing) => (from: Readonly<Record<string, string>>) => ({ distance1: { value: '0' }, ...textsOfSearch(SURVEY_FIELDS, from, writing) });

/** Readings along the discharge line, and at once what they show. */
export function SurveyDesk({ search, writing }: Props) {
  const [texts, onText] = useTexts({ fields: SURVEY_FIELDS, search, writing, begin: useMemo(() => begin(writing), [writing]) });
  const keypad = useKeypad();
  const surveyed = useMemo(() => survey(texts, writing), [texts, writing]);
  // Typing comes first: the plot follows when there is time.
  const later = useDeferredValue(surveyed);
  const { headline, sentences } = surveyed.kind === 'read' ? surveyText(surveyed, writing) : { headline: '—', sentences: [WAITING] };
  return (
    <div className="grid gap-x-14 gap-y-10 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)]">
      <div className="grid min-w-0 content-start gap-6">
        <h2 className="sr-only">Readings</h2>
        <BeforeYouMeasure cautions={CAUTIONS} />
        <List lines={HOW} />
        <form onSubmit={(event) => event.preventDefault()} onFocus={keypad.onFocus} aria-label="Readings" className="grid gap-4">
          <SurveyFields {...{ texts, writing, onText }} errors={surveyed.kind === 'refused' ? surveyed.errors : {}} inputMode={keypad.inputMode} />
        </form>
        <Foot keypad={keypad} decimalMark={writing.decimal ?? '.'}>
          <p aria-hidden="true" className="flex min-h-touch items-center py-2 font-bold lg:hidden">{headline}</p>
        </Foot>
      </div>
      <section aria-labelledby="result" className="grid min-w-0 content-start gap-3 border-t-2 border-ink pt-4 lg:sticky lg:top-4 lg:self-start">
        <h2 id="result">What it shows</h2>
        <p className="text-[1.75rem] leading-tight font-bold" data-testid="result">{headline}</p>
        <div className="grid min-h-32 max-w-prose content-start gap-2">{sentences.map((sentence) => <p key={sentence}>{sentence}</p>)}</div>
      </section>
      <div className="grid min-w-0 gap-10 lg:col-span-2 lg:grid-cols-2">
        <SurveyPlot read={later.kind === 'read' ? later : undefined} writing={writing} />
        <section aria-labelledby="sudden" className="grid content-start gap-3">
          <h2 id="sudden">What counts as sudden</h2>
          <p className="max-w-prose">{suddenText(writing)}</p>
        </section>
        <section aria-labelledby="cannot-tell" className="grid content-start gap-3">
          <h2 id="cannot-tell">What it can’t tell</h2>
          <List lines={CANNOT_TELL} />
          <p className="max-w-prose text-[0.9375rem] text-ink-soft">Source: common practice, no source.</p>
        </section>
      </div>
      <LiveRegion>{surveyed.kind === 'read' && surveyed.points.length > 2 ? headline : ''}</LiveRegion>
    </div>
  );
}

const List = ({ lines }: { lines: readonly string[] }) => <ul className="ml-5 grid max-w-prose list-disc gap-1">{lines.map((line) => <li key={line}>{line}</li>)}</ul>;
