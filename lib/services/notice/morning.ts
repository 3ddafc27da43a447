const A_QUARTER_MS = 15 * 60_000;
const QUARTERS_OF_TWO_DAYS = 192;
const MORNING = '06:00';

/** The next six o'clock in a time zone; their differences to universal time are quarters of an hour. */
export function nextMorning(now: Date, timeZone: string): Date {
  const clock = new Intl.DateTimeFormat('en-GB', { timeZone, hour: '2-digit', minute: '2-digit', hourCycle: 'h23' });
  const first = Math.floor(now.getTime() / A_QUARTER_MS) + 1;
  for (let i = 0; i < QUARTERS_OF_TWO_DAYS; i++) {
    const at = new Date((first + i) * A_QUARTER_MS);
    if (clock.format(at) === MORNING) return at;
  }
  throw new RangeError(`It is never ${MORNING} in ${timeZone}`);
}
