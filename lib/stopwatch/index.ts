/**
 * A stopwatch as data. It remembers at what time of the clock it was started, stopped and marked, and counts nothing:
 * a locked screen, a sleeping tab or a reload takes nothing from it.
 */
export interface Stopwatch {
  /** By the device's clock, in ms since 1970; null: not started. */
  readonly startedAt: number | null;
  /** null: it runs, or was not started. */
  readonly stoppedAt: number | null;
  /** What was passed on the way, in order. */
  readonly marks: readonly Mark[];
}

export interface Mark {
  /** What was passed, as it is kept: never how a person reads it, who may change units meanwhile. */
  readonly id: string;
  readonly at: number;
}

export const IDLE: Stopwatch = { startedAt: null, stoppedAt: null, marks: [] };

export const isRunning = ({ startedAt, stoppedAt }: Stopwatch): boolean => startedAt !== null && stoppedAt === null;

/** Starts from nothing, whatever was there before. @example started(0) // { startedAt: 0, stoppedAt: null, marks: [] } */
export const started = (now: number): Stopwatch => ({ startedAt: now, stoppedAt: null, marks: [] });

/** Stops one that runs; any other stays as it is. */
export const stopped = (watch: Stopwatch, now: number): Stopwatch => (isRunning(watch) ? { ...watch, stoppedAt: now } : watch);

/** Notes when something was passed, in one that runs; any other stays as it is. */
export const marked = (watch: Stopwatch, id: string, now: number): Stopwatch =>
  isRunning(watch) ? { ...watch, marks: [...watch.marks, { id, at: now }] } : watch;

/**
 * How long it ran, or has run so far.
 *
 * @param now by the same clock, in ms; any number once it is stopped
 * @returns ms; undefined before the start, and where somebody has set the clock back past the start meanwhile: then
 *   nobody knows
 * @example elapsedMs(started(1_000), 3_500) // 2500
 */
export function elapsedMs({ startedAt, stoppedAt }: Stopwatch, now: number): number | undefined {
  if (startedAt === null) return undefined;
  const elapsed = (stoppedAt ?? now) - startedAt;
  return elapsed < 0 ? undefined : elapsed;
}

/** From the start to each mark, in ms. */
export const splits = ({ startedAt, marks }: Stopwatch): { id: string; ms: number }[] =>
  startedAt === null ? [] : marks.map(({ id, at }) => ({ id, ms: at - startedAt }));

/**
 * As a stopwatch shows it: tenths below an hour, seconds above.
 *
 * @param ms 0 or more
 * @example clockFace(83_450) // '1:23.4'
 */
export function clockFace(ms: number): string {
  const tenths = Math.floor(ms / 100);
  const [hours, minutes, seconds] = [Math.floor(tenths / 36_000), Math.floor(tenths / 600) % 60, Math.floor(tenths / 10) % 60];
  const two = (number: number) => String(number).padStart(2, '0');
  return hours > 0 ? `${hours}:${two(minutes)}:${two(seconds)}` : `${minutes}:${two(seconds)}.${tenths % 10}`;
}

/** Reads what was kept as text; anything else is a stopwatch that was not started. */
export function readStopwatch(text: string | null): Stopwatch {
  try {
    const { startedAt, stoppedAt, marks } = JSON.parse(text ?? '') as Record<keyof Stopwatch, unknown>;
    const instant = (value: unknown): value is number | null => value === null || Number.isFinite(value);
    if (!instant(startedAt) || !instant(stoppedAt) || !Array.isArray(marks)) return IDLE;
    // Marks were once kept by the words on their keys, which are the ids of today.
    const read = (marks as (Partial<Mark> & { label?: unknown })[]).map(({ id, label, at }) => ({ id: id ?? label, at }));
    return { startedAt, stoppedAt, marks: read.filter((mark): mark is Mark => typeof mark.id === 'string' && Number.isFinite(mark.at)) };
  } catch {
    return IDLE;
  }
}
