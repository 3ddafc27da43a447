'use client';

import { percent } from '@/components/ui/SightGlass';
import { STATIONS, type StationId } from '@/lib/diagnose/stations';
import type { CaseState, RulebookView } from '@/lib/schemas/case-view';

interface Props {
  state: CaseState;
  rulebook: RulebookView;
  picked: StationId | null;
  onPick: (station: StationId | null) => void;
}

/** How many checks of a station are still open. */
export function openAt(station: StationId, state: CaseState, rulebook: RulebookView): string[] {
  const answered = new Set(state.findings.filter(({ current }) => current).map(({ checkId }) => checkId));
  return Object.values(rulebook.checks)
    .filter((check) => check.station === station && !answered.has(check.id))
    .map(({ id }) => id);
}

/** The stations of the oil path with their open checks and their share of the suspicion; all shares make 100. */
export function Stations({ state, rulebook, picked, onPick }: Props) {
  return (
    <nav aria-label="Stations on the oil path" className="min-w-0">
      <h2 className="label mb-1">The oil path</h2>
      <ul className="grid grid-cols-2 border-t border-ink sm:grid-cols-3 lg:grid-cols-1">
        {STATIONS.map(({ id, name }) => {
          const open = openAt(id, state, rulebook).length;
          const share = state.suspicion[id];
          return (
            <li key={id} className="border-b border-rule">
              <button
                type="button"
                aria-pressed={picked === id}
                onClick={() => onPick(picked === id ? null : id)}
                className="relative grid min-h-touch w-full content-center gap-0.5 px-2 py-1.5 text-left hover:bg-sunk aria-pressed:bg-ink aria-pressed:text-paper"
              >
                <span className="font-bold">{name}</span>
                <span className="figure text-[0.875rem]">{percent(share)} suspicion, {open} open</span>
                <span aria-hidden="true" className="absolute bottom-0 left-0 h-1 border-t border-oil-ink bg-oil-fill" style={{ width: `${share * 100}%` }} />
              </button>
            </li>
          );
        })}
        <li className="flex min-h-touch items-center border-b border-rule px-2 text-[0.875rem]">
          <span>Not on the path <span className="figure">{percent(state.suspicion.none)}</span></span>
        </li>
      </ul>
    </nav>
  );
}
