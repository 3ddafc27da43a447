import { z } from 'zod';
import { SCOPE_IDS } from '@/lib/auth/scopes';
import { line, rowId, several } from './common';

/** Days that a token can be made for, at most a year. */
export const TOKEN_DAYS = [7, 30, 90, 365] as const;
const LONGEST_DAYS = 365;

export const createTokenInput = z.strictObject({
  name: line('a name', 60),
  scopes: several(z.enum(SCOPE_IDS, 'This is not a scope.'))
    .refine((chosen) => chosen.length > 0, 'Choose at least one thing that it may do.')
    .transform((chosen) => SCOPE_IDS.filter((scope) => chosen.includes(scope))),
  days: z.coerce.number<unknown>('Choose how long it works.').int('Give whole days.').min(1, 'Choose how long it works.').max(LONGEST_DAYS, 'A token works for a year at most.'),
});

export const tokenInput = z.strictObject({ tokenId: rowId });
