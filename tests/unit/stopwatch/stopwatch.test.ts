import { describe, expect, test } from 'vitest';
import { clockFace, elapsedMs, IDLE, isRunning, marked, readStopwatch, splits, started, stopped } from '@/lib/stopwatch';

describe('a stopwatch', () => {
  test('counts by the clock and not by ticks: hours of sleep are in it', () => {
    expect(elapsedMs(started(1_000), 1_000 + 8 * 3_600_000)).toBe(8 * 3_600_000);
  });

  test('keeps its time once stopped', () => {
    const watch = stopped(started(0), 15_300);
    expect(elapsedMs(watch, 999_999)).toBe(15_300);
    expect(stopped(watch, 20_000)).toBe(watch);
  });

  test('is unknown before its start, and where the clock was set back past it', () => {
    expect(elapsedMs(IDLE, 5)).toBeUndefined();
    expect(elapsedMs(started(10_000), 9_000)).toBeUndefined();
  });

  test('marks what is passed, while it runs only', () => {
    const watch = marked(marked(started(500), '90 psi', 5_500), '95 psi', 10_700);
    expect(splits(watch)).toEqual([{ id: '90 psi', ms: 5_000 }, { id: '95 psi', ms: 10_200 }]);
    const done = stopped(watch, 16_000);
    expect(marked(done, '110 psi', 17_000)).toBe(done);
    expect(marked(IDLE, '85 psi', 1)).toBe(IDLE);
  });

  test('goes on after it was kept as text', () => {
    const watch = marked(started(1), 'a', 2);
    expect(readStopwatch(JSON.stringify(watch))).toEqual(watch);
    expect(isRunning(readStopwatch(JSON.stringify(watch)))).toBe(true);
  });

  test('reads marks that were kept by their words, and leaves out what is none', () => {
    const kept = { startedAt: 0, stoppedAt: null, marks: [{ label: '90 psi', at: 5_000 }, { id: '95 psi', at: 9_000 }, { at: 1 }, { id: 'x', at: 'late' }] };
    expect(splits(readStopwatch(JSON.stringify(kept)))).toEqual([{ id: '90 psi', ms: 5_000 }, { id: '95 psi', ms: 9_000 }]);
    expect(readStopwatch('{"startedAt":0,"stoppedAt":null,"marks":[null]}')).toEqual(IDLE);
  });

  test.each(['', 'null', '{', '[]', '{"startedAt":"soon","stoppedAt":null,"marks":[]}', '{"startedAt":1}'])('reads %j as not started', (text) => {
    expect(readStopwatch(text)).toEqual(IDLE);
    expect(readStopwatch(null)).toEqual(IDLE);
  });

  test.each([
    [0, '0:00.0'],
    [999, '0:00.9'],
    [83_450, '1:23.4'],
    [3_599_999, '59:59.9'],
    [3_600_000, '1:00:00'],
    [36_000_000 + 61_000, '10:01:01'],
  ])('shows %d ms as %s', (ms, face) => {
    expect(clockFace(ms)).toBe(face);
  });
});
