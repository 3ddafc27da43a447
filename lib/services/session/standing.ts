import type { Database } from '@/db/connect';
import { findStanding } from '@/db/queries/sign-in';
import { isRole } from '@/lib/auth/roles';
import { withUnits } from '@/lib/units';
import type { Ctx } from '../context';
import { unitsOfCountry } from '../units-of-measure';

export type Standing = Omit<Ctx, 'db' | 'now' | 'jobs' | 'storage' | 'signingSecret' | 'repeat'>;

/**
 * What a request stands on, read anew at each; undefined when the person is no member, or his sessions were ended since
 * this one began. A token isn't a session and gives no version.
 */
export async function standingOf(
  db: Database,
  { personId, organisationId, sessionVersion }: { personId: string; organisationId: string; sessionVersion?: number },
): Promise<Standing | undefined> {
  const row = await findStanding(db, { personId, organisationId });
  if (!row || (sessionVersion !== undefined && row.sessionVersion !== sessionVersion)) return undefined;
  return {
    organisation: { id: organisationId, name: row.organisationName, country: row.country, currency: row.currency },
    person: {
      id: personId,
      name: row.name,
      email: row.email,
      units: withUnits(unitsOfCountry(row.country), row.unitPreferences ?? {}),
      siteId: row.siteId,
    },
    roles: row.roles.filter(isRole),
    mayRelease: row.mayRelease,
  };
}
