import { z } from 'zod';
import { signedLink } from './signed-link';

/** `expiresAt`: ms since 1970. */
const contents = z.strictObject({ organisationId: z.uuid(), linkId: z.uuid(), caseId: z.uuid(), expiresAt: z.number().int() });

/** What the link of a reading says by itself. */
export type WatchToken = z.infer<typeof contents>;

export const { sign: signWatchToken, read: readWatchToken } = signedLink('watch link', contents);
