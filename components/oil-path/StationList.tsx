import { SightGlass } from '@/components/ui/SightGlass';
import { STATIONS } from '@/lib/diagnose/stations';
import type { OilPathProps } from './OilPath';
import type { Place } from './shares';

/** What a station is called aloud, where the eye has the drawing. */
export const stationText = (name: string, percent: number, open: number) => `${name}, ${percent}% suspicion, ${open} open`;

/** The oil path as a list, in the order in which air and oil flow. */
export function StationList({ percents, suspicion, open, picked, onPick }: Omit<OilPathProps, 'drawing'> & { percents: Readonly<Record<Place, number>> }) {
  return (
    <ul aria-label="Stations on the oil path" className="border-t border-ink sm:columns-2 sm:gap-x-8">
      {STATIONS.map(({ id, name }) => (
        <li key={id} className="break-inside-avoid border-b border-rule">
          <button
            type="button"
            aria-pressed={picked === id}
            onClick={() => onPick(picked === id ? null : id)}
            className="flex min-h-touch w-full items-center gap-4 px-2 py-1.5 text-left hover:bg-sunk aria-pressed:bg-ink aria-pressed:text-paper"
          >
            <span className="sr-only">{stationText(name, percents[id], open[id])}</span>
            <SightGlass size="small" value={suspicion[id]} printed={`${percents[id]}%`} className="w-20 shrink-0" />
            <span aria-hidden="true" className="min-w-0 flex-1 font-bold">{name}</span>
            <span aria-hidden="true" className="figure text-[0.9375rem]">{open[id]} open</span>
          </button>
        </li>
      ))}
    </ul>
  );
}
