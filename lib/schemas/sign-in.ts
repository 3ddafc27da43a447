import { z } from 'zod';
import { email } from './common';

/** Long enough that guessing is hopeless at the rate that is let through; longer ones are the person's choice. */
export const SHORTEST_PASSWORD = 12;
const LONGEST_PASSWORD = 200;

/** A password that is being chosen. What makes one strong is length, so that nothing else is asked of it. */
export const newPassword = z
  .string('Choose a password.')
  .min(SHORTEST_PASSWORD, `Use ${SHORTEST_PASSWORD} characters or more; a few words in a row do well.`)
  .max(LONGEST_PASSWORD, `Keep it under ${LONGEST_PASSWORD} characters.`)
  .refine((password) => new Set(password).size >= 5, 'Use more different characters.');

/** A password that is being tried. */
export const triedPassword = z.string('Enter your password.').min(1, 'Enter your password.').max(LONGEST_PASSWORD, 'That is longer than any password here.');

/** From a mailed link. */
const tokenOf = (otherwise: string) =>
  z.string().regex(/^[A-Za-z0-9_-]{43}$/, `This link is not complete. Open it from the mail once more, or ${otherwise}.`);
export const linkToken = tokenOf('ask for a new one');
export const invitationToken = tokenOf('ask the administrator who invited you for a new one');

export const signInInput = z.object({ email, password: triedPassword });

export const requestResetInput = z.object({ email });

export const viewResetInput = z.object({ token: linkToken });

export const resetPasswordInput = z.object({ token: linkToken, password: newPassword });

export const changePasswordInput = z.object({ current: triedPassword, password: newPassword });
