import { createHmac, timingSafeEqual } from 'node:crypto';
import type { z } from 'zod';

/**
 * The secret part of links with which somebody without a sign-in does one thing: what the link says by itself, and our
 * signature. Made again it is the same, so that nothing secret of a link is kept.
 *
 * @param purpose signed with it, so that a link of one kind is none of another
 */
export function signedLink<Schema extends z.ZodType>(purpose: string, contents: Schema) {
  const signatureOf = (secret: string, payload: string) => createHmac('sha256', secret).update(`${purpose} ${payload}`).digest();
  return {
    sign(secret: string, said: z.infer<Schema>): string {
      const payload = Buffer.from(JSON.stringify(contents.parse(said))).toString('base64url');
      return `${payload}.${signatureOf(secret, payload).toString('base64url')}`;
    },

    /** @returns undefined for a text that we didn't sign, or that was altered */
    read(secret: string, token: string): z.infer<Schema> | undefined {
      const [payload = '', signature = '', ...more] = token.split('.');
      const [given, ours] = [Buffer.from(signature, 'base64url'), signatureOf(secret, payload)];
      // The same bytes can be written in more than one way; only ours is a link.
      if (more.length > 0 || given.length !== ours.length || !timingSafeEqual(given, ours) || ours.toString('base64url') !== signature) return undefined;
      return contents.safeParse(JSON.parse(Buffer.from(payload, 'base64url').toString('utf8'))).data;
    },
  };
}
