/** A clock that a test moves by hand. */
export function makeClock(start = new Date('2026-03-02T09:00:00Z')) {
  let at = start.getTime();
  return {
    now: () => new Date(at),
    forward(ms: number) {
      at += ms;
    },
  };
}

export const MINUTE_MS = 60_000;
export const HOUR_MS = 60 * MINUTE_MS;
export const DAY_MS = 24 * HOUR_MS;
