import { z } from 'zod';

const LARGEST = 100_000_000;

/** An amount in the organisation's currency, with a point or a comma; empty is null. */
export const optionalAmount = z
  .union([z.number(), z.string().trim()])
  .nullish()
  .transform((value, context) => {
    if (value === null || value === undefined || value === '') return null;
    const amount = typeof value === 'number' ? value : Number(value.replace(',', '.'));
    if (Number.isFinite(amount) && amount >= 0 && amount < LARGEST) return Math.round(amount * 100) / 100;
    context.addIssue({ code: 'custom', message: 'Enter an amount, such as 480 or 98.50.' });
    return z.NEVER;
  });
