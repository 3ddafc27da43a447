'use client';

import { useMemo } from 'react';
import { PlotInPlace } from '@/components/plots/PlotInPlace';
import { DataTable } from '@/components/ui/DataTable';
import { Disclosure } from '@/components/ui/Disclosure';
import { axisOf, DISTANCE, fallText, perLength, surveySummary, TEMPERATURE, type Surveyed } from '@/lib/bench/line-survey';
import type { Writing } from '@/lib/bench/read-texts';
import { shown, shownNumber } from '@/lib/bench/show';

/** The line's temperature over its length, and the same in words and in a table of its stretches. */
export function SurveyPlot({ read, writing }: { read: Extract<Surveyed, { kind: 'read' }> | undefined; writing: Writing }) {
  const drawn = useMemo(
    () =>
      read && read.stretches.length > 0 && {
        xLabel: axisOf(DISTANCE, writing),
        yLabel: axisOf(TEMPERATURE, writing),
        series: [{ label: TEMPERATURE.label, points: read.points.map(({ distanceM, temperatureK }) => ({ x: shownNumber(distanceM, DISTANCE, writing), y: shownNumber(temperatureK, TEMPERATURE, writing) })) }],
        marks: [],
      },
    [read, writing],
  );
  return (
    <section aria-labelledby="plot" className="grid min-w-0 content-start gap-3 lg:col-span-2">
      <h2 id="plot">Along the line</h2>
      <p className="max-w-prose" data-testid="plot-summary">{read ? surveySummary(read, writing) : 'The plot comes when every reading can be used.'}</p>
      <PlotInPlace drawn={drawn} />
      {read && read.stretches.length > 0 && (
        <Disclosure summary="The same as a table">
          <DataTable
            caption="Stretches of the line, as a table"
            captionHidden
            columns={[
              { key: 'from', header: 'From', numeric: true, rowHeader: true, cell: ({ fromM }) => shown(fromM, DISTANCE, writing) },
              { key: 'to', header: 'To', numeric: true, cell: ({ toM }) => shown(toM, DISTANCE, writing) },
              { key: 'fall', header: 'Falls by', numeric: true, cell: (stretch) => fallText(stretch, writing) },
              { key: 'rate', header: 'Falls', numeric: true, cell: ({ fallPerM }) => perLength(fallPerM, writing) },
              { key: 'sudden', header: 'Sudden', cell: ({ sudden }) => (sudden ? 'Yes' : 'No') },
            ]}
            rows={read.stretches}
            rowKey={({ fromM }) => String(fromM)}
          />
        </Disclosure>
      )}
    </section>
  );
}
