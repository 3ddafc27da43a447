import type { Database } from '@/db/connect';
import type { Role } from '@/lib/auth/roles';
import type { JobQueue } from '@/lib/jobs';

/** Who asks, for which organisation, and with what: everything that a service may lean on. */
export interface Ctx {
  db: Database;
  organisation: { id: string; name: string; country: string; currency: string };
  person: { id: string; name: string; email: string };
  roles: readonly Role[];
  mayRelease: boolean;
  /** The clock, so that a test can set it. */
  now: () => Date;
  jobs: JobQueue;
}
