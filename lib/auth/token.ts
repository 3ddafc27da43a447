import { createHash, randomBytes } from 'node:crypto';

/** 256 random bits for a mailed link. */
export const newToken = () => randomBytes(32).toString('base64url');

/** Begins every personal token, so that one is known wherever it turns up: in a log, in a repository, in an address. */
const PERSONAL = 'carryover_';

/** A personal token for scripts. */
export const newPersonalToken = () => PERSONAL + newToken();

/** Whether a text holds a personal token, whole or as part of something longer. */
export const holdsPersonalToken = (text: string) => new RegExp(`${PERSONAL}[A-Za-z0-9_-]{43}`).test(text);

/** What is kept of it. A token is random in all its bits, so that a plain hash can't be guessed back. */
export const hashToken = (token: string) => createHash('sha256').update(token).digest('hex');
