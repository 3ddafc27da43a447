import { createHash, createHmac, randomBytes } from 'node:crypto';

/**
 * The token of a mailed link: 256 bits that only who has the secret can make, out of the mail's own id. Tried again, a
 * mail holds the same link, so that it doesn't matter which copy is read; and nothing that could be stolen is kept of it.
 */
export const mailedToken = (secret: string, purpose: 'invitation' | 'password reset', id: string) => createHmac('sha256', secret).update(`mailed link: ${purpose} ${id}`).digest('base64url');

/** 256 random bits. */
const newToken = () => randomBytes(32).toString('base64url');

/** Begins every personal token, so that one is known wherever it turns up: in a log, in a repository, in an address. */
const PERSONAL = 'carryover_';

/** A personal token for scripts. */
export const newPersonalToken = () => PERSONAL + newToken();

/** Whether a text holds a personal token, whole or as part of something longer. */
export const holdsPersonalToken = (text: string) => new RegExp(`${PERSONAL}[A-Za-z0-9_-]{43}`).test(text);

/** What is kept of it. A token is random in all its bits, so that a plain hash can't be guessed back. */
export const hashToken = (token: string) => createHash('sha256').update(token).digest('hex');
