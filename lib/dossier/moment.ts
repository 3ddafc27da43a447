/** An instant as a document says it, where the site is: "2 Mar 2026, 09:10". @param at ISO 8601 */
export const momentText = (at: string | Date, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone }).format(new Date(at));
