import type { Database } from '@/db/connect';
import type { Role } from '@/lib/auth/roles';
import type { JobQueue } from '@/lib/jobs';
import type { Storage } from '@/lib/storage';
import type { UnitPreferences } from '@/lib/units';
import type { Repeat } from './repeat';

/** Who asks, for which organisation, and with what: everything that a service may lean on. */
export interface Ctx {
  db: Database;
  organisation: { id: string; name: string; country: string; currency: string };
  /** `units` is what to show quantities in; `siteId` the site that he or she works at, if one is set. */
  person: { id: string; name: string; email: string; units: UnitPreferences; siteId: string | null };
  roles: readonly Role[];
  mayRelease: boolean;
  /** The clock, so that a test can set it. */
  now: () => Date;
  jobs: JobQueue;
  /** Where photos are kept. */
  storage: Storage;
  /** What links are signed with. */
  signingSecret: string;
  /** Given when the request may be a repeat of one that was done already. */
  repeat?: Repeat;
}

/** Somebody who isn't signed in: all that is known is where the request came from. */
export interface Visitor {
  db: Database;
  /** Network address, to slow guessing. */
  network: string;
  now: () => Date;
  jobs: JobQueue;
  /** What links are signed with. */
  signingSecret: string;
}
