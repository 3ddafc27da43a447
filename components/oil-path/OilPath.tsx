'use client';

import { useId, useRef, useState, type CSSProperties, type KeyboardEvent, type ReactNode } from 'react';
import { Button } from '@/components/ui/Button';
import { STATIONS, type StationId } from '@/lib/diagnose/stations';
import { directionOf, nextInDirection } from './directions';
import { buttonPlace, labelPlace, levelOf } from './places';
import { wholePercents, type Place } from './shares';
import { StationList, stationText } from './StationList';

export interface OilPathProps {
  /** `OilPathCompositions`, drawn by the server. */
  drawing: ReactNode;
  /** How much of the suspicion sits where, together 1. */
  suspicion: Readonly<Record<Place, number>>;
  /** How many checks of a station are still open. */
  open: Readonly<Record<StationId, number>>;
  picked: StationId | null;
  onPick: (station: StationId | null) => void;
}

/**
 * The path that oil takes, where a case is worked: each station holds as much oil as suspicion sits there. One stop of
 * the keyboard; arrows walk the drawing as it lies on the screen. The same drawing stands across a page or down a phone.
 */
export function OilPath({ drawing, suspicion, open, picked, onPick }: OilPathProps) {
  const [asList, setAsList] = useState(false);
  const [stop, setStop] = useState<StationId>(picked ?? 'intake');
  const stations = useRef<HTMLDivElement>(null);
  const help = useId();
  const percents = wholePercents(suspicion);

  const walk = (event: KeyboardEvent) => {
    const buttons = [...(stations.current?.querySelectorAll<HTMLButtonElement>('button') ?? [])];
    const from = buttons.indexOf(event.target as HTMLButtonElement);
    const centres = buttons.map((button) => {
      const { left, top, width, height } = button.getBoundingClientRect();
      return { x: left + width / 2, y: top + height / 2 };
    });
    const direction = directionOf(event.key);
    const here = centres[from];
    if (!here) return;
    const to = event.key === 'Home' ? 0 : event.key === 'End' ? buttons.length - 1 : direction && nextInDirection(here, direction, centres);
    if (to === undefined) return;
    event.preventDefault();
    buttons[to]?.focus();
  };

  return (
    <section aria-labelledby="oil-path" className="oil-path">
      <h2 id="oil-path" className="sr-only">The oil path</h2>
      <div className="oil-path-frame">
      {asList ? (
        <StationList {...{ percents, suspicion, open, picked, onPick }} />
      ) : (
        <div className="oil-path-plate" style={levels(suspicion)}>
          {drawing}
          <div ref={stations} role="toolbar" aria-label="Stations on the oil path" aria-describedby={help} onKeyDown={walk}>
            {STATIONS.map(({ id, name }) => (
              <button
                key={id}
                type="button"
                className="oil-path-station"
                style={buttonPlace(id)}
                tabIndex={id === stop ? 0 : -1}
                aria-pressed={picked === id}
                onFocus={() => setStop(id)}
                onClick={() => onPick(picked === id ? null : id)}
              >
                <span className="sr-only">{stationText(name, percents[id], open[id])}</span>
                <span aria-hidden="true" className="oil-path-words" style={labelPlace(id)}>
                  <span className="oil-path-plate-words">
                    <span className="oil-path-name">{name}</span>
                    <span className="oil-path-figures"><b>{percents[id]}%</b> {open[id]} open</span>
                  </span>
                </span>
              </button>
            ))}
          </div>
          <p id={help} className="sr-only">Arrow keys go along the path. Enter opens the checks of a station.</p>
        </div>
      )}
      <div className="oil-path-caption">
        <p className="oil-path-none"><span className="label">Not on the path</span> <b className="figure">{percents.none}%</b></p>
        <p>Oil stands where the suspicion is. The stations and this make <span className="figure">100%</span>.</p>
        {!asList && <Key />}
        <Button variant="quiet" className="no-print justify-self-start" aria-pressed={asList} onClick={() => setAsList(!asList)}>As a list</Button>
      </div>
      </div>
    </section>
  );
}

const levels = (suspicion: OilPathProps['suspicion']) => Object.fromEntries(STATIONS.map(({ id }) => [levelOf(id), suspicion[id]])) as CSSProperties;

function Key() {
  return (
    <p aria-hidden="true" className="oil-path-key">
      <span><i className="oil-path-key-air" />Air line</span>
      <span><i className="oil-path-key-oil" />Oil line</span>
    </p>
  );
}
