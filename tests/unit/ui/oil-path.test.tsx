// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import fc from 'fast-check';
import { afterEach, describe, expect, test, vi } from 'vitest';
import { nextInDirection, type Direction } from '@/components/oil-path/directions';
import { OilPath } from '@/components/oil-path/OilPath';
import { TALL, WIDE } from '@/components/oil-path/places';
import { PLACES, wholePercents, type Place } from '@/components/oil-path/shares';
import { STATION_IDS, STATIONS, type StationId } from '@/lib/diagnose/stations';

afterEach(cleanup);

const shares = (values: readonly number[]) => Object.fromEntries(PLACES.map((place, i) => [place, values[i] ?? 0])) as Record<Place, number>;
const sum = (values: Record<Place, number>) => PLACES.reduce((total, place) => total + values[place], 0);

describe('whole percents', () => {
  test('add up to 100 where plain rounding would not', () => {
    expect(sum(wholePercents(shares([1 / 3, 1 / 3, 1 / 3])))).toBe(100);
    expect(Object.values(wholePercents(shares([0.335, 0.665]))).slice(0, 2).sort()).toEqual([34, 66]);
  });

  test('always add up to 100, each less than one away from the truth', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: PLACES.length, maxLength: PLACES.length }), (weights) => {
        const total = weights.reduce((a, b) => a + b, 0);
        fc.pre(total > 1e-6);
        const exact = shares(weights.map((weight) => weight / total));
        const printed = wholePercents(exact);
        expect(sum(printed)).toBe(100);
        for (const place of PLACES) expect(Math.abs(printed[place] - exact[place] * 100)).toBeLessThan(1);
      }),
    );
  });
});

describe.each([
  ['across a page', WIDE],
  ['down a phone', TALL],
])('the drawing %s', (_name, { width, height, places }) => {
  const centres = STATION_IDS.map((id) => {
    const [x, y, w, h] = places[id].box;
    return { x: x + w / 2, y: y + h / 2 };
  });

  test('can be walked from anywhere to everywhere by arrow keys', () => {
    for (const start of STATION_IDS.keys()) {
      const seen = new Set([start]);
      for (const from of seen) {
        for (const direction of ['left', 'right', 'up', 'down'] as const satisfies Direction[]) {
          const here = centres[from];
          const to = here && nextInDirection(here, direction, centres);
          if (to !== undefined) seen.add(to);
        }
      }
      expect([STATION_IDS[start], seen.size]).toEqual([STATION_IDS[start], STATION_IDS.length]);
    }
  });

  test('keeps every part and its words within itself', () => {
    for (const id of STATION_IDS) {
      const { box, label } = places[id];
      const [x, y, w, h] = box;
      expect([id, x >= 0, y >= -6, x + w <= width, y + h <= height]).toEqual([id, true, true, true, true]);
      expect([id, label[0] >= x, label[1] >= y, label[0] + label[2] <= x + w, label[1] + label[3] <= y + h]).toEqual([id, true, true, true, true]);
    }
  });
});

describe('OilPath', () => {
  const suspicion = shares([0.03, 0.19, 0.16, 0.02, 0.02, 0.04, 0.32, 0.02, 0.04, 0, 0.16]);
  const open = Object.fromEntries(STATION_IDS.map((id, i) => [id, i])) as Record<StationId, number>;

  test('is one stop of the keyboard, each station named with its figures', () => {
    const onPick = vi.fn();
    render(<OilPath drawing={null} suspicion={suspicion} open={open} picked={null} onPick={onPick} />);
    const stations = within(screen.getByRole('toolbar')).getAllByRole('button');
    for (const [i, { name }] of STATIONS.entries()) {
      expect(within(screen.getByRole('toolbar')).getByRole('button', { name: new RegExp(`^${name}, \\d+% suspicion, ${i} open$`) })).toBe(stations[i]);
    }
    expect(stations.filter(({ tabIndex }) => tabIndex === 0)).toHaveLength(1);
    fireEvent.click(screen.getByRole('button', { name: /^Dryer/ }));
    expect(onPick).toHaveBeenCalledWith('dryer');
  });

  test('stands as a list as well, with the same names', () => {
    render(<OilPath drawing={null} suspicion={suspicion} open={open} picked="drive" onPick={() => undefined} />);
    fireEvent.click(screen.getByRole('button', { name: 'As a list' }));
    expect(screen.queryByRole('toolbar')).toBeNull();
    expect(within(screen.getByRole('list', { name: 'Stations on the oil path' })).getAllByRole('button')).toHaveLength(STATIONS.length);
    expect(screen.getByRole('button', { name: /^Drive/ }).getAttribute('aria-pressed')).toBe('true');
  });

  test('a picked station is put back by a second tap', () => {
    const onPick = vi.fn();
    render(<OilPath drawing={null} suspicion={suspicion} open={open} picked="drive" onPick={onPick} />);
    fireEvent.click(screen.getByRole('button', { name: /^Drive/ }));
    expect(onPick).toHaveBeenCalledWith(null);
  });
});
