'use client';

import Link from 'next/link';
import { timeText } from '@/components/case/words';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { secondsUnderLoad, type BreakInFigures, type HotCheck, type Run } from '@/lib/break-in';
import type { BreakInRunView } from '@/lib/schemas/break-in';
import { clockText } from './clock-text';
import { Curve } from './Curve';

interface Unit {
  symbol: string;
  pascals: number;
}

/** By which figures it runs, where they are from, and the bleed that holds it there. */
export function HowToRun({ figures, bleed, unit, modelName }: { figures: BreakInFigures; bleed: Record<string, string>; unit: Unit; modelName: string | null }) {
  const { engineRpm, pressure, duration, from, source } = figures;
  const at = (pa: number) => Math.round(pa / unit.pascals);
  return (
    <div className="grid max-w-prose gap-2">
      <p>
        {modelName && `${modelName}. `}Engine at <span className="figure whitespace-nowrap">{engineRpm.toLocaleString('en')} rpm</span>; bleed the wet tank so that it holds about{' '}
        <span className="figure whitespace-nowrap">{at(pressure.aim)} {unit.symbol}</span>, between {at(pressure.low)} and {at(pressure.high)}, and never unloads, for {Math.round(duration.least / 60)} to {Math.round(duration.most / 60)} minutes.
      </p>
      <p className="text-[0.9375rem] text-ink-soft">{from === 'model' ? `From the record of this compressor model: ${source}.` : `From the rulebook: ${source ?? 'no source given.'}`}</p>
      <p><Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/bench/break-in-bleed?${new URLSearchParams(bleed)}`}>How far to open the bleed, on the bench</Link></p>
    </div>
  );
}

/** A run that is over: how long, what was read, what was seen while it was hot. */
export function EndedRun({ run, unit, timeZone }: { run: BreakInRunView; unit: Unit; timeZone: string }) {
  const clock: Run = { startedAt: Date.parse(run.startedAt), endedAt: run.endedAt ? Date.parse(run.endedAt) : null, events: run.events.map(({ id, kind, at, pressurePa }) => ({ id, kind, at: Date.parse(at), pressurePa })) };
  const { least, most } = run.figures.duration;
  return (
    <div className="grid gap-4">
      <DefinitionList
        items={[
          { term: 'Under load', value: `${clockText(secondsUnderLoad(clock, clock.endedAt ?? clock.startedAt))} of ${Math.round(least / 60)} to ${Math.round(most / 60)} minutes`, figure: true },
          { term: 'Begun', value: `${run.startedBy}, ${timeText(run.startedAt, timeZone)}` },
          ...(run.endedAt ? [{ term: 'Ended', value: `${run.endedBy}, ${timeText(run.endedAt, timeZone)}` }] : []),
          ...(run.whyStopped ? [{ term: 'Why it was stopped', value: run.whyStopped }] : []),
          { term: 'Hot check', value: run.hotCheck ? hotText(run.hotCheck) : 'not looked yet' },
        ]}
      />
      <Curve events={run.events.map((event) => ({ ...event, waits: false }))} clock={clock} figures={run.figures} unit={unit} timeZone={timeZone} />
    </div>
  );
}

function hotText({ oil, coolant, where }: HotCheck): string {
  const leaks = [oil === 'leak' && 'oil leaks', coolant === 'leak' && 'coolant leaks'].filter(Boolean);
  return leaks.length > 0 ? `${leaks.join(' and ')}: ${where}` : 'dry';
}
