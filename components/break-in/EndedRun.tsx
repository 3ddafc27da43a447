'use client';

import { timeText } from '@/components/case/words';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { leaksOf, secondsUnderLoad } from '@/lib/break-in';
import type { BreakInRunView } from '@/lib/schemas/break-in';
import { clockOf } from './clock-of';
import { clockText } from './clock-text';
import { Curve, type PressureUnit } from './Curve';

/** A run that is over: how long, what was read, what was seen while it was hot. */
export function EndedRun({ run, unit, timeZone }: { run: BreakInRunView; unit: PressureUnit; timeZone: string }) {
  const clock = clockOf(run);
  const { least, most } = run.figures.duration;
  return (
    <div className="grid gap-4">
      <DefinitionList
        items={[
          { term: 'Under load', value: `${clockText(secondsUnderLoad(clock, clock.endedAt ?? clock.startedAt))} of ${Math.round(least / 60)} to ${Math.round(most / 60)} minutes`, figure: true },
          { term: 'Begun', value: `${run.startedBy}, ${timeText(run.startedAt, timeZone)}` },
          ...(run.endedAt ? [{ term: 'Ended', value: `${run.endedBy}, ${timeText(run.endedAt, timeZone)}` }] : []),
          ...(run.whyStopped ? [{ term: 'Why it was stopped', value: run.whyStopped }] : []),
          { term: 'Hot check', value: run.hotCheck ? (leaksOf(run.hotCheck) ?? 'dry') : 'not looked yet' },
        ]}
      />
      <Curve events={run.events} clock={clock} figures={run.figures} unit={unit} timeZone={timeZone} />
    </div>
  );
}
