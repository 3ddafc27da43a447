/** The break-in run as times of the clock: how long the compressor has been under load, whatever page or device looks. */

/** By which a compressor is run in. SI; speed in revolutions a minute. */
export interface BreakInFigures {
  engineRpm: number;
  /** Pa: what to hold, and the band around it. */
  pressure: { aim: number; low: number; high: number };
  /** s under load. */
  duration: { least: number; most: number };
  /** Where they are from: the compressor model's record, or the rulebook's edition. */
  from: 'model' | 'edition';
  source: string | null;
}

export const BREAK_IN_EVENTS = ['pause', 'resume', 'reading'] as const;
export type BreakInEventKind = (typeof BREAK_IN_EVENTS)[number];

export interface BreakInEvent {
  id: string;
  kind: BreakInEventKind;
  /** ms of the clock. */
  at: number;
  /** Of a reading, Pa. */
  pressurePa: number | null;
}

/** What was seen while it was hot. */
export interface HotCheck {
  oil: 'none' | 'leak';
  coolant: 'none' | 'leak' | 'not-applicable';
  where: string | null;
}

/** What leaked and where; null: nothing. @example leaksOf({ oil: 'leak', coolant: 'none', where: 'at the flange' }) // 'oil leaks: at the flange' */
export function leaksOf({ oil, coolant, where }: HotCheck): string | null {
  const leaks = [oil === 'leak' && 'oil leaks', coolant === 'leak' && 'coolant leaks'].filter(Boolean).join(' and ');
  return leaks ? `${leaks}: ${where ?? ''}` : null;
}

export interface Run {
  /** ms of the clock. */
  startedAt: number;
  /** null: it goes on. */
  endedAt: number | null;
  events: readonly BreakInEvent[];
}

interface Span {
  from: number;
  to: number;
}

/**
 * The spans under load: from the start, less every pause. A pause within a pause, a resume without one and what lies outside
 * the run change nothing, so that what arrives late or twice does no harm.
 */
function spansUnderLoad({ startedAt, endedAt, events }: Run, now: number): Span[] {
  const end = Math.max(startedAt, endedAt ?? now);
  const spans: Span[] = [];
  let from: number | null = startedAt;
  for (const { kind, at } of inOrder(events)) {
    if (at < startedAt || at > end) continue;
    if (kind === 'pause' && from !== null) {
      spans.push({ from, to: at });
      from = null;
    }
    if (kind === 'resume' && from === null) from = at;
  }
  if (from !== null) spans.push({ from, to: end });
  return spans;
}

const inOrder = (events: readonly BreakInEvent[]) => [...events].sort((a, b) => a.at - b.at || (a.id < b.id ? -1 : 1));

/**
 * Time under load until an instant.
 *
 * @param run as it is known
 * @param now ms of the clock; an instant before the start counts as the start
 * @returns s, at least 0
 * @example secondsUnderLoad({ startedAt: 0, endedAt: null, events: [] }, 60_000) // 60
 */
export function secondsUnderLoad(run: Run, now: number): number {
  return spansUnderLoad(run, now).reduce((sum, { from, to }) => sum + (Math.min(to, Math.max(now, from)) - from), 0) / 1000;
}

/** Whether it stands still: the last of pause and resume is a pause. */
export function isPaused({ events }: Pick<Run, 'events'>): boolean {
  return inOrder(events).findLast(({ kind }) => kind !== 'reading')?.kind === 'pause';
}

export interface CurvePoint {
  /** s under load when it was read. */
  second: number;
  pressurePa: number;
  inBand: boolean;
}

/**
 * The readings over the time under load, for a plot against the band.
 *
 * @param run as it is known
 * @param band Pa, both ends within it
 * @returns in the order of reading
 */
export function curveOf(run: Run, band: { low: number; high: number }): CurvePoint[] {
  return inOrder(run.events).flatMap(({ kind, at, pressurePa }) =>
    kind === 'reading' && pressurePa !== null ? [{ second: secondsUnderLoad(run, at), pressurePa, inBand: pressurePa >= band.low && pressurePa <= band.high }] : [],
  );
}

/** What still keeps a run from being done, in a sentence each; none: it may be ended as done. */
export function missingForDone(run: Run, { duration }: Pick<BreakInFigures, 'duration'>, now: number): string[] {
  const seconds = secondsUnderLoad(run, now);
  const missing: string[] = [];
  if (seconds < duration.least) missing.push(`It has run ${Math.floor(seconds / 60)} of at least ${Math.round(duration.least / 60)} minutes under load.`);
  if (!run.events.some(({ kind }) => kind === 'reading')) missing.push('No pressure was read: nobody can see that it stayed under load.');
  return missing;
}
