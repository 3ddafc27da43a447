const format = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric', timeZone: 'UTC' });

/** A day of the calendar as people read it, whatever their browser's habits: 3/4 is two different days. */
export const dayText = (day: string): string => format.format(new Date(`${day}T00:00:00Z`));
