import { SightGlass } from '@/components/ui/SightGlass';
import { STATIONS } from '@/lib/diagnose/stations';
import type { OilPathProps } from './OilPath';
import type { Place } from './shares';

/** The oil path as a list, in the order in which air and oil flow. */
export function StationList({ percents, suspicion, open, picked, onPick }: Omit<OilPathProps, 'drawing'> & { percents: Readonly<Record<Place, number>> }) {
  return (
    <ul aria-label="Stations on the oil path" className="border-t border-ink sm:columns-2 sm:gap-x-8">
      {STATIONS.map(({ id, name }) => (
        <li key={id} className="break-inside-avoid border-b border-rule">
          <button
            type="button"
            aria-pressed={picked === id}
            aria-label={`${name}, ${percents[id]}% suspicion, ${open[id]} open`}
            onClick={() => onPick(picked === id ? null : id)}
            className="flex min-h-touch w-full items-center gap-4 px-2 py-1.5 text-left hover:bg-sunk aria-pressed:bg-ink aria-pressed:text-paper"
          >
            <SightGlass size="small" value={suspicion[id]} printed={`${percents[id]}%`} className="w-20 shrink-0" />
            <span className="min-w-0 flex-1 font-bold">{name}</span>
            <span className="figure text-[0.9375rem]">{open[id]} open</span>
          </button>
        </li>
      ))}
    </ul>
  );
}
