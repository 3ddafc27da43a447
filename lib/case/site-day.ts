/** The calendar day of an instant where the site is: cautions and dates are counted in days of the workshop. */
export function siteDay(at: Date, timeZone: string): string {
  // en-CA writes a date as ISO does.
  return new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' }).format(at);
}
