import { describe, expect, it } from 'vitest';
import { curveOf, isPaused, missingForDone, secondsUnderLoad, type BreakInEvent, type Run } from '@/lib/break-in';

const START = Date.UTC(2026, 2, 2, 9);
const minute = (n: number) => START + n * 60_000;
const event = (kind: BreakInEvent['kind'], minutes: number, pressurePa: number | null = null): BreakInEvent => ({ id: `${kind}-${minutes}`, kind, at: minute(minutes), pressurePa });
const run = (events: BreakInEvent[] = [], endedAt: number | null = null): Run => ({ startedAt: START, endedAt, events });

describe('time under load', () => {
  it('is that of the clock, less every pause', () => {
    expect(secondsUnderLoad(run(), minute(12.5))).toBe(750);
    expect(secondsUnderLoad(run([event('pause', 5), event('resume', 15)]), minute(20))).toBe(600);
    expect(secondsUnderLoad(run([event('pause', 5)]), minute(60))).toBe(300);
  });

  it('ends with the run, and is nothing before its start', () => {
    expect(secondsUnderLoad(run([], minute(21)), minute(90))).toBe(21 * 60);
    expect(secondsUnderLoad(run(), minute(-5))).toBe(0);
  });

  it('is the same in whatever order events arrive, and however often somebody pauses or goes on', () => {
    const events = [event('pause', 4), event('pause', 6), event('resume', 10), event('resume', 12), event('pause', 30)];
    for (let i = 0; i < events.length; i++) {
      const turned = [...events.slice(i), ...events.slice(0, i)];
      expect(secondsUnderLoad(run(turned), minute(40))).toBe(24 * 60);
    }
    expect(secondsUnderLoad(run([event('resume', 3)]), minute(10))).toBe(600);
  });

  it('takes no notice of what lies outside the run', () => {
    expect(secondsUnderLoad(run([event('pause', -3), event('resume', 50)], minute(20)), minute(60))).toBe(1200);
  });

  it('never grows while it stands still, and by a second a second while it runs', () => {
    const paused = run([event('pause', 10)]);
    for (let s = 0; s < 600; s += 7) expect(secondsUnderLoad(paused, minute(10) + s * 1000)).toBe(600);
    for (let s = 1; s < 600; s += 7) expect(secondsUnderLoad(run(), START + s * 1000) - secondsUnderLoad(run(), START + (s - 1) * 1000)).toBeCloseTo(1, 9);
  });
});

it('stands still when the last of pause and resume is a pause', () => {
  expect(isPaused(run())).toBe(false);
  expect(isPaused(run([event('pause', 5), event('reading', 6, 1)]))).toBe(true);
  expect(isPaused(run([event('resume', 7), event('pause', 5)]))).toBe(false);
});

it('draws readings over the time under load, both ends of the band within it', () => {
  const points = curveOf(run([event('reading', 2, 500), event('pause', 5), event('resume', 25), event('reading', 26, 601), event('reading', 27, 600)]), { low: 500, high: 600 });
  expect(points).toEqual([
    { second: 120, pressurePa: 500, inBand: true },
    { second: 360, pressurePa: 601, inBand: false },
    { second: 420, pressurePa: 600, inBand: true },
  ]);
});

it('is done when it ran long enough and somebody read the pressure', () => {
  const figures = { duration: { least: 1200, most: 1800 } };
  expect(missingForDone(run(), figures, minute(19.9))).toEqual(['It has run 19 of at least 20 minutes under load.', 'No pressure was read: nobody can see that it stayed under load.']);
  expect(missingForDone(run([event('reading', 3, 1)]), figures, minute(20))).toEqual([]);
});
