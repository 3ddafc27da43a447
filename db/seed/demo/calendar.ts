/**
 * The demo's days are counted from the first of its record, so that the same things happen whatever today is; only
 * here they become dates.
 */
export const DAYS_OF_RECORD = 3 * 365;

const DAY_MS = 86_400_000;
const OPENS_MINUTE = 7 * 60;
const CLOSES_MINUTE = 16 * 60 + 30;

export interface Calendar {
  /** "YYYY-MM-DD" of a day; days before the record are negative. */
  date(day: number): string;
  /** 0 in January to 11. */
  month(day: number): number;
  isSunday(day: number): boolean;
  /** The instant at so many minutes past midnight where a site is. */
  at(day: number, minute: number, timeZone: string): Date;
}

/** @param today its start, UTC; the record ends the day before */
export function calendarTo(today: Date): Calendar {
  const first = Math.floor(today.getTime() / DAY_MS) - DAYS_OF_RECORD;
  const midnight = (day: number) => new Date((first + day) * DAY_MS);
  const offsets = new Map<string, number>();
  const offsetMs = (day: number, timeZone: string) => {
    const key = `${timeZone} ${day}`;
    const known = offsets.get(key) ?? zoneOffsetMs(midnight(day).getTime() + DAY_MS / 2, timeZone);
    offsets.set(key, known);
    return known;
  };
  return {
    date: (day) => midnight(day).toISOString().slice(0, 10),
    month: (day) => midnight(day).getUTCMonth(),
    isSunday: (day) => midnight(day).getUTCDay() === 0,
    at: (day, minute, timeZone) => new Date(Math.round(midnight(day).getTime() + minute * 60_000) - offsetMs(day, timeZone)),
  };
}

const formats = new Map<string, Intl.DateTimeFormat>();

/** How far the clocks of a zone are ahead of UTC. */
function zoneOffsetMs(at: number, timeZone: string): number {
  const format = formats.get(timeZone) ?? new Intl.DateTimeFormat('en', { timeZone, timeZoneName: 'longOffset' });
  formats.set(timeZone, format);
  const parts = format.formatToParts(at);
  const [, sign = '+', hours = '0', minutes = '0'] = /([+-])(\d+):(\d+)/.exec(parts.find(({ type }) => type === 'timeZoneName')?.value ?? '') ?? [];
  return (sign === '-' ? -1 : 1) * (Number(hours) * 60 + Number(minutes)) * 60_000;
}

/** Time passing in a workshop: half past four is the end of a day, and nobody works on Sundays. */
export class WorkClock {
  private minute: number;

  constructor(
    private readonly calendar: Calendar,
    private readonly timeZone: string,
    public day: number,
    startMinute: number,
  ) {
    this.minute = startMinute;
    this.skipSunday();
  }

  /** Nothing of the demo happens today or later. */
  get isOver(): boolean {
    return this.day >= DAYS_OF_RECORD;
  }

  now(): Date {
    return this.calendar.at(this.day, this.minute, this.timeZone);
  }

  advance(minutes: number): void {
    this.minute += minutes;
    if (this.minute <= CLOSES_MINUTE) return;
    this.day += 1;
    // What is left of a long job goes on in the morning, a coffee later.
    this.minute = OPENS_MINUTE + 10 + Math.min(minutes, 120) / 4;
    this.skipSunday();
  }

  /** To a minute of a later day. */
  goTo(day: number, minute: number): void {
    if (day <= this.day) return;
    this.day = day;
    this.minute = minute;
    this.skipSunday();
  }

  private skipSunday(): void {
    if (this.calendar.isSunday(this.day)) this.day += 1;
  }
}
