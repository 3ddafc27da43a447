'use client';

import { useMemo } from 'react';
import { PlotInPlace } from '@/components/plots/PlotInPlace';
import { DataTable } from '@/components/ui/DataTable';
import { Disclosure } from '@/components/ui/Disclosure';
import { completeInputs, plotPoints, type Given } from '@/lib/air-and-oil/sums';
import type { Sum, SumQuantity } from '@/lib/air-and-oil/sums/sum';
import type { Writing } from '@/lib/bench/read-texts';
import { shown, shownNumber, shownValue, symbolOf } from '@/lib/bench/show';

interface Props {
  sum: Sum;
  /** Inputs in SI; null while they can't be used: the last plot's place is kept. */
  given: Given | null;
  writing: Writing;
}

/** A row of the table for every so many points of the line. */
const TABLE_EVERY = 8;

/** Where the shape tells more than the number: a line over one input, where one stands on it, and the same in words and in a table. */
export function SumPlot({ sum, given, writing }: Props) {
  const data = useMemo(() => dataOf(sum, given, writing), [sum, given, writing]);
  const { plot } = sum;
  if (!plot) return null;
  return (
    <section aria-labelledby="plot" className="grid min-w-0 content-start gap-3 lg:col-span-2">
      <h2 id="plot">{plot.title}</h2>
      <p className="max-w-prose" data-testid="plot-summary">{data?.summary ?? 'The plot comes when every reading can be used.'}</p>
      <PlotInPlace drawn={data?.drawn} />
      {data && (
        <Disclosure summary="The same as a table">
          <DataTable
            caption={`${plot.title}, as a table`}
            captionHidden
            columns={[
              { key: 'x', header: data.x.label, unit: symbolOf(data.x, writing), numeric: true, rowHeader: true, cell: (row) => shownValue(row.x, data.x, writing) },
              ...data.series.map((output) => ({
                key: output.id,
                header: output.label,
                unit: symbolOf(output, writing),
                numeric: true,
                cell: (row: (typeof data.points)[number]) => (row.y[output.id] === undefined ? 'never' : shownValue(row.y[output.id] ?? 0, output, writing)),
              })),
            ]}
            rows={data.points.filter((_, index) => index % TABLE_EVERY === 0)}
            rowKey={({ x }) => String(x)}
          />
        </Disclosure>
      )}
    </section>
  );
}

function dataOf(sum: Sum, given: Given | null, writing: Writing) {
  const { plot } = sum;
  const x = sum.inputs.find(({ id }) => id === plot?.x);
  const series = plot?.series.flatMap((id) => sum.outputs.find((output) => output.id === id) ?? []) ?? [];
  const [main] = series;
  if (!plot || !x || !main || !given) return null;
  try {
    const inputs = completeInputs(sum, given);
    const points = plotPoints(sum, given);
    const number = (si: number, of: SumQuantity) => shownNumber(si, of, writing);
    const marks = plot.marks.map(({ label, at }) => ({ label, y: number(at(inputs), main), text: `${label}: ${shown(at(inputs), main, writing)}` }));
    return {
      x,
      series,
      points,
      summary: [summaryOf(points, main.id, { x, y: main, writing }), ...marks.map(({ text }) => `${text}.`)].join(' '),
      drawn: {
        xLabel: axis(x, writing),
        yLabel: axis(main, writing),
        series: series.map((output) => ({
          label: output.label,
          points: points.flatMap((point) => {
            const y = point.y[output.id];
            return y === undefined ? [] : [{ x: number(point.x, x), y: number(y, output) }];
          }),
        })),
        marks: marks.map(({ label, y }) => ({ label, y })),
        here: number(inputs[x.id] ?? 0, x),
      },
    };
  } catch {
    // Inputs that don't fit each other are said beside their fields.
    return null;
  }
}

const axis = (of: SumQuantity, writing: Writing) => [of.label, symbolOf(of, writing)].filter(Boolean).join(', ');

/** The ends of the line in a sentence: what it says without being seen. */
function summaryOf(points: ReturnType<typeof plotPoints>, id: string, { x, y, writing }: { x: SumQuantity; y: SumQuantity; writing: Writing }): string {
  const there = points.filter((point) => point.y[id] !== undefined);
  const [first, last] = [there[0], there.at(-1)];
  if (!first || !last) return 'There is no such value anywhere along this range.';
  const at = (point: typeof first) => `${shown(point.y[id] ?? 0, y, writing)} at ${shown(point.x, x, writing)}`;
  return `${y.label}: from ${at(first)} to ${at(last)}.`;
}
