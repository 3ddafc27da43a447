import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { narrowed, offsetOf, type ClockBounds } from '@/lib/offline/clock';

/** What a device whose clock is off by `offsetMs` (to be added to it) knows after requests that took these times. */
function afterRequests(offsetMs: number, requests: { at: number; there: number; back: number }[]): ClockBounds | undefined {
  let held: ClockBounds | undefined;
  for (const { at, there, back } of requests) {
    const serverSecond = Math.floor((at + there) / 1000) * 1000;
    held = narrowed(held, { askedAt: at - offsetMs, heardAt: at + there + back - offsetMs, serverSecond });
  }
  return held;
}

const request = fc.record({ at: fc.integer({ min: 1_700_000_000_000, max: 1_900_000_000_000 }), there: fc.integer({ min: 1, max: 5_000 }), back: fc.integer({ min: 1, max: 5_000 }) });

describe('the offset of a device’s clock', () => {
  test('always lies within the bounds, however slow the requests were', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e9, max: 1e9 }), fc.array(request, { minLength: 1, maxLength: 20 }), (offset, requests) => {
        const bounds = afterRequests(offset, requests);
        expect(bounds?.least).toBeLessThanOrEqual(offset);
        expect(bounds?.most).toBeGreaterThanOrEqual(offset);
      }),
    );
  });

  test('is known better with each request', () => {
    const requests = Array.from({ length: 40 }, (_, i) => ({ at: 1_700_000_000_000 + i * 1_137, there: 20, back: 20 }));
    const bounds = afterRequests(-600_000, requests);
    expect(offsetOf(bounds)).toBeGreaterThan(-600_100);
    expect(offsetOf(bounds)).toBeLessThan(-599_900);
  });

  test('is none where the clock may be right', () => {
    expect(offsetOf(afterRequests(0, [{ at: 1_700_000_000_400, there: 30, back: 30 }]))).toBe(0);
    expect(offsetOf(undefined)).toBe(0);
  });

  test('is learnt anew when somebody sets the clock', () => {
    const slow = afterRequests(600_000, [{ at: 1_700_000_000_000, there: 10, back: 10 }]);
    const fresh = narrowed(slow, { askedAt: 1_700_000_100_000, heardAt: 1_700_000_100_020, serverSecond: 1_700_000_100_000 });
    expect(offsetOf(fresh)).toBe(0);
  });
});
