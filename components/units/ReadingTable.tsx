import { DataTable } from '@/components/ui/DataTable';
import { EmptyState } from '@/components/ui/EmptyState';
import { Tag } from '@/components/ui/Tag';
import { dayText } from '@/lib/schemas/day-text';
import type { UnitPage } from '@/lib/services/unit/read';
import type { UnitPreferences } from '@/lib/units';
import { measureText } from './MeasureField';

export type Reading = UnitPage['readings'][number];

const ENTERED_WITH: Record<string, string> = { unit: 'With the unit', fit: 'With a fit', case: 'With a case' };

/** Odometer and engine hours by day, the latest first. */
export function ReadingTable({ readings, units }: { readings: readonly Reading[]; units: UnitPreferences }) {
  return (
    <DataTable
      caption="Readings, the latest first"
      captionHidden
      rows={readings.toReversed()}
      rowKey={(row) => row.id}
      empty={<EmptyState title="No reading yet">The first comes with the next case, or enter one.</EmptyState>}
      columns={[
        { key: 'day', header: 'Read on', rowHeader: true, cell: (row) => <span className="whitespace-nowrap">{dayText(row.readOn)}</span> },
        {
          key: 'odometer',
          header: 'Odometer',
          numeric: true,
          cell: (row) => <Figure text={measureText(row.odometerM, { quantity: 'distance' }, units)} replaced={row.odometerReplaced && 'new odometer'} />,
        },
        {
          key: 'hours',
          header: 'Engine hours',
          numeric: true,
          cell: (row) => <Figure text={measureText(row.engineS, { quantity: 'engineHours' }, units)} replaced={row.engineHoursReplaced && 'new hour meter'} />,
        },
        {
          key: 'entered',
          header: 'Entered',
          cell: (row) => (
            <>
              {ENTERED_WITH[row.source] ?? row.source}
              {row.by && `, by ${row.by}`}
              {row.note && <p className="text-ink-soft">{row.note}</p>}
            </>
          ),
        },
      ]}
    />
  );
}

function Figure({ text, replaced }: { text: string | null; replaced: string | false }) {
  return (
    <>
      {replaced && <span className="mr-2"><Tag>{replaced}</Tag></span>}
      {text}
    </>
  );
}

/** A reading in one line, to choose it from a list. */
export const readingLabel = (row: Reading, units: UnitPreferences): string =>
  [dayText(row.readOn), measureText(row.odometerM, { quantity: 'distance' }, units), measureText(row.engineS, { quantity: 'engineHours' }, units)].filter(Boolean).join(', ');
