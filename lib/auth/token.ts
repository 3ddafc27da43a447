import { createHash, randomBytes } from 'node:crypto';

/** 256 random bits for a mailed link. */
export const newToken = () => randomBytes(32).toString('base64url');

/** What is kept of it. A token is random in all its bits, so that a plain hash can't be guessed back. */
export const hashToken = (token: string) => createHash('sha256').update(token).digest('hex');
