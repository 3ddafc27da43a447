import { DataTable } from '@/components/ui/DataTable';
import { EmptyState } from '@/components/ui/EmptyState';
import { Tag } from '@/components/ui/Tag';
import { dayText } from '@/lib/schemas/day-text';
import type { UnitPage } from '@/lib/services/unit/read';
import type { UnitPreferences } from '@/lib/units';
import { measureText } from './MeasureField';

export type Reading = UnitPage['readings'][number];

const ENTERED_WITH: Record<string, string> = { unit: 'the unit', fit: 'a fit', case: 'a case' };

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
        { key: 'day', header: 'Read on', rowHeader: true, cell: (row) => dayText(row.readOn) },
        { key: 'odometer', header: 'Odometer', numeric: true, cell: (row) => measureText(row.odometerM, { quantity: 'distance' }, units) },
        { key: 'hours', header: 'Engine hours', numeric: true, cell: (row) => measureText(row.engineS, { quantity: 'engineHours' }, units) },
        {
          key: 'replaced',
          header: 'Replaced',
          cell: (row) => (
            <span className="flex flex-wrap gap-1">
              {row.odometerReplaced && <Tag>new odometer</Tag>}
              {row.engineHoursReplaced && <Tag>new hour meter</Tag>}
            </span>
          ),
        },
        { key: 'with', header: 'Entered with', cell: (row) => ENTERED_WITH[row.source] ?? row.source },
        { key: 'by', header: 'By', cell: (row) => row.by },
        { key: 'note', header: 'Note', cell: (row) => row.note },
      ]}
    />
  );
}

/** A reading in one line, to choose it from a list. */
export const readingLabel = (row: Reading, units: UnitPreferences): string =>
  [dayText(row.readOn), measureText(row.odometerM, { quantity: 'distance' }, units), measureText(row.engineS, { quantity: 'engineHours' }, units)].filter(Boolean).join(', ');
