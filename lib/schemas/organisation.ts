import { z } from 'zod';
import { line, rowId } from './common';
import { versionText } from './record';

/** Whether the runtime knows it: the list itself differs from one to the next, and a browser may know a newer one. */
function isTimeZone(name: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: name });
    return true;
  } catch {
    return false;
  }
}

const timeZone = z
  .string('Choose a time zone.')
  .max(64, 'This time zone is not known here.')
  .refine((name) => name.includes('/') && isTimeZone(name), 'This time zone is not known here. Write it as Europe/Lisbon.');

export const addSiteInput = z.object({ name: line('the name of the site', 80), timeZone });
export const changeSiteInput = addSiteInput.extend({
  siteId: rowId,
  /** Given by a script, which is refused when the site isn't as it was when it was read. */
  version: versionText.optional(),
});

const code = (kind: 'region' | 'currency', length: number, message: string) =>
  z
    .string(message)
    .trim()
    .toUpperCase()
    .refine((text) => new RegExp(`^[A-Z]{${length}}$`).test(text) && new Intl.DisplayNames('en', { type: kind, fallback: 'none' }).of(text) !== undefined, message);

/** An amount per hour, with a point or a comma; empty when the rulebook's is to be used. */
const labourRate = z
  .union([z.number(), z.string().trim()])
  .nullish()
  .transform((value, context) => {
    if (value === null || value === undefined || value === '') return null;
    const amount = typeof value === 'number' ? value : Number(value.replace(',', '.'));
    if (Number.isFinite(amount) && amount > 0 && amount < 10_000) return amount;
    context.addIssue({ code: 'custom', message: 'Enter what an hour costs, such as 120 or 98.50.' });
    return z.NEVER;
  });

export const changeOrganisationInput = z.object({
  name: line('the name of the organisation', 120),
  country: code('region', 2, 'Enter the country as two letters, such as US or PT.'),
  currency: code('currency', 3, 'Enter the currency as three letters, such as USD or EUR.'),
  labourRatePerHour: labourRate,
});
