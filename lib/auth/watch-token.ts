import { createHmac, timingSafeEqual } from 'node:crypto';
import { z } from 'zod';

const contents = z.strictObject({ organisationId: z.uuid(), linkId: z.uuid(), caseId: z.uuid(), expiresAt: z.number().int() });

/** What the link of a reading says by itself. `expiresAt`: ms since 1970. */
export type WatchToken = z.infer<typeof contents>;

const signatureOf = (secret: string, payload: string) => createHmac('sha256', secret).update(`watch link ${payload}`).digest();

/** Made again it is the same, so that nothing secret of a link is kept. */
export function signWatchToken(secret: string, { organisationId, linkId, caseId, expiresAt }: WatchToken): string {
  const payload = Buffer.from(JSON.stringify({ organisationId, linkId, caseId, expiresAt })).toString('base64url');
  return `${payload}.${signatureOf(secret, payload).toString('base64url')}`;
}

/** @returns undefined for a text that we didn't sign, or that was altered */
export function readWatchToken(secret: string, token: string): WatchToken | undefined {
  const [payload = '', signature = '', ...more] = token.split('.');
  const [given, ours] = [Buffer.from(signature, 'base64url'), signatureOf(secret, payload)];
  // The same bytes can be written in more than one way; only ours is a link.
  if (more.length > 0 || given.length !== ours.length || !timingSafeEqual(given, ours) || ours.toString('base64url') !== signature) return undefined;
  return contents.safeParse(JSON.parse(Buffer.from(payload, 'base64url').toString('utf8'))).data;
}
