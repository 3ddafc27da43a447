import { createHash } from 'node:crypto';
import { AppError } from '@/lib/errors';

/** Of RFC 9110: `ETag` names a state, `If-Match` and `If-None-Match` make a request depend on it. */

const quoted = (version: string) => `"${version}"`;

/** A state by its content, for what has no version of its own. */
const digest = (json: string) => createHash('sha256').update(json).digest('base64url').slice(0, 22);

/**
 * The tag of an answer. One that can be changed has its version before the digest: a change names the whole tag, and is
 * of that version.
 */
export const etagOf = (json: string, version?: string | number): string => quoted(version === undefined ? digest(json) : `${version};${digest(json)}`);

/** Whether the caller has this state already. */
export function isHeld(request: Request, etag: string): boolean {
  const given = request.headers.get('if-none-match');
  if (given === null) return false;
  return given.trim() === '*' || given.split(',').some((one) => one.trim().replace(/^W\//, '') === etag);
}

/**
 * The version that a change is based on; "*" for any.
 *
 * @throws AppError "unconditional" when it isn't said and has to be
 */
export function versionInIfMatch(request: Request, { needed }: { needed: boolean }): string | undefined {
  const given = request.headers.get('if-match')?.trim();
  if (given === undefined) {
    if (!needed) return undefined;
    throw new AppError('unconditional', 'Say in If-Match which state you are changing: the ETag that reading it gave, or * for any.');
  }
  if (given === '*') return given;
  const [, version] = /^(?:W\/)?"([^";]{1,60})(?:;[\w-]+)?"$/.exec(given) ?? [];
  // Proxies that compress make a tag weak on its way; its version is what counts here. Several can’t be meant.
  return version ?? 'none of ours';
}

const LONGEST_KEY = 200;

/** @throws AppError "invalid" */
export function idempotencyKeyOf(request: Request): string | undefined {
  const key = request.headers.get('idempotency-key')?.trim();
  if (key === undefined) return undefined;
  if (key !== '' && key.length <= LONGEST_KEY) return key;
  const message = `An Idempotency-Key has 1 to ${LONGEST_KEY} characters.`;
  throw new AppError('invalid', message, { 'Idempotency-Key': message });
}
