import { z } from 'zod';

/** Pieces that schemas of forms and requests are made of. */

export const rowId = z.uuid('This is not the id of anything here.');

/** A required line of text. */
export const line = (what: string, most = 120) =>
  z.string(`Enter ${what}.`).trim().min(1, `Enter ${what}.`).max(most, `Keep it under ${most} characters.`);

/** A line that may stay empty, which is null. */
export const optionalLine = (most = 500) =>
  z.string().trim().max(most, `Keep it under ${most} characters.`).nullish().transform((text) => text || null);

/** An address for mail, compared in lower case. */
export const email = z
  .string('Enter an email address.')
  .trim()
  .toLowerCase()
  .max(254, 'Keep it under 254 characters.')
  .pipe(z.email('Enter an email address, such as name@example.org.'));

/** A checkbox: a form sends "on" or nothing, a script true or false. */
export const checkbox = z
  .union([z.boolean(), z.literal(['on', 'true', 'false', ''])])
  .optional()
  .transform((value) => value === true || value === 'on' || value === 'true');

/** Several of the same name: a form with one ticked sends a single text, with none nothing at all. */
export const several = <Item extends z.ZodType>(item: Item) =>
  z.preprocess((value) => (value === undefined ? [] : Array.isArray(value) ? value : [value]), z.array(item).max(100));

/** A choice from a list that may stay open, which is null. */
export const optionalId = z
  .union([z.literal(''), rowId])
  .nullish()
  .transform((value) => value || null);

/** A page number in an address; nonsense there is page one. */
export const pageNumber = z.coerce.number().int().min(1).max(1_000_000).catch(1);
