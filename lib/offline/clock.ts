/**
 * How far this device's clock is off. Each answer of the server says its time to the second, and we know when we asked
 * and when we heard: that bounds the offset, and bounds of several answers together narrow it.
 */
export interface ClockBounds {
  /** The offset (server less device, in ms) is at least and at most this. */
  least: number;
  most: number;
}

const KEPT = 'carryover-clock';

/**
 * Narrows what is known by one more answer. Bounds that contradict each other mean that somebody set the clock: then
 * the newest alone count.
 *
 * @param held what was known; undefined at first
 * @param askedAt, heardAt by the device's clock, in ms
 * @param serverSecond the server's time, cut to the second, in ms
 * @example narrowed(undefined, { askedAt: 1000, heardAt: 1200, serverSecond: 601_000 }) // { least: 599_800, most: 601_000 }
 */
export function narrowed(
  held: ClockBounds | undefined,
  { askedAt, heardAt, serverSecond }: { askedAt: number; heardAt: number; serverSecond: number },
): ClockBounds {
  const fresh = { least: serverSecond - heardAt, most: serverSecond + 1000 - askedAt };
  if (!held) return fresh;
  const both = { least: Math.max(held.least, fresh.least), most: Math.min(held.most, fresh.most) };
  return both.least <= both.most ? both : fresh;
}

/** What to add to this device's clock: nothing, if it may be right. */
export function offsetOf(bounds: ClockBounds | undefined): number {
  if (!bounds || (bounds.least <= 0 && bounds.most >= 0)) return 0;
  return Math.round((bounds.least + bounds.most) / 2);
}

let known: ClockBounds | undefined;

function remembered(): ClockBounds | undefined {
  try {
    return known ?? (JSON.parse(localStorage.getItem(KEPT) ?? 'null') as ClockBounds | null) ?? undefined;
  } catch {
    return known;
  }
}

/** Learns from an answer of the server. */
export function heardFrom(response: Response, askedAt: number, heardAt = Date.now()): void {
  const serverSecond = Date.parse(response.headers.get('date') ?? '');
  // A copy from a cache tells the time at which it was made.
  if (Number.isNaN(serverSecond) || Number(response.headers.get('age') ?? 0) > 0) return;
  known = narrowed(remembered(), { askedAt, heardAt, serverSecond });
  try {
    localStorage.setItem(KEPT, JSON.stringify(known));
  } catch {
    // Without storage it is learnt anew on each page.
  }
}

let lastStamp = 0;

/** Now, as an answer is stamped: no two of one page at the same time, so that their order is never in doubt. */
export function stamp(): { deviceAt: string; clockOffsetMs: number } {
  lastStamp = Math.max(lastStamp + 1, Date.now());
  return { deviceAt: new Date(lastStamp).toISOString(), clockOffsetMs: offsetOf(remembered()) };
}
