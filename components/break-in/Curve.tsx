'use client';

import { useMemo } from 'react';
import { PlotInPlace } from '@/components/plots/PlotInPlace';
import { timeText } from '@/components/case/words';
import { DataTable } from '@/components/ui/DataTable';
import { curveOf, secondsUnderLoad, type BreakInFigures, type Run } from '@/lib/break-in';
import { clockText } from './clock-text';
import type { ShownEvent } from './use-break-in';

/** Of the person: how a pressure is written, and how many Pa one of it is. */
export interface PressureUnit {
  symbol: string;
  pascals: number;
}

interface Props {
  events: readonly ShownEvent[];
  clock: Run;
  figures: BreakInFigures;
  unit: PressureUnit;
  timeZone: string;
}

const WORDS = { pause: 'Stood still', resume: 'Ran again', reading: 'Read' } as const;

/** What was read, against the band to hold; and everything that was noted, in a table. */
export function Curve({ events, clock, figures: { pressure }, unit, timeZone }: Props) {
  const points = useMemo(() => curveOf(clock, pressure), [clock, pressure]);
  const drawn = useMemo(
    () =>
      points.length > 1 && {
        xLabel: 'Minutes under load',
        yLabel: `Wet tank, ${unit.symbol}`,
        series: [{ label: 'Read', points: points.map(({ second, pressurePa }) => ({ x: second / 60, y: pressurePa / unit.pascals })) }],
        marks: [{ label: 'At least', y: pressure.low / unit.pascals }, { label: 'At most', y: pressure.high / unit.pascals }],
      },
    [points, pressure, unit],
  );
  const outside = points.filter(({ inBand }) => !inBand).length;
  return (
    <div className="grid gap-4">
      {points.length > 0 && (
        <p>
          {points.length === 1 ? 'One reading' : `${points.length} readings`}, {outside === 0 ? 'all within the band' : `${outside} outside the band`} of{' '}
          <span className="figure whitespace-nowrap">{Math.round(pressure.low / unit.pascals)} to {Math.round(pressure.high / unit.pascals)} {unit.symbol}</span>.
        </p>
      )}
      {drawn && <PlotInPlace drawn={drawn} />}
      {events.length > 0 && (
        <DataTable
          caption="What was noted"
          rows={[...events].reverse()}
          rowKey={(event) => event.id}
          columns={[
            { key: 'under-load', header: 'Under load', rowHeader: true, cell: ({ at }) => <span className="figure">{clockText(secondsUnderLoad(clock, Date.parse(at)))}</span> },
            { key: 'what', header: 'What', cell: ({ kind, pressure: text, reason, waits }) => <>{WORDS[kind]}{text && <>: <span className="figure">{text}</span></>}{reason && `, “${reason}”`}{waits && ' (waits on this device)'}</> },
            { key: 'who', header: 'Who', cell: ({ by, at }) => `${by}, ${timeText(at, timeZone)}` },
          ]}
        />
      )}
    </div>
  );
}
