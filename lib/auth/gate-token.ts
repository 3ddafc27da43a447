import { z } from 'zod';
import { signedLink } from './signed-link';

/** `expiresAt`: ms since 1970. */
const contents = z.strictObject({ organisationId: z.uuid(), gateId: z.uuid(), siteId: z.uuid(), expiresAt: z.number().int() });

/** What the link of a gate says by itself. */
export type GateToken = z.infer<typeof contents>;

export const { sign: signGateToken, read: readGateToken } = signedLink('gate', contents);
