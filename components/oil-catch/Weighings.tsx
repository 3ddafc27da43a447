import { DataTable, type Column } from '@/components/ui/DataTable';
import { timeText } from '@/components/case/words';
import { measureText } from '@/components/units/MeasureField';
import { measureUnit } from '@/lib/schemas/measures';
import { USUAL_SCALE_ERROR } from '@/lib/schemas/oil-catch';
import { formatValue, withoutPlusMinus, type Quantity, type UnitPreferences } from '@/lib/units';

export interface WeighingView {
  id: string;
  ranS: number;
  engineS: number | null;
  asTyped: Record<string, string>;
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
  const text = measureText(si, OIL_RATE, units) ?? '';
  const bare = (value: number) => formatValue<Quantity>(value, { quantity: OIL_RATE.quantity, unit: measureUnit(units, OIL_RATE) });
  return low === null || high === null ? text : `${text} (${bare(low)} to ${bare(high)})`;
}

/** What was weighed, one row each, with what each says by itself. */
export function Weighings({ caption, weighings, units, timeZone }: { caption: string; weighings: readonly WeighingView[]; units: UnitPreferences; timeZone: string }) {
  const columns: Column<WeighingView>[] = [
    { key: 'at', header: 'When', rowHeader: true, cell: ({ at, takenBack }) => <When text={timeText(at, timeZone)} struck={takenBack !== null} /> },
    { key: 'oil', header: 'Oil', numeric: true, cell: ({ asTyped }) => `${asTyped.massKg ?? ''} ± ${withoutPlusMinus(asTyped.massErrorKg ?? USUAL_SCALE_ERROR)}` },
    { key: 'ran', header: 'Engine ran', numeric: true, cell: ({ ranS }) => measureText(ranS, HOURS, units) },
    { key: 'meter', header: 'Hour meter', numeric: true, cell: ({ engineS }) => measureText(engineS, HOURS, units) },
    { key: 'rate', header: 'By itself', numeric: true, cell: ({ perHour }) => perHour && measureText(perHour.si, OIL_RATE, units) },
    { key: 'by', header: 'By', cell: ({ by, note, takenBack }) => [by, note && `“${note}”`, takenBack && `taken back by ${takenBack.by}: “${takenBack.why}”`].filter(Boolean).join('; ') },
  ];
  return <DataTable caption={caption} columns={columns} rows={weighings} rowKey={({ id }) => id} />;
}

const When = ({ text, struck }: { text: string; struck: boolean }) => <span className="whitespace-nowrap">{struck ? <s>{text}</s> : text}</span>;
