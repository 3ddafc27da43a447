import { z } from 'zod';

/** Pieces of the forms that keep records: units, models, fits. */

/** A figure as typed, with or without its unit; whether it can be read is for lib/units to say. */
export const measureText = z
  .string()
  .trim()
  .max(60, 'That is longer than a figure with its unit.')
  .nullish()
  .transform((text) => text || null);

/** A day of the calendar, "YYYY-MM-DD". */
export const day = (what: string) => z.iso.date(`Give ${what} as a date.`).refine((text) => text >= '1950-01-01', 'That is too long ago.');

export const optionalDay = z
  .union([z.literal(''), day('it')], 'Give it as a date.')
  .nullish()
  .transform((text) => text || null);

/** A whole number in a text field, or nothing. */
export const optionalCount = (most: number) =>
  z
    .union([z.literal(''), z.coerce.number<string | number>().int().min(1).max(most)], `A whole number from 1 to ${most}.`)
    .nullish()
    .transform((value) => value || null);

/** What a form was filled from: the time of the row's last change. A later one means that somebody else saved. */
export const versionText = z.string().max(40);

export const reason = z.string('Say why.').trim().min(1, 'Say why.').max(500, 'Keep it under 500 characters.');
