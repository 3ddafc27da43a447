import { DataTable, type Column } from '@/components/ui/DataTable';
import { timeText } from '@/components/case/words';
import { measureText } from '@/components/units/MeasureField';
import { OIL_MEASURE } from '@/lib/schemas/oil-catch';
import type { UnitPreferences } from '@/lib/units';

export interface WeighingView {
  id: string;
  massKg: number;
  massErrorKg: number;
  ranS: number;
  engineS: number | null;
  note: string | null;
  by: string;
  at: string;
  perHour: Rate | null;
  takenBack: { at: string; by: string; why: string } | null;
}

export interface Rate {
  si: number;
  low: number | null;
  high: number | null;
}

const OIL_RATE = { quantity: 'oilRate', like: 'mL/h' } as const;
const HOURS = { quantity: 'engineHours' } as const;

/** "1.4 mL/h (1.2 to 1.6)" */
export function rateText({ si, low, high }: Rate, units: UnitPreferences): string {
  const text = (value: number) => measureText(value, OIL_RATE, units) ?? '';
  return low === null || high === null ? text(si) : `${text(si)} (${text(low)} to ${text(high)})`;
}

/** What was weighed, one row each, with what each says by itself. */
export function Weighings({ caption, weighings, units, timeZone }: { caption: string; weighings: readonly WeighingView[]; units: UnitPreferences; timeZone: string }) {
  const columns: Column<WeighingView>[] = [
    { key: 'at', header: 'When', rowHeader: true, cell: ({ at, takenBack }) => (takenBack ? <s>{timeText(at, timeZone)}</s> : timeText(at, timeZone)) },
    { key: 'oil', header: 'Oil', numeric: true, cell: ({ massKg, massErrorKg }) => `${measureText(massKg, OIL_MEASURE, units)} ± ${measureText(massErrorKg, OIL_MEASURE, units)}` },
    { key: 'ran', header: 'Engine ran', numeric: true, cell: ({ ranS }) => measureText(ranS, HOURS, units) },
    { key: 'meter', header: 'Hour meter', numeric: true, cell: ({ engineS }) => measureText(engineS, HOURS, units) },
    { key: 'rate', header: 'By itself', numeric: true, cell: ({ perHour }) => perHour && measureText(perHour.si, OIL_RATE, units) },
    { key: 'by', header: 'By', cell: ({ by, note, takenBack }) => `${by}${note ? `: ${note}` : ''}${takenBack ? ` Taken back by ${takenBack.by}: ${takenBack.why}` : ''}` },
  ];
  return <DataTable caption={caption} columns={columns} rows={weighings} rowKey={({ id }) => id} />;
}
