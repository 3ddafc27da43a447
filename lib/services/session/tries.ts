import { createHash } from 'node:crypto';
import { countAttempt, forgetAttempts } from '@/db/queries/attempt';
import { tooMany } from '@/lib/errors';
import type { Visitor } from '../context';

const MINUTE_MS = 60_000;

interface Limit {
  most: number;
  windowMs: number;
}

/**
 * How often something may be tried. By address, so that a password isn't guessed from many places; by network address,
 * so that one place doesn't try many addresses. A whole workshop may sit behind one network address.
 */
export const LIMITS = {
  'sign-in by address': { most: 10, windowMs: 15 * MINUTE_MS },
  'sign-in by network': { most: 100, windowMs: 15 * MINUTE_MS },
  'reset by address': { most: 5, windowMs: 60 * MINUTE_MS },
  'reset by network': { most: 40, windowMs: 60 * MINUTE_MS },
  'link by network': { most: 60, windowMs: 15 * MINUTE_MS },
  // A passage is a dozen requests, and a counter has one network address.
  'gate by network': { most: 400, windowMs: 15 * MINUTE_MS },
  'gate unit by network': { most: 40, windowMs: 15 * MINUTE_MS },
  'dossier by network': { most: 60, windowMs: 15 * MINUTE_MS },
} as const satisfies Record<string, Limit>;

export type Tried = keyof typeof LIMITS;

/** Windows begin at fixed times, the same for everybody; keys are hashes, so that the table holds no addresses. */
function slot({ now }: Visitor, tried: Tried, subject: string) {
  const { windowMs } = LIMITS[tried];
  return {
    key: createHash('sha256').update(`${tried}\n${subject}`).digest('base64url'),
    windowStart: new Date(Math.floor(now().getTime() / windowMs) * windowMs),
  };
}

/** Counts a try and says whether it may go on. Counted whether or not the subject exists. */
export async function mayTry(visitor: Visitor, tried: Tried, subject: string): Promise<boolean> {
  return (await countAttempt(visitor.db, slot(visitor, tried, subject))) <= LIMITS[tried].most;
}

export async function tryOrRefuse(visitor: Visitor, tried: Tried, subject: string): Promise<void> {
  if (await mayTry(visitor, tried, subject)) return;
  throw tooMany(`That was tried too often. Wait ${LIMITS[tried].windowMs / MINUTE_MS} minutes, then try again.`);
}

export const forgetTries = (visitor: Visitor, tried: Tried, subject: string) => forgetAttempts(visitor.db, slot(visitor, tried, subject));
